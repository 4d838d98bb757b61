import type { CellEditView } from '@/lib/contract/submission';

/** What an edit takes away and what it puts there; null where it does only one of the two. */
export interface EditPiece {
  readonly cell: string;
  readonly was: string | null;
  readonly now: string | null;
}

export function contentText(content: string | number | null): string {
  return content === null ? '' : String(content);
}

const SEPARATORS = /\s*(?:[,;\n&]|\band\b)\s*/i;

function entries(text: string): string[] {
  return text.split(SEPARATORS).filter(Boolean);
}

/** Those of `from` that `without` lacks, counting repeats. */
function less(from: readonly string[], without: readonly string[]): string[] {
  const left = [...without];
  return from.filter((entry) => {
    const at = left.indexOf(entry);
    if (at >= 0) left.splice(at, 1);
    return at < 0;
  });
}

const joined = (texts: readonly string[]): string | null => (texts.length === 0 ? null : texts.join(', '));

/**
 * The part of a cell that changes. A cell that lists several entries shows only those that come or go
 * (`B-1, B-2O` → `B-1, B-20` is `B-2O` → `B-20`); any other shows the whole.
 */
export function pieceOf(edit: CellEditView): EditPiece {
  const from = contentText(edit.from);
  const to = contentText(edit.to);
  const before = entries(from);
  const after = entries(to);
  const listed = before.length > 1 || after.length > 1;
  const was = listed ? less(before, after) : before;
  const now = listed ? less(after, before) : after;
  if (listed && was.length + now.length > 0) return { cell: edit.cell, was: joined(was), now: joined(now) };
  return { cell: edit.cell, was: from === '' ? null : from, now: to === '' ? null : to };
}

/** How many pieces a grid cell has room for. */
const ROOM = 2;

export type FixSummary =
  | { readonly kind: 'none' }
  | { readonly kind: 'pieces'; readonly pieces: readonly EditPiece[] }
  | { readonly kind: 'count'; readonly text: string };

/** A fix in the width of a grid cell: its pieces, or how many cells it changes. */
export function summariseEdits(edits: readonly CellEditView[]): FixSummary {
  if (edits.length === 0) return { kind: 'none' };
  const pieces = edits.map(pieceOf);
  const long = pieces.some((piece) => (piece.was?.length ?? 0) + (piece.now?.length ?? 0) > 60);
  if (edits.length <= ROOM && !long) return { kind: 'pieces', pieces };
  return { kind: 'count', text: edits.length === 1 ? '1 cell changed' : `${edits.length} cells changed` };
}

/** The same in words, for screen readers and for measuring the row's height. */
export function pieceWords(piece: EditPiece): string {
  if (piece.was === null) return `${piece.now ?? ''} added`;
  if (piece.now === null) return `${piece.was} removed`;
  return `${piece.was} → ${piece.now}`;
}
