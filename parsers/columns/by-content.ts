import { columnLetters } from '@/lib/schedule/cell';
import type { Field } from '@/lib/schedule/field';
import type { Choice } from './assign';
import type { Content } from './content';

/** How sure a column is that is told by its cells alone: a proposal, never taken unasked. */
const CONFIDENCE = 0.4;
const FEW = 2;

/**
 * Proposes columns for what the headers do not tell: three columns of numbers of which the second is mostly
 * between the others, or one of numbers; and a column of short texts that do not repeat.
 */
export function proposeByContent(
  contents: readonly Content[],
  choices: ReadonlyMap<Field, Choice>,
): Map<Field, Choice> {
  const proposed = new Map<Field, Choice>();
  const taken = new Set([...choices.values()].map(({ column }) => column));
  const isFree = (column: number) => !taken.has(column) && (contents[column]?.filled ?? 0) >= FEW;
  const put = (field: Field, column: number, because: string) => {
    taken.add(column);
    proposed.set(field, { column, confidence: CONFIDENCE, reason: because });
  };
  if (!choices.has('id')) {
    const id = contents.findIndex(({ unique, length }, i) => isFree(i) && unique > 0.9 && length <= 14);
    if (id >= 0) put('id', id, 'No header says so; its cells are short and do not repeat.');
  }
  const estimates: readonly Field[] = ['optimistic', 'likely', 'pessimistic', 'duration'];
  if (estimates.some((field) => choices.has(field))) return proposed;
  const numbers = contents.flatMap(({ numeric }, i) => (isFree(i) && numeric > 0.8 ? [i] : []));
  const triple = numbers.find((column, i) => isOrdered(contents, column, numbers[i + 1], numbers[i + 2]));
  const [first] = numbers;
  if (triple !== undefined) {
    const [a, m, b] = [triple, ...numbers.slice(numbers.indexOf(triple) + 1)];
    const because = `No header says so; the numbers in columns ${columnLetters(a)} to ${columnLetters(b ?? a)} rise from left to right.`;
    put('optimistic', a, because);
    if (m !== undefined) put('likely', m, because);
    if (b !== undefined) put('pessimistic', b, because);
  } else if (first !== undefined) put('duration', first, 'No header says so; its cells are numbers.');
  return proposed;
}

function isOrdered(
  contents: readonly Content[],
  a: number,
  m: number | undefined,
  b: number | undefined,
): boolean {
  if (m === undefined || b === undefined) return false;
  const [low, middle, high] = [contents[a]?.numbers, contents[m]?.numbers, contents[b]?.numbers];
  let [ordered, all, spread] = [0, 0, 0];
  low?.forEach((value, i) => {
    const [likely, most] = [middle?.[i] ?? null, high?.[i] ?? null];
    if (value === null || likely === null || most === null) return;
    all++;
    if (value <= likely && likely <= most) ordered++;
    if (value < most) spread++;
  });
  return all >= FEW && ordered / all > 0.8 && spread / all > 0.5;
}
