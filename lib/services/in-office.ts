import { withOffice, type Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { NotFound } from '@/lib/contract/errors';
import { uuid } from '@/lib/contract/shared';

/** One transaction in the asker's name; row-level security shows what they may see. */
export function inOffice<T>(ctx: OfficeContext, work: (tx: Tx) => Promise<T>): Promise<T> {
  return withOffice({ office: ctx.office.id, user: ctx.user.id, contractor: ctx.contractor }, work);
}

/** A path's id; what is no id names nothing, so it is not found. */
export function idOf(value: string | undefined, what: string): string {
  const id = uuid.safeParse(value);
  if (!id.success) throw notFound(what);
  return id.data.toLowerCase();
}

export function found<T>(value: T | null | undefined, what: string): T {
  if (value === null || value === undefined) throw notFound(what);
  return value;
}

function notFound(what: string): NotFound {
  return new NotFound(`There is no such ${what}, or it is not yours to see.`);
}
