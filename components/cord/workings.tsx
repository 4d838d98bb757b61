'use client';

import { useFormat } from '@/components/ui/locale';
import { ErrorState, Loading } from '@/components/ui/states';
import type { Working } from '@/components/ui/worked-line';
import { useAnalysis, useChance } from '@/lib/client/submissions';
import type { AnalysedActivity } from '@/lib/contract/submission';
import type { ScheduleState } from '@/lib/schedule/weight';
import { pathWorking } from './path-working';

/** How the three figures of the head come about, with this schedule's figures put in. Fetched when opened. */

const THREE_POINTS = 'Malcolm, Roseboom, Clark, Fazar 1959 (Operations Research 7)';

export interface WorkingPlace {
  readonly office: string;
  readonly submission: string;
  readonly state: ScheduleState;
}

export function finishWorking(place: WorkingPlace, result: string): Working {
  return {
    title: `Expected finish, ${stateWords(place.state)}`,
    formula: 'T = Σ (a + 4m + b) / 6 along the critical path, and the lags along it',
    figures: <PathSum {...place} of="expected" />,
    result,
    source: THREE_POINTS,
    note: 'In working days from the start of the project’s first one.',
  };
}

export function varianceWorking(place: WorkingPlace, result: string): Working {
  return {
    title: `Variance of the path, ${stateWords(place.state)}`,
    formula: 'V = Σ ((b − a) / 6)² along the critical path; deviation = √V',
    figures: <PathSum {...place} of="variance" />,
    result,
    source: THREE_POINTS,
    note: 'Where several paths are critical, it is the one with the largest variance.',
  };
}

export function chanceWorking(place: WorkingPlace, target: string, result: string): Working {
  return {
    title: `Chance of the target, ${stateWords(place.state)}`,
    formula: 'z = (x − T) / σ; chance = Φ(z)',
    figures: <ChanceSum {...place} target={target} />,
    result,
    source: `${THREE_POINTS}; cumulative normal distribution`,
    note: 'x: working days from the start to the end of the target date. One path, taken as normal.',
  };
}

function stateWords(state: ScheduleState): string {
  return state === 'proposed' ? 'with proposed fixes adopted' : `as ${state}`;
}

function PathSum({ office, submission, state, of }: WorkingPlace & { of: 'expected' | 'variance' }) {
  const format = useFormat();
  const analysis = useAnalysis(office, submission, state);
  if (analysis.error) return <ErrorState error={analysis.error} retry={() => void analysis.refetch()} />;
  if (!analysis.data) return <Loading label="Fetching the path" rows={2} />;
  if (!analysis.data.computable) return 'It cannot be computed in this state.';
  const { steps, offset } = pathWorking(analysis.data);
  return (
    <>
      <p className="break-words">
        {steps.map((step) => format.number(step[of], 2)).join(' + ')}
        {of === 'expected' &&
          offset !== 0 &&
          ` ${offset < 0 ? '−' : '+'} ${format.number(Math.abs(offset), 2)}`}
      </p>
      {of === 'expected' && offset !== 0 && (
        <p className="text-slate">The last number: lags, leads and overlaps along the path.</p>
      )}
      <StepTable steps={steps} of={of} />
    </>
  );
}

function StepTable({ steps, of }: { steps: readonly AnalysedActivity[]; of: 'expected' | 'variance' }) {
  const format = useFormat();
  return (
    <table className="mt-2 w-full border-collapse">
      <thead>
        <tr className="border-b border-ink text-slate">
          <th scope="col" className="pr-2 text-left font-semibold">
            Activity
          </th>
          {['a', 'm', 'b', of === 'expected' ? 'mean' : 'variance'].map((name) => (
            <th key={name} scope="col" className="pl-2 text-right font-semibold">
              {name}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {steps.map((step) => (
          <tr key={step.id} className="border-b border-hair">
            <th scope="row" className="py-0.5 pr-2 text-left font-normal break-all">
              {step.id}
            </th>
            {[step.optimistic, step.likely, step.pessimistic].map((days, index) => (
              <td key={index} className="pl-2 text-right">
                {format.number(days, Number.isInteger(days) ? 0 : 1)}
              </td>
            ))}
            <td className="pl-2 text-right">{format.number(step[of], 2)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function ChanceSum({ office, submission, state, target }: WorkingPlace & { target: string }) {
  const format = useFormat();
  const chance = useChance(office, submission, state, { date: target });
  if (chance.error) return <ErrorState error={chance.error} retry={() => void chance.refetch()} />;
  if (!chance.data) return <Loading label="Fetching the chance" rows={2} />;
  const { days, expectedDuration, standardDeviation, z, table, before } = chance.data;
  if (z === null) {
    return `The deviation is 0, so it is certain or impossible: x = ${format.number(days, 2)}, T = ${format.number(expectedDuration, 2)}.`;
  }
  return (
    <>
      <p>
        z = ({format.number(days, 2)} − {format.number(expectedDuration, 2)}) /{' '}
        {format.number(standardDeviation, 2)} = {format.number(z, 4)}
      </p>
      {table && (
        <p>
          Φ({format.number(table.z, 2)}) = {format.number(table.before, 4)}{' '}
          <span className="text-slate">as the printed table has it</span>
        </p>
      )}
      <p>
        Φ({format.number(z, 4)}) = {format.number(before, 6)} <span className="text-slate">exactly</span>
      </p>
    </>
  );
}
