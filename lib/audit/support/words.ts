import type { Activity, Estimate, Unit } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { MessageData } from '../rule';

const LISTED = 6;

/** `A, B and C`; of more than six (in `total`) the first five and a count of the rest. */
export function joined(words: readonly (string | number)[], last = 'and', total = words.length): string {
  const shown = total > LISTED ? words.slice(0, LISTED - 1) : words;
  const rest = total - shown.length;
  const parts = rest > 0 ? [...shown, `${rest} more`] : shown;
  if (parts.length < 2) return parts.join('');
  return `${parts.slice(0, -1).join(', ')} ${last} ${parts.at(-1)}`;
}

/** A list kept in a message's data. */
export function listIn(data: MessageData, name: string): readonly (string | number)[] {
  const value = data[name];
  return Array.isArray(value) ? value : [];
}

export const joinedIn = (data: MessageData, name: string, last?: string) => joined(listIn(data, name), last);

export const counted = (count: number, one: string, many = `${one}s`) =>
  `${count} ${count === 1 ? one : many}`;

/** How a sentence names an activity. */
export function called(activity: Activity): string {
  if (activity.id !== '') return activity.id;
  return activity.name === ''
    ? `the activity in row ${activity.row}`
    : `“${activity.name}” in row ${activity.row}`;
}

/** As the first word of a sentence. */
export const capital = (text: string | number | boolean | null | undefined | readonly (string | number)[]) =>
  String(text).replace(/^the /, 'The ');

const rounded = (value: number) => Number(value.toFixed(Math.abs(value) < 1 ? 3 : 1));

/** A duration in a unit, at most one decimal from 1 on. */
export const amount = (value: number, unit: Unit = 'day') =>
  `${rounded(value)} ${Math.abs(rounded(value)) === 1 ? unit : `${unit}s`}`;

/** An estimate as the contractor wrote it, with its unit where the text itself shows none. */
export function shown(estimate: Estimate, list: ActivityList): string {
  const text = estimate.text.trim();
  if (/\p{L}/u.test(text)) return text;
  const unit = estimate.unit ?? list.unit.value;
  return `${text} ${Math.abs(Number(text)) === 1 ? unit : `${unit}s`}`;
}

/** Where something stands: `row 9`, with the sheet where it is not the one spoken of. */
export const inRow = (place: { sheet: string; row: number }, sheet: string) =>
  place.sheet === sheet ? `row ${place.row}` : `row ${place.row} of sheet “${place.sheet}”`;
