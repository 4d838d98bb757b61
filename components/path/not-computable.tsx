'use client';

import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { useFormat } from '@/components/ui/locale';
import type { AnalysisView, Figures } from '@/lib/contract/submission';

type Blocked = Extract<AnalysisView, { computable: false }>;

/** Says what stands in the way, and offers the figures that would be had with the proposed fixes. */
export function NotComputable({
  blocked,
  findingsHref,
  proposed,
  onShowProposed,
}: {
  blocked: Blocked;
  findingsHref: string;
  proposed: Figures | null;
  onShowProposed: () => void;
}) {
  const format = useFormat();
  const count = blocked.because.length;
  const words = { received: 'as received', corrected: 'as corrected', proposed: 'with the proposed fixes' };
  return (
    <div className="border border-l-4 border-hair border-l-umber bg-leaf p-4">
      <h2 className="text-base font-semibold">The schedule {words[blocked.state]} cannot be computed</h2>
      <p className="max-w-prose">
        {format.plural(count, 'finding blocks', 'findings block')} it: until{' '}
        {count === 1 ? 'it is' : 'they are'} corrected there is no path and no finish to show. Nothing is
        lost; the list stays as it was received.
      </p>
      {blocked.loops.slice(0, 5).map((loop) => (
        <p key={loop.join(' ')} className="mt-2">
          <span className="font-semibold">Loop of {loop.length}: </span>
          {[...loop, loop[0] ?? ''].join(' → ')}
        </p>
      ))}
      {blocked.loops.length > 5 && <p className="mt-2">And {blocked.loops.length - 5} further loops.</p>}
      <div className="mt-3 flex flex-wrap items-center gap-3">
        <Link href={findingsHref} className="font-semibold">
          Go to the blocking findings
        </Link>
        {proposed?.computable && (
          <Button variant="ghost" onClick={onShowProposed}>
            Show it with the proposed fixes
          </Button>
        )}
      </div>
    </div>
  );
}
