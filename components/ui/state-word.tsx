import type { FindingState, FixState, SubmissionState } from '@/lib/schedule/weight';
import { classes } from './classes';

type AnyState = FindingState | FixState | SubmissionState;

const LOOKS: Record<AnyState, string> = {
  open: 'text-ink',
  corrected: 'text-moss',
  waived: 'text-slate',
  answered: 'text-cord',
  proposed: 'text-ink',
  adopted: 'text-moss',
  declined: 'text-slate',
  received: 'text-ink',
  'under review': 'text-brass',
  returned: 'text-umber',
  accepted: 'text-moss',
  superseded: 'text-slate',
};

/** The state of a finding, a fix or a submission: the word says it, the colour only helps. */
export function StateWord({ state, capital = false }: { state: AnyState; capital?: boolean }) {
  return (
    <span className={classes('font-semibold whitespace-nowrap', LOOKS[state])}>
      {capital ? state.charAt(0).toUpperCase() + state.slice(1) : state}
    </span>
  );
}
