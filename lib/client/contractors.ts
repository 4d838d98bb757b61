'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { ContractorView } from '@/lib/contract/office';
import { call, officePath } from './http';
import { keys } from './keys';

export function useContractors(office: string, enabled = true) {
  return useQuery({
    queryKey: keys.contractors(office),
    queryFn: ({ signal }) => call<{ items: ContractorView[] }>(officePath(office, 'contractors'), { signal }),
    select: (answer) => answer.items,
    enabled,
  });
}

export function useCreateContractor(office: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { name: string }) =>
      call<ContractorView>(officePath(office, 'contractors'), { method: 'POST', body }),
    onSuccess: () => client.invalidateQueries({ queryKey: keys.contractors(office) }),
  });
}
