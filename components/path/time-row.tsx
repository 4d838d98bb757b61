'use client';

import { memo } from 'react';
import { classes } from '@/components/ui/classes';
import { useFormat } from '@/components/ui/locale';
import type { AnalysedActivity } from '@/lib/contract/submission';
import type { Standing } from './rows';
import type { TimeScale } from './time-scale';

export const ROW_HEIGHT = 30;
/** Room left and right of the scale, so that a bob at either end is whole. */
export const PAD = 12;

const COLOUR: Record<Standing, string> = {
  critical: 'var(--umber)',
  near: 'var(--brass)',
  slack: 'var(--slate)',
};

interface Props {
  activity: AnalysedActivity;
  standing: Standing;
  scale: TimeScale;
  /** Width of the names at the left. */
  labels: number;
  selected: boolean;
  onSelect: (id: string) => void;
}

/** One activity: mean bar, a–b whisker above it, rule under it by standing, dotted tail to the late finish. */
export const TimeRow = memo(function TimeRow({
  activity,
  standing,
  scale,
  labels,
  selected,
  onSelect,
}: Props) {
  const format = useFormat();
  const words = { critical: 'critical', near: 'near-critical', slack: '' }[standing];
  return (
    <button
      type="button"
      aria-pressed={selected}
      aria-label={`${activity.id} ${activity.name}, from ${format.date(activity.startDate)} to ${format.date(activity.finishDate)}, ${format.days(activity.expected)}, slack ${format.days(activity.totalFloat)}${words && `, ${words}`}`}
      onClick={() => onSelect(activity.id)}
      className={classes('flex w-full items-center text-left hover:bg-tint', selected && 'bg-tint')}
      style={{ height: ROW_HEIGHT }}
    >
      <span
        className={classes('flex-none truncate pr-3 text-right', standing === 'critical' && 'font-semibold')}
        style={{ width: labels }}
      >
        {activity.name || activity.id}
      </span>
      <svg width={scale.width + 2 * PAD} height={ROW_HEIGHT} aria-hidden="true" className="flex-none">
        <g transform={`translate(${PAD},0)`}>
          {scale.ticks.map((day) => (
            <path key={day} d={`M${scale.x(day)} 0v${ROW_HEIGHT}`} stroke="var(--hair)" />
          ))}
          {activity.expected === 0 ? (
            <Milestone x={scale.x(activity.earlyStart)} colour={COLOUR[standing]} />
          ) : (
            <Bar activity={activity} standing={standing} scale={scale} />
          )}
          <Tail activity={activity} scale={scale} />
        </g>
      </svg>
    </button>
  );
});

function Bar({ activity, standing, scale }: Pick<Props, 'activity' | 'standing' | 'scale'>) {
  const colour = COLOUR[standing];
  const left = scale.x(activity.earlyStart);
  const right = scale.x(activity.earlyFinish);
  const best = scale.x(activity.earlyStart + activity.optimistic);
  const worst = scale.x(activity.earlyStart + activity.pessimistic);
  return (
    <>
      {worst > best && (
        <path d={`M${best} 5v4M${best} 7H${worst}M${worst} 5v4`} stroke="var(--ink)" fill="none" />
      )}
      <rect
        x={left}
        y="11"
        width={Math.max(1, right - left)}
        height="9"
        fill={colour}
        fillOpacity="0.18"
        stroke={colour}
        strokeDasharray={standing === 'near' ? '4 3' : undefined}
      />
      {standing === 'critical' && (
        <path d={`M${left} 23H${right}M${left} 26H${right}`} stroke={colour} strokeWidth="1.5" />
      )}
      {standing === 'near' && (
        <path d={`M${left} 24H${right}`} stroke={colour} strokeWidth="1.5" strokeDasharray="4 3" />
      )}
    </>
  );
}

/** A short upright tick with a bob below it. */
function Milestone({ x, colour }: { x: number; colour: string }) {
  return (
    <>
      <path d={`M${x} 5v11`} stroke="var(--ink)" strokeWidth="1.5" />
      <path d={`M${x - 4} 16h8l-1.4 4L${x} 26l-2.6 -6z`} fill={colour} />
    </>
  );
}

function Tail({ activity, scale }: Pick<Props, 'activity' | 'scale'>) {
  if (activity.totalFloat <= 1e-6) return null;
  return (
    <path
      d={`M${scale.x(activity.earlyFinish)} 16H${scale.x(activity.lateFinish)}`}
      stroke="var(--slate)"
      strokeWidth="1.5"
      strokeDasharray="1 4"
    />
  );
}
