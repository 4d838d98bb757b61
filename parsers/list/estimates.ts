import type { Estimate, Unit } from '@/lib/schedule/activity';
import type { ActivityList, ReadingOptions } from '@/lib/schedule/activity-list';
import type { Field } from '@/lib/schedule/field';
import type { SheetRow } from '@/lib/schedule/sheet';
import { type DurationContext, numberIn, readDuration } from '@/parsers/cells/duration';
import { settleMark } from '@/parsers/cells/number';
import { toContent } from '@/parsers/cells/text';
import type { SheetCells } from './sheet-cells';

export type EstimateField = 'optimistic' | 'likely' | 'pessimistic' | 'duration';

export interface ThreeEstimates {
  readonly optimistic: Estimate;
  readonly likely: Estimate;
  readonly pessimistic: Estimate;
}

const NO_COLUMN: Estimate = {
  days: null,
  text: '',
  content: null,
  cell: null,
  problem: 'empty',
  unit: null,
  readings: [],
};

/**
 * Which column holds the one duration of a list that has no three estimates: the duration, or the likely
 * estimate where it stands alone. Null where there are three.
 */
export function singleColumn(cells: SheetCells): EstimateField | null {
  if (cells.has('optimistic') || cells.has('pessimistic')) return null;
  return cells.has('likely') ? 'likely' : 'duration';
}

/** The field whose column gives an estimate: a duration stands in for a likely estimate that has no column. */
export function columnFor(field: EstimateField, cells: SheetCells): EstimateField {
  return field === 'likely' && !cells.has('likely') ? 'duration' : field;
}

/** The unit of a duration that states none: as the header says, else the project, else working days. */
export function listUnit(cells: readonly SheetCells[], { unit }: ReadingOptions): ActivityList['unit'] {
  for (const one of cells) {
    const header = one.header(columnFor('likely', one)).unit;
    const [stated, other] = header ?? [];
    if (stated) return { value: other ? 'day' : stated.unit, from: 'header' };
  }
  return unit ? { value: unit, from: 'project' } : { value: 'day', from: 'assumed' };
}

/** Reads the estimates of a sheet's rows. */
export class EstimateReader {
  private readonly contexts = new Map<EstimateField, DurationContext>();
  private readonly single: EstimateField | null;

  constructor(
    private readonly cells: SheetCells,
    rows: readonly SheetRow[],
    private readonly unit: Unit,
    private readonly options: ReadingOptions,
  ) {
    this.single = singleColumn(cells);
    for (const field of ['optimistic', 'likely', 'pessimistic', 'duration'] as const) {
      if (cells.has(field)) this.contexts.set(field, this.contextOf(field, rows));
    }
  }

  read(row: SheetRow): ThreeEstimates {
    if (this.single) {
      const only = this.estimate(row, this.single);
      return { optimistic: only, likely: only, pessimistic: only };
    }
    return {
      optimistic: this.estimate(row, 'optimistic'),
      likely: this.estimate(row, columnFor('likely', this.cells)),
      pessimistic: this.estimate(row, 'pessimistic'),
    };
  }

  private estimate(row: SheetRow, field: EstimateField): Estimate {
    const context = this.contexts.get(field);
    const cell = this.cells.ref(row, field);
    if (!context || !cell) return NO_COLUMN;
    const source = this.cells.durationCell(row, field);
    const { days, text, problem, unit, readings } = readDuration(source, context);
    return { days, text, content: toContent(source.value), cell, problem, unit, readings };
  }

  private contextOf(field: EstimateField, rows: readonly SheetRow[]): DurationContext {
    return {
      mark: markOf(this.cells, rows, field),
      header: this.cells.header(field).unit,
      unit: this.unit,
      options: this.options,
    };
  }
}

/** What separates decimals in the texts of a column, where they settle it. */
export function markOf(cells: SheetCells, rows: readonly SheetRow[], field: Field) {
  return settleMark(
    rows.map((row) => {
      const value = cells.value(row, field);
      return typeof value === 'string' ? numberIn(value) : null;
    }),
  );
}
