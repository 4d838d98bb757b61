import type { Activity } from '@/lib/schedule/activity';
import type { HeadingRow, RefusedRow, RowCounts } from '@/lib/schedule/activity-list';
import type { SheetRow } from '@/lib/schedule/sheet';
import { toContent } from '@/parsers/cells/text';
import { isLoneRemark, isRemark, isRolledUp, isTotalLabel, type RowFacts, HeaderRepeats } from './row-facts';
import type { SheetCells } from './sheet-cells';

export type RowKind = 'activity' | 'heading' | 'continued' | 'blank' | 'note' | 'refused';

/** A row of the list with what was made of it. */
export interface ReadRow {
  readonly cells: SheetCells;
  readonly row: SheetRow;
  readonly facts: RowFacts | null;
  kind: RowKind;
  /** Index of the activity it is, or goes on with; −1 where it is neither. */
  readonly activity: number;
  /** Why it was refused. */
  readonly reason: string | null;
}

/** Sorts the rows of a list, sheet by sheet: every row is one of the kinds. */
export class RowSorter {
  readonly rows: ReadRow[] = [];
  readonly activities: Activity[] = [];
  readonly headings: HeadingRow[] = [];
  readonly refused: RefusedRow[] = [];
  private blank = 0;
  private current: { facts: RowFacts; ties: Set<string> } | null = null;
  private sums: [number, number, number] = [0, 0, 0];

  /** Takes the rows below a sheet's header, in order. */
  addSheet(cells: SheetCells, rows: readonly SheetRow[], read: (row: SheetRow) => RowFacts): void {
    const first = this.rows.length;
    const repeats = new HeaderRepeats(cells);
    let last = cells.matching.headerRow;
    this.current = null;
    this.sums = [0, 0, 0];
    const held = rows.filter((row) => cells.holdsAnything(row));
    for (const [i, row] of held.entries()) {
      this.blank += row.number - last - 1;
      last = row.number;
      if (repeats.test(row)) this.put(cells, row, null, 'note');
      else this.sort(cells, row, read(row), held[i + 1]);
    }
    this.settleHeadings(first);
  }

  counts(): RowCounts {
    const counts = { activities: 0, headings: 0, continued: 0, notes: 0, refused: 0 };
    const keyOf = {
      activity: 'activities',
      heading: 'headings',
      continued: 'continued',
      note: 'notes',
      refused: 'refused',
    } as const;
    for (const { kind } of this.rows) if (kind !== 'blank') counts[keyOf[kind]]++;
    return { read: this.rows.length + this.blank, blank: this.blank, ...counts };
  }

  private sort(cells: SheetCells, row: SheetRow, facts: RowFacts, next: SheetRow | undefined): void {
    const hasId = facts.id !== '' || facts.idError !== null;
    if (isLoneRemark(row) || this.isTotal(cells, facts)) this.put(cells, row, facts, 'note');
    else if (this.continues(facts)) this.put(cells, row, facts, 'continued');
    else if (facts.hasEstimates) {
      if (isSummary(cells, facts, next)) this.put(cells, row, facts, 'heading');
      else this.addActivity(cells, row, facts);
    } else if (facts.hasLinks) {
      if (hasId || facts.name !== '') this.addActivity(cells, row, facts);
      else
        this.refuse(
          cells,
          row,
          facts,
          'It gives predecessors or successors, and no activity stands above it to which they could belong.',
        );
    } else if (facts.hasTie && !hasId && facts.name === '') {
      this.refuse(
        cells,
        row,
        facts,
        'It gives a relation or a lag, and no predecessor that they could belong to.',
      );
    } else this.put(cells, row, facts, this.isHeading(facts) ? 'heading' : 'note');
  }

  /** A row whose estimates are all empty: a heading, unless it reads like a remark. */
  private isHeading({ id, idError, name }: RowFacts): boolean {
    if (idError !== null || (id !== '' && name !== '')) return true;
    return (id !== '' || name !== '') && !isRemark(id === '' ? name : id);
  }

  /** A total, or another figure of the whole list: by its label, or by being the sum of what stands above. */
  private isTotal(cells: SheetCells, facts: RowFacts): boolean {
    const { id, name, hasEstimates, hasLinks, estimates } = facts;
    if (hasLinks || facts.idError !== null) return false;
    if (isTotalLabel(id)) return name === '' || !hasEstimates || isTotalLabel(name);
    if (id !== '') return false;
    if (isTotalLabel(name)) return true;
    if (!hasEstimates || name !== '') return false;
    const [label] =
      cells.sheet.rows.length > 0 ? facts.row.cells.filter((value) => typeof value === 'string') : [];
    if (label !== undefined && isTotalLabel(label.trim())) return true;
    return (
      isRolledUp(facts, cells) || this.isSum([estimates.optimistic, estimates.likely, estimates.pessimistic])
    );
  }

