import type { SheetColumnView, SheetRowsView } from '@/lib/contract/sheet-rows';
import { contentOf } from '@/lib/corrections';
import { columnLetters } from '@/lib/schedule/cell';
import { FIELDS, type Field, type SheetMatching } from '@/lib/schedule/field';
import type { ReadState } from '@/lib/services/schedule/state';

type RowState = SheetRowsView['rows'][number]['received'];

/** The columns that hold a field, in the sheet's order. */
export function columnsOf({ columns }: SheetMatching): SheetColumnView[] {
  return (Object.entries(columns) as [Field, number][])
    .map(([field, index]) => ({ index, letters: columnLetters(index), field, title: FIELDS[field] }))
    .sort((a, b) => a.index - b.index);
}

/** What the wanted rows of a sheet hold in a state, looked up in one pass over it. */
export function rowStates(
  { sheets, list }: ReadState,
  name: string,
  columns: readonly SheetColumnView[],
  wanted: readonly number[],
): (row: number) => RowState {
  const numbers = new Set(wanted);
  const rows =
    sheets.find((sheet) => sheet.name === name)?.rows.filter((row) => numbers.has(row.number)) ?? [];
  const cells = new Map(rows.map((row) => [row.number, row.cells]));
  const begun = list.activities.filter((activity) => activity.sheet === name && numbers.has(activity.row));
  const estimates = new Map(
    begun.map(({ row, optimistic, likely, pessimistic }) => [
      row,
      { optimistic: optimistic.days, likely: likely.days, pessimistic: pessimistic.days },
    ]),
  );
  return (row) => ({
    cells: columns.map(({ index }) => String(contentOf(cells.get(row)?.[index]) ?? '')),
    estimates: estimates.get(row) ?? null,
  });
}
