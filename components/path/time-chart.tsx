'use client';

import { useMemo, useState } from 'react';
import { useFormat } from '@/components/ui/locale';
import type { AnalysedActivity, AnalysisView } from '@/lib/contract/submission';
import { dateOfStart } from '@/lib/schedule/calendar';
import { rowsInSight, standing } from './rows';
import { PAD, ROW_HEIGHT, TimeRow } from './time-row';
import { timeScale, type TimeScale } from './time-scale';
import { useWidth } from './use-size';

type Computed = Extract<AnalysisView, { computable: true }>;

const AXIS_HEIGHT = 44;
const TALLEST = 640;

/** When the work runs: working days across, dates under them, one activity a row. Draws only the rows in sight. */
export function TimeChart({
  analysis,
  rows,
  nearWithin,
  selected,
  onSelect,
}: {
  analysis: Computed;
  rows: readonly AnalysedActivity[];
  nearWithin: number;
  selected: string | null;
  onSelect: (id: string) => void;
}) {
  const { ref, width } = useWidth<HTMLDivElement>(960);
  const [scrollTop, setScrollTop] = useState(0);
  const labels = Math.min(240, Math.max(96, Math.round(width * 0.24)));
  const end = useMemo(
    () =>
      rows.reduce((most, row) => Math.max(most, row.earlyStart + row.pessimistic), analysis.expectedDuration),
    [rows, analysis],
  );
  const scale = timeScale(end, Math.max(120, width - labels - 2 * PAD));
  const height = Math.min(TALLEST, rows.length * ROW_HEIGHT + AXIS_HEIGHT);
  const { first, end: last } = rowsInSight(scrollTop, TALLEST, ROW_HEIGHT, rows.length);

  return (
    <div
      ref={ref}
      role="region"
      aria-label="Time chart"
      tabIndex={0}
      onScroll={(event) => setScrollTop(event.currentTarget.scrollTop)}
      className="relative overflow-x-hidden overflow-y-auto"
      style={{ height }}
    >
      <Axis analysis={analysis} scale={scale} left={labels} />
      <ul className="relative" style={{ height: rows.length * ROW_HEIGHT }}>
        {rows.slice(first, last).map((activity, offset) => (
          <li key={activity.id} className="absolute inset-x-0" style={{ top: (first + offset) * ROW_HEIGHT }}>
            <TimeRow
              activity={activity}
              standing={standing(activity, nearWithin)}
              scale={scale}
              labels={labels}
              selected={activity.id === selected}
              onSelect={onSelect}
            />
          </li>
        ))}
      </ul>
    </div>
  );
}

function Axis({ analysis, scale, left }: { analysis: Computed; scale: TimeScale; left: number }) {
  const format = useFormat();
  return (
    <svg
      className="sticky top-0 z-10 block border-b border-ink bg-leaf text-sm"
      width={left + scale.width + 2 * PAD}
      height={AXIS_HEIGHT - 1}
      role="img"
      aria-label={`Axis in working days from ${format.date(analysis.start)}, with dates under them`}
    >
      {scale.ticks.map((day) => (
        <g key={day} transform={`translate(${left + PAD + scale.x(day)},0)`}>
          <path d="M0 36v8" stroke="var(--ink)" />
          <text y="14" textAnchor={day === 0 ? 'start' : 'middle'} fill="var(--ink)" fontSize="13">
            {format.number(day, 0)} d
          </text>
          <text y="31" textAnchor={day === 0 ? 'start' : 'middle'} fill="var(--slate)" fontSize="12">
            {format.date(dateOfStart(analysis.calendar, analysis.start, day))}
          </text>
        </g>
      ))}
    </svg>
  );
}
