import { database, type Tx } from './client';

/**
 * One transaction as the owner of the tables, whom no policy holds: for making an office from nothing.
 * Only the seed, the commands and the tests may import this file.
 */
export function withOwner<T>(work: (tx: Tx) => Promise<T>): Promise<T> {
  return database().transaction(work);
}
