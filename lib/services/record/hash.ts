import { createHash } from 'node:crypto';

/** What an entry's hash is taken over. */
export interface SealedEntry {
  readonly office: string;
  readonly submission: string | null;
  readonly sequence: number;
  /** ISO, to the millisecond. */
  readonly at: string;
  readonly actor: string;
  readonly actorName: string;
  readonly verb: string;
  readonly audience: string;
  readonly data: unknown;
}

/** SHA-256, in hex, over the previous entry's hash, a line feed and the entry as canonical JSON. */
export function entryHash(previous: string, entry: SealedEntry): string {
  return createHash('sha256')
    .update(`${previous}\n${canonicalJson(entry)}`, 'utf8')
    .digest('hex');
}

/** JSON with the names of each object in order of their code units, and no white space: one text for one value. */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map((item) => canonicalJson(item ?? null)).join(',')}]`;
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  const members = Object.entries(value)
    .filter(([, member]) => member !== undefined)
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([name, member]) => `${JSON.stringify(name)}:${canonicalJson(member)}`);
  return `{${members.join(',')}}`;
}
