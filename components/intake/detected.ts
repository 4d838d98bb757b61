import { ClientError } from '@/lib/client/error';
import { trusted } from '@/lib/client/http';
import type { IntakeView } from '@/lib/contract/intake';

/** A refused submission says what was detected in its problem document; null where it does not. */
export function detectedIn(error: unknown): IntakeView | null {
  if (!(error instanceof ClientError) || error.status !== 422) return null;
  for (const candidate of [error.body, error.body.detected, error.body.intake]) {
    if (isIntake(candidate)) return trusted<IntakeView>(candidate);
  }
  return null;
}

/** A file that came last already is refused with the revision it is; null for any other refusal. */
export function existingIn(error: unknown): { id: string; revision: number } | null {
  if (!(error instanceof ClientError) || error.status !== 409) return null;
  const { submission, revision } = error.body;
  return typeof submission === 'string' && typeof revision === 'number' ? { id: submission, revision } : null;
}

function isIntake(value: unknown): boolean {
  if (typeof value !== 'object' || value === null) return false;
  return (
    'sheets' in value && Array.isArray(value.sheets) && 'preview' in value && Array.isArray(value.preview)
  );
}
