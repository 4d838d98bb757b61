import ExcelJS from 'exceljs';
import { strToU8, zipSync } from 'fflate';
import { describe, expect, it } from 'vitest';
import { UnreadableFile } from '@/parsers/errors';
import { readXlsx } from '@/parsers/xlsx';
import { syntheticList, toCells, toXlsx } from '../../support/lists';
import { handMade, MAIN, RELATED, valuesOf } from '../../support/xlsx';

const one = { name: 'Works', rows: '<row r="1"><c r="A1"><v>1</v></c></row>' };
const codeOf = (bytes: Uint8Array): string => {
  try {
    readXlsx(bytes);
  } catch (error) {
    if (error instanceof UnreadableFile) return error.code;
    throw error;
  }
  return 'read';
};

describe('the parts of a workbook', () => {
  it('gives sheets in the order of their tabs, hidden ones marked', () => {
    const sheets = readXlsx(
      handMade({ sheets: [one, { ...one, name: 'Old &amp; gone', state: 'veryHidden' }] }),
    );
    expect(sheets.map(({ name, hidden }) => [name, hidden])).toEqual([
      ['Works', false],
      ['Old & gone', true],
    ]);
  });

  it('finds parts by their relationships, whatever they are called', () => {
    const rels = (target: string) =>
      `<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="s1" Type="${RELATED}/worksheet" Target="${target}"/></Relationships>`;
    const sheet = `<worksheet xmlns="${MAIN}"><sheetData>${one.rows}</sheetData></worksheet>`;
    for (const [target, part] of [
      ['/data/List%201.xml', 'data/List 1.xml'],
      ['../data/LIST.xml', 'data/list.xml'],
      ['./x.xml', 'xl\\x.xml'],
    ]) {
      const bytes = handMade({
        sheets: [one],
        parts: {
          'xl/worksheets/sheet1.xml': null,
          'xl/_rels/workbook.xml.rels': rels(target ?? ''),
          [part ?? '']: sheet,
        },
      });
      expect(valuesOf(readXlsx(bytes)[0])).toEqual({ A1: 1 });
    }
  });

  it('reads prefixes, CDATA, the strict namespace and UTF-16', () => {
    const prefixed = `<x:worksheet xmlns:x="${MAIN}" xmlns:o="urn:other"><x:sheetData><x:row r="2"><o:c r="A2"/><x:c r="B2" t="str"><x:v><![CDATA[a<b]]></x:v></x:c></x:row></x:sheetData></x:worksheet>`;
    const strict = `<worksheet xmlns="http://purl.oclc.org/ooxml/spreadsheetml/main"><sheetData>${one.rows}</sheetData></worksheet>`;
    const wide = new Uint8Array(
      Buffer.from(`\ufeff<?xml version="1.0" encoding="UTF-16"?>${strict}`, 'utf16le'),
    );
    const part = (content: string | Uint8Array) =>
      handMade({ sheets: [one], parts: { 'xl/worksheets/sheet1.xml': content } });
    expect(valuesOf(readXlsx(part(prefixed))[0])).toEqual({ B2: 'a<b' });
    expect(valuesOf(readXlsx(part(strict))[0])).toEqual({ A1: 1 });
    expect(valuesOf(readXlsx(part(wide))[0])).toEqual({ A1: 1 });
  });
});

