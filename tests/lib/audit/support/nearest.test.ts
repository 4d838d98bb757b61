import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isOneEdit } from '@/lib/audit/support/edit-distance';
import { loose, nearestTo } from '@/lib/audit/support/nearest';
import { list } from '@/tests/support/networks';

const ids = (...all: string[]) => list(...all.map((id) => `${id} 1`));
const near = (wanted: string, ...all: string[]) => {
  const found = nearestTo(ids(...all), wanted);
  return found && { how: found.how, ids: found.activities.map((activity) => all[activity]) };
};

describe('nearestTo', () => {
  it('tells in what way an ID is near', () => {
    expect(near('pier-3', 'PIER-3', 'PIER-4')).toEqual({ how: 'letters', ids: ['PIER-3'] });
    expect(near('P-OO3', 'P-3', 'P-4')).toEqual({ how: 'lookalike', ids: ['P-3'] });
    expect(near('P-44', 'P-4', 'P-9')).toEqual({ how: 'edit', ids: ['P-4'] });
    expect(near('3', 'A3', 'A4')).toEqual({ how: 'edit', ids: ['A3'] });
    expect(near('Q', 'P', 'P-9')).toBeNull();
  });

  it('lists what is equally near in the order of the list', () => {
    expect(near('T-19', 'T-29', 'T-1', 'T-91', 'T-88')?.ids).toEqual(['T-29', 'T-1', 'T-91']);
  });

  it('keeps to those of the same build where there are any', () => {
    expect(near('A9', 'B9', 'A8')?.ids).toEqual(['A8']);
    expect(near('A9', 'B9', 'AB')?.ids).toEqual(['B9', 'AB']);
  });

  it('finds all that one edit can reach, and no other', () => {
    const id = fc.string({ unit: fc.constantFrom('A', 'B', '2', '3'), minLength: 2, maxLength: 5 });
    fc.assert(
      fc.property(fc.uniqueArray(id, { minLength: 1, maxLength: 30 }), id, (all, wanted) => {
        fc.pre(!all.includes(wanted));
        const reachable = all.filter((one) => isOneEdit(loose(one), loose(wanted)));
        const found = near(wanted, ...all);
        if (reachable.length === 0) return found === null;
        return found !== null && found.ids.length > 0 && found.ids.every((one) => reachable.includes(one!));
      }),
    );
  });

  it('is quick on a long list with many unknown IDs', () => {
    const all = ids(...Array.from({ length: 20_000 }, (_, i) => `ACT-${i}`));
    const started = performance.now();
    for (let i = 0; i < 20_000; i++) nearestTo(all, `ACT-${i}x`);
    expect(performance.now() - started).toBeLessThan(10_000);
  });
});
