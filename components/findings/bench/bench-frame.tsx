'use client';

import { X } from 'lucide-react';
import { useId, type ReactNode, type Ref } from 'react';
import { classes } from '@/components/ui/classes';

interface BenchFrameProps {
  title: string;
  /** On a narrow screen, whether the sheet is drawn up. */
  open: boolean;
  onClose: () => void;
  /** The heading, which takes the focus when a row is opened by key. */
  heading: Ref<HTMLHeadingElement>;
  children: ReactNode;
}

/**
 * Beside the grid where there is room; else a sheet drawn in from the right, or up from below on a phone,
 * without locking the list: the keys go on working, and what is left of it can still be read.
 */
export function BenchFrame({ title, open, onClose, heading, children }: BenchFrameProps) {
  const id = useId();
  return (
    <aside
      aria-labelledby={id}
      onKeyDown={(event) => {
        if (event.key === 'Escape' && !event.defaultPrevented) onClose();
      }}
      className={classes(
        'border border-t-2 border-hair border-t-ink bg-leaf p-4',
        'xl:sticky xl:top-4 xl:max-h-[calc(100dvh-32px)] xl:overflow-y-auto',
        'max-xl:fixed max-xl:right-0 max-xl:bottom-0 max-xl:z-30 max-xl:overflow-y-auto max-xl:shadow-lift',
        'max-md:left-0 max-md:max-h-[72dvh] md:max-xl:top-13 md:max-xl:w-100',
        !open && 'max-xl:hidden',
      )}
    >
      <div className="mb-1.5 flex items-start justify-between gap-3">
        <h2 ref={heading} id={id} tabIndex={-1} className="text-base font-semibold">
          {title}
        </h2>
        <button
          type="button"
          aria-label="Put the bench away"
          onClick={onClose}
          className="-mt-1 rounded p-1 text-slate hover:bg-tint hover:text-ink xl:hidden"
        >
          <X aria-hidden="true" size={18} />
        </button>
      </div>
      {children}
    </aside>
  );
}
