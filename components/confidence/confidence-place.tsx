'use client';

import { NotComputable } from '@/components/path/not-computable';
import { StateSwitch } from '@/components/path/state-switch';
import { usePlace } from '@/components/path/use-place';
import { ErrorState, Loading } from '@/components/ui/states';
import { useAnalysis, useSubmission } from '@/lib/client/submissions';
import { ConfidenceAnswer } from './confidence-answer';
import { firstQuestion, WAYS, type Asked, type Way } from './question';

/** How likely the promised date is: by a date, within a number of days, or the date for a confidence. */
export function ConfidencePlace({ office, submission }: { office: string; submission: string }) {
  const { search, set, state } = usePlace();
  const head = useSubmission(office, submission);
  const analysis = useAnalysis(office, submission, state);
  const proposed = head.data?.figures.proposed ?? null;
  const way = search.get('ask');
  const value = search.get('value');
  const asked: Asked | null =
    way !== null && value !== null && Object.hasOwn(WAYS, way)
      ? { way: way as Way, value }
      : head.data
        ? firstQuestion(head.data.project.targetFinish)
        : null;

  return (
    <div className="flex flex-col gap-4">
      <StateSwitch
        state={state}
        withProposed={proposed !== null || state === 'proposed'}
        onChange={(next) => set({ state: next })}
      />
      {(analysis.isPending || head.isPending) && <Loading label="Computing the chance" rows={6} />}
      {analysis.isError && <ErrorState error={analysis.error} retry={() => void analysis.refetch()} />}
      {head.isError && <ErrorState error={head.error} retry={() => void head.refetch()} />}
      {analysis.data?.computable === false && (
        <NotComputable
          blocked={analysis.data}
          proposed={state === 'proposed' ? null : proposed}
          findingsHref={`/${office}/submissions/${submission}?weight=blocks`}
          onShowProposed={() => set({ state: 'proposed' })}
        />
      )}
      {analysis.data?.computable && asked && (
        <ConfidenceAnswer
          office={office}
          submission={submission}
          state={state}
          analysis={analysis.data}
          targetFinish={head.data?.project.targetFinish ?? null}
          asked={asked}
          onAsk={(next) => set({ ask: next.way, value: next.value })}
        />
      )}
    </div>
  );
}
