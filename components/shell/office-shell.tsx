'use client';

import Link from 'next/link';
import type { ReactNode } from 'react';
import { ErrorState, Loading } from '@/components/ui/states';
import { useOffice } from '@/lib/client/office';
import { CrumbsProvider } from './crumbs';
import { Masthead, MastheadFrame } from './masthead';
import { OfficeProvider } from './office-context';
import { OfficeRail } from './office-rail';
import { SkipLink } from './skip-link';

/** Masthead, places of the office, and the page once it is known which office this is and who is asking. */
export function OfficeShell({ slug, children }: { slug: string; children: ReactNode }) {
  const office = useOffice(slug);
  if (!office.data) {
    return (
      <div className="flex min-h-dvh flex-col">
        <MastheadFrame home="/" />
        <main id="main" className="w-full max-w-4xl px-4 py-8 sm:px-6">
          <h1 className="sr-only">Office</h1>
          {office.error ? (
            <ErrorState error={office.error} retry={() => void office.refetch()}>
              <p className="mt-2">
                <Link href="/">Go to your own office</Link>
              </p>
            </ErrorState>
          ) : (
            <Loading label="Opening the office" />
          )}
        </main>
      </div>
    );
  }
  return (
    <OfficeProvider office={office.data}>
      <CrumbsProvider>
        <div className="flex min-h-dvh flex-col">
          <SkipLink />
          <Masthead />
          <OfficeRail />
          {children}
        </div>
      </CrumbsProvider>
    </OfficeProvider>
  );
}