describe('what is no workbook that can be read', () => {
  const sheet = (xml: string) => handMade({ sheets: [one], parts: { 'xl/worksheets/sheet1.xml': xml } });

  it('is refused with what it is', () => {
    expect(codeOf(zipSync({ 'a.txt': strToU8('hello') }))).toBe('not-a-spreadsheet');
    expect(codeOf(zipSync({ mimetype: strToU8('application/vnd.oasis.opendocument.spreadsheet') }))).toBe(
      'not-a-spreadsheet',
    );
    expect(
      codeOf(handMade({ sheets: [one], parts: { 'xl/workbook.xml': '<document xmlns="urn:x"/>' } })),
    ).toBe('not-a-spreadsheet');
    expect(codeOf(handMade({ sheets: [] }))).toBe('no-rows');
    expect(codeOf(handMade({ sheets: [{ name: 'Works', rows: '' }] }))).toBe('no-rows');
    expect(codeOf(handMade({ sheets: [one], parts: { 'xl/worksheets/sheet1.xml': null } }))).toBe('damaged');
    expect(codeOf(handMade({ sheets: [one], parts: { 'xl/workbook.xml': null } }))).toBe('damaged');
  });

  it('is refused where a part declares a document type or expands entities', () => {
    const bomb =
      '<!DOCTYPE worksheet [<!ENTITY a "ha"><!ENTITY b "&a;&a;&a;&a;">]>' +
      `<worksheet xmlns="${MAIN}"><sheetData><row><c t="str"><v>&b;</v></c></row></sheetData></worksheet>`;
    expect(codeOf(sheet(bomb))).toBe('damaged');
    expect(codeOf(handMade({ sheets: [one], parts: { 'xl/workbook.xml': bomb } }))).toBe('damaged');
  });

  it('is refused where its XML is not well-formed, wherever that is', () => {
    const good = `<worksheet xmlns="${MAIN}"><cols><col min="1" max="2"/></cols><sheetData><row r="1"><c r="A1" t="str"><v>one &amp; two</v></c></row></sheetData><mergeCells><mergeCell ref="A1:B1"/></mergeCells></worksheet>`;
    expect(codeOf(sheet(good))).toBe('read');
    for (let length = 0; length < good.length; length++)
      expect(codeOf(sheet(good.slice(0, length)))).toBe('damaged');
    for (const [from, to] of [
      ['&amp;', '&nbsp;'],
      ['&amp;', '&'],
      ['</c>', '</d>'],
      ['</row>', ''],
      ['<v>', '<v><v>'],
      ['r="A1"', 'r=A1'],
      ['<sheetData>', '<sheetData></sheetData>'],
    ] as const) {
      expect([from, to, codeOf(sheet(good.replace(from, to)))]).toEqual([from, to, 'damaged']);
    }
  });

  it('is refused where it is nested without end', () => {
    expect(codeOf(sheet('<a>'.repeat(100_000)))).toBe('damaged');
  });
});

describe('exceljs as the second reader', () => {
  it('agrees on a list of three hundred rows', async () => {
    const rows = syntheticList(300, 7);
    const bytes = await toXlsx(rows);
    const [sheet] = readXlsx(bytes);
    const workbook = new ExcelJS.Workbook();
    await workbook.xlsx.load(Buffer.from(bytes) as never);
    const other = workbook.worksheets[0];
    expect(sheet?.rows).toHaveLength(other?.rowCount ?? -1);
    for (const row of sheet?.rows ?? []) {
      const theirs = row.cells.map((_, column) => other?.getRow(row.number).getCell(column + 1).value);
      expect(row.cells).toEqual(theirs);
    }
    expect(sheet?.rows.slice(1).map(({ cells }) => cells.slice(0, 6).map((value) => value ?? ''))).toEqual(
      rows.map((row, i) => toCells(row, i).slice(0, 6)),
    );
  });

  it('agrees on the cells of each kind that exceljs writes', async () => {
    const workbook = new ExcelJS.Workbook();
    const sheet = workbook.addWorksheet('Kinds');
    sheet.addRow([
      'a <b> & "c"',
      12.5,
      true,
      { error: '#N/A' },
      { formula: 'B1*2', result: 25 },
      { richText: [{ text: 'x' }, { text: ' y', font: { bold: true } }] },
    ]);
    sheet.addRow([
      { text: 'A10', hyperlink: 'https://example.org' },
      new Date(Date.UTC(2027, 2, 12)),
      { formula: 'B1*2' },
    ]);
    const [ours] = readXlsx(new Uint8Array(await workbook.xlsx.writeBuffer()));
    expect(valuesOf(ours)).toEqual({
      A1: 'a <b> & "c"',
      B1: 12.5,
      C1: true,
      D1: '#N/A',
      E1: 25,
      F1: 'x y',
      A2: 'A10',
      B2: 46458,
      C2: 25,
    });
  });
});
