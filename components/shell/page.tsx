import type { ReactNode } from 'react';
import { classes } from '@/components/ui/classes';

interface PageProps {
  title: ReactNode;
  /** A line or two under the title. */
  sub?: ReactNode;
  /** At the right of the title: buttons, or the figures. */
  aside?: ReactNode;
  /** For running text and forms. */
  narrow?: boolean;
  children: ReactNode;
}

/** The content of a page below the masthead, under its heading. */
export function Page({ title, sub, aside, narrow = false, children }: PageProps) {
  return (
    <main
      id="main"
      tabIndex={-1}
      className={classes('w-full px-4 pt-5 pb-8 sm:px-6', narrow ? 'max-w-4xl' : 'max-w-[1800px]')}
    >
      <div className="mb-4 flex flex-wrap items-start justify-between gap-x-7 gap-y-3 border-b border-hair pb-4">
        <div className="min-w-0">
          <h1 className="text-lg font-semibold">{title}</h1>
          {sub && <div className="mt-1 text-slate">{sub}</div>}
        </div>
        {aside && <div className="flex flex-wrap items-start gap-2">{aside}</div>}
      </div>
      {children}
    </main>
  );
}
