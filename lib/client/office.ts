'use client';

import { useQuery } from '@tanstack/react-query';
import type { MeView, OfficeView } from '@/lib/contract/office';
import { call, officePath } from './http';
import { keys } from './keys';

export function useOffice(office: string) {
  return useQuery({
    queryKey: keys.office(office),
    queryFn: ({ signal }) => call<OfficeView>(officePath(office), { signal }),
    staleTime: 60_000,
  });
}

export function useMe() {
  return useQuery({ queryKey: keys.me, queryFn: ({ signal }) => call<MeView>('/api/me', { signal }) });
}
