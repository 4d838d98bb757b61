import type { Activity, Link, LinkCell, LinkItem } from '@/lib/schedule/activity';
import type { ReadingOptions } from '@/lib/schedule/activity-list';
import type { Unit } from '@/lib/schedule/activity';
import type { SheetRow } from '@/lib/schedule/sheet';
import { IdBook } from '@/parsers/cells/id-book';
import { asShown, formatKind } from '@/parsers/cells/number-format';
import { type CellItem, type CellLinks, type LinkContext, readLinks, SEPARATOR } from '@/parsers/cells/links';
import { toContent } from '@/parsers/cells/text';
import { UnreadableFile } from '@/parsers/errors';
import { LIMITS } from '@/parsers/limits';
import type { ReadRow, RowSorter } from './rows';
import type { SheetCells } from './sheet-cells';
import { TieReader } from './ties';

type Gives = LinkCell['gives'];
const DEFAULT_SEPARATOR = ', ';

/** The IDs of activities and headings, and the other ways in which numbers among them may stand. */
export function bookOf({ activities, rows }: RowSorter): IdBook {
  const book = new IdBook(SEPARATOR);
  for (const { id, name } of activities) book.add(id, name);
  for (const { kind, facts, cells, row } of rows) {
    if (kind === 'heading' && facts) book.add(facts.id);
    if (kind !== 'activity' || !facts) continue;
    const value = cells.value(row, 'id');
    if (typeof value === 'number') book.addAlias(asShown(value, 'General', false), facts.id);
  }
  return book;
}

/** Reads the predecessor and successor cells of every activity and the rows it goes on in. */
export function readLinkCells(
  sorter: RowSorter,
  book: IdBook,
  unit: Unit,
  options: ReadingOptions,
): LinkCell[] {
  const context: LinkContext = { ids: book, unit, options };
  const found: (Omit<LinkCell, 'separator'> & { separator: string | null })[] = [];
  const ties = new Map<SheetCells, TieReader>();
  let entries = 0;
  for (const read of sorter.rows) {
    if (read.activity < 0) continue;
    const { cells } = read;
    let tie = ties.get(cells);
    if (!tie) ties.set(cells, (tie = new TieReader(cells, cells.sheet.rows, context)));
    // Relation and lag columns belong to the predecessors where the list gives both.
    const tied: Gives = cells.has('predecessors') ? 'predecessors' : 'successors';
    for (const gives of ['predecessors', 'successors'] as const) {
      const cell = linkCell(read, gives, context, gives === tied ? tie : null);
      if (!cell) continue;
      found.push(cell);
      entries += cell.items.length;
      if (entries > LIMITS.links) throw new UnreadableFile('too-many-links');
    }
  }
  const usual = usualSeparators(found);
  return found.map((cell) => ({ ...cell, separator: cell.separator ?? usual[cell.gives] }));
}

function linkCell(
  { cells, row, activity }: ReadRow,
  gives: Gives,
  context: LinkContext,
  tie: TieReader | null,
) {
  const cell = cells.ref(row, gives);
  const value = cells.value(row, gives);
  const pending = cells.pendingFormula(row, gives);
  if (!cell || (value === null && pending === null)) return null;
  const text = pending ?? cells.rawText(row, gives);
  const error = cells.error(row, gives);
  const { items, separator } =
    error === null ? readCell(cells, row, gives, text, context) : { items: [], separator: null };
  const ties = tie && tiesOf(cells, row);
  const tied: LinkItem[] = tie
    ? tie.apply(items, row)
    : items.map(({ text: one, link, readings }) => ({ text: one, link, readings }));
  return {
    owner: activity,
    gives,
    cell,
    text: error ?? text,
    content: toContent(value),
    items: tied,
    separator,
    ...(ties && ties.length > 0 ? { ties } : {}),
    error,
  };
}

