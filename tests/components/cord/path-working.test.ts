import { expect, it } from 'vitest';
import { pathWorking } from '@/components/cord/path-working';
import type { AnalysedActivity, AnalysisView } from '@/lib/contract/submission';

function activity(id: string, expected: number, variance: number): AnalysedActivity {
  return {
    id,
    name: id,
    row: 2,
    optimistic: expected,
    likely: expected,
    pessimistic: expected,
    expected,
    variance,
    earlyStart: 0,
    earlyFinish: expected,
    lateStart: 0,
    lateFinish: expected,
    totalFloat: 0,
    freeFloat: 0,
    critical: true,
    startDate: '2027-01-04',
    finishDate: '2027-01-08',
    predecessors: [],
  };
}

function analysis(expectedDuration: number): Extract<AnalysisView, { computable: true }> {
  return {
    computable: true,
    state: 'corrected',
    unit: 'working day',
    calendar: { workingDays: [1, 2, 3, 4, 5], holidays: [] },
    start: '2027-01-04',
    finish: '2027-01-20',
    expectedDuration,
    variance: 1.5,
    standardDeviation: Math.sqrt(1.5),
    criticalPaths: [['A', 'C']],
    criticalPathCount: 1,
    activities: [activity('A', 4.1, 1), activity('B', 2, 9), activity('C', 6.2, 0.5)],
  };
}

it('adds up the reported path, and nothing beside it', () => {
  const working = pathWorking(analysis(10.3));
  expect(working.steps.map(({ id }) => id)).toEqual(['A', 'C']);
  expect(working.expected).toBeCloseTo(10.3, 12);
  expect(working.offset).toBe(0);
  expect(working.variance).toBe(1.5);
});

it('says what lags and overlaps add to the sum', () => {
  expect(pathWorking(analysis(12.3)).offset).toBeCloseTo(2, 12);
  expect(pathWorking(analysis(8.3)).offset).toBeCloseTo(-2, 12);
});
