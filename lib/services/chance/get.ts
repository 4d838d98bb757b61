import type { z } from 'zod';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Conflict, Invalid } from '@/lib/contract/errors';
import { chanceQuery, type ChanceView } from '@/lib/contract/submission';
import { chance, daysFor, tableValue, tableZ } from '@/lib/estimates';
import { dateOfFinish, workingDaysThrough } from '@/lib/schedule/calendar';
import { because } from '@/lib/services/analysis/get';
import { idOf, inOffice } from '@/lib/services/in-office';
import { loadState } from '@/lib/services/schedule/load';
import { computed } from '@/lib/services/schedule/state';
import type { ProjectDates } from '@/lib/services/submissions/figures';
import { requireSubmission } from '@/lib/services/submissions/require';
import { datesOf } from '@/lib/services/submissions/view';

type Question = z.output<typeof chanceQuery>;
interface Finish {
  readonly expectedDuration: number;
  readonly standardDeviation: number;
}

/** The chance of a finish within days or by a date, or the finish for a confidence, on the normal distribution. */
export async function getChance(
  ctx: OfficeContext,
  { path, query }: { path: { submission: string }; query: z.input<typeof chanceQuery> },
): Promise<ChanceView> {
  requirePermission(ctx, 'submissions:read');
  const id = idOf(path.submission, 'submission');
  const question = askedOnce(checked(chanceQuery, query));
  return inOffice(ctx, async (tx) => {
    const row = await requireSubmission(tx, id);
    const read = await loadState(tx, row.submission, question.state);
    const analysis = computed(read);
    if (analysis) return answer(question, analysis, datesOf(row));
    throw new Conflict('The finish cannot be computed while these findings stand in the way.', {
      members: { because: await because(tx, id, read) },
    });
  });
}

function askedOnce(question: Question): Question {
  const asked = (['days', 'date', 'confidence'] as const).filter((name) => question[name] !== undefined);
  if (asked.length === 1) return question;
  const sentence = 'Ask by exactly one of days, date and confidence.';
  const errors = (asked.length === 0 ? ['days'] : asked).map((path) => ({ path, message: sentence }));
  throw new Invalid(sentence, { errors });
}

function answer(
  question: Question,
  { expectedDuration, standardDeviation }: Finish,
  dates: ProjectDates,
): ChanceView {
  const { start, calendar } = dates;
  const days = daysOf(question, { expectedDuration, standardDeviation }, dates);
  const { z, before, after } = chance(days, expectedDuration, standardDeviation);
  return {
    days,
    date: question.date ?? dateOfFinish(calendar, start, days),
    z,
    before,
    after,
    table: z === null ? null : { z: tableZ(z), before: tableValue(z) },
    expectedDuration,
    standardDeviation,
  };
}

function daysOf(
  { days, date, confidence }: Question,
  finish: Finish,
  { start, calendar }: ProjectDates,
): number {
  if (date !== undefined) return workingDaysThrough(calendar, start, date);
  if (confidence !== undefined) return daysFor(confidence, finish.expectedDuration, finish.standardDeviation);
  return days ?? 0;
}
