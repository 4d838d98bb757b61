'use client';

import { Panel } from '@/components/ui/panel';
import { useFormat, type Format } from '@/components/ui/locale';
import type { SubmissionView } from '@/lib/contract/submission';
import { axisMarks, findingsTrend, finishTrend, movement, type TrendPoint } from './trend';

const WIDTH = 360;
const HEIGHT = 176;
const LEFT = 52;
const RIGHT = 16;
const TOP = 36;
const BOTTOM = 28;

/** How the findings and the expected finish moved over the revisions; the table above holds the figures. */
export function RevisionTrend({ revisions }: { revisions: readonly SubmissionView[] }) {
  const format = useFormat();
  const finish = finishTrend(revisions);
  const findings = findingsTrend(revisions);
  return (
    <div className="grid gap-5 sm:grid-cols-2">
      <Panel
        title={finishTitle(finish, format)}
        sub="Expected finish as corrected, working days from the start."
      >
        <Trend points={finish} write={(value) => format.number(value, 1)} unit="d" />
      </Panel>
      <Panel title={findingsTitle(findings)} sub="Findings of each revision as it came in and was worked on.">
        <Trend points={findings} write={(value) => format.count(value)} unit="findings" fromZero />
      </Panel>
    </div>
  );
}

interface TrendProps {
  points: readonly TrendPoint[];
  write: (value: number) => string;
  unit: string;
  /** For counts, which mean nothing without their zero. */
  fromZero?: boolean;
}

function Trend({ points, write, unit, fromZero = false }: TrendProps) {
  const known = points.flatMap(({ value }) => (value === null ? [] : [value]));
  if (known.length === 0) return <p className="text-slate">No revision can be computed yet.</p>;
  const marks = axisMarks(fromZero ? [0, ...known] : known);
  const low = marks[0] ?? 0;
  const high = marks.at(-1) ?? 1;
  const x = (index: number) =>
    LEFT + 12 + (index * (WIDTH - LEFT - RIGHT - 24)) / Math.max(1, points.length - 1);
  const y = (value: number) => TOP + ((high - value) / (high - low)) * (HEIGHT - TOP - BOTTOM);
  const drawn = points.flatMap(({ revision, value }, index) =>
    value === null ? [] : [{ revision, value, x: x(index), y: y(value) }],
  );
  return (
    <svg viewBox={`0 0 ${String(WIDTH)} ${String(HEIGHT)}`} className="w-full max-w-90" aria-hidden="true">
      {marks.map((mark) => (
        <g key={mark}>
          <path d={`M${String(LEFT)} ${String(y(mark))}H${String(WIDTH - RIGHT)}`} stroke="var(--hair)" />
          <text x={LEFT - 8} y={y(mark) + 4} textAnchor="end" fontSize="14" fill="var(--slate)">
            {write(mark)}
          </text>
        </g>
      ))}
      <text x="0" y="14" fontSize="14" fill="var(--slate)">
        {unit}
      </text>
      <polyline
        points={drawn.map((p) => `${String(p.x)},${String(p.y)}`).join(' ')}
        fill="none"
        stroke="var(--ink)"
        strokeWidth="1.5"
      />
      {drawn.map((point) => (
        <g key={point.revision}>
          <circle cx={point.x} cy={point.y} r="4" fill="var(--leaf)" stroke="var(--ink)" strokeWidth="1.5" />
          <text
            x={point.x}
            y={point.y - 9}
            textAnchor="middle"
            fontSize="14"
            fontWeight="600"
            fill="var(--ink)"
          >
            {write(point.value)}
          </text>
        </g>
      ))}
      {points.map(({ revision }, index) => (
        <text
          key={revision}
          x={x(index)}
          y={HEIGHT - 8}
          textAnchor="middle"
          fontSize="14"
          fill="var(--slate)"
        >
          Rev {revision}
        </text>
      ))}
    </svg>
  );
}

function finishTitle(points: readonly TrendPoint[], format: Format): string {
  const moved = movement(points);
  if (!moved) return 'The finish cannot be followed yet';
  const span = `from Rev\u00a0${String(moved.from.revision)} to Rev\u00a0${String(moved.to.revision)}`;
  if (Math.abs(moved.by) < 0.05) return `The expected finish stayed where it was ${span}`;
  const word = moved.by > 0 ? 'later' : 'earlier';
  return `The expected finish is ${format.days(Math.abs(moved.by))} ${word}, ${span}`;
}

function findingsTitle(points: readonly TrendPoint[]): string {
  const moved = movement(points);
  if (!moved) return 'Findings over the revisions';
  const { from, to } = moved;
  if (moved.by === 0)
    return `As many findings in Rev\u00a0${String(to.revision)} as in Rev\u00a0${String(from.revision)}`;
  const word = moved.by < 0 ? 'Fewer' : 'More';
  return `${word} findings: ${String(from.value)} in Rev\u00a0${String(from.revision)}, ${String(to.value)} in Rev\u00a0${String(to.revision)}`;
}
