import { describe, expect, it } from 'vitest';
import { PUBLISHED_NETWORKS } from '@/fixtures/published/networks';
import { chance, tableValue, tableZ } from '@/lib/estimates';
import { analyse, compile } from '@/lib/network';
import { list } from '@/tests/support/networks';

describe.each(PUBLISHED_NETWORKS)('$source ($known)', (published) => {
  const activities = list(...published.rows);
  const analysis = analyse(compile(activities));
  if (!analysis.computable) throw new Error('A published network has no loop.');
  const { times } = analysis;
  const at = (id: string) => activities.indexOf.get(id) ?? -1;
  const named = (path: readonly number[]) => path.map((i) => activities.activities[i]?.id);

  it('takes as long, with the same variance', () => {
    expect(analysis.expectedDuration).toBeCloseTo(published.duration, 9);
    if (published.variance !== undefined) expect(analysis.variance).toBeCloseTo(published.variance, 9);
  });

  if (published.paths)
    it('has the same critical paths', () => {
      expect(analysis.criticalPaths.map(named)).toEqual(published.paths);
    });

  if (published.times)
    it('has the same times and floats', () => {
      for (const [id, expected] of Object.entries(published.times ?? {})) {
        const { earlyStart, earlyFinish, lateStart, lateFinish, totalFloat } = times;
        const found = [earlyStart, earlyFinish, lateStart, lateFinish, totalFloat].map((by) => by[at(id)]);
        expect(found, id).toEqual(expected);
      }
    });

  if (published.totalFloat)
    it('has the same floats', () => {
      for (const [id, days] of Object.entries(published.totalFloat ?? {})) {
        expect(times.totalFloat[at(id)], id).toBe(days);
      }
      for (const [id, days] of Object.entries(published.freeFloat ?? {})) {
        expect(times.freeFloat[at(id)], id).toBe(days);
      }
    });

  if (published.chance)
    it('gives the same chance by the printed table', () => {
      for (const { days, z, before } of published.chance ?? []) {
        const found = chance(days, analysis.expectedDuration, analysis.standardDeviation);
        expect(tableZ(found.z ?? Number.NaN)).toBe(z);
        expect(tableValue(found.z ?? Number.NaN)).toBe(before);
        expect(found.before).toBeCloseTo(before, 2);
      }
    });
});
