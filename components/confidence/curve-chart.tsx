'use client';

import { useFormat } from '@/components/ui/locale';
import { dateOfFinish, type WorkCalendar } from '@/lib/schedule/calendar';
import { useWidth } from '@/components/path/use-size';
import type { ChanceView } from '@/lib/contract/submission';
import { drawCurve, type CurveKind } from './curve';

const HEIGHT = 260;
const MARGIN = { left: 48, right: 24, top: 28, bottom: 58 };

/** The bell (or the cumulative curve) with the area up to the chosen day shaded and hatched. */
export function CurveChart({
  kind,
  chance,
  target,
  calendar,
  start,
}: {
  kind: CurveKind;
  chance: ChanceView;
  /** Working days to the target finish, where there is one and it is not the day asked about. */
  target: number | null;
  calendar: WorkCalendar;
  start: string;
}) {
  const format = useFormat();
  const { ref, width } = useWidth<HTMLDivElement>(760);
  const inner = Math.max(160, width - MARGIN.left - MARGIN.right);
  const { expectedDuration: mean, standardDeviation: deviation, days, before } = chance;
  const curve = drawCurve(kind, { mean, deviation, days }, inner, HEIGHT);
  const at = curve.x(days);
  const label = `${format.percent(before)} by then`;
  const labelLeft = at > inner / 2;
  return (
    <div ref={ref} className="min-w-0">
      <svg
        width={inner + MARGIN.left + MARGIN.right}
        height={HEIGHT + MARGIN.top + MARGIN.bottom}
        className="block max-w-full"
        role="img"
        aria-label={`Normal curve around ${format.days(mean)} with a deviation of ${format.days(deviation, 2)}; the area up to ${format.days(days)} is shaded and holds ${format.percent(before)}.`}
      >
        <defs>
          <pattern
            id="hatch"
            width="6"
            height="6"
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(45)"
          >
            <path d="M0 0v6" stroke="var(--cord)" strokeWidth="1.6" />
          </pattern>
        </defs>
        <g transform={`translate(${MARGIN.left},${MARGIN.top})`}>
          {kind === 'cumulative' && <Shares inner={inner} />}
          <path d={curve.shaded} fill="var(--cord)" fillOpacity="0.12" />
          <path d={curve.shaded} fill="url(#hatch)" fillOpacity="0.4" />
          <path d={curve.outline} fill="none" stroke="var(--ink)" strokeWidth="1.8" />
          <path d={`M0 ${HEIGHT}H${inner}`} stroke="var(--ink)" />
          <path d={`M${curve.x(mean)} ${HEIGHT}V0`} stroke="var(--slate)" strokeDasharray="2 4" />
          {target !== null && target >= curve.from && target <= curve.to && (
            <g>
              <path d={`M${curve.x(target)} ${HEIGHT}V14`} stroke="var(--brass)" strokeDasharray="6 3" />
              <text x={curve.x(target)} y="10" textAnchor="middle" fontSize="12" fill="var(--brass)">
                target
              </text>
            </g>
          )}
          <Bob x={at} />
          <text
            x={at + (labelLeft ? -8 : 8)}
            y="-8"
            textAnchor={labelLeft ? 'end' : 'start'}
            fontSize="14"
            fontWeight="600"
            fill="var(--ink)"
          >
            {label}
          </text>
          {curve.ticks.map((tick) => (
            <g key={tick} transform={`translate(${curve.x(tick)},${HEIGHT})`}>
              <path d="M0 0v5" stroke="var(--ink)" />
              <text y="20" textAnchor="middle" fontSize="13" fill="var(--ink)">
                {Number.isInteger(tick) ? format.number(tick, 0) : format.number(tick, 1)}
              </text>
              <text y="36" textAnchor="middle" fontSize="12" fill="var(--slate)">
                {tick >= 0 && Number.isInteger(tick)
                  ? shortDate(dateOfFinish(calendar, start, tick), format.locale)
                  : ''}
              </text>
            </g>
          ))}
          <text x={inner / 2} y={HEIGHT + 54} textAnchor="middle" fontSize="13" fill="var(--slate)">
            working days from {format.date(start)}
          </text>
        </g>
      </svg>
    </div>
  );
}

function Shares({ inner }: { inner: number }) {
  return [0, 20, 40, 60, 80, 100].map((share) => (
    <g key={share} transform={`translate(0,${HEIGHT - (share / 100) * HEIGHT})`}>
      <path d={`M0 0H${inner}`} stroke="var(--hair)" />
      <text x="-8" y="4" textAnchor="end" fontSize="12" fill="var(--slate)">
        {share} %
      </text>
    </g>
  ));
}

function Bob({ x }: { x: number }) {
  return (
    <g transform={`translate(${x},0)`}>
      <path d={`M0 -6V${HEIGHT}`} stroke="var(--ink)" strokeWidth="1.6" />
      <path d={`M-6 ${HEIGHT}h12l-2 7L0 ${HEIGHT + 14}l-4 -7z`} fill="var(--ink)" />
    </g>
  );
}

function shortDate(iso: string, locale: string): string {
  return new Intl.DateTimeFormat(locale, { day: 'numeric', month: 'short', timeZone: 'UTC' }).format(
    new Date(`${iso}T00:00:00Z`),
  );
}
