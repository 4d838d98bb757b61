'use client';

import { keepPreviousData, useQuery } from '@tanstack/react-query';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import { call, withQuery } from './http';
import { keys } from './keys';
import { submissionPath } from './submissions';

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
    queryFn: ({ signal }) =>
      call<SheetRowsView>(withQuery(submissionPath(office, submission, 'rows'), { sheet, rows: wanted }), {
        signal,
      }),
    staleTime: 300_000,
    enabled: sheet !== null && rows.length > 0,
    placeholderData: keepPreviousData,
  });
}
