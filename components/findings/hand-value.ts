/**
 * What the text typed in place of a cell's content is written as. A number stays a number where the cell
 * held one or was empty; elsewhere what is typed is text, so that an ID such as 007 keeps its zeros.
 */
export function handValue(text: string, from: string | number | null): string | number | null {
  const trimmed = text.trim();
  if (trimmed === '') return null;
  const plain = /^[-−]?\d+(\.\d+)?$/.test(trimmed);
  const padded = /^[-−]?0\d/.test(trimmed);
  const numeric = typeof from === 'number' || from === null;
  return plain && !padded && numeric ? Number(trimmed.replace('−', '-')) : trimmed;
}

/** Why the text cannot be written; null where it can. */
export function handProblem(text: string, from: string | number | null): string | null {
  const to = handValue(text, from);
  if (to === from) return 'This is what the cell holds already.';
  if (typeof to === 'string' && to.length > 2000) return 'A cell takes at most 2 000 characters here.';
  return null;
}