/** The relation and the lag of a row, where they stand in columns of their own. */
function tiesOf(cells: SheetCells, row: SheetRow): NonNullable<LinkCell['ties']> {
  return (['relation', 'lag'] as const).flatMap((field) => {
    const cell = cells.ref(row, field);
    const content = toContent(cells.value(row, field));
    return cell && content !== null ? [{ cell, content }] : [];
  });
}

function readCell(
  cells: SheetCells,
  row: SheetRow,
  gives: Gives,
  text: string,
  context: LinkContext,
): CellLinks {
  const value = cells.value(row, gives);
  const one = (item: Omit<CellItem, 'text' | 'stated'>): CellLinks => ({
    items: [{ text, stated: false, ...item }],
    separator: null,
  });
  if (cells.pendingFormula(row, gives) !== null) return one({ link: null, readings: [] });
  if (typeof value !== 'number') return readLinks(text, context);
  const known = context.ids.find(text) ?? context.ids.find(String(value));
  if (known !== null) return one({ link: { id: known, type: 'FS', lag: 0 }, readings: [] });
  if (formatKind(cells.format(row, gives)) === 'date') return one({ link: null, readings: [] });
  // A cell in which 10,20 was typed may hold 10.2, or 1020 shown as 10,20.
  const shown = text.includes(',') ? readLinks(text, context) : null;
  if (shown?.items.every(({ link }) => link && context.ids.find(link.id) !== null)) return shown;
  const parts = String(value)
    .split('.')
    .map((part) => context.ids.find(part));
  if (parts.length === 2 && parts.every((id) => id !== null))
    return one({ link: null, readings: [parts.join(', ')] });
  return one({ link: { id: String(value), type: 'FS', lag: 0 }, readings: [] });
}

/** What most cells of each kind have between their first entries. */
function usualSeparators(
  cells: readonly { gives: Gives; separator: string | null }[],
): Record<Gives, string> {
  const most = (gives: Gives): string => {
    const counts = new Map<string, number>();
    for (const cell of cells) {
      if (cell.gives === gives && cell.separator !== null)
        counts.set(cell.separator, (counts.get(cell.separator) ?? 0) + 1);
    }
    return [...counts].sort(([, a], [, b]) => b - a)[0]?.[0] ?? DEFAULT_SEPARATOR;
  };
  return { predecessors: most('predecessors'), successors: most('successors') };
}

/** The links that the cells give; one that both its ends state alike is one link. */
export function linksOf(
  cells: readonly LinkCell[],
  activities: readonly Activity[],
  indexOf: ReadonlyMap<string, number>,
): Link[] {
  const links: Link[] = [];
  const stated = new Set<string>();
  const both =
    cells.some(({ gives }) => gives === 'successors') && cells.some(({ gives }) => gives === 'predecessors');
  const keyOf = ({ from, to, type, lag }: Link) => `${from}\u0000${to}\u0000${type}\u0000${lag}`;
  for (const gives of ['predecessors', 'successors'] as const) {
    cells.forEach((cell, linkCell) => {
      if (cell.gives !== gives) return;
      cell.items.forEach((_, item) => {
        const link = toLink(cell, linkCell, item, activities, indexOf);
        if (!link) return;
        if (both && gives === 'predecessors') stated.add(keyOf(link));
        if (both && gives === 'successors' && stated.has(keyOf(link))) return;
        links.push(link);
      });
    });
  }
  return links;
}

function toLink(
  cell: LinkCell,
  linkCell: number,
  item: number,
  activities: readonly Activity[],
  indexOf: ReadonlyMap<string, number>,
): Link | null {
  const link = cell.items[item]?.link;
  if (!link) return null;
  const owner = { id: activities[cell.owner]?.id ?? '', index: cell.owner };
  const other = { id: link.id, index: indexOf.get(link.id) ?? -1 };
  const [from, to] = cell.gives === 'predecessors' ? [other, owner] : [owner, other];
  return {
    from: from.id,
    to: to.id,
    fromIndex: from.index,
    toIndex: to.index,
    type: link.type,
    lag: link.lag,
    linkCell,
    item,
  };
}
