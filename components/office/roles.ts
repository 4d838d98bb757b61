import type { Role } from '@/lib/contract/shared';

/** What each role may do, in a line. */
export const ROLE_LINES: Record<Role, string> = {
  administrator: 'Runs the account: people, contractors and projects.',
  analyst: 'Takes in activity lists, adopts or declines fixes, sets calendar and target.',
  reviewer: 'Reads everything, and comments on rows and findings.',
  scheduler: 'Works for one contractor and sees only its projects.',
};
