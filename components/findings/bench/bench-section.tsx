import { useId, type ReactNode } from 'react';

/** A part of the bench under its small heading. */
export function BenchSection({ title, children }: { title: string; children: ReactNode }) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="mt-4">
      <h3 id={id} className="mb-1.5 font-semibold text-slate">
        {title}
      </h3>
      {children}
    </section>
  );
}
