import { describe, expect, it } from 'vitest';
import { axisTicks, drawCurve } from '@/components/confidence/curve';

const points = (path: string) =>
  path
    .replace(/[MZ]/g, '')
    .split('L')
    .map((pair) => pair.split(',').map(Number));

describe('drawCurve', () => {
  it('has its top at the mean', () => {
    const curve = drawCurve('bell', { mean: 100, deviation: 5, days: 100 }, 800, 200);
    const top = points(curve.outline).reduce((best, point) =>
      (point[1] ?? 0) < (best[1] ?? 0) ? point : best,
    );
    expect(top[0]).toBeCloseTo(curve.x(100), 0);
    expect(top[1]).toBeCloseTo(0, 1);
  });

  it('shades up to the day asked about', () => {
    const curve = drawCurve('bell', { mean: 100, deviation: 5, days: 95 }, 800, 200);
    const right = Math.max(...points(curve.shaded).map(([x]) => x ?? 0));
    expect(right).toBeCloseTo(curve.x(95), 1);
  });

  it('widens where the day lies far outside', () => {
    const curve = drawCurve('bell', { mean: 100, deviation: 5, days: 200 }, 800, 200);
    expect(curve.to).toBeGreaterThan(200);
    expect(curve.x(200)).toBeLessThan(800);
  });

  it('rises from 0 to 1 when cumulative, half way at the mean', () => {
    const curve = drawCurve('cumulative', { mean: 100, deviation: 5, days: 100 }, 800, 200);
    const heights = points(curve.outline).map(([, y]) => y ?? 0);
    expect(heights[0]).toBeGreaterThan(199);
    expect(heights.at(-1)).toBeLessThan(1);
    expect(heights[Math.floor(heights.length / 2)]).toBeCloseTo(100, 0);
  });
});

describe('axisTicks', () => {
  it('are round and lie between the ends', () => {
    expect(axisTicks(97.3, 142.2, 6)).toEqual([100, 110, 120, 130, 140]);
    expect(axisTicks(0.1, 0.9, 5)).toEqual([0.2, 0.4, 0.6, 0.8]);
  });
});
