import type { Field } from '@/lib/schedule/field';
import { readRelation } from '@/parsers/cells/relation';
import type { Content } from './content';
import { type HeaderReading, letterEstimates } from './header';

/** A column that may hold a field. */
export interface Candidate {
  readonly column: number;
  readonly field: Field;
  /** From the header alone. */
  readonly sureness: number;
  /** From the header and the cells, 0 … 1. */
  readonly fit: number;
  readonly reason: string;
}

const ESTIMATES = new Set<Field>([
  'optimistic',
  'likely',
  'pessimistic',
  'duration',
  'remaining',
  'lag',
  'totalFloat',
]);
/** Cells that are too few tell nothing. */
const FEW = 3;

/** Every field that a column's header may mean, weighed by what its cells hold. */
export function candidatesOf(headers: readonly HeaderReading[], contents: readonly Content[]): Candidate[] {
  const letters = letterEstimates(headers);
  return headers.flatMap((header, column) => {
    const content = contents[column];
    if (!content) return [];
    const letter = letters.get(column);
    const named = letter ? [{ field: letter, sureness: 0.95 }] : header.fields;
    return named.map(({ field, sureness }) => {
      const { change, because } = weigh(field, content);
      const fit = Math.max(0, Math.min(1, sureness + change));
      const says = letter
        ? `The header says \u201c${header.text}\u201d, one of three`
        : `The header says \u201c${header.text}\u201d`;
      return {
        column,
        field,
        sureness,
        fit,
        reason: because === '' ? `${says}.` : `${says}, and ${because}.`,
      };
    });
  });
}

/** What the cells say for or against a field. */
function weigh(field: Field, content: Content): { change: number; because: string } {
  if (content.filled < FEW) return { change: 0, because: '' };
  if (field === 'id') return weighId(content);
  if (field === 'name') {
    if (content.numeric > 0.8) return { change: -0.5, because: 'its cells are numbers' };
    const wordy = content.phrases > 0.5 || content.length > 12;
    return wordy
      ? { change: 0.15, because: 'its cells hold words' }
      : { change: -0.15, because: 'its cells are short' };
  }
  if (field === 'relation') {
    const known = content.values.filter((text) => text !== '' && readRelation(text) !== null).length;
    return known / content.filled > 0.5
      ? { change: 0.3, because: 'its cells are relations' }
      : { change: -0.5, because: '' };
  }
  if (ESTIMATES.has(field)) {
    if (content.numeric < 0.3) return { change: -0.4, because: 'few of its cells are numbers' };
    return content.numeric > 0.8
      ? { change: 0, because: 'its cells are numbers' }
      : { change: 0, because: '' };
  }
  return { change: 0, because: '' };
}

function weighId({ unique, length, phrases, numeric }: Content): { change: number; because: string } {
  if (phrases > 0.6 && length > 14) return { change: -0.35, because: 'its cells are long' };
  if (unique > 0.9 && length <= 14) return { change: 0.2, because: 'its cells are short and do not repeat' };
  if (unique < 0.4) return { change: numeric > 0.9 ? -0.4 : -0.25, because: 'its cells repeat' };
  return { change: 0, because: '' };
}
