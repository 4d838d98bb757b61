import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { IntakeView } from '@/lib/contract/intake';
import type { Form } from '@/lib/contract/transfer';
import { detectMatching } from '@/parsers';
import { readUpload, refusing } from './upload';
import { intakeViewOf } from './view';

/** Says how a file would be read; nothing is kept. */
export async function createIntake(ctx: OfficeContext, { form }: { form: Form }): Promise<IntakeView> {
  requirePermission(ctx, 'submissions:create');
  const { sheets, wanted } = readUpload(form);
  return refusing(() => intakeViewOf(sheets, detectMatching(sheets, wanted)));
}
