'use client';

import Link from 'next/link';
import type { ReactNode } from 'react';
import { Crumbs } from '@/components/shell/crumbs';
import { Caution } from '@/components/ui/caution';
import { ErrorState, Loading } from '@/components/ui/states';
import { useSubmissionEvents } from '@/lib/client/events';
import { useSubmission } from '@/lib/client/submissions';
import { usePathname } from 'next/navigation';
import { Cord } from './cord';
import { NewsLine } from './news-line';
import { STOP_NAMES, stopAt, stopPath } from './stops';
import { SubmissionHead } from './submission-head';

interface FrameProps {
  office: string;
  submission: string;
  children: ReactNode;
}

/** Cord and head of a submission, kept fresh by its events; the pages along the cord come inside. */
export function SubmissionFrame({ office, submission, children }: FrameProps) {
  const { data: view, error, refetch } = useSubmission(office, submission);
  const news = useSubmissionEvents(office, submission);
  const stop = stopAt(usePathname());
  return (
    <div className="flex min-w-0 flex-1 flex-col lg:flex-row">
      <Cord office={office} submission={submission} view={view ?? null} />
      <main id="main" tabIndex={-1} className="min-w-0 flex-1 px-4 pt-5 pb-6 sm:px-6 lg:pl-0">
        {view && (
          <>
            <Crumbs
              trail={[
                { label: view.project.name, href: `/${office}/projects/${view.project.id}` },
                { label: `Rev ${String(view.revision)}`, href: stopPath(office, submission, 'findings') },
                { label: STOP_NAMES[stop] },
              ]}
            />
            <SubmissionHead office={office} view={view} />
            <NewsLine news={news} />
            {children}
            <Caution />
          </>
        )}
        {!view && error && (
          <ErrorState error={error} retry={() => void refetch()} title="This submission could not be opened">
            <p className="mt-2">
              <Link href={`/${office}`}>Go to the desk</Link>
            </p>
          </ErrorState>
        )}
        {!view && !error && <Loading label="Opening the submission" rows={6} />}
      </main>
    </div>
  );
}
