import { Refusal } from '@/db/cluster';

/** What went wrong, for whoever started the command: one sentence where the cause is known, else the whole of it. */
export function explain(error: unknown): string {
  if (error instanceof Refusal) return error.message;
  if (!(error instanceof Error)) return String(error);
  // A failed query wraps what the database said.
  if (error.cause instanceof Error && !('code' in error)) return explain(error.cause);
  const { code, path } = error as NodeJS.ErrnoException;
  const place = path ? ` (${path})` : '';
  switch (code) {
    case 'ENOSPC':
    case '53100':
      return `There is no space left on the disk${place}: make room and start again.`;
    case 'EDQUOT':
      return `The disk quota is used up${place}: make room and start again.`;
    case 'EACCES':
    case 'EPERM':
    case 'EROFS':
    case 'ENOENT':
      return `The folder cannot be written to${place}: allow it, or set PLUMBROW_HOME to another one.`;
    case 'EEXIST':
    case 'ENOTDIR':
      return `A file stands where a folder is needed${place}: move it away, or set PLUMBROW_HOME to another folder.`;
    case 'ECONNREFUSED':
    case 'ENOTFOUND':
    case 'EAI_AGAIN':
      return `The database does not answer (${error.message || code}): check DATABASE_URL.`;
    case '28P01':
    case '28000':
      return `The database refuses the user or the password of DATABASE_URL: ${error.message}.`;
    case '3D000':
      return `The database named in DATABASE_URL does not exist: ${error.message}.`;
    case '42501':
      return `The database's user lacks a right: ${error.message}. It must own the database that DATABASE_URL names.`;
    default:
      return error.stack ?? error.message;
  }
}

/** Runs a command to its exit code; what it throws is explained. */
export async function exitCode(work: () => Promise<number>): Promise<number> {
  try {
    return await work();
  } catch (error) {
    process.stderr.write(`\n${explain(error)}\n`);
    return 1;
  }
}
