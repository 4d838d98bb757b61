import { normalCdf, normalDensity } from '@/lib/estimates';

/** A drawn curve over working days, with the part at or before the chosen day shaded. */
export interface CurveGeometry {
  /** Working days at the left and right edge. */
  readonly from: number;
  readonly to: number;
  readonly x: (days: number) => number;
  /** SVG paths. */
  readonly outline: string;
  readonly shaded: string;
  readonly ticks: readonly number[];
}

export const CURVES = { bell: 'Bell', cumulative: 'Cumulative' } as const;
export type CurveKind = keyof typeof CURVES;

const POINTS = 160;

/**
 * Draws mean ± 4 deviations (wider where the chosen day lies outside): the normal density, or the chance of having
 * finished. `deviation` must be above 0.
 */
export function drawCurve(
  kind: CurveKind,
  { mean, deviation, days }: { mean: number; deviation: number; days: number },
  width: number,
  height: number,
): CurveGeometry {
  const from = Math.min(mean - 4 * deviation, days - 0.5 * deviation);
  const to = Math.max(mean + 4 * deviation, days + 0.5 * deviation);
  const x = (value: number) => ((value - from) / (to - from)) * width;
  const share = (z: number) => (kind === 'bell' ? normalDensity(z) / normalDensity(0) : normalCdf(z));
  const line = (left: number, right: number) =>
    Array.from({ length: POINTS + 1 }, (_, i) => {
      const at = left + ((right - left) * i) / POINTS;
      return `${x(at).toFixed(2)},${(height - share((at - mean) / deviation) * height).toFixed(2)}`;
    }).join('L');
  const cut = Math.min(Math.max(days, from), to);
  return {
    from,
    to,
    x,
    outline: `M${line(from, to)}`,
    shaded: `M${x(from).toFixed(2)},${height}L${line(from, cut)}L${x(cut).toFixed(2)},${height}Z`,
    ticks: axisTicks(from, to, Math.max(3, Math.floor(width / 90))),
  };
}

/** Round values between two ends, at most about `most` of them. */
export function axisTicks(from: number, to: number, most: number): number[] {
  const rough = (to - from) / most;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step =
    [1, 2, 5, 10].map((factor) => factor * power).find((candidate) => candidate >= rough) ?? power * 10;
  const ticks: number[] = [];
  for (let i = Math.ceil(from / step); i * step <= to; i++) ticks.push(Number((i * step).toPrecision(12)));
  return ticks;
}
