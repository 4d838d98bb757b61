import type { AnalysedActivity } from '@/lib/contract/submission';

/** An activity of an analysis with nothing in it but what a test says. */
export function activity(id: string, given: Partial<AnalysedActivity> = {}): AnalysedActivity {
  return {
    id,
    name: `Work ${id}`,
    row: 1,
    optimistic: 0,
    likely: 0,
    pessimistic: 0,
    expected: 0,
    variance: 0,
    earlyStart: 0,
    earlyFinish: 0,
    lateStart: 0,
    lateFinish: 0,
    totalFloat: 0,
    freeFloat: 0,
    critical: false,
    startDate: '2027-01-04',
    finishDate: '2027-01-04',
    predecessors: [],
    ...given,
  };
}

export const after = (...ids: string[]) => ids.map((id) => ({ id, type: 'FS' as const, lag: 0 }));
