'use client';

import { classes } from '@/components/ui/classes';
import { useFormat } from '@/components/ui/locale';
import type { AnalysedActivity } from '@/lib/contract/submission';
import type { Feeders } from './feeders';

/** The critical path as one straight line of activities; what feeds each hangs below it, counted. */
export function Chain({
  path,
  feeders,
  nearWithin,
  selected,
  onSelect,
}: {
  path: readonly AnalysedActivity[];
  feeders: readonly Feeders[];
  nearWithin: number;
  selected: string | null;
  onSelect: (id: string) => void;
}) {
  return (
    <div role="region" aria-label="Critical path" tabIndex={0} className="overflow-x-auto pb-2">
      <ol className="flex min-w-max items-start">
        {path.map((activity, index) => (
          <li key={activity.id} className="flex items-start">
            {index > 0 && <span aria-hidden="true" className="mt-6 h-[3px] w-8 flex-none bg-umber" />}
            <div className="w-40 flex-none">
              <ChainNode activity={activity} selected={selected === activity.id} onSelect={onSelect} />
              <Hanging
                feeders={feeders[index]}
                nearWithin={nearWithin}
                selected={selected}
                onSelect={onSelect}
              />
            </div>
          </li>
        ))}
      </ol>
    </div>
  );
}

function ChainNode({
  activity,
  selected,
  onSelect,
}: {
  activity: AnalysedActivity;
  selected: boolean;
  onSelect: (id: string) => void;
}) {
  const format = useFormat();
  return (
    <button
      type="button"
      aria-pressed={selected}
      onClick={() => onSelect(activity.id)}
      className={classes(
        'block w-full border border-umber px-2 py-1 text-left hover:bg-tint',
        selected ? 'bg-tint' : 'bg-leaf',
        // The double rule under what is critical.
        'border-b-[6px] [border-bottom-style:double]',
      )}
    >
      <span className="block truncate font-semibold" title={activity.name}>
        {activity.name || activity.id}
      </span>
      <span className="block truncate text-slate">
        {activity.id} · {format.days(activity.expected)} · {format.variance(activity.variance)}
      </span>
    </button>
  );
}

const LISTED = 12;

function Hanging({
  feeders,
  nearWithin,
  selected,
  onSelect,
}: {
  feeders: Feeders | undefined;
  nearWithin: number;
  selected: string | null;
  onSelect: (id: string) => void;
}) {
  const format = useFormat();
  if (!feeders || feeders.activities.length === 0) return null;
  const near = feeders.leastFloat <= nearWithin + 1e-9;
  const more = feeders.activities.length - LISTED;
  return (
    <details className={classes('ml-4 border-l-2 pl-2', near ? 'border-dashed border-brass' : 'border-hair')}>
      <summary className={classes('py-2', near ? 'text-brass' : 'text-slate')}>
        {format.plural(feeders.activities.length, 'feeds', 'feed')} this, {near ? 'near-critical, ' : ''}
        {format.days(Math.max(0, feeders.leastFloat))} of slack
      </summary>
      <ul className="flex flex-col gap-1">
        {feeders.activities.slice(0, LISTED).map((activity) => (
          <li key={activity.id}>
            <button
              type="button"
              aria-pressed={selected === activity.id}
              onClick={() => onSelect(activity.id)}
              className="block w-full border border-hair bg-leaf px-2 py-1 text-left hover:border-slate aria-pressed:bg-tint"
            >
              <span className="block truncate">{activity.name || activity.id}</span>
              <span className="block text-slate">
                {format.days(activity.expected)}, slack {format.days(activity.totalFloat)}
              </span>
            </button>
          </li>
        ))}
        {more > 0 && <li className="text-slate">and {format.count(more)} more</li>}
      </ul>
    </details>
  );
}
