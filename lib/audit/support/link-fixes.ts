import type { Activity, Link, LinkCell, LinkItem } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { cellAddress } from '@/lib/schedule/cell';
import type { CellEdit, Fix, ItemChange } from '@/lib/schedule/edit';
import { linkEdit } from './link-edits';
import { memo } from './memo';
import { rewritable } from './rewritable';

/** Empties the relation and the lag of a row whose last entry goes. */
function withoutTies({ ties = [] }: LinkCell, edit: CellEdit): CellEdit[] {
  if (edit.to !== null) return [edit];
  return [
    edit,
    ...ties.map(({ cell, content }) => ({
      sheet: cell.sheet,
      cell: cellAddress(cell),
      from: content,
      to: null,
    })),
  ];
}

interface Entry {
  readonly cell: LinkCell;
  readonly item: LinkItem;
}

const linkKey = (from: string, to: string, { type, lag }: { type: string; lag: number }) =>
  [from, to, type, lag].join('\u0000');

/** Entries that say again, from the other end, what stands among the predecessors: the list has one link for both. */
const echoes = memo((list: ActivityList): ReadonlyMap<string, Entry> => {
  const found = new Map<string, Entry>();
  if (!list.linkCells.some(({ gives }) => gives === 'predecessors')) return found;
  for (const cell of list.linkCells) {
    const owner = list.activities[cell.owner]?.id;
    if (cell.gives !== 'successors' || owner === undefined) continue;
    for (const item of cell.items) {
      if (item.link) found.set(linkKey(owner, item.link.id, item.link), { cell, item });
    }
  }
  return found;
});

/** Where a link is written: its entry, and the one that says it from the other end. */
function entriesOf(list: ActivityList, index: number): Entry[] {
  const link = list.links[index];
  const cell = link && list.linkCells[link.linkCell];
  const item = link && cell?.items[link.item];
  if (!cell || !item) return [];
  const echo =
    cell.gives === 'predecessors' ? echoes(list).get(linkKey(link.from, link.to, link)) : undefined;
  return echo ? [{ cell, item }, echo] : [{ cell, item }];
}

/** Removes links from the cells they are written in, one edit a cell; undefined where such a cell is too long for it. */
export function removeLinks(list: ActivityList, links: readonly number[], reason: string): Fix | undefined {
  const byCell = new Map<LinkCell, ItemChange[]>();
  for (const { cell, item } of links.flatMap((index) => entriesOf(list, index))) {
    const changes = byCell.get(cell) ?? [];
    changes.push({ op: 'remove', item: item.text });
    byCell.set(cell, changes);
  }
  if ([...byCell.keys()].some((cell) => !rewritable(list, cell))) return undefined;
  return {
    reason,
    edits: [...byCell].flatMap(([cell, items]) => withoutTies(cell, linkEdit(cell, items))),
    changes: links.map((link) => ({ kind: 'remove-link', link })),
  };
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

/** Where relations and lags stand in columns of their own, an added entry says its own. */
function entryFor(list: ActivityList, owner: Activity, id: string): string {
  const columns = columnsOf(list).get(owner.sheet);
  const hasTies = columns?.relation !== undefined || columns?.lag !== undefined;
  return hasTies ? `${id} FS` : id;
}

/**
 * A finish-to-start link without lag from one activity to another, written where the list keeps its links:
 * among the predecessors of the later one, else among the successors of the earlier. Null where the list
 * has no column for it, or the cell cannot be read.
 */
export function addLink(list: ActivityList, from: Activity, to: Activity, reason: string): Fix | null {
  const predecessors = cellFor(list, to, 'predecessors');
  const cell = predecessors ?? cellFor(list, from, 'successors');
  if (!cell || cell.error !== null || !rewritable(list, cell)) return null;
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
