import type { ReactNode } from 'react';
import { useId } from 'react';
import { classes } from './classes';

interface PanelProps {
  title?: ReactNode;
  /** A line under the title. */
  sub?: ReactNode;
  /** Stands at the right of the title. */
  aside?: ReactNode;
  /** The dark upper edge of a panel that holds what is being worked on. */
  bench?: boolean;
  level?: 2 | 3;
  className?: string;
  children?: ReactNode;
}

/** A drawn surface, with a heading of its own. */
export function Panel({ title, sub, aside, bench = false, level = 2, className, children }: PanelProps) {
  const id = useId();
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <section
      aria-labelledby={title ? id : undefined}
      className={classes(
        'min-w-0 border border-hair bg-leaf p-4',
        bench && 'border-t-2 border-t-ink',
        className,
      )}
    >
      {(title || aside) && (
        <div className="mb-3 flex flex-wrap items-start justify-between gap-x-4 gap-y-2">
          <div className="min-w-0">
            {title && (
              <Heading id={id} className="text-base font-semibold">
                {title}
              </Heading>
            )}
            {sub && <p className="text-slate">{sub}</p>}
          </div>
          {aside}
        </div>
      )}
      {children}
    </section>
  );
}
