'use client';

import { Change } from '@/components/ui/change';
import { useFormat, type Format } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { Td } from '@/components/ui/table';
import {
  COMPARED,
  linksText,
  type Asked,
  type ComparedActivity,
  type Comparison,
  type Unasked,
} from '@/lib/comparison/revisions';
import { LongTable } from './long-table';

interface ComparisonViewProps {
  comparison: Comparison<ComparedActivity>;
  earlier: number;
  later: number;
}

/** What each correction came to, and everything else that differs. */
export function ComparisonView({ comparison, earlier, later }: ComparisonViewProps) {
  const format = useFormat();
  const { asked, unasked, added, removed, same } = comparison;
  return (
    <div className="flex flex-col gap-4">
      <Panel title={askedTitle(asked, earlier, format)} sub={askedSub(asked, later)}>
        {asked.length > 0 && (
          <LongTable
            label={`Corrections of Rev ${String(earlier)}`}
            head={['Activity', 'Field', 'Asked', `Rev ${String(later)} has`, 'Outcome']}
            rows={asked}
            row={(entry) => <AskedRow key={`${entry.id} ${entry.field}`} entry={entry} />}
          />
        )}
      </Panel>
      <Panel
        title={`${countOrNo(unasked.length, 'value', 'values', format)} changed unasked`}
        sub={`${format.plural(same, 'activity is', 'activities are')} the same in both.`}
      >
        {unasked.length > 0 && (
          <LongTable
            label="Changed unasked"
            head={['Activity', 'Field', `Rev ${String(earlier)} as corrected → Rev ${String(later)}`]}
            rows={unasked}
            row={(entry) => <UnaskedRow key={`${entry.id} ${entry.field}`} entry={entry} />}
          />
        )}
      </Panel>
      <Activities what="added" activities={added} />
      <Activities what="removed" activities={removed} />
    </div>
  );
}

function askedTitle(asked: readonly Asked[], earlier: number, format: Format): string {
  if (asked.length === 0) return `Nothing was corrected in Rev ${String(earlier)}`;
  const done = asked.filter(({ outcome }) => outcome === 'done').length;
  return `${format.count(done)} of ${format.plural(asked.length, 'correction', 'corrections')} of Rev ${String(earlier)} came back`;
}

function askedSub(asked: readonly Asked[], later: number): string {
  if (asked.length === 0) return `So nothing was asked of Rev ${String(later)}.`;
  const count = (wanted: Asked['outcome']) => asked.filter(({ outcome }) => outcome === wanted).length;
  return `${String(count('not done'))} not done, ${String(count('otherwise'))} done otherwise, ${String(count('gone'))} with the activity gone.`;
}

function AskedRow({ entry }: { entry: Asked }) {
  const format = useFormat();
  return (
    <tr>
      <About id={entry.id} name={entry.name} />
      <Td>{COMPARED[entry.field]}</Td>
      <Td>
        <Change from={text(entry.was, format)} to={text(entry.asked, format)} />
      </Td>
      <Td>{entry.now === undefined ? 'no such activity' : text(entry.now, format) || '(empty)'}</Td>
      <Td className={entry.outcome === 'done' ? 'text-moss' : 'font-semibold text-umber'}>{entry.outcome}</Td>
    </tr>
  );
}

function UnaskedRow({ entry }: { entry: Unasked }) {
  const format = useFormat();
  return (
    <tr>
      <About id={entry.id} name={entry.name} />
      <Td>{COMPARED[entry.field]}</Td>
      <Td>
        <Change from={text(entry.was, format)} to={text(entry.now, format)} />
      </Td>
    </tr>
  );
}

function countOrNo(count: number, one: string, many: string, format: Format): string {
  return count === 0 ? `No ${one}` : format.plural(count, one, many);
}

function Activities({ what, activities }: { what: string; activities: readonly ComparedActivity[] }) {
  const format = useFormat();
  const title = `${countOrNo(activities.length, 'activity', 'activities', format)} ${what}`;
  return (
    <Panel title={title}>
      {activities.length > 0 && (
        <LongTable
          label={title}
          head={['Activity', 'a / m / b', 'Predecessors']}
          rows={activities}
          row={(activity) => (
            <tr key={activity.id}>
              <About id={activity.id} name={activity.name} />
              <Td className="whitespace-nowrap">
                {[activity.optimistic, activity.likely, activity.pessimistic]
                  .map((days) => text(days, format) || '–')
                  .join(' / ')}
              </Td>
              <Td>{linksText(activity.predecessors) || '–'}</Td>
            </tr>
          )}
        />
      )}
    </Panel>
  );
}

function About({ id, name }: { id: string; name: string }) {
  return (
    <Td>
      <span className="font-semibold">{id}</span> {name}
    </Td>
  );
}

/** Days with as many decimals as they need, and at most two. */
function text(value: string | number | null, format: Format): string {
  if (typeof value !== 'number') return value ?? '';
  const decimals = Number.isInteger(value) ? 0 : Number.isInteger(value * 10) ? 1 : 2;
  return format.days(value, decimals);
}
