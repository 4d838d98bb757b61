'use client';

import { useFormat } from '@/components/ui/locale';
import { DateText } from '@/components/ui/date-text';
import { Panel } from '@/components/ui/panel';
import { WorkingTable } from '@/components/ui/worked-line';
import type { ChanceView } from '@/lib/contract/submission';
import type { Asked } from './question';

/** The answer in figures, each as a worked line with what was put in. */
export function WorkedAnswer({ chance, asked }: { chance: ChanceView; asked: Asked }) {
  const format = useFormat();
  const n = (value: number, decimals: number) => format.number(value, decimals);
  const { z, before, after, table, days, expectedDuration: mean, standardDeviation: deviation } = chance;
  const forConfidence = asked.way === 'confidence';
  return (
    <Panel
      bench
      title={
        <>
          By <DateText value={chance.date} />{' '}
          <span className="font-normal text-slate">({format.days(days)})</span>
        </>
      }
    >
      <table className="mb-4 w-full border-collapse text-left">
        <tbody>
          <Answer label="finished by then" value={before} />
          <Answer label="later than that" value={after} />
        </tbody>
      </table>
      <div className="flex flex-col gap-5">
        {forConfidence && z !== null && (
          <div>
            <WorkingTable
              working={{
                title: 'The day for that confidence',
                formula: 'x = expected + z × deviation, with Φ(z) = confidence',
                figures: `${n(mean, 3)} + ${n(z, 4)} × ${n(deviation, 4)}`,
                result: `${format.days(days, 3)}, the working day of ${format.date(chance.date)}`,
                source: 'normal quantile: Wichura 1988, AS 241',
              }}
            />
          </div>
        )}
        {z === null ? (
          <div>
            <WorkingTable
              working={{
                title: 'No spread',
                formula: 'deviation = 0: the chance is a step',
                figures: `${n(days, 3)} ${before === 1 ? '≥' : '<'} ${n(mean, 3)}`,
                result: before === 1 ? 'finished by then' : 'later than that',
                source: 'a = m = b along the path, so nothing is left to chance',
              }}
            />
          </div>
        ) : (
          <div>
            <WorkingTable
              working={{
                title: 'How many deviations away',
                formula: 'z = (x − expected) / deviation',
                figures: `(${n(days, 3)} − ${n(mean, 3)}) / ${n(deviation, 4)}`,
                result: n(z, 4),
                source: 'Malcolm, Roseboom, Clark, Fazar 1959',
              }}
            />
          </div>
        )}
        {z !== null && table && (
          <div>
            <WorkingTable
              working={{
                title: 'Chance of having finished',
                formula: 'before = Φ(z), after = 1 − Φ(z)',
                figures: `Φ(${n(z, 4)})`,
                result: `${n(before, 6)} before, ${n(after, 6)} after`,
                source: 'cumulative normal distribution',
                note: `The printed table, read at z = ${n(table.z, 2)}, has ${n(table.before, 4)}.`,
              }}
            />
          </div>
        )}
      </div>
    </Panel>
  );
}

function Answer({ label, value }: { label: string; value: number }) {
  const format = useFormat();
  return (
    <tr className="border-b border-hair">
      <th scope="row" className="py-2 font-normal">
        {label}
      </th>
      <td className="py-2 text-right text-lg font-semibold">{format.percent(value)}</td>
    </tr>
  );
}
