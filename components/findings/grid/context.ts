import type { Format } from '@/components/ui/locale';

/** What the cells need beside their row. */
export interface GridContext {
  readonly format: Format;
  readonly severalSheets: boolean;
}

/** How much room the grid has: every column, fewer, or one column of cards. */
export type GridShape = 'wide' | 'fair' | 'cards';

export function shapeFor(width: number): GridShape {
  if (width < 620) return 'cards';
  return width < 800 ? 'fair' : 'wide';
}
