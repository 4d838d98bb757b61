import type { CorrectionRow } from '@/db/queries/corrections';
import type { CorrectionView } from '@/lib/contract/submission';
import { editView } from '@/lib/services/findings/view';
import { SOMEBODY } from '@/lib/services/submissions/view';

export function correctionView({ id, batch, fix, finding, edits, by, at }: CorrectionRow): CorrectionView {
  return { id, batch, fix, finding, edits: edits.map(editView), by: by ?? SOMEBODY, at: at.toISOString() };
}
