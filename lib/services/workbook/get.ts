import type { z } from 'zod';
import { listCorrections } from '@/db/queries/corrections';
import { listFindings } from '@/db/queries/findings';
import { listFixes } from '@/db/queries/fixes';
import { findFile } from '@/db/queries/submissions';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Conflict } from '@/lib/contract/errors';
import { workbookQuery } from '@/lib/contract/submission';
import { Download } from '@/lib/contract/transfer';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { loadState, receivedSheets, toEvents } from '@/lib/services/schedule/load';
import { requireSubmission } from '@/lib/services/submissions/require';
import { UnreadableFile } from '@/parsers';
import { giveBack, type GiveBackInput } from '@/parsers/workbook';
import { listedChanges } from './changes';

/** The file as it was received, byte for byte, or the same file with the corrected cells changed. */
export async function getWorkbook(
  ctx: OfficeContext,
  { path, query }: { path: { submission: string }; query: z.input<typeof workbookQuery> },
): Promise<Download> {
  requirePermission(ctx, 'submissions:read');
  const id = idOf(path.submission, 'submission');
  const { state } = checked(workbookQuery, query);
  const { bytes, fileName, input } = await inOffice(ctx, async (tx) => {
    const { submission } = await requireSubmission(tx, id);
    const file = { bytes: found(await findFile(tx, id), 'file'), fileName: submission.fileName };
    if (state === 'received') return { ...file, input: null };
    const sources = {
      received: await receivedSheets(tx, submission),
      list: (await loadState(tx, submission, 'corrected')).list,
      corrections: await listCorrections(tx, id),
      findings: await listFindings(tx, id),
      fixes: await listFixes(tx, id),
    };
    const { received, corrections } = sources;
    const changes = listedChanges(sources);
    return { ...file, input: { ...file, sheets: received, corrections: toEvents(corrections), changes } };
  });
  return input ? corrected(input) : new Download(fileName, mediaTypeOf(bytes), bytes);
}

function corrected(input: GiveBackInput): Download {
  try {
    const { bytes, fileName, contentType, check } = giveBack(input);
    return new Download(fileName, contentType, bytes, {
      'x-corrections-found': `${check.found}/${check.expected}`,
    });
  } catch (error) {
    if (error instanceof UnreadableFile) throw new Conflict(error.message);
    throw error;
  }
}

function mediaTypeOf(bytes: Uint8Array): string {
  const isZip = bytes[0] === 0x50 && bytes[1] === 0x4b;
  return isZip ? 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet' : 'text/csv';
}
