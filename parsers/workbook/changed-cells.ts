import { applyCorrections, cellReader, type Corrections, editsOf } from '@/lib/corrections';
import type { Sheet } from '@/lib/schedule/sheet';
import type { ChangedCell } from './types';

/** The cells that differ between received and corrected, each once, in the order they were first corrected. */
export function changedCells(received: readonly Sheet[], corrections: Corrections): ChangedCell[] {
  const was = cellReader(received);
  const is = cellReader(applyCorrections(received, corrections));
  const cells = new Map<string, ChangedCell>();
  for (const { sheet, cell } of editsOf(corrections)) {
    const [before, after] = [was(sheet, cell), is(sheet, cell)];
    if (!before || !after || before.content === after.content) continue;
    const { row, column } = after;
    cells.set(`${after.cell} ${sheet}`, {
      ...{ sheet, row, column, cell: after.cell },
      from: before.content,
      to: after.content,
    });
  }
  return [...cells.values()];
}
