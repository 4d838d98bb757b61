import type { SubmissionView } from '@/lib/contract/submission';

type Revision = Pick<SubmissionView, 'id' | 'revision'>;

/** The revision before this one, else the nearest after it; undefined where there is no other. */
export function defaultOther<R extends Revision>(others: readonly R[], view: Revision): R | undefined {
  const inOrder = [...others].sort((x, y) => x.revision - y.revision);
  return inOrder.findLast(({ revision }) => revision < view.revision) ?? inOrder[0];
}

/** Two revisions by their numbers, whichever of them one is looking from. */
export function orderedPair<R extends Revision>(one: R, other: R): { earlier: R; later: R } {
  return one.revision < other.revision ? { earlier: one, later: other } : { earlier: other, later: one };
}
