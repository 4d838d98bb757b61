import type { Unit } from '@/lib/schedule/activity';
import {
  type ActivityList,
  DEFAULT_READING,
  type ErrorCell,
  type ReadingOptions,
} from '@/lib/schedule/activity-list';
import type { Field, Matching } from '@/lib/schedule/field';
import type { Sheet } from '@/lib/schedule/sheet';
import { damaged, UnreadableFile } from './errors';
import { LIMITS } from './limits';
import { columnFor, EstimateReader, listUnit, singleColumn } from './list/estimates';
import { bookOf, linksOf, readLinkCells } from './list/links';
import { factsOf } from './list/row-facts';
import { type ReadRow, type RowKind, RowSorter } from './list/rows';
import { SheetCells } from './list/sheet-cells';

const USED: readonly Field[] = [
  'id',
  'name',
  'wbs',
  'optimistic',
  'likely',
  'pessimistic',
  'duration',
  'predecessors',
  'successors',
  'relation',
  'lag',
];

/** A row as it is read, for showing before anything is kept. */
export interface SampleRow {
  readonly row: number;
  readonly kind: RowKind;
  readonly id: string;
  readonly name: string;
  /** Working days. */
  readonly optimistic: number | null;
  readonly likely: number | null;
  readonly pessimistic: number | null;
  readonly predecessors: string;
  readonly reason: string | null;
}

/**
 * Reads an activity list: the rows below the headers of the matching's sheets, in order, each accounted for.
 * Durations and lags in working days. Throws UnreadableFile where the list has too many rows.
 */
export function readActivityList(
  sheets: readonly Sheet[],
  matching: Matching,
  options: ReadingOptions = DEFAULT_READING,
): ActivityList {
  const { sorter, cells, unit } = readRows(sheets, matching, options);
  const { activities, headings, refused } = sorter;
  const linkCells = readLinkCells(sorter, bookOf(sorter), lagUnit(sorter, unit), options);
  const indexOf = new Map<string, number>();
  for (const { id, index } of activities) if (id !== '' && !indexOf.has(id)) indexOf.set(id, index);
  return {
    matching,
    activities,
    headings,
    refused,
    rows: sorter.counts(),
    linkCells,
    links: linksOf(linkCells, activities, indexOf),
    errorCells: sorter.rows.flatMap(errorsOf),
    indexOf,
    singleDuration: cells.every((one) => singleColumn(one) !== null),
    unit,
    reading: options,
  };
}

/** The first rows below the header, as they are read in the context of the whole list. */
export function sampleRows(
  sheets: readonly Sheet[],
  matching: Matching,
  options: ReadingOptions,
  count: number,
): SampleRow[] {
  const { sorter } = readRows(sheets, matching, options);
  return sorter.rows.slice(0, count).map(({ cells, row, facts, kind, reason }) => ({
    row: row.number,
    kind,
    id: facts?.id ?? '',
    name: facts?.name ?? '',
    optimistic: facts?.estimates.optimistic.days ?? null,
    likely: facts?.estimates.likely.days ?? null,
    pessimistic: facts?.estimates.pessimistic.days ?? null,
    predecessors: cells.text(row, 'predecessors'),
    reason,
  }));
}

function readRows(sheets: readonly Sheet[], matching: Matching, options: ReadingOptions) {
  const cells = matching.map((one) => {
    const sheet = sheets.find(({ name }) => name === one.sheet);
    if (!sheet) throw damaged(`There is no sheet \u201c${one.sheet}\u201d in this file.`);
    return new SheetCells(sheet, one);
  });
  const unit = listUnit(cells, options);
  const sorter = new RowSorter();
  for (const one of cells) {
    const rows = one.sheet.rows.filter(({ number }) => number > one.matching.headerRow);
    const estimates = new EstimateReader(one, rows, unit.value, options);
    sorter.addSheet(one, rows, (row) => factsOf(row, one, estimates));
  }
  if (sorter.rows.length > LIMITS.rows) throw new UnreadableFile('too-many-rows');
  return { sorter, cells, unit };
}

/** A lag without a unit has that of the durations: where only their cells state it, the one they all state. */
function lagUnit({ activities }: RowSorter, { value, from }: ActivityList['unit']): Unit {
  if (from !== 'assumed') return value;
  const stated = new Set<Unit | null>();
  for (const { likely, optimistic, pessimistic } of activities) {
    for (const { days, unit } of [likely, optimistic, pessimistic])
      if (days !== null && days !== 0) stated.add(unit);
  }
  const [only] = stated;
  return stated.size === 1 && only ? only : value;
}

function errorsOf({ cells, row, kind, activity }: ReadRow): ErrorCell[] {
  if (kind === 'note' || kind === 'blank') return [];
  return USED.flatMap((field) => {
    if (field === 'duration' && columnFor('likely', cells) !== 'duration') return [];
    const code = cells.error(row, field);
    const cell = cells.ref(row, field);
    return code === null || !cell ? [] : [{ cell, field, code, owner: activity }];
  });
}
