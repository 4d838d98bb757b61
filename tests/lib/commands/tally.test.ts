import { describe, expect, it } from 'vitest';
import { add, lastLine, ofStage, playwrightCounts, vitestCounts } from '@/lib/commands/tally';

const file = (status: string, ...tests: string[]) => ({
  status,
  assertionResults: tests.map((test) => ({ status: test })),
});

describe('vitestCounts', () => {
  it('counts tests, with those to be written among the skipped', () => {
    const report = {
      numPassedTests: 5,
      numFailedTests: 1,
      numPendingTests: 2,
      numTodoTests: 3,
      testResults: [file('passed', 'passed'), file('failed', 'failed', 'passed')],
    };
    expect(vitestCounts(report)).toEqual({ passed: 5, failed: 1, skipped: 5 });
  });

  it('counts a file that could not be run', () => {
    const report = {
      numPassedTests: 5,
      numFailedTests: 0,
      numPendingTests: 0,
      numTodoTests: 0,
      testResults: [file('passed', 'passed'), file('failed')],
    };
    expect(vitestCounts(report).failed).toBe(1);
  });
});

describe('playwrightCounts', () => {
  it('counts errors outside tests, and what passed only at the second attempt, as failures', () => {
    const stats = { expected: 4, unexpected: 1, flaky: 1, skipped: 2 };
    expect(playwrightCounts({ stats, errors: [{}] })).toEqual({ passed: 4, failed: 3, skipped: 2 });
  });
});

describe('ofStage', () => {
  const good = { passed: 3, failed: 0, skipped: 1 };

  it('takes the report of a stage that ended well', () => {
    expect(ofStage(good, 0)).toEqual(good);
  });

  it.each([
    ['ended badly though no test failed', good, 1],
    ['wrote no report', null, 0],
    ['ran nothing', { passed: 0, failed: 0, skipped: 4 }, 0],
  ])('counts one failure where it %s', (_, report, code) => {
    expect(ofStage(report, code).failed).toBe(1);
  });

  it('does not count a failure twice', () => {
    expect(ofStage({ ...good, failed: 2 }, 1).failed).toBe(2);
  });
});

describe('lastLine', () => {
  it('reads as it is relied on', () => {
    const total = add({ passed: 10, failed: 0, skipped: 1 }, { passed: 2, failed: 1, skipped: 0 });
    expect(lastLine(total)).toBe('12 passed, 1 failed, 1 skipped');
  });
});
