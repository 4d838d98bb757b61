'use client';

import { usePathname, useRouter, useSearchParams } from 'next/navigation';
import { useCallback } from 'react';
import { SCHEDULE_STATES, type ScheduleState } from '@/lib/schedule/weight';

/** What a page shows, kept in its address, so that it can be sent to somebody and survives going back. */
export function usePlace() {
  const search = useSearchParams();
  const router = useRouter();
  const pathname = usePathname();
  const set = useCallback(
    (changes: Readonly<Record<string, string | null>>) => {
      const next = new URLSearchParams(search);
      for (const [name, value] of Object.entries(changes)) {
        if (value === null) next.delete(name);
        else next.set(name, value);
      }
      const query = next.toString();
      router.replace(query === '' ? pathname : `${pathname}?${query}`, { scroll: false });
    },
    [search, router, pathname],
  );
  const asked = search.get('state');
  const state: ScheduleState = SCHEDULE_STATES.find((known) => known === asked) ?? 'corrected';
  return { search, set, state };
}
