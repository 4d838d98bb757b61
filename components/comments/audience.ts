import type { Audience } from '@/lib/client/comments';
import type { Role } from '@/lib/contract/shared';

/** Who reads a comment: one table for the thread, the composer and the type. */
export const AUDIENCES: Record<Audience, { readonly name: string; readonly explained: string }> = {
  inside: { name: 'Inside the office', explained: 'The contractor does not see it.' },
  shared: { name: 'Shared with the contractor', explained: 'The contractor’s scheduler sees it at once.' },
};

/** The audiences a role may write for; the first is the one offered. */
export function audiencesFor(role: Role): readonly Audience[] {
  return role === 'scheduler' ? ['shared'] : ['inside', 'shared'];
}
