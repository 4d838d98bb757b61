import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { timeScale } from '@/components/path/time-scale';

describe('timeScale', () => {
  it('puts 0 at the left and the end at the right', () => {
    const scale = timeScale(120, 600);
    expect([scale.x(0), scale.x(60), scale.x(120)]).toEqual([0, 300, 600]);
  });

  it('has at least the mark at 0, and marks that do not crowd', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1e6, noNaN: true }),
        fc.integer({ min: 120, max: 3000 }),
        (end, width) => {
          const { ticks, x } = timeScale(end, width);
          expect(ticks[0]).toBe(0);
          expect(ticks.length).toBeLessThan(60);
          for (let i = 1; i < ticks.length; i++) {
            expect(x(ticks[i] ?? 0) - x(ticks[i - 1] ?? 0)).toBeGreaterThan(20);
          }
        },
      ),
    );
  });
});
