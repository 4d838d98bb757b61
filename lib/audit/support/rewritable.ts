import type { LinkCell } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { memo } from './memo';

/**
 * What the fixes of a list may hold together, in characters. Each fix of an entry holds its whole cell as it
 * would be, so the cost of a cell grows with the square of its entries; an honest list stays far below this.
 */
const MOST = 30_000_000;

const cost = ({ items, text }: LinkCell): number => items.length * text.length;

/** The cells for which no fix is proposed, the costliest of the list; none in any list a person could check. */
const beyond = memo(({ linkCells }: ActivityList): ReadonlySet<LinkCell> => {
  const total = linkCells.reduce((sum, cell) => sum + cost(cell), 0);
  if (total <= MOST) return new Set();
  let left = MOST;
  const sorted = [...linkCells].sort((one, other) => cost(one) - cost(other));
  return new Set(sorted.filter((cell) => (left -= cost(cell)) < 0));
});

/** Whether fixes may be proposed that write this cell anew. */
export const rewritable = (list: ActivityList, cell: LinkCell): boolean => !beyond(list).has(cell);
