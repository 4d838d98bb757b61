import { applyCorrections, cellReader, type Corrections, editsOf } from '@/lib/corrections';
import type { CellContent, Sheet } from '@/lib/schedule/sheet';
import type { Check, Patched } from './types';

const lines = (text: string) => text.replace(/\r\n?/g, '\n');

/** Alike but for what a file of text cannot tell: a number from its text, one line end from another. */
function alike(found: CellContent, wanted: CellContent): boolean {
  if (found === wanted) return true;
  if (found === null || wanted === null) return false;
  return lines(String(found)) === lines(String(wanted));
}

/** Holds the file as read again against what the corrections ask for. */
export function checkFile(
  received: readonly Sheet[],
  corrections: Corrections,
  again: readonly Sheet[],
  { remarks, refused }: Pick<Patched, 'remarks' | 'refused'>,
): Check {
  const wanted = cellReader(applyCorrections(received, corrections));
  const found = cellReader(again);
  const missing = new Map(refused.map((cell) => [`${cell.cell} ${cell.sheet}`, cell]));
  const holds = (sheet: string, address: string): boolean => {
    const cell = wanted(sheet, address);
    if (!cell) {
      const reason = `There is no cell ${address} on a sheet “${sheet}”.`;
      missing.set(`${address} ${sheet}`, { sheet, cell: address, reason });
      return false;
    }
    const there = found(sheet, address)?.content ?? null;
    if (alike(there, cell.content)) return true;
    const key = `${cell.cell} ${sheet}`;
    const reason = `${cell.cell} was found to hold something else when the file was read again.`;
    if (!missing.has(key)) missing.set(key, { sheet, cell: cell.cell, reason });
    return false;
  };
  const good = corrections.filter((correction) =>
    editsOf([correction]).every(({ sheet, cell }) => holds(sheet, cell)),
  ).length;
  const expected = corrections.length;
  const noun = expected === 1 ? 'correction' : 'corrections';
  const sentence = `${good} of ${expected} ${noun} found in the file.`;
  return { expected, found: good, missing: [...missing.values()], remarks, sentence };
}
