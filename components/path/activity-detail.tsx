'use client';

import { DateText } from '@/components/ui/date-text';
import { useFormat } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { WorkedLine } from '@/components/ui/worked-line';
import type { AnalysedActivity } from '@/lib/contract/submission';
import { expectedWorking, varianceWorking } from './workings';

/** One activity: estimates, the four times, floats, what it waits for. */
export function ActivityDetail({ activity }: { activity: AnalysedActivity }) {
  const format = useFormat();
  const times: [string, number, number][] = [
    ['Early', activity.earlyStart, activity.earlyFinish],
    ['Late', activity.lateStart, activity.lateFinish],
  ];
  return (
    <Panel bench title={`${activity.id} ${activity.name}`.trim()} sub={`row ${activity.row} of the list`}>
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1">
        <dt className="text-slate">a / m / b</dt>
        <dd>
          {[activity.optimistic, activity.likely, activity.pessimistic]
            .map((value) => format.number(value, 1))
            .join(' / ')}{' '}
          d
        </dd>
        <dt className="text-slate">Expected</dt>
        <dd>
          <WorkedLine working={expectedWorking(activity, format)}>
            {format.days(activity.expected, 2)}
          </WorkedLine>
        </dd>
        <dt className="text-slate">Variance</dt>
        <dd>
          <WorkedLine working={varianceWorking(activity, format)}>
            {format.variance(activity.variance)}
          </WorkedLine>
        </dd>
        <dt className="text-slate">Total float</dt>
        <dd>
          {format.days(activity.totalFloat)}
          {activity.critical && <span className="font-semibold text-umber"> ═ critical</span>}
        </dd>
        <dt className="text-slate">Free float</dt>
        <dd>{format.days(activity.freeFloat)}</dd>
      </dl>
      <table className="mt-3 w-full border-collapse text-left">
        <thead>
          <tr className="border-b border-ink text-slate">
            <th className="py-1 font-semibold">Times</th>
            <th className="py-1 text-right font-semibold">start</th>
            <th className="py-1 text-right font-semibold">finish</th>
          </tr>
        </thead>
        <tbody>
          {times.map(([label, start, finish]) => (
            <tr key={label} className="border-b border-hair">
              <th scope="row" className="py-1 font-normal">
                {label}
              </th>
              <td className="py-1 text-right">{format.days(start)}</td>
              <td className="py-1 text-right">{format.days(finish)}</td>
            </tr>
          ))}
          <tr>
            <th scope="row" className="py-1 font-normal">
              Early dates
            </th>
            <td className="py-1 text-right">
              <DateText value={activity.startDate} />
            </td>
            <td className="py-1 text-right">
              <DateText value={activity.finishDate} />
            </td>
          </tr>
        </tbody>
      </table>
      <h3 className="mt-3 font-semibold text-slate">Waits for</h3>
      {activity.predecessors.length === 0 ? (
        <p>Nothing: it can start at time 0.</p>
      ) : (
        <ul className="flex flex-wrap gap-x-3">
          {activity.predecessors.map((link, index) => (
            <li key={index}>
              {link.id} {link.type}
              {link.lag !== 0 && ` ${format.signed(link.lag, 1)} d`}
            </li>
          ))}
        </ul>
      )}
    </Panel>
  );
}
