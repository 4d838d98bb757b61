import fc from 'fast-check';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import type { Matching } from '@/lib/schedule/field';
import type { Sheet } from '@/lib/schedule/sheet';
import { matchingFrom, readActivityList, readSheets } from '@/parsers';
import { type Cell, laidOut, type Layout, layout, plan, type PlanActivity } from '../support/layouts';
import { sheetOf } from '../support/sheets';
import { handMade, MAIN } from '../support/xlsx';

const escape = (text: string) => text.replace(/[&<>"]/g, (one) => `&#${one.charCodeAt(0)};`);

/** The rows as a workbook, texts in place or shared. */
function toWorkbook(rows: readonly Cell[][], shared: boolean, prefix: string): Uint8Array {
  const strings: string[] = [];
  const p = prefix === '' ? '' : `${prefix}:`;
  const cell = (value: Cell, column: number, row: number) => {
    const at = `r="${String.fromCharCode(65 + column)}${row}"`;
    if (value === null) return `<${p}c ${at} s="0"/>`;
    if (typeof value === 'number') return `<${p}c ${at}><${p}v>${value}</${p}v></${p}c>`;
    if (!shared) return `<${p}c ${at} t="inlineStr"><${p}is><${p}t>${escape(value)}</${p}t></${p}is></${p}c>`;
    strings.push(`<si><r><t xml:space="preserve">${escape(value)}</t></r></si>`);
    return `<${p}c ${at} t="s"><${p}v>${strings.length - 1}</${p}v></${p}c>`;
  };
  const xml = rows
    .map(
      (cells, i) =>
        `<${p}row r="${i + 1}">${cells.map((value, column) => cell(value, column, i + 1)).join('')}</${p}row>`,
    )
    .join('\n');
  const sheet = `<${p}worksheet xmlns${prefix && `:${prefix}`}="${MAIN}"><${p}sheetData>${xml}</${p}sheetData></${p}worksheet>`;
  return handMade({
    sheets: [
      { name: 'Cover', rows: '' },
      { name: 'Works', rows: sheet },
    ],
    strings: strings.join(''),
    parts: { 'xl/worksheets/sheet2.xml': sheet },
  });
}

function toText(rows: readonly Cell[][], delimiter: string, newline: string, encoding: string): Uint8Array {
  const text = Papa.unparse(
    rows.map((cells) => cells.map((value) => value ?? '')),
    { delimiter, newline },
  );
  if (encoding === 'windows-1252') return new Uint8Array(Buffer.from(text, 'latin1'));
  return new Uint8Array(
    Buffer.from(encoding === 'utf-8' ? text : `\ufeff${text}`, encoding === 'utf-16le' ? 'utf16le' : 'utf8'),
  );
}

function expectSame(
  list: readonly PlanActivity[],
  laid: Layout,
  sheets: readonly Sheet[],
  matching: Matching,
) {
  const found = readActivityList(sheets, matching);
  const { read, ...kinds } = found.rows;
  expect(Object.values(kinds).reduce((sum, count) => sum + count, 0)).toBe(read);
  expect(kinds.refused).toBe(0);
  expect(kinds.headings).toBe(laid.headings ? Math.ceil(list.length / 5) : 0);
  expect(kinds.notes).toBe((laid.total ? 1 : 0) + (laid.note ? 1 : 0));
  expect(
    found.activities.map(({ id, name, optimistic, likely, pessimistic }) => [
      id,
      name,
      optimistic.days,
      likely.days,
      pessimistic.days,
    ]),
  ).toEqual(list.map(({ id, name, estimates }) => [id, name.replaceAll('\n', ' '), ...estimates]));
  const key = (from: string, to: string, type: string, lag: number) => `${from} > ${to} ${type} ${lag}`;
  expect(found.links.map(({ from, to, type, lag }) => key(from, to, type, lag)).sort()).toEqual(
    list.flatMap(({ id, links }) => links.map(({ from, type, lag }) => key(from, id, type, lag))).sort(),
  );
  expect(found.links.every(({ fromIndex, toIndex }) => fromIndex >= 0 && toIndex >= 0)).toBe(true);
}

describe('a list in any layout reads as the same list', () => {
  it('from cells', () => {
    fc.assert(
      fc.property(plan, layout, (list, laid) => {
        const sheets = [sheetOf(laidOut(list, laid))];
        expectSame(list, laid, sheets, matchingFrom({}, sheets));
      }),
      { numRuns: 600 },
    );
  });

  it('from a workbook', () => {
    fc.assert(
      fc.property(plan, layout, fc.boolean(), fc.constantFrom('', 'x'), (list, laid, shared, prefix) => {
        const sheets = readSheets(toWorkbook(laidOut(list, laid), shared, prefix), 'list.xlsx');
        expectSame(list, laid, sheets, matchingFrom({}, sheets));
      }),
      { numRuns: 150 },
    );
  });

  it('from delimited text in any encoding', () => {
    const delimiter = fc.constantFrom(',', ';', '\t', '|');
    const encoding = fc.constantFrom('utf-8', 'utf-8 with mark', 'utf-16le', 'windows-1252');
    fc.assert(
      fc.property(
        plan,
        layout,
        delimiter,
        fc.constantFrom('\n', '\r\n'),
        encoding,
        (list, laid, mark, newline, coded) => {
          const sheets = readSheets(toText(laidOut(list, laid), mark, newline, coded), 'list.csv');
          expectSame(list, laid, sheets, matchingFrom({}, sheets));
        },
      ),
      { numRuns: 400 },
    );
  });
});
