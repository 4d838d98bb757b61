'use client';

import { Chip } from '@/components/ui/chip';
import type { ScheduleState } from '@/lib/schedule/weight';

const WORDS: Record<ScheduleState, string> = {
  received: 'as received',
  corrected: 'as corrected',
  proposed: 'with the proposed fixes',
};

/** Which of the schedule's states is shown; the proposed one only where the corrected one cannot be computed. */
export function StateSwitch({
  state,
  withProposed,
  onChange,
}: {
  state: ScheduleState;
  withProposed: boolean;
  onChange: (state: ScheduleState) => void;
}) {
  const offered: ScheduleState[] = withProposed
    ? ['received', 'corrected', 'proposed']
    : ['received', 'corrected'];
  return (
    <div role="group" aria-label="State of the schedule" className="flex flex-wrap gap-2">
      {offered.map((each) => (
        <Chip key={each} pressed={each === state} onClick={() => onChange(each)}>
          {WORDS[each]}
        </Chip>
      ))}
    </div>
  );
}
