import type { ReactNode } from 'react';
import { Mark } from './mark';
import { SkipLink } from './skip-link';

/** The page before the office: a panel that hangs from the row by its cord. */
export function Door({ title, sub, children }: { title: string; sub?: ReactNode; children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <header className="flex min-h-13 items-center gap-2 border-b-2 border-ink bg-leaf px-4 text-base font-semibold sm:px-6">
        <Mark />
        Plumbrow
      </header>
      <div className="flex flex-col items-center px-4 pb-12 sm:px-6">
        <svg width="14" height="72" viewBox="0 0 14 72" aria-hidden="true" className="text-ink print:hidden">
          <path d="M7 0v52" stroke="currentColor" strokeWidth="1.5" />
          <path d="M1 50h12l-1.8 7L7 70l-4.2-13z" fill="var(--cord)" />
        </svg>
        <main
          id="main"
          tabIndex={-1}
          className="w-full max-w-md border border-t-2 border-hair border-t-ink bg-leaf p-5 sm:p-6"
        >
          <h1 className="text-lg font-semibold">{title}</h1>
          {sub && <div className="mt-1 text-slate">{sub}</div>}
          <div className="mt-4">{children}</div>
        </main>
        <footer className="mt-6 max-w-md text-slate">
          A contractor’s activity list comes in; what is wrong with it, what sets the finish and how sure the
          date is come out.
        </footer>
      </div>
    </div>
  );
}
