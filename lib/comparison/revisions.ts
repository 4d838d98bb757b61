/** One activity of a revision, as far as revisions are compared. Estimates in working days. */
export interface ComparedActivity {
  readonly id: string;
  readonly name: string;
  readonly optimistic: number | null;
  readonly likely: number | null;
  readonly pessimistic: number | null;
  readonly predecessors: readonly { readonly id: string; readonly type: string; readonly lag: number }[];
}

export const COMPARED = {
  name: 'Name',
  optimistic: 'Optimistic (a)',
  likely: 'Most likely (m)',
  pessimistic: 'Pessimistic (b)',
  predecessors: 'Predecessors',
} as const;
type ComparedField = keyof typeof COMPARED;

type Value = string | number | null;

/** A field that a correction of the earlier revision changed, and what the later one made of it. */
export interface Asked {
  readonly id: string;
  readonly name: string;
  readonly field: ComparedField;
  readonly was: Value;
  readonly asked: Value;
  /** What the later revision has; undefined where the activity is gone. */
  readonly now: Value | undefined;
  readonly outcome: 'done' | 'not done' | 'otherwise' | 'gone';
}

/** A field that differs though nothing was asked of it. */
export interface Unasked {
  readonly id: string;
  readonly name: string;
  readonly field: ComparedField;
  readonly was: Value;
  readonly now: Value;
}

export interface Comparison<A extends ComparedActivity> {
  readonly asked: readonly Asked[];
  readonly unasked: readonly Unasked[];
  readonly added: readonly A[];
  readonly removed: readonly A[];
  /** Activities of both revisions without any difference. */
  readonly same: number;
}

const FIELDS = Object.keys(COMPARED) as ComparedField[];
/** Working days; closer than this, two durations are one. */
const CLOSE = 1e-9;

/**
 * A later revision against an earlier one, by activity ID (the first row that bears it counts): which of the
 * corrections came back, and what changed without being asked. `received` and `corrected` are the earlier
 * revision's two states, `later` is the later one as received.
 */
export function compareRevisions<A extends ComparedActivity>(
  received: readonly A[],
  corrected: readonly A[],
  later: readonly A[],
): Comparison<A> {
  const before = byId(received);
  const wanted = byId(corrected);
  const now = byId(later);
  const asked: Asked[] = [];
  const unasked: Unasked[] = [];
  let same = 0;
  for (const [id, activity] of wanted) {
    const came = now.get(id);
    const original = before.get(id) ?? activity;
    const found = FIELDS.map((field) => compareField(field, original, activity, came)).filter(
      (entry) => entry !== null,
    );
    asked.push(...found.filter((entry) => 'asked' in entry));
    unasked.push(...found.filter((entry): entry is Unasked => !('asked' in entry)));
    if (came && found.length === 0) same += 1;
  }
  return {
    asked,
    unasked,
    added: [...now.values()].filter(({ id }) => !wanted.has(id)),
    removed: [...wanted.values()].filter(({ id }) => !now.has(id)),
    same,
  };
}

function compareField(
  field: ComparedField,
  original: ComparedActivity,
  wanted: ComparedActivity,
  came: ComparedActivity | undefined,
): Asked | Unasked | null {
  const was = valueOf(original, field);
  const asked = valueOf(wanted, field);
  const now = came && valueOf(came, field);
  const { id, name } = wanted;
  if (!alike(was, asked)) return { id, name, field, was, asked, now, outcome: outcomeOf(was, asked, now) };
  return now === undefined || alike(asked, now) ? null : { id, name, field, was: asked, now };
}

function outcomeOf(was: Value, asked: Value, now: Value | undefined): Asked['outcome'] {
  if (now === undefined) return 'gone';
  if (alike(now, asked)) return 'done';
  return alike(now, was) ? 'not done' : 'otherwise';
}

function valueOf(activity: ComparedActivity, field: ComparedField): Value {
  return field === 'predecessors' ? linksText(activity.predecessors) : activity[field];
}

/** Links in one order and notation, so that the same links are the same text. */
export function linksText(links: ComparedActivity['predecessors']): string {
  return links.map(linkText).sort().join(', ');
}

function linkText({ id, type, lag }: ComparedActivity['predecessors'][number]): string {
  const plain = type === 'FS' && lag === 0;
  const offset = lag === 0 ? '' : `${lag > 0 ? '+' : '−'}${String(Math.abs(lag))}`;
  return plain ? id : `${id} ${type}${offset}`;
}

function alike(x: Value, y: Value): boolean {
  return x === y || (typeof x === 'number' && typeof y === 'number' && Math.abs(x - y) < CLOSE);
}

function byId<A extends ComparedActivity>(activities: readonly A[]): Map<string, A> {
  const map = new Map<string, A>();
  for (const activity of activities) if (!map.has(activity.id)) map.set(activity.id, activity);
  return map;
}
