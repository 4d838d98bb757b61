'use client';

import Link from 'next/link';
import { useMay } from '@/components/shell/office-context';
import { useFormat } from '@/components/ui/locale';
import { TwoStateFigure } from '@/components/ui/two-state-figure';
import type { Working } from '@/components/ui/worked-line';
import type { Figures, SubmissionView } from '@/lib/contract/submission';
import { chanceLine, finishLine, varianceLine } from './differences';
import { chanceWorking, finishWorking, varianceWorking, type WorkingPlace } from './workings';

interface HeadFiguresProps {
  office: string;
  view: SubmissionView;
}

/** Expected finish, variance of its path, chance of the target: as received → as corrected. */
export function HeadFigures({ office, view }: HeadFiguresProps) {
  const format = useFormat();
  const target = view.project.targetFinish;
  return (
    <dl className="flex flex-wrap gap-x-7 gap-y-3">
      <HeadFigure
        office={office}
        view={view}
        label="Expected finish"
        text={({ expectedDuration }) => written(expectedDuration, format.days)}
        difference={finishLine}
        explain={finishWorking}
      />
      <HeadFigure
        office={office}
        view={view}
        label="Variance of the path"
        text={({ variance }) => written(variance, format.variance)}
        difference={varianceLine}
        explain={varianceWorking}
      />
      {target === null ? (
        <NoTarget office={office} project={view.project.id} />
      ) : (
        <HeadFigure
          office={office}
          view={view}
          label={`Chance of ${format.date(target)}`}
          text={({ chanceOfTarget }) => written(chanceOfTarget, format.percent)}
          difference={chanceLine}
          explain={(place, result) => chanceWorking(place, target, result)}
        />
      )}
    </dl>
  );
}

interface HeadFigureProps extends HeadFiguresProps {
  label: string;
  /** Null where the state has no such figure. */
  text: (figures: Figures) => string | null;
  difference: (received: Figures, corrected: Figures, locale: string) => string | null;
  explain: (place: WorkingPlace, result: string) => Working;
}

function HeadFigure({ office, view, label, text, difference, explain }: HeadFigureProps) {
  const { locale } = useFormat();
  const { received, corrected } = view.figures;
  const working = (figures: Figures) => {
    const result = text(figures);
    return result === null
      ? undefined
      : explain({ office, submission: view.id, state: figures.state }, result);
  };
  return (
    <TwoStateFigure
      label={label}
      received={text(received)}
      corrected={text(corrected)}
      difference={difference(received, corrected, locale)}
      working={working(corrected)}
      receivedWorking={working(received)}
    />
  );
}

function NoTarget({ office, project }: { office: string; project: string }) {
  const maySet = useMay()('projects:update');
  return (
    <div>
      <dt className="text-slate">Chance of the target</dt>
      <dd className="text-base">no target date set</dd>
      {maySet && (
        <dd>
          <Link href={`/${office}/projects/${project}`}>Set one on the project’s page</Link>
        </dd>
      )}
    </div>
  );
}

function written(value: number | null, write: (value: number) => string): string | null {
  return value === null ? null : write(value);
}
