'use client';

import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';
import { ClientError, sentenceOf } from '@/lib/client/error';
import { Button } from './button';
import { classes } from './classes';

interface Shown {
  title: string;
  children?: ReactNode;
  /** What to do next: a button or a link. */
  action?: ReactNode;
}

/** A cord with nothing on it: the place is right, and there is nothing in it yet. */
export function EmptyState({ title, children, action }: Shown) {
  return (
    <Hanging>
      <p className="text-base font-semibold">{title}</p>
      {children && <div className="max-w-prose text-slate">{children}</div>}
      {action && <div className="mt-3 flex flex-wrap gap-2">{action}</div>}
    </Hanging>
  );
}

interface ErrorProps {
  error: unknown;
  title?: string;
  retry?: () => void;
  children?: ReactNode;
}

/** What happened, what was kept, what to do next. */
export function ErrorState({ error, title, retry, children }: ErrorProps) {
  const pathname = usePathname();
  const status = error instanceof ClientError ? error.status : 0;
  const refused = status === 403 || status === 404;
  return (
    <div role="alert" className="border border-l-4 border-hair border-l-umber bg-leaf p-4">
      <p className="text-base font-semibold">{title ?? TITLES[status] ?? 'This could not be shown'}</p>
      <p className="max-w-prose">{sentenceOf(error)}</p>
      {children}
      {status === 401 && (
        <p className="mt-3">
          {/* A full navigation: nothing of the ended session stays in memory. */}
          <a href={`/sign-in?next=${encodeURIComponent(pathname)}`}>Sign in again</a>
        </p>
      )}
      {retry && !refused && status !== 401 && (
        <Button variant="ghost" className="mt-3" onClick={retry}>
          Try again
        </Button>
      )}
    </div>
  );
}

const TITLES: Partial<Record<number, string>> = {
  401: 'Your session has ended',
  403: 'This is not open to you',
  404: 'This is not open to you',
};

/** Rows that are still to come, with a word for those who do not see them. */
export function Loading({ label, rows = 3 }: { label: string; rows?: number }) {
  return (
    <div role="status" className="flex flex-col gap-3 py-2">
      <span className="text-slate">{label} …</span>
      {Array.from({ length: rows }, (_, row) => (
        <span
          key={row}
          aria-hidden="true"
          className={classes('block h-4 animate-pulse bg-hair', row % 3 === 2 ? 'w-3/5' : 'w-full')}
        />
      ))}
    </div>
  );
}

function Hanging({ children }: { children: ReactNode }) {
  return (
    <div className="relative py-2 pl-8">
      <svg
        aria-hidden="true"
        className="absolute top-0 left-2 h-full w-3 text-slate"
        viewBox="0 0 12 40"
        preserveAspectRatio="xMidYMin meet"
      >
        <path d="M6 0v22" stroke="currentColor" strokeWidth="1.5" />
        <path d="M2 22h8l-1.2 5L6 34l-2.8-7z" fill="none" stroke="currentColor" strokeWidth="1.5" />
      </svg>
      {children}
    </div>
  );
}
