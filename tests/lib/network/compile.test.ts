import { describe, expect, it } from 'vitest';
import { compile, usedEstimates } from '@/lib/network';
import { list } from '@/tests/support/networks';

describe('compiling a list', () => {
  const network = compile(list('A 2 4 6', 'B 1 2 9 <- A SS+1, Z9, B, C', 'C 5 5 5 <- A FF-0.5'));

  it('keeps the links that have two ends, and where they stand in the list', () => {
    expect(network.linkCount).toBe(3);
    expect([...network.predecessorStart]).toEqual([0, 0, 2, 3]);
    expect([...network.predecessor]).toEqual([0, 2, 0]);
    expect([...network.linkIndex]).toEqual([0, 3, 4]);
    expect([...network.relation]).toEqual([1, 0, 2]);
    expect([...network.lag]).toEqual([1, 0, -0.5]);
    expect([...network.successorStart]).toEqual([0, 2, 2, 3]);
    expect([...network.successor]).toEqual([1, 2, 1]);
    expect([...network.successorPosition]).toEqual([0, 2, 1]);
  });

  it('turns the estimates into expected durations and variances', () => {
    expect([...network.expected]).toEqual([4, 3, 5]);
    expect(network.variance[0]).toBeCloseTo(16 / 36, 12);
    expect(network.variance[2]).toBe(0);
  });

  it('takes a missing extreme as the likely one, and nothing as 0', () => {
    const used = list('A - 4 6', 'B 1 4 -', 'C 1 - 6', 'D - - -').activities.map(usedEstimates);
    expect(used).toEqual([
      { optimistic: 4, likely: 4, pessimistic: 6 },
      { optimistic: 1, likely: 4, pessimistic: 4 },
      { optimistic: 0, likely: 0, pessimistic: 0 },
      { optimistic: 0, likely: 0, pessimistic: 0 },
    ]);
  });

  it('takes the first activity that bears an ID', () => {
    const { predecessor, predecessorStart } = compile(list('A 1', 'A 2', 'B 3 <- A'));
    expect([...predecessorStart]).toEqual([0, 0, 0, 1]);
    expect([...predecessor]).toEqual([0]);
  });
});
