'use client';

import { useEffect, useRef, type ReactNode } from 'react';

/**
 * The button that settles a finding, or takes that back, goes with it: the focus stays here and is not lost
 * to the page.
 */
export function KeptFocus({ when, children }: { when: boolean; children: ReactNode }) {
  const place = useRef<HTMLDivElement>(null);
  const was = useRef(when);
  useEffect(() => {
    if (was.current !== when && document.activeElement === document.body) {
      place.current?.focus({ preventScroll: true });
    }
    was.current = when;
  }, [when]);
  return (
    <div ref={place} tabIndex={-1}>
      {children}
    </div>
  );
}
