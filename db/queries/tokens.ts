import type { Tx } from '../client';
import { apiTokens } from '../schema';

export interface TokenInsert {
  readonly officeId: string;
  readonly membershipId: string;
  readonly name: string;
  readonly tokenHash: string;
  readonly readOnly: boolean;
}

export async function insertToken(tx: Tx, token: TokenInsert): Promise<void> {
  await tx.insert(apiTokens).values(token);
}
