import { readFile } from 'node:fs/promises';
import { z } from 'zod';

export interface Counts {
  readonly passed: number;
  readonly failed: number;
  readonly skipped: number;
}

const NONE: Counts = { passed: 0, failed: 0, skipped: 0 };

export const add = (one: Counts, other: Counts): Counts => ({
  passed: one.passed + other.passed,
  failed: one.failed + other.failed,
  skipped: one.skipped + other.skipped,
});

/** The last line of `npm test`. */
export const lastLine = ({ passed, failed, skipped }: Counts): string =>
  `${passed} passed, ${failed} failed, ${skipped} skipped`;

/** A stage that ended badly, or ran nothing, has failed at least once, whatever its report says. */
export function ofStage(report: Counts | null, exitCode: number): Counts {
  const counts = report ?? NONE;
  const ranNothing = counts.passed + counts.failed === 0;
  if (counts.failed === 0 && (exitCode !== 0 || ranNothing)) return { ...counts, failed: 1 };
  return counts;
}

const vitestReport = z.object({
  numPassedTests: z.int(),
  numFailedTests: z.int(),
  numPendingTests: z.int(),
  numTodoTests: z.int(),
  testResults: z.array(
    z.object({ status: z.string(), assertionResults: z.array(z.object({ status: z.string() })) }),
  ),
});

/** Vitest's JSON report. A file that fails without a failing test (it cannot be read, a hook throws) counts as one. */
export function vitestCounts(json: unknown): Counts {
  const report = vitestReport.parse(json);
  const brokenFiles = report.testResults.filter(
    (file) => file.status === 'failed' && !file.assertionResults.some((test) => test.status === 'failed'),
  );
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + brokenFiles.length,
    skipped: report.numPendingTests + report.numTodoTests,
  };
}

const playwrightReport = z.object({
  stats: z.object({ expected: z.int(), unexpected: z.int(), flaky: z.int(), skipped: z.int() }),
  errors: z.array(z.unknown()),
});

/** Playwright's JSON report; what failed outside a test counts as well, and a flaky test has not passed. */
export function playwrightCounts(json: unknown): Counts {
  const { stats, errors } = playwrightReport.parse(json);
  return {
    passed: stats.expected,
    failed: stats.unexpected + stats.flaky + errors.length,
    skipped: stats.skipped,
  };
}

/** Null where the report was not written, or not to its end. */
export async function readReport(file: string, count: (json: unknown) => Counts): Promise<Counts | null> {
  try {
    return count(JSON.parse(await readFile(file, 'utf8')));
  } catch {
    return null; // The stage crashed; `ofStage` counts that.
  }
}
