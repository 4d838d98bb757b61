'use client';

import { useMutation, useQuery } from '@tanstack/react-query';
import { call } from './http';

export interface InvitationCheck {
  readonly name: string;
  readonly email: string;
  readonly office: string;
}

const path = (token: string) => `/api/invitations/${encodeURIComponent(token)}`;

/** Whom a one-time link is for. */
export function useInvitation(token: string) {
  return useQuery({
    queryKey: ['invitation', token],
    queryFn: ({ signal }) => call<InvitationCheck>(path(token), { signal }),
    // It works once: asked again after the password is set, it would be gone.
    staleTime: Infinity,
  });
}

export function useAcceptInvitation(token: string) {
  return useMutation({
    mutationFn: (password: string) => call<undefined>(path(token), { method: 'POST', body: { password } }),
  });
}
