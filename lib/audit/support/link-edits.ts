import type { Activity, Link, LinkCell } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { cellAddress } from '@/lib/schedule/cell';
import type { CellEdit, Fix, ItemChange } from '@/lib/schedule/edit';
import { applyItems } from '@/lib/schedule/link-items';
import type { CellContent } from '@/lib/schedule/sheet';
import { memo } from './memo';

/** A cell of numbers keeps a number where what is left in it is one. */
function contentFor(text: string, content: CellContent): CellContent {
  if (text === '') return null;
  return typeof content === 'number' && String(Number(text)) === text ? Number(text) : text;
}

/** The cell written anew, for one whose entries nothing but blanks divide. */
function rebuilt({ items }: LinkCell, changes: readonly ItemChange[]): string {
  const texts = items.map(({ text }) => text);
  for (const change of changes) {
    const at = change.op === 'add' ? texts.length : texts.lastIndexOf(change.item);
    if (change.op === 'add') texts.push(change.item);
    else if (at >= 0) texts.splice(at, 1, ...(change.op === 'replace' ? [change.with] : []));
  }
  return texts.join(', ');
}

/** The change of a predecessor or successor cell, entry by entry and as its new text. */
export function linkEdit(cell: LinkCell, items: readonly ItemChange[]): CellEdit {
  const { content } = cell;
  const separator =
    cell.separator.trim() === '' && !cell.separator.includes('\n') ? undefined : cell.separator;
  const applied = applyItems(cell.text, items, separator);
  const place = { sheet: cell.cell.sheet, cell: cellAddress(cell.cell), from: content };
  if (applied.unmet.length > 0) return { ...place, to: contentFor(rebuilt(cell, items), content) };
  const added = separator !== undefined && items.some(({ op }) => op === 'add');
  return { ...place, to: contentFor(applied.text, content), items, ...(added ? { separator } : {}) };
}

/** Removes links from the cells they are written in, one edit a cell. */
export function removeLinks(list: ActivityList, links: readonly number[], reason: string): Fix {
  const byCell = new Map<LinkCell, ItemChange[]>();
  for (const index of links) {
    const link = list.links[index];
    const cell = link && list.linkCells[link.linkCell];
    const item = link && cell?.items[link.item];
    if (!cell || !item) continue;
    const changes = byCell.get(cell) ?? [];
    changes.push({ op: 'remove', item: item.text });
    byCell.set(cell, changes);
  }
  return {
    reason,
    edits: [...byCell].map(([cell, items]) => linkEdit(cell, items)),
    changes: links.map((link) => ({ kind: 'remove-link', link })),
  };
}

/** The text of an entry with another ID in it, its relation and lag as written. */
export function withId(text: string, id: string, other: string): string {
  const at = text.indexOf(id);
  return at < 0 ? other : text.slice(0, at) + other + text.slice(at + id.length);
}

/** Where the cells of an activity stand, by what they give. */
const cellsOf = memo((list: ActivityList) => {
  const cells = { predecessors: new Map<number, LinkCell>(), successors: new Map<number, LinkCell>() };
  for (const cell of list.linkCells) {
    if (!cells[cell.gives].has(cell.owner)) cells[cell.gives].set(cell.owner, cell);
  }
  return cells;
});

const columnsOf = memo(
  (list: ActivityList) => new Map(list.matching.map(({ sheet, columns }) => [sheet, columns])),
);

/** The cell in which an activity's predecessors (or successors) are to be written, empty where it has none yet. */
function cellFor(list: ActivityList, owner: Activity, gives: LinkCell['gives']): LinkCell | null {
  const present = cellsOf(list)[gives].get(owner.index);
  if (present) return present;
  const column = columnsOf(list).get(owner.sheet)?.[gives];
  if (column === undefined) return null;
  const cell = { sheet: owner.sheet, row: owner.row, column };
  return { owner: owner.index, gives, cell, text: '', content: null, items: [], separator: '', error: null };
}

/** The cell of an activity's row that holds its predecessors (or successors); null where there is no column. */
export const linkColumnCell = (list: ActivityList, activity: Activity, gives: LinkCell['gives']) =>
  cellFor(list, activity, gives)?.cell ?? null;

/** Where the row's relation stands in a column of its own, an added entry says its own. */
function entryFor(list: ActivityList, owner: Activity, id: string): string {
  const columns = columnsOf(list).get(owner.sheet);
  if (columns?.lag !== undefined) return `${id} FS+0`;
  return columns?.relation === undefined ? id : `${id} FS`;
}

/**
 * A finish-to-start link without lag from one activity to another, written where the list keeps its links:
 * among the predecessors of the later one, else among the successors of the earlier. Null where the list
 * has no column for it, or the cell cannot be read.
 */
export function addLink(list: ActivityList, from: Activity, to: Activity, reason: string): Fix | null {
  const predecessors = cellFor(list, to, 'predecessors');
  const cell = predecessors ?? cellFor(list, from, 'successors');
  if (!cell || cell.error !== null) return null;
  const [owner, other] = predecessors ? [to, from] : [from, to];
  const item = entryFor(list, owner, other.id);
  return {
    reason,
    edits: [linkEdit(cell, [{ op: 'add', item }])],
    changes: [{ kind: 'add-link', from: from.index, to: to.index, type: 'FS', lag: 0 }],
  };
}

/** The cell and the entry a link is written in. */
export function writtenIn(list: ActivityList, link: Link | undefined) {
  const cell = link && list.linkCells[link.linkCell];
  return { cell, item: link && cell?.items[link.item] };
}
