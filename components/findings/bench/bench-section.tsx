import type { ReactNode } from 'react';

/** A part of the bench under its small heading. */
export function BenchSection({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div className="mt-4">
      <h3 className="mb-1.5 font-semibold text-slate">{title}</h3>
      {children}
    </div>
  );
}
