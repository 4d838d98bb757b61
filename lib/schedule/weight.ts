/** What a finding does to the answer. */
export const WEIGHTS = {
  blocks: 'the network cannot be computed',
  distorts: 'it can be computed, and the answer is wrong',
  query: 'worth a question',
} as const;
export type Weight = keyof typeof WEIGHTS;

export const FINDING_STATES = ['open', 'corrected', 'waived', 'answered'] as const;
export type FindingState = (typeof FINDING_STATES)[number];

export const FIX_STATES = ['proposed', 'adopted', 'declined'] as const;
export type FixState = (typeof FIX_STATES)[number];

export const SUBMISSION_STATES = ['received', 'under review', 'returned', 'accepted', 'superseded'] as const;
export type SubmissionState = (typeof SUBMISSION_STATES)[number];

export const SCHEDULE_STATES = ['received', 'corrected', 'proposed'] as const;
/** `proposed`: as corrected, with the proposed fixes of the blocking findings adopted as well. */
export type ScheduleState = (typeof SCHEDULE_STATES)[number];
