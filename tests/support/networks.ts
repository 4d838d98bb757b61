import type { Activity, Estimate, Link, LinkCell, LinkItem } from '@/lib/schedule/activity';
import { type ActivityList, DEFAULT_READING, type HeadingRow } from '@/lib/schedule/activity-list';
import type { CellRef } from '@/lib/schedule/cell';
import { RELATIONS, type Relation } from '@/lib/schedule/relation';

/**
 * Activity lists in a short notation, for tests that need no parser. One row a string:
 *
 *     list('A 2 4 6', 'B "Pour the slab" 1 2 3 <- A SS+1, C', 'C 5 <- A FF-0.5')
 *
 * An ID, a name in quotation marks if it matters, then a, m and b (or one duration: a = m = b), then
 * predecessors after `<-` or successors after `->`. `-` in place of a number is an empty cell, any other
 * word an unreadable one; `_` as ID is a missing ID; a row that begins with `#` is a heading (`# H1 "Site"`).
 * An entry that is no `ID relation lag` is one that cannot be read. Columns: A ID, B name, C a, D m, E b
 * (C alone where every row has one duration), F predecessors, G successors; the header is row 1.
 */
export function list(...rows: readonly string[]): ActivityList {
  const parsed = rows.map((row, i) => parseRow(row, i + 2));
  const written = parsed.filter((row) => !row.heading);
  const singleDuration = written.length > 0 && written.every((row) => row.numbers.length === 1);
  const activities = written.map((row, index) => toActivity(row, index, singleDuration));
  const indexOf = new Map<string, number>();
  for (const { id, index } of activities) if (id !== '' && !indexOf.has(id)) indexOf.set(id, index);

  const linkCells = written.flatMap((row, owner) => toLinkCells(row, owner, indexOf));
  const links = linkCells.flatMap((cell, i) => toLinks(cell, i, activities, indexOf));
  const headings = parsed.filter((row) => row.heading).map(toHeading);
  const { id, name, optimistic, likely, pessimistic, predecessors, successors } = COLUMNS;
  const durations = singleDuration ? { duration: optimistic } : { optimistic, likely, pessimistic };
  return {
    matching: [{ sheet: SHEET, headerRow: 1, columns: { id, name, ...durations, predecessors, successors } }],
    activities,
    headings,
    refused: [],
    rows: {
      read: parsed.length,
      activities: activities.length,
      headings: headings.length,
      continued: 0,
      blank: 0,
      notes: 0,
      refused: 0,
    },
    linkCells,
    links,
    errorCells: [],
    indexOf,
    singleDuration,
    unit: { value: 'day', from: 'project' },
    reading: { ...DEFAULT_READING, unit: 'day' },
  };
}

const SHEET = 'Activities';
const COLUMNS = {
  id: 0,
  name: 1,
  optimistic: 2,
  likely: 3,
  pessimistic: 4,
  predecessors: 5,
  successors: 6,
} as const;
const ROW = /^(#\s*)?(\S+)(?:\s+"([^"]*)")?((?:\s+(?!<-|->)\S+)*)(?:\s*(<-|->)\s*(.*))?$/;
const ITEM = /^(\S+?)(?:\s+(?:(FS|SS|FF|SF)\s*)?([+-]\s*\d+(?:\.\d+)?)?)?$/;

interface Row {
  readonly number: number;
  readonly heading: boolean;
  readonly id: string;
  readonly name: string;
  readonly numbers: readonly string[];
  readonly arrow: '<-' | '->';
  readonly links: string;
}

function parseRow(text: string, number: number): Row {
  const match = ROW.exec(text.trim());
  if (!match) throw new Error(`Not a row of the short notation: ${text}`);
  const [, heading, id = '', name, numbers = '', arrow, links = ''] = match;
  return {
    number,
    heading: heading !== undefined,
    id: id === '_' ? '' : id,
    name: name ?? `Activity ${id}`,
    numbers: numbers.trim() === '' ? [] : numbers.trim().split(/\s+/),
    arrow: arrow === '->' ? '->' : '<-',
    links: links.trim(),
  };
}

const cellOf = (row: Row, column: number): CellRef => ({ sheet: SHEET, row: row.number, column });

function toEstimate(text: string, cell: CellRef): Estimate {
  const written = text === '-' ? '' : text;
  const days = written === '' || Number.isNaN(Number(written)) ? null : Number(written);
  const problem = days !== null ? null : written === '' ? 'empty' : 'unreadable';
  const content = days ?? (written === '' ? null : written);
  return { days, text: written, content, cell, problem, unit: null, readings: [] };
}

function toActivity(row: Row, index: number, singleDuration: boolean): Activity {
  const [a = '-', m = row.numbers.length === 1 ? a : '-', b = row.numbers.length === 1 ? a : '-'] =
    row.numbers;
  const column = (own: number) => cellOf(row, singleDuration ? COLUMNS.optimistic : own);
  return {
    index,
    id: row.id,
    idCell: cellOf(row, COLUMNS.id),
    idContent: row.id === '' ? null : row.id,
    idError: null,
    name: row.name,
    nameCell: cellOf(row, COLUMNS.name),
    wbs: '',
    sheet: SHEET,
    row: row.number,
    hidden: false,
    optimistic: toEstimate(a, column(COLUMNS.optimistic)),
    likely: toEstimate(m, column(COLUMNS.likely)),
    pessimistic: toEstimate(b, column(COLUMNS.pessimistic)),
  };
}

const toHeading = (row: Row): HeadingRow => ({
  id: row.id,
  name: row.name,
  sheet: SHEET,
  row: row.number,
  outline: 0,
});

const isRelation = (text: string | undefined): text is Relation =>
  (RELATIONS as readonly (string | undefined)[]).includes(text);

function toItem(text: string, indexOf: ReadonlyMap<string, number>): LinkItem {
  if (indexOf.has(text)) return { text, link: { id: text, type: 'FS', lag: 0 }, readings: [] };
  const match = ITEM.exec(text);
  if (!match?.[1]) return { text, link: null, readings: [] };
  const type = isRelation(match[2]) ? match[2] : 'FS';
  return {
    text,
    link: { id: match[1], type, lag: Number((match[3] ?? '0').replace(/\s/g, '')) },
    readings: [],
  };
}

function toLinkCells(row: Row, owner: number, indexOf: ReadonlyMap<string, number>): LinkCell[] {
  if (row.links === '') return [];
  const gives = row.arrow === '<-' ? 'predecessors' : 'successors';
  const items = row.links.split(/\s*,\s*/).map((text) => toItem(text, indexOf));
  return [
    {
      owner,
      gives,
      cell: cellOf(row, COLUMNS[gives]),
      text: row.links,
      content: row.links,
      items,
      separator: ', ',
      error: null,
    },
  ];
}

function toLinks(
  cell: LinkCell,
  linkCell: number,
  activities: readonly Activity[],
  indexOf: ReadonlyMap<string, number>,
): Link[] {
  return cell.items.flatMap(({ link }, item) => {
    if (!link) return [];
    const own = { id: activities[cell.owner]?.id ?? '', index: cell.owner };
    const other = { id: link.id, index: indexOf.get(link.id) ?? -1 };
    const [from, to] = cell.gives === 'predecessors' ? [other, own] : [own, other];
    return [
      {
        from: from.id,
        to: to.id,
        fromIndex: from.index,
        toIndex: to.index,
        type: link.type,
        lag: link.lag,
        linkCell,
        item,
      },
    ];
  });
}
