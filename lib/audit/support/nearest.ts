import type { ActivityList } from '@/lib/schedule/activity-list';
import { isOneEdit, lessOne } from './edit-distance';
import { memo } from './memo';

/** In what way an ID is near to what was written. */
export type Nearness = 'letters' | 'lookalike' | 'edit';

export interface Near {
  /** Indices of the activities whose IDs are equally near, in the order of the list. */
  readonly activities: readonly number[];
  readonly how: Nearness;
}

/** Without case, blanks and the kind of dash. */
export const loose = (id: string) =>
  id
    .normalize('NFKC')
    .toLowerCase()
    .replace(/[\s\u00ad\u200b-\u200d]+/g, '')
    .replace(/[\u2010-\u2015\u2212]/g, '-');

/** O and 0, l, I and 1 alike, and leading zeros left out. */
const lookalike = (looseId: string) =>
  looseId
    .replace(/o/g, '0')
    .replace(/[li|]/g, '1')
    .replace(/(^|\D)0+(?=\d)/g, '$1');

type Index = ReadonlyMap<string, readonly number[]>;

function indexBy(list: ActivityList, keysOf: (id: string) => Iterable<string>): Index {
  const index = new Map<string, number[]>();
  for (const [id, activity] of list.indexOf) {
    for (const key of keysOf(id)) {
      const known = index.get(key);
      if (known) known.push(activity);
      else index.set(key, [activity]);
    }
  }
  return index;
}

/** Made when first asked for: the last costs a second's tenths at 50 000 IDs, and most lists never need it. */
const looseIndex = memo((list: ActivityList) => indexBy(list, (id) => [loose(id)]));
const lookalikeIndex = memo((list: ActivityList) => indexBy(list, (id) => [lookalike(loose(id))]));
const editIndex = memo((list: ActivityList) => indexBy(list, (id) => lessOne(loose(id))));

const idAt = (list: ActivityList, activity: number) => loose(list.activities[activity]?.id ?? '');

/** Of one letter every other is one edit away, which says nothing. */
const isNear = (wanted: string, id: string) => isOneEdit(wanted, id) && wanted.length + id.length > 2;

function oneEditAway(list: ActivityList, wanted: string): number[] {
  const found = new Set<number>();
  for (const key of lessOne(wanted)) {
    for (const activity of editIndex(list).get(key) ?? []) {
      const id = idAt(list, activity);
      if (isNear(wanted, id)) found.add(activity);
    }
  }
  return likeliest(list, wanted, [...found]);
}

/** Letters and digits told apart, so that Z9 is nearer to Z6 than to A9. */
const shape = (text: string) => text.replace(/\d+/g, '#');

/** Those that differ in their digits alone, where there are any. */
function likeliest(list: ActivityList, wanted: string, found: number[]): number[] {
  const alike = found.filter((activity) => shape(idAt(list, activity)) === shape(wanted));
  return (alike.length > 0 ? alike : found).sort((one, other) => one - other);
}

/** Of several lookalikes those that are one edit away, where there are any. */
function closest(list: ActivityList, wanted: string, found: readonly number[]): readonly number[] {
  if (found.length < 2) return found;
  const close = found.filter((activity) => isOneEdit(wanted, idAt(list, activity)));
  return close.length > 0 ? close : found;
}

/**
 * The IDs of the list nearest to one that is not in it: the same but for case, blanks and dashes; else but
 * for O/0, l/1 and leading zeros; else one edit away. Null where none is near.
 */
export function nearestTo(list: ActivityList, id: string): Near | null {
  const wanted = loose(id);
  const same = looseIndex(list).get(wanted);
  if (same) return { activities: same, how: 'letters' };
  const alike = lookalikeIndex(list).get(lookalike(wanted));
  if (alike) return { activities: closest(list, wanted, alike), how: 'lookalike' };
  const edited = oneEditAway(list, wanted);
  return edited.length === 0 ? null : { activities: edited, how: 'edit' };
}
