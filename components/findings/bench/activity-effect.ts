import type { CellEditView } from '@/lib/contract/submission';
import type { RowEstimates, SheetColumnView, SheetRowsView } from '@/lib/contract/sheet-rows';
import { parseAddress } from '@/lib/schedule/cell';

/** The estimates of one activity as used, working days, with its expected duration and variance, working days². */
export interface Moments {
  readonly optimistic: number;
  readonly likely: number;
  readonly pessimistic: number;
  readonly expected: number;
  readonly variance: number;
}

/** (a + 4m + b) / 6 and ((b − a) / 6)² (Malcolm, Roseboom, Clark, Fazar 1959); a missing a or b is taken as m. */
export function momentsOf(estimates: RowEstimates | null): Moments | null {
  if (!estimates || estimates.likely === null) return null;
  const m = estimates.likely;
  const a = estimates.optimistic ?? m;
  const b = estimates.pessimistic ?? m;
  return {
    optimistic: a,
    likely: m,
    pessimistic: b,
    expected: (a + 4 * m + b) / 6,
    variance: ((b - a) / 6) ** 2,
  };
}

/**
 * What a fix would make of the moments of the activity in `row`. Null where it touches no estimate of it, or
 * where the working days of a new value cannot be told from what the cell holds now.
 */
export function activityEffect(
  piece: SheetRowsView,
  row: number,
  edits: readonly CellEditView[],
): { readonly before: Moments; readonly after: Moments } | null {
  const shown = piece.rows.find((candidate) => candidate.row === row);
  const estimates = shown?.corrected.estimates;
  const before = momentsOf(estimates ?? null);
  if (!shown || !estimates || !before) return null;
  let after: RowEstimates = estimates;
  let touched = false;
  for (const edit of edits) {
    const column = columnOf(piece.columns, edit, row);
    if (!column) continue;
    const unit = daysPerUnit(piece.columns, shown.corrected.cells, estimates, column);
    const value = plainNumber(edit.to);
    if (value === null || unit === null) return null;
    after = { ...after, ...written(column.field, value * unit) };
    touched = true;
  }
  const moments = touched ? momentsOf(after) : null;
  return moments && { before, after: moments };
}

type EstimateField = keyof RowEstimates | 'duration';

function columnOf(
  columns: readonly SheetColumnView[],
  edit: CellEditView,
  row: number,
): { readonly field: EstimateField } | null {
  const at = parseAddress(edit.cell);
  const field = at?.row === row ? columns.find(({ index }) => index === at.column)?.field : undefined;
  return isEstimate(field) ? { field } : null;
}

function isEstimate(field: string | undefined): field is EstimateField {
  return field === 'optimistic' || field === 'likely' || field === 'pessimistic' || field === 'duration';
}

/** Working days of 1 in the cell's unit, told from a plain number that stands in one of the row's estimate cells. */
function daysPerUnit(
  columns: readonly SheetColumnView[],
  cells: readonly string[],
  estimates: RowEstimates,
  column: { readonly field: EstimateField },
): number | null {
  const own = unitFrom(columns, cells, estimates, column.field);
  if (own !== null) return own;
  const others = (['likely', 'optimistic', 'pessimistic'] as const).map((field) =>
    unitFrom(columns, cells, estimates, field),
  );
  return others.find((unit) => unit !== null) ?? null;
}

function unitFrom(
  columns: readonly SheetColumnView[],
  cells: readonly string[],
  estimates: RowEstimates,
  field: EstimateField,
): number | null {
  const value = plainNumber(cells[columns.findIndex((column) => column.field === field)] ?? null);
  const days = field === 'duration' ? estimates.likely : estimates[field];
  return days === null || days === 0 || value === null || value === 0 ? null : days / value;
}

/** A number without a unit or a doubtful separator; in a text file a number is a text as well. */
function plainNumber(content: CellEditView['to']): number | null {
  if (typeof content === 'number') return content;
  return content !== null && /^-?\d+(\.\d+)?$/.test(content.trim()) ? Number(content) : null;
}

function written(field: EstimateField, days: number): Partial<RowEstimates> {
  if (field === 'duration') return { optimistic: days, likely: days, pessimistic: days };
  return { [field]: days };
}
