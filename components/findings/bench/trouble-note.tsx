'use client';

import { Button } from '@/components/ui/button';
import { sentenceOf } from '@/lib/client/error';
import { wasStale, type Trouble } from '../use-steps';

/** Why a step did not happen, what was kept, and what to do next. */
export function TroubleNote({ trouble, onDismiss }: { trouble: Trouble; onDismiss: () => void }) {
  const stale = wasStale(trouble.error);
  return (
    <div role="alert" className="mb-3 border border-l-4 border-hair border-l-umber px-3 py-2">
      <p className="font-semibold">{stale ? 'Someone else was first' : 'That was not done'}</p>
      <p>{trouble.first ?? sentenceOf(trouble.error)}</p>
      <p className="text-slate">
        {stale
          ? 'Nothing of yours was written, and what you typed is still here. The findings have been fetched anew: look, and repeat your step if it still holds.'
          : 'Nothing was changed, and what you typed is still here.'}
      </p>
      <Button variant="quiet" className="-ml-3" onClick={onDismiss}>
        Put this away
      </Button>
    </div>
  );
}
