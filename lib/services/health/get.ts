import { ping } from '@/db/scope';
import { Unavailable } from '@/lib/contract/errors';

const PATIENCE_MS = 3000;

/** Answers while the database does. */
export async function getHealth(): Promise<{ status: 'ok' }> {
  let late: NodeJS.Timeout | undefined;
  const silence = new Promise<never>((_resolve, reject) => {
    late = setTimeout(() => reject(new Error('no answer in time')), PATIENCE_MS);
  });
  try {
    await Promise.race([ping(), silence]);
    return { status: 'ok' };
  } catch {
    throw new Unavailable('The database does not answer.');
  } finally {
    clearTimeout(late);
  }
}
