import type { z } from 'zod';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Invalid } from '@/lib/contract/errors';
import { sheetRowsQuery, type SheetRowsView } from '@/lib/contract/sheet-rows';
import { idOf, inOffice } from '@/lib/services/in-office';
import { loadState } from '@/lib/services/schedule/load';
import { requireSubmission } from '@/lib/services/submissions/require';
import { columnsOf, rowStates } from './view';

/** A piece of the sheet that the list stands on, as received and as corrected. */
export async function getSheetRows(
  ctx: OfficeContext,
  { path, query }: { path: { submission: string }; query: z.input<typeof sheetRowsQuery> },
): Promise<SheetRowsView> {
  requirePermission(ctx, 'submissions:read');
  const id = idOf(path.submission, 'submission');
  const { sheet, rows: wanted } = checked(sheetRowsQuery, query);
  return inOffice(ctx, async (tx) => {
    const { submission } = await requireSubmission(tx, id);
    const matching = submission.matching.find((each) => each.sheet === sheet);
    if (!matching) throw Invalid.field('sheet', 'The list does not stand on a sheet of that name.');
    const columns = columnsOf(matching);
    const rows = wanted.split(',').map(Number);
    const received = rowStates(await loadState(tx, submission, 'received'), sheet, columns, rows);
    const corrected = rowStates(await loadState(tx, submission, 'corrected'), sheet, columns, rows);
    return {
      sheet,
      columns,
      rows: rows.map((row) => ({ row, received: received(row), corrected: corrected(row) })),
    };
  });
}
