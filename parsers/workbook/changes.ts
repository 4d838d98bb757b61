import type { CellContent } from '@/lib/schedule/sheet';
import type { ChangedCell, ListedChange } from './types';

/** Headings of the list of changes, in the order of `changeRow`. */
export const CHANGE_HEADINGS = [
  'Sheet',
  'Cell',
  'Activity',
  'Was',
  'Is now',
  'Rule',
  'Why',
  'By',
  'When',
] as const;

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** `2027-03-12T14:05:00Z` → 12 Mar 2027, 14:05 UTC; what is no such time stays as it is. */
export function plainTime(iso: string): string {
  const time = new Date(iso);
  if (Number.isNaN(time.getTime())) return iso;
  const [year, month, day] = [time.getUTCFullYear(), MONTHS[time.getUTCMonth()], time.getUTCDate()];
  const two = (number: number) => String(number).padStart(2, '0');
  return `${day} ${month} ${year}, ${two(time.getUTCHours())}:${two(time.getUTCMinutes())} UTC`;
}

export function changeRow(change: ListedChange): CellContent[] {
  const { sheet, cell, activity, from, to, rule, reason, by, at } = change;
  return [sheet, cell, activity, from, to, rule || 'edit by hand', reason, by, plainTime(at)];
}

const keyOf = (change: { sheet: string; cell: string }) => `${change.cell.toUpperCase()} ${change.sheet}`;

/** The changes as listed, and after them the changed cells that no line names. */
export function allChanges(changes: readonly ListedChange[], cells: readonly ChangedCell[]): ListedChange[] {
  const named = new Set(changes.map(keyOf));
  const unnamed = cells.filter((cell) => !named.has(keyOf(cell)));
  const rest = { activity: '', rule: '', reason: '', by: '', at: '' };
  return [...changes, ...unnamed.map(({ sheet, cell, from, to }) => ({ sheet, cell, from, to, ...rest }))];
}

/** The lines about each cell, by `sheet` and `cell`. */
export function changesByCell(
  changes: readonly ListedChange[],
): (cell: ChangedCell) => readonly ListedChange[] {
  const map = new Map<string, ListedChange[]>();
  for (const change of changes) {
    const there = map.get(keyOf(change));
    if (there) there.push(change);
    else map.set(keyOf(change), [change]);
  }
  return (cell) => map.get(keyOf(cell)) ?? [];
}

/** A note shows this much of a long text; the list of changes has all of it. */
const NOTE_LENGTH = 500;

function shown(content: CellContent): string {
  const text = String(content ?? '');
  if (content === null) return 'empty';
  return text.length > NOTE_LENGTH ? `“${text.slice(0, NOTE_LENGTH)}…”` : `“${text}”`;
}

/** What a cell's note says. */
export function noteText(cell: ChangedCell, changes: readonly ListedChange[]): string {
  const head = `Corrected: was ${shown(cell.from)}, is now ${shown(cell.to)}.`;
  const lines = changes.map(({ reason, rule, by, at }) => {
    const who = [by, at && plainTime(at)].filter(Boolean).join(', ');
    return [reason, rule && `Rule: ${rule}.`, who && `(${who})`].filter(Boolean).join(' ');
  });
  return [head, ...lines.filter(Boolean)].join('\n');
}
