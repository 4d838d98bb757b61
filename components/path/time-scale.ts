/** Maps working days to pixels and says where the axis has its marks. */
export interface TimeScale {
  readonly end: number;
  readonly width: number;
  x(days: number): number;
  readonly ticks: readonly number[];
}

const STEPS = [1, 2, 5, 10, 20, 50, 100, 200, 250, 500, 1000, 2000, 5000];

/** `end` working days over `width` pixels, with marks no closer than `minGap` pixels. */
export function timeScale(end: number, width: number, minGap = 88): TimeScale {
  const span = Math.max(end, 1);
  const step = STEPS.find((candidate) => (candidate / span) * width >= minGap) ?? niceStep(span);
  const ticks: number[] = [];
  for (let day = 0; day <= span + 1e-9; day += step) ticks.push(day);
  return { end: span, width, x: (days) => (days / span) * width, ticks };
}

function niceStep(span: number): number {
  return 10 ** Math.ceil(Math.log10(span / 5));
}