  private isSum(given: readonly { days: number | null; problem: string | null }[]): boolean {
    if (this.rows.length < 3) return false;
    return given.every(({ days, problem }, i) => {
      if (problem === 'empty') return true;
      const sum = this.sums[i] ?? 0;
      return days !== null && days > 0 && Math.abs(days - sum) < 1e-6 * Math.max(1, sum);
    });
  }

  /** A further row of the activity above: no estimates of its own, or the same row again with other links. */
  private continues(facts: RowFacts): boolean {
    const { current } = this;
    if (!current || facts.idError !== null || !(facts.hasLinks || (facts.hasTie && facts.id !== '')))
      return false;
    const { id, name, estimates } = current.facts;
    const sameId = facts.id !== '' && facts.id === id;
    if (!(sameId || facts.id === '') || !(facts.name === '' || facts.name === name)) return false;
    if (!facts.hasEstimates) return true;
    const sameEstimates = (['optimistic', 'likely', 'pessimistic'] as const).every(
      (part) => facts.estimates[part].text === estimates[part].text,
    );
    return sameId && sameEstimates && current.facts.hasLinks && !current.ties.has(facts.ties);
  }

  private addActivity(cells: SheetCells, row: SheetRow, facts: RowFacts): void {
    const { id, idError, name, estimates } = facts;
    this.activities.push({
      index: this.activities.length,
      id,
      idCell: cells.ref(row, 'id'),
      idContent: toContent(cells.value(row, 'id')),
      idError,
      name,
      nameCell: cells.ref(row, 'name'),
      wbs: cells.text(row, 'wbs'),
      sheet: cells.sheet.name,
      row: row.number,
      hidden: row.hidden,
      ...estimates,
    });
    this.current = { facts, ties: new Set([facts.ties]) };
    [estimates.optimistic, estimates.likely, estimates.pessimistic].forEach(({ days }, i) => {
      this.sums[i] = (this.sums[i] ?? 0) + (days ?? 0);
    });
    this.put(cells, row, facts, 'activity');
  }

  private refuse(cells: SheetCells, row: SheetRow, facts: RowFacts, reason: string): void {
    this.refused.push({ sheet: cells.sheet.name, row: row.number, reason });
    this.put(cells, row, facts, 'refused', reason);
  }

  private put(
    cells: SheetCells,
    row: SheetRow,
    facts: RowFacts | null,
    kind: RowKind,
    reason: string | null = null,
  ): void {
    if (kind === 'heading') this.current = null;
    if (kind === 'continued' && facts) this.current?.ties.add(facts.ties);
    const activity = kind === 'activity' || kind === 'continued' ? this.activities.length - 1 : -1;
    this.rows.push({ cells, row, facts, kind, activity, reason });
  }

  /** What stands below the last activity and is not both numbered and named heads nothing: it is a note. */
  private settleHeadings(first: number): void {
    const last = this.rows.findLastIndex(({ kind }) => kind === 'activity' || kind === 'continued');
    for (const [i, read] of this.rows.entries()) {
      if (i < first || read.kind !== 'heading' || !read.facts) continue;
      const { id, name } = read.facts;
      const heads = i < last || (id !== '' && (name !== '' || !id.includes(' ')));
      if (!heads) read.kind = 'note';
      else this.headings.push(toHeading(read, id, name));
    }
  }
}

/** A row without links that sums up those below it: by its formulas, or, where it has no ID, by its level. */
function isSummary(cells: SheetCells, facts: RowFacts, next: SheetRow | undefined): boolean {
  const { row, id, idError, name, hasLinks } = facts;
  const hasId = id !== '' || idError !== null;
  if (hasLinks || (!hasId && name === '')) return false;
  if (isRolledUp(facts, cells)) return true;
  if (hasId || !next) return false;
  const wbs = cells.text(row, 'wbs');
  return next.outline > row.outline || (wbs !== '' && cells.text(next, 'wbs').startsWith(`${wbs}.`));
}

function toHeading({ cells, row }: ReadRow, id: string, name: string): HeadingRow {
  return {
    id,
    name: name === '' ? id : name,
    sheet: cells.sheet.name,
    row: row.number,
    outline: row.outline,
  };
}
