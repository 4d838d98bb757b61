import { describe, expect, it } from 'vitest';
import { STOPS, stopAt, stopPath } from '@/components/cord/stops';

describe('the places along the cord', () => {
  it('have addresses that lead back to them', () => {
    for (const stop of STOPS) expect(stopAt(stopPath('demo', 'a1', stop))).toBe(stop);
  });

  it('begin with the findings at the submission itself', () => {
    expect(stopPath('demo', 'a1', 'findings')).toBe('/demo/submissions/a1');
    expect(stopAt('/demo/submissions/a1/')).toBe('findings');
    expect(stopAt('/demo/submissions/record')).toBe('findings');
  });
});
