'use client';

import { useState } from 'react';
import { Chip } from '@/components/ui/chip';
import { useFormat, type Format } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { ErrorState, Loading } from '@/components/ui/states';
import { useChance } from '@/lib/client/submissions';
import type { AnalysisView, ChanceView } from '@/lib/contract/submission';
import { workingDaysThrough } from '@/lib/schedule/calendar';
import type { ScheduleState } from '@/lib/schedule/weight';
import { CURVES, type CurveKind } from './curve';
import { CurveChart } from './curve-chart';
import { nearby } from './nearby';
import { NearbyTable } from './nearby-table';
import { readQuestion, type Asked } from './question';
import { QuestionForm } from './question-form';
import { WorkedAnswer } from './worked-answer';

type Computed = Extract<AnalysisView, { computable: true }>;
type Picture = CurveKind | 'table';
const PICTURES: Record<Picture, string> = { ...CURVES, table: 'Table' };

interface Props {
  office: string;
  submission: string;
  state: ScheduleState;
  analysis: Computed;
  targetFinish: string | null;
  asked: Asked;
  onAsk: (asked: Asked) => void;
}

export function ConfidenceAnswer(props: Props) {
  const { office, submission, state, analysis, targetFinish, asked, onAsk } = props;
  const [picture, setPicture] = useState<Picture>('bell');
  const format = useFormat();
  const question = readQuestion(asked);
  const chance = useChance(office, submission, state, typeof question === 'string' ? null : question);
  const target = targetFinish ? workingDaysThrough(analysis.calendar, analysis.start, targetFinish) : null;
  return (
    <div className="grid items-start gap-4 lg:grid-cols-[minmax(0,1fr)_minmax(300px,372px)]">
      <Panel
        title={chance.data ? sentence(chance.data, asked, format) : 'How likely is the date?'}
        sub="One path alone, as a normal curve: expected duration and variance of the critical path with the largest variance. Where paths merge the true chance is lower."
      >
        <QuestionForm key={`${asked.way} ${asked.value}`} asked={asked} onAsk={onAsk} />
        {typeof question === 'string' && <p className="mt-4">{question}</p>}
        {chance.isLoading && <Loading label="Computing the chance" />}
        {chance.isError && <ErrorState error={chance.error} retry={() => void chance.refetch()} />}
        {chance.data && (
          <>
            <div role="group" aria-label="Picture" className="mt-4 mb-3 flex flex-wrap gap-2">
              {(Object.keys(PICTURES) as Picture[]).map((each) => (
                <Chip key={each} pressed={each === picture} onClick={() => setPicture(each)}>
                  {PICTURES[each]}
                </Chip>
              ))}
            </div>
            <Drawing picture={picture} chance={chance.data} analysis={analysis} target={target} />
          </>
        )}
      </Panel>
      {chance.data && <WorkedAnswer chance={chance.data} asked={asked} />}
    </div>
  );
}

function Drawing({
  picture,
  chance,
  analysis,
  target,
}: {
  picture: Picture;
  chance: ChanceView;
  analysis: Computed;
  target: number | null;
}) {
  const normal = { mean: chance.expectedDuration, deviation: chance.standardDeviation, days: chance.days };
  if (picture === 'table') {
    return <NearbyTable rows={nearby(normal, analysis.calendar, analysis.start)} asked={chance.days} />;
  }
  if (normal.deviation === 0) {
    return <p>Every estimate on the path has a = m = b: there is no spread, and so no curve to draw.</p>;
  }
  return (
    <CurveChart
      kind={picture}
      chance={chance}
      target={target !== null && Math.abs(target - chance.days) > 1e-9 ? target : null}
      calendar={analysis.calendar}
      start={analysis.start}
    />
  );
}

function sentence(chance: ChanceView, asked: Asked, format: Format): string {
  const date = format.date(chance.date);
  if (asked.way === 'confidence') {
    return `${asked.value.replace(/\s*%$/, '')} % sure by ${date}: ${format.days(chance.days)}`;
  }
  if (chance.standardDeviation === 0) {
    return chance.before === 1 ? `Finished by ${date}: nothing is left to chance` : `Later than ${date}`;
  }
  const inTen = Math.round(chance.before * 10);
  const often =
    inTen === 0
      ? 'hardly ever'
      : inTen === 10
        ? 'nearly always'
        : `about ${inTen} ${inTen === 1 ? 'time' : 'times'} in ten`;
  return `${date} is kept ${often}: ${format.percent(chance.before)}`;
}
