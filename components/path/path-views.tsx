'use client';

import { useMemo } from 'react';
import { Select } from '@/components/ui/field';
import { useFormat } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { WorkedLine } from '@/components/ui/worked-line';
import type { AnalysedActivity, AnalysisView } from '@/lib/contract/submission';
import { ActivityDetail } from './activity-detail';
import { ActivityTable } from './activity-table';
import { Chain } from './chain';
import { feedersOf } from './feeders';
import type { View } from './views';
import { rowsToDraw, SHOWN, type Shown } from './rows';
import { TimeChart } from './time-chart';
import { pathVarianceWorking } from './workings';

type Computed = Extract<AnalysisView, { computable: true }>;

export interface PathViewsProps {
  analysis: Computed;
  byId: ReadonlyMap<string, AnalysedActivity>;
  view: View;
  shown: Shown;
  near: number;
  /** Which of the listed critical paths is drawn as the chain. */
  pathIndex: number;
  selected: string | null;
  onSelect: (id: string) => void;
  onShown: (shown: Shown) => void;
  onPath: (index: number) => void;
}

export function PathViews(props: PathViewsProps) {
  const { analysis, byId, view, selected } = props;
  const activity = selected === null ? undefined : byId.get(selected);
  return (
    <div className={activity ? 'grid items-start gap-4 xl:grid-cols-[minmax(0,1fr)_340px]' : 'grid gap-4'}>
      {view === 'drawn' && (
        <div className="grid min-w-0 gap-4">
          <ChainPanel {...props} />
          <TimePanel {...props} />
        </div>
      )}
      {view === 'table' && (
        <Panel
          title="Every activity, every figure"
          sub="Working days from time 0, as computed; nothing is rounded before it is shown."
        >
          <ActivityTable
            activities={analysis.activities}
            near={props.near}
            selected={selected}
            onSelect={props.onSelect}
          />
        </Panel>
      )}
      {activity && <ActivityDetail activity={activity} />}
    </div>
  );
}

function ChainPanel({ analysis, byId, near, pathIndex, selected, onSelect, onPath }: PathViewsProps) {
  const format = useFormat();
  const index = analysis.criticalPaths[pathIndex] ? pathIndex : 0;
  const path = useMemo(() => analysis.criticalPaths[index] ?? [], [analysis, index]);
  const activities = useMemo(() => path.flatMap((id) => byId.get(id) ?? []), [path, byId]);
  const feeders = useMemo(() => feedersOf(path, byId), [path, byId]);
  const variance = activities.reduce((sum, activity) => sum + activity.variance, 0);
  return (
    <Panel
      title={`${format.plural(activities.length, 'activity sets', 'activities set')} the finish: ${format.number(analysis.expectedDuration, 1)} working days, ${format.date(analysis.finish)}`}
      sub={
        <>
          Variance along this path{' '}
          <WorkedLine working={pathVarianceWorking(activities, variance, format)}>
            {format.variance(variance)}
          </WorkedLine>
          , deviation {format.days(Math.sqrt(variance), 2)}. {howMany(analysis, format)}
        </>
      }
      aside={
        analysis.criticalPaths.length > 1 && (
          <label className="flex items-center gap-2 whitespace-nowrap">
            path
            <span className="w-44">
              <Select value={index} onChange={(event) => onPath(Number(event.target.value))}>
                {analysis.criticalPaths.map((each, at) => (
                  <option key={at} value={at}>
                    {at + 1}: {each.length} activities
                  </option>
                ))}
              </Select>
            </span>
          </label>
        )
      }
    >
      <Chain path={activities} feeders={feeders} nearWithin={near} selected={selected} onSelect={onSelect} />
    </Panel>
  );
}

function howMany(analysis: Computed, format: ReturnType<typeof useFormat>): string {
  const count = analysis.criticalPathCount;
  if (count <= 1) return 'It is the only critical path.';
  const listed = analysis.criticalPaths.length;
  const rest = count > listed ? ` The first ${listed} can be chosen.` : '';
  const total = Number.isFinite(count) ? format.count(count) : 'More than can be counted';
  return `${total} paths are critical; the one with the largest variance stands first.${rest}`;
}

function TimePanel({ analysis, shown, near, selected, onSelect, onShown }: PathViewsProps) {
  const format = useFormat();
  const rows = useMemo(() => rowsToDraw(analysis.activities, shown, near), [analysis, shown, near]);
  const critical = analysis.activities.filter((activity) => activity.critical).length;
  return (
    <Panel
      title={`From ${format.date(analysis.start)} to ${format.date(analysis.finish)}: ${format.count(critical)} of ${format.plural(analysis.activities.length, 'activity is', 'activities are')} critical`}
      sub="Bar: expected duration from the early start. Bracket above it: a to b. Double rule: critical; dashed: near-critical. Dots: slack to the late finish."
      aside={
        <label className="flex items-center gap-2 whitespace-nowrap">
          show
          <span className="w-52">
            <Select value={shown} onChange={(event) => onShown(event.target.value as Shown)}>
              {Object.entries(SHOWN).map(([id, word]) => (
                <option key={id} value={id}>
                  {word}
                </option>
              ))}
            </Select>
          </span>
        </label>
      }
    >
      {rows.length === 0 ? (
        <p>The list holds no activity to draw.</p>
      ) : (
        <TimeChart
          analysis={analysis}
          rows={rows}
          nearWithin={near}
          selected={selected}
          onSelect={onSelect}
        />
      )}
    </Panel>
  );
}
