'use client';

import { useCallback, useMemo } from 'react';
import { Chip } from '@/components/ui/chip';
import { Select } from '@/components/ui/field';
import { ErrorState, Loading } from '@/components/ui/states';
import { useAnalysis, useSubmission } from '@/lib/client/submissions';
import { NotComputable } from './not-computable';
import { PathViews } from './path-views';
import { SHOWN, type Shown } from './rows';
import { StateSwitch } from './state-switch';
import { usePlace } from './use-place';
import { VIEWS } from './views';

const NEAR = [1, 2, 5, 10, 20];

/** The recomputed critical path: drawn as a chain and over time, and as a table of every figure. */
export function PathPlace({ office, submission }: { office: string; submission: string }) {
  const { search, set, state } = usePlace();
  const head = useSubmission(office, submission);
  const analysis = useAnalysis(office, submission, state);
  const view = keyOf(VIEWS, search.get('view')) ?? 'drawn';
  const shown = keyOf(SHOWN, search.get('show')) ?? 'all';
  const near = NEAR.find((days) => String(days) === search.get('near')) ?? 2;
  const select = useCallback((id: string) => set({ activity: id }), [set]);
  const proposed = head.data?.figures.proposed ?? null;
  const byId = useMemo(
    () => new Map(analysis.data?.computable ? analysis.data.activities.map((each) => [each.id, each]) : []),
    [analysis.data],
  );

  return (
    <div className="flex flex-col gap-4">
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <div role="group" aria-label="View" className="flex flex-wrap gap-2">
          {Object.entries(VIEWS).map(([id, word]) => (
            <Chip key={id} pressed={id === view} onClick={() => set({ view: id })}>
              {word}
            </Chip>
          ))}
        </div>
        <StateSwitch
          state={state}
          withProposed={proposed !== null || state === 'proposed'}
          onChange={(next) => set({ state: next })}
        />
        <label className="flex items-center gap-2 whitespace-nowrap">
          near-critical within
          <span className="w-24">
            <Select value={near} onChange={(event) => set({ near: event.target.value })}>
              {NEAR.map((days) => (
                <option key={days} value={days}>
                  {days} d
                </option>
              ))}
            </Select>
          </span>
        </label>
      </div>
      {analysis.isPending && <Loading label="Computing the network" rows={6} />}
      {analysis.isError && <ErrorState error={analysis.error} retry={() => void analysis.refetch()} />}
      {analysis.data?.computable === false && (
        <NotComputable
          blocked={analysis.data}
          proposed={state === 'proposed' ? null : proposed}
          findingsHref={`/${office}/submissions/${submission}?weight=blocks`}
          onShowProposed={() => set({ state: 'proposed' })}
        />
      )}
      {analysis.data?.computable && (
        <PathViews
          analysis={analysis.data}
          byId={byId}
          view={view}
          shown={shown}
          near={near}
          pathIndex={Number(search.get('path') ?? 0)}
          selected={search.get('activity')}
          onSelect={select}
          onShown={(next: Shown) => set({ show: next })}
          onPath={(next) => set({ path: String(next) })}
        />
      )}
    </div>
  );
}

function keyOf<T extends object>(table: T, value: string | null): keyof T | null {
  return value !== null && Object.hasOwn(table, value) ? (value as keyof T) : null;
}
