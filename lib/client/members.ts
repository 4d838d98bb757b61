'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { InvitationView, MemberView } from '@/lib/contract/office';
import type { Role } from '@/lib/contract/shared';
import { call, officePath } from './http';
import { keys } from './keys';

export interface NewMember {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly contractor: string | null;
}

export function useMembers(office: string) {
  return useQuery({
    queryKey: keys.members(office),
    queryFn: ({ signal }) => call<{ items: MemberView[] }>(officePath(office, 'members'), { signal }),
    select: (answer) => answer.items,
  });
}

/** Adds a person; the answer holds the one-time link, which is not to be had again. */
export function useCreateMember(office: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: NewMember) =>
      call<InvitationView>(officePath(office, 'members'), { method: 'POST', body }),
    onSuccess: () => client.invalidateQueries({ queryKey: keys.members(office) }),
  });
}

/** Makes a new one-time link; the one before stops working. */
export function useInviteMember(office: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (member: string) =>
      call<InvitationView>(officePath(office, 'members', member, 'invitation'), { method: 'POST' }),
    onSuccess: () => client.invalidateQueries({ queryKey: keys.members(office) }),
  });
}

/** Takes a membership away, or gives it back; what the person did stays. */
export function useUpdateMember(office: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ member, disabled }: { member: string; disabled: boolean }) =>
      call<MemberView>(officePath(office, 'members', member), { method: 'PATCH', body: { disabled } }),
    onSuccess: () => client.invalidateQueries({ queryKey: keys.members(office) }),
  });
}
