import { DatabaseError } from 'pg';

const UNIQUE_VIOLATION = '23505';

/** Whether a query failed because a row of that unique constraint is there already. */
export function isDuplicate(error: unknown, constraint: string): boolean {
  const cause = error instanceof Error && error.cause instanceof DatabaseError ? error.cause : error;
  return cause instanceof DatabaseError && cause.code === UNIQUE_VIOLATION && cause.constraint === constraint;
}
