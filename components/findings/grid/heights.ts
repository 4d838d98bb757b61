import type { FindingView } from '@/lib/contract/submission';
import { aboutText } from '../place-text';
import { linesOf, MOST_LINES, remembering, type Measure } from '../row-height';
import type { ColumnId } from './columns';
import type { GridShape } from './context';
import { fixText, messageText, sideNotes } from './texts';

/** Widths of the columns, as the grid has laid them out; px. */
export type ColumnWidths = Readonly<Partial<Record<ColumnId, number>>>;

/** Left and right of a cell's text, above and below it; px. */
const SIDES = 22;
const AROUND = 15;
const CARD_AROUND = 24;

/** Heights that let each row show its texts, so that nothing moves while one scrolls. */
export function makeHeights(
  shape: GridShape,
  widths: ColumnWidths,
  measure: Measure,
  line: number,
): (finding: FindingView) => number {
  const lines = (text: string, column: ColumnId) =>
    Math.min(MOST_LINES, linesOf(text, (widths[column] ?? 200) - SIDES, measure));
  const rowLines = (finding: FindingView): number => {
    const message = lines(messageText(finding), shape === 'cards' ? 'card' : 'message');
    if (shape === 'cards') return 3 + message;
    const told = shape === 'fair' ? 1 + message : Math.max(message, lines(aboutText(finding), 'about'));
    return Math.max(told, lines(fixText(finding), 'fix'), 1 + sideNotes(finding).length);
  };
  const known = new WeakMap<FindingView, number>();
  return (finding) => {
    const height =
      known.get(finding) ?? Math.ceil(rowLines(finding) * line + (shape === 'cards' ? CARD_AROUND : AROUND));
    known.set(finding, height);
    return height;
  };
}

/** The widths known already where nothing differs, so that no row is measured again. */
export function sameWidths(known: ColumnWidths, now: ColumnWidths): ColumnWidths {
  const ids = Object.keys(now) as ColumnId[];
  const same = ids.length === Object.keys(known).length && ids.every((id) => known[id] === now[id]);
  return same ? known : now;
}

/** Measures in the page's own face; about right where a canvas cannot be had. */
export function canvasMeasure(font: string): Measure {
  const context = typeof document === 'undefined' ? null : document.createElement('canvas').getContext('2d');
  if (!context) return (text) => text.length * 7;
  context.font = font;
  return remembering((text) => context.measureText(text).width);
}
