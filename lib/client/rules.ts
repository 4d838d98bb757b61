'use client';

import { useQuery } from '@tanstack/react-query';
import type { RuleView } from '@/lib/contract/rule';
import { call, officePath } from './http';
import { keys } from './keys';

/** What the audit looks for. It changes only with the program. */
export function useRules(office: string) {
  return useQuery({
    queryKey: keys.rules(office),
    queryFn: ({ signal }) => call<{ items: RuleView[] }>(officePath(office, 'rules'), { signal }),
    select: (answer) => answer.items,
    staleTime: Infinity,
  });
}
