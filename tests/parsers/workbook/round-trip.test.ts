import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { applyCorrections } from '@/lib/corrections';
import { cellAddress, columnLetters } from '@/lib/schedule/cell';
import type { CellContent, Sheet } from '@/lib/schedule/sheet';
import { readSheets } from '@/parsers';
import { giveBack } from '@/parsers/workbook';
import { makeWorkbook, malformedParts } from './packages';

/** What the cells of a sheet show, by address; formulas are left out, since they may be calculated anew. */
function contents(sheet: Sheet | undefined, formulas: ReadonlyMap<string, unknown>): Map<string, string> {
  const found = new Map<string, string>();
  for (const row of sheet?.rows ?? []) {
    row.cells.forEach((value, column) => {
      const address = cellAddress({ row: row.number, column });
      if (value !== null && !formulas.has(address)) found.set(address, String(value).replace(/\r\n?/g, '\n'));
    });
  }
  return found;
}

const characters = [...'abAB019 .,;-=+@\'"&<>_x\n\té€🙂'];
const text = fc.string({ unit: fc.constantFrom(...characters), maxLength: 8 });
const number = fc.oneof(fc.integer(), fc.double({ noNaN: true, noDefaultInfinity: true }));
const content = fc.oneof<fc.Arbitrary<CellContent>[]>(text, number, fc.constant(null));
const edits = (sheet: string) =>
  fc.array(
    fc
      .record({ row: fc.integer({ min: 1, max: 12 }), column: fc.integer({ min: 0, max: 6 }), to: content })
      .map(({ row, column, to }) => ({ sheet, cell: cellAddress({ row, column }), from: null, to })),
    { minLength: 1, maxLength: 8 },
  );

describe('a workbook', () => {
  const escape = (raw: string) => raw.replaceAll('&', '&amp;').replaceAll('<', '&lt;');
  const value = fc.oneof(
    number.map((n) => ({ type: '', inner: `<v>${n}</v>` })),
    text.map((t) => ({ type: ' t="inlineStr"', inner: `<is><t xml:space="preserve">${escape(t)}</t></is>` })),
    text.map((t) => ({ type: ' t="str"', inner: `<v>${escape(t)}</v>` })),
    fc.constant({ type: ' t="b"', inner: '<v>1</v>' }),
    fc.constant({ type: ' t="e"', inner: '<v>#N/A</v>' }),
    fc.constant({ type: '', inner: '<f>SUM(A1:C3)</f><v>7</v>' }),
    fc.constant({ type: '', inner: '' }),
  );
  const cell = fc.record({ gap: fc.nat(2), told: fc.boolean(), style: fc.nat(2), value });
  const row = fc.record({ gap: fc.nat(2), told: fc.boolean(), cells: fc.array(cell, { maxLength: 4 }) });

  const sheet = fc.array(row, { maxLength: 6 }).map((rows) => {
    let number = 0;
    const markup = rows.map(({ gap, told, cells }) => {
      number += gap + 1;
      let column = -1;
      const inner = cells.map((each) => {
        column += each.gap + 1;
        const told = each.told || each.gap > 0 ? ` r="${columnLetters(column)}${number}"` : '';
        return `<c${told} s="${each.style}"${each.value.type}>${each.value.inner}</c>`;
      });
      return `<row${told || gap > 0 ? ` r="${number}"` : ''}>${inner.join('')}</row>`;
    });
    return `<sheetData>${markup.join('')}</sheetData>`;
  });
  const kept = '<sheetData><row r="1"><c r="A1"><v>1</v></c></row></sheetData>';

  it('given back and read again is the corrected one', () => {
    fc.assert(
      fc.property(sheet, edits('List'), (content, corrections) => {
        const bytes = makeWorkbook({ sheets: { List: content, Kept: kept } });
        const received = readSheets(bytes, 'x.xlsx');
        const { bytes: after, check } = giveBack({ bytes, fileName: 'x.xlsx', corrections, changes: [] });
        const again = readSheets(after, 'x.xlsx');
        const [wanted, other] = applyCorrections(received, corrections);
        const formulas = wanted?.formulas ?? new Map();
        expect(check.missing).toEqual([]);
        expect(contents(again[0], formulas)).toEqual(contents(wanted, formulas));
        expect([...(again[0]?.formulas.keys() ?? [])].sort()).toEqual([...formulas.keys()].sort());
        expect(again[1]).toEqual(other);
        expect(malformedParts(after)).toEqual([]);
      }),
      { numRuns: 300 },
    );
  });
});

describe('a CSV', () => {
  const layout = fc.record({
    delimiter: fc.constantFrom(',', ';', '\t', '|'),
    newline: fc.constantFrom('\r\n', '\n', '\r'),
    quoteAll: fc.boolean(),
    encoding: fc.constantFrom('utf8', 'utf8 marked', 'utf16'),
    ended: fc.boolean(),
  });
  const records = fc.array(fc.array(text, { minLength: 1, maxLength: 5 }), { minLength: 3, maxLength: 8 });

  it('given back and read again is the corrected one, and what was not corrected stays as written', () => {
    fc.assert(
      fc.property(layout, records, edits('CSV'), (way, fields, corrections) => {
        const { delimiter, newline, encoding } = way;
        const write = (field: string) =>
          way.quoteAll || field.includes(delimiter) || /["\r\n]/.test(field)
            ? `"${field.replaceAll('"', '""')}"`
            : field;
        const lines = [['ID', 'm'], ...fields].map((record) => record.map(write).join(delimiter));
        // The delimiter is stated, since so short a list could be parted by several.
        const whole = [`sep=${delimiter}`, ...lines].join(newline) + (way.ended ? newline : '');
        const marked = encoding === 'utf8' ? whole : `\ufeff${whole}`;
        const bytes = new Uint8Array(Buffer.from(marked, encoding === 'utf16' ? 'utf16le' : 'utf8'));
        const received = readSheets(bytes, 'x.csv');
        const { bytes: after, check } = giveBack({ bytes, fileName: 'x.csv', corrections, changes: [] });
        const [wanted] = applyCorrections(received, corrections);
        expect(check.missing).toEqual([]);
        expect(contents(readSheets(after, 'x.csv')[0], new Map())).toEqual(contents(wanted, new Map()));
      }),
      { numRuns: 500 },
    );
  });
});
