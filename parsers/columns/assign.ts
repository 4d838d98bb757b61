import { columnLetters } from '@/lib/schedule/cell';
import { type Field, FIELDS } from '@/lib/schedule/field';
import { type Candidate, candidatesOf } from './candidates';
import { type Content, referenceShare } from './content';
import type { HeaderReading } from './header';

/** Which column was taken for a field. */
export interface Choice {
  readonly column: number;
  readonly confidence: number;
  readonly reason: string;
}

export interface Assignment {
  readonly choices: ReadonlyMap<Field, Choice>;
  /** Plain sentences: what is missing, or stands twice. */
  readonly problems: readonly string[];
}

/** Fields of which a second column is a contradiction; of the others the surer one is taken. */
const UNIQUE_FIELDS: readonly Field[] = [
  'predecessors',
  'successors',
  'optimistic',
  'likely',
  'pessimistic',
  'duration',
  'id',
];
const OTHER_FIELDS = (Object.keys(FIELDS) as Field[]).filter((field) => !UNIQUE_FIELDS.includes(field));
const SURE = 0.85;
/** Beside three estimates, a column that is less surely the duration is the mean of them. */
const USUAL = 0.8;
const CLOSE = 0.12;
const LEAST = 0.3;
/** How much it says for an ID column that the predecessors name its cells. */
const REFERENCES = 0.5;

/** Gives each field the column that fits best, each column to one field. */
export function assign(headers: readonly HeaderReading[], contents: readonly Content[]): Assignment {
  const candidates = candidatesOf(headers, contents);
  const choices = new Map<Field, Choice>();
  const problems: string[] = [];
  const taken = new Set<number>();
  const take = (field: Field, found: readonly Candidate[]) => {
    const [best] = found;
    if (!best || best.fit < LEAST) return;
    choices.set(field, { column: best.column, confidence: round(best.fit), reason: best.reason });
    taken.add(best.column);
  };
  const open = (field: Field) =>
    candidates.filter((one) => one.field === field && !taken.has(one.column)).sort((a, b) => b.fit - a.fit);

  for (const field of UNIQUE_FIELDS) {
    const found = field === 'id' ? withReferences(open('id'), choices, contents) : open(field);
    const standsBeside = field === 'duration' && choices.has('likely');
    if (standsBeside && (found[0]?.sureness ?? 0) < USUAL) continue;
    const rival = standsBeside ? null : rivalOf(found, headers, field);
    if (rival && found[0]) problems.push(twice(field, found[0], rival, headers));
    take(field, found);
  }
  for (const field of OTHER_FIELDS) take(field, open(field));
  if (!choices.has('id')) nameAsId(choices, contents);
  if (!choices.has('id')) wbsAsId(choices, contents);
  problems.push(...missing(choices));
  return { choices, problems };
}

/** An ID column is told above all by the predecessors that name its cells. */
function withReferences(
  found: readonly Candidate[],
  choices: ReadonlyMap<Field, Choice>,
  contents: readonly Content[],
): Candidate[] {
  const links = contents[(choices.get('predecessors') ?? choices.get('successors'))?.column ?? -1];
  if (!links) return [...found];
  return found
    .map((one) => {
      const ids = contents[one.column];
      const share = ids ? referenceShare(links, ids) : null;
      if (share === null) return one;
      const reason = share > 0.5 ? `${one.reason.slice(0, -1)}, and the links name its cells.` : one.reason;
      return { ...one, fit: one.fit + (share - 0.5) * REFERENCES, reason };
    })
    .sort((a, b) => b.fit - a.fit)
    .map((one) => ({ ...one, fit: Math.min(1, one.fit) }));
}

/** A second column as sure as the best; headers that say the same are always rivals. */
function rivalOf(
  [best, ...others]: readonly Candidate[],
  headers: readonly HeaderReading[],
  field: Field,
): Candidate | null {
  if (!best) return null;
  const key = headers[best.column]?.key;
  for (const other of others) {
    const same = headers[other.column]?.key === key && best.sureness >= 0.6;
    const close = best.sureness >= SURE && other.sureness >= SURE && best.fit - other.fit < CLOSE;
    if (same || (close && (field !== 'id' || best.sureness - other.sureness < CLOSE))) return other;
  }
  return null;
}

/** A list without an ID column may call activities by their names, if its links do. */
function nameAsId(choices: Map<Field, Choice>, contents: readonly Content[]): void {
  const name = choices.get('name');
  const names = contents[name?.column ?? -1];
  const links = contents[(choices.get('predecessors') ?? choices.get('successors'))?.column ?? -1];
  if (!name || !names || !links || names.unique < 0.9 || (referenceShare(links, names) ?? 0) < 0.5) return;
  choices.delete('name');
  choices.set('id', {
    column: name.column,
    confidence: 0.7,
    reason: 'No other column is an ID, and the links name its cells.',
  });
}

/** A list without an ID column may give its work breakdown codes as IDs. */
function wbsAsId(choices: Map<Field, Choice>, contents: readonly Content[]): void {
  const wbs = choices.get('wbs');
  const content = contents[wbs?.column ?? -1];
  if (!wbs || !content || content.filled === 0 || content.unique < 0.9) return;
  choices.delete('wbs');
  choices.set('id', {
    column: wbs.column,
    confidence: 0.7,
    reason: 'No other column is an ID, and the WBS codes do not repeat.',
  });
}

function twice(field: Field, best: Candidate, rival: Candidate, headers: readonly HeaderReading[]): string {
  const [first, second] = [best.column, rival.column].sort((a, b) => a - b);
  const spell = (column = 0) => `${columnLetters(column)} (\u201c${headers[column]?.text ?? ''}\u201d)`;
  return `Columns ${spell(first)} and ${spell(second)} both seem to hold ${FIELD_WORDS[field] ?? FIELDS[field]}. Choose one of them.`;
}

const FIELD_WORDS: Readonly<Partial<Record<Field, string>>> = {
  id: 'the ID',
  optimistic: 'the optimistic estimate',
  likely: 'the most likely estimate',
  pessimistic: 'the pessimistic estimate',
  duration: 'the duration',
  predecessors: 'the predecessors',
  successors: 'the successors',
};

/** What a list cannot be read without. */
export function missing(choices: ReadonlyMap<Field, unknown>): string[] {
  const problems: string[] = [];
  if (!choices.has('id')) problems.push('No column could be told to hold the IDs. Choose it.');
  if (choices.has('likely') || choices.has('duration')) return problems;
  const some = choices.has('optimistic') || choices.has('pessimistic');
  problems.push(
    some
      ? 'No column could be told to hold the most likely estimate. Choose it.'
      : 'No column could be told to hold estimates or a duration. Choose them.',
  );
  return problems;
}

function round(value: number): number {
  return Math.round(value * 100) / 100;
}
