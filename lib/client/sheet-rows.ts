'use client';

import { keepPreviousData, useQuery } from '@tanstack/react-query';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import { call, withQuery } from './http';
import { keys } from './keys';
import { submissionPath } from './submissions';

const SETTLED_MS = 90;

function pause(ms: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, ms));
}

/** A piece of a sheet, as received and as corrected; nothing is fetched for no rows. */
export function useSheetRows(
  office: string,
  submission: string,
  sheet: string | null,
  rows: readonly number[],
) {
  const wanted = rows.join(',');
  return useQuery({
    queryKey: keys.submissionPart(office, submission, 'rows', sheet, wanted),
    queryFn: async ({ signal }) => {
      await pause(SETTLED_MS);
      // Whoever runs through the findings with the key held asks for none of those passed by.
      signal.throwIfAborted();
      const path = withQuery(submissionPath(office, submission, 'rows'), { sheet, rows: wanted });
      return call<SheetRowsView>(path, { signal });
    },
    staleTime: 300_000,
    enabled: sheet !== null && rows.length > 0,
    placeholderData: keepPreviousData,
  });
}
