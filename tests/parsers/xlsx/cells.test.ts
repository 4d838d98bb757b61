import { describe, expect, it } from 'vitest';
import { readXlsx } from '@/parsers/xlsx';
import { handMade, MAIN, valuesOf } from '../../support/xlsx';

const read = (rows: string, more: Parameters<typeof handMade>[0] = {}) =>
  readXlsx(handMade({ sheets: [{ name: 'Works', rows }], ...more }))[0];
const values = (rows: string, more: Parameters<typeof handMade>[0] = {}) => valuesOf(read(rows, more));
const row = (cells: string, attributes = 'r="1"') => `<row ${attributes}>${cells}</row>`;

/** The same rows once as written and once with a comment, which sends them to the strict parser. */
const bothWays = (rows: string, more: Parameters<typeof handMade>[0] = {}) => [
  values(rows, more),
  values(`<!-- by hand -->${rows}`, more),
];

describe('cells of each type', () => {
  const strings =
    '<si><t>Pour</t></si><si><r><rPr><b/></rPr><t>Set </t></r><r><t xml:space="preserve">forms</t></r></si>';

  it('reads numbers, shared and inline texts, truth values and errors, alike by either reader', () => {
    const rows = row(
      '<c r="A1"><v>7</v></c><c r="B1" t="s"><v>0</v></c><c r="C1" t="s"><v>1</v></c>' +
        '<c r="D1" t="inlineStr"><is><t>In place &amp; here</t></is></c><c r="E1" t="b"><v>1</v></c>' +
        '<c r="F1" t="e"><v>#REF!</v></c><c r="G1"><v>-0.125</v></c><c r="H1"><v>1.5E-3</v></c>' +
        '<c r="I1" t="str"><f>A1&amp;"x"</f><v>7x</v></c><c r="J1" t="n"><v>0.30000000000000004</v></c>' +
        '<c r="K1" t="d"><v>2024-01-01</v></c>',
    );
    for (const found of bothWays(rows, { strings })) {
      expect(found).toEqual({
        A1: 7,
        B1: 'Pour',
        C1: 'Set forms',
        D1: 'In place & here',
        E1: true,
        F1: '#REF!',
        G1: -0.125,
        H1: 0.0015,
        I1: '7x',
        J1: 0.1 + 0.2,
        K1: 45292,
      });
    }
  });

  it('leaves phonetic runs out and resolves escapes and references', () => {
    const table =
      '<si><t>東京</t><rPh sb="0" eb="2"><t>トウキョウ</t></rPh><phoneticPr fontId="1"/></si>' +
      '<si><t>a_x000D_b&#10;c&#x41;_x005F_x</t></si><si/><si><t/></si><si><t>caf\u00e9 \u2013 x</t></si>';
    const rows = row([0, 1, 2, 3, 4].map((i) => `<c t="s"><v>${i}</v></c>`).join(''));
    for (const strings of [table, `<!-- x -->${table}`]) {
      expect(values(rows, { strings })).toEqual({
        A1: '東京',
        B1: 'a\rb\ncA_x',
        E1: 'café – x',
      });
    }
  });

  it('places cells and rows that tell no address after the one before', () => {
    const rows =
      '<row><c><v>1</v></c><c r="D1"><v>2</v></c><c><v>3</v></c></row><row r="5"><c><v>4</v></c></row><row><c><v>5</v></c></row>';
    for (const found of bothWays(rows)) expect(found).toEqual({ A1: 1, D1: 2, E1: 3, A5: 4, A6: 5 });
  });

  it('sorts rows that stand out of order', () => {
    const sheet = read('<row r="9"><c r="A9"><v>9</v></c></row><row r="2"><c r="A2"><v>2</v></c></row>');
    expect(sheet?.rows.map(({ number }) => number)).toEqual([2, 9]);
  });

  it('keeps no blank row and no blank cell, however many are styled', () => {
    const blank = Array.from(
      { length: 50_000 },
      (_, i) => `<row r="${i + 2}" s="1" customFormat="1"><c r="A${i + 2}" s="1"/></row>`,
    );
    const sheet = read(`${row('<c r="A1"><v>1</v></c><c r="XFD1" s="3"/>')}${blank.join('')}`);
    expect(sheet?.rows).toHaveLength(1);
    expect(sheet?.columnCount).toBe(1);
  });

  it('tells hidden rows, outline levels, hidden columns and merged cells', () => {
    const sheet = read(
      `<worksheet xmlns="${MAIN}"><cols><col min="2" max="16384" hidden="1"/></cols><sheetData>` +
        '<row r="1" hidden="1"><c><v>1</v></c></row><row r="2" outlineLevel="2"><c><v>1</v></c><c/><c><v>1</v></c></row>' +
        '<row r="3" ht="0" customHeight="1"><c><v>1</v></c></row></sheetData>' +
        '<mergeCells count="1"><mergeCell ref="A1:B2"/></mergeCells></worksheet>',
    );
    expect(sheet?.rows.map(({ hidden, outline }) => [hidden, outline])).toEqual([
      [true, 0],
      [false, 2],
      [true, 0],
    ]);
    expect([...(sheet?.hiddenColumns ?? [])]).toEqual([1, 2]);
    expect(sheet?.merges).toEqual([{ top: 1, left: 0, bottom: 2, right: 1 }]);
  });
});

describe('number formats', () => {
  const styles =
    '<numFmts count="1"><numFmt numFmtId="164" formatCode="0&quot; d&quot;"/></numFmts>' +
    '<cellStyleXfs><xf numFmtId="9"/></cellStyleXfs>' +
    '<cellXfs count="4"><xf numFmtId="0"/><xf numFmtId="14"/><xf numFmtId="164"/><xf numFmtId="2"/></cellXfs>';

  it('tells the format of numbers, not of texts', () => {
    const sheet = read(
      row(
        '<c s="1"><v>45292</v></c><c s="2"><v>5</v></c><c s="0"><v>1</v></c><c s="3"><v>1.1</v></c><c s="2" t="str"><v>x</v></c>',
      ),
      { styles },
    );
    const codes = sheet?.rows[0]?.formats?.map((format) =>
      format === undefined ? null : sheet.formatCodes[format],
    );
    expect(codes).toEqual(['m/d/yyyy', '0" d"', null, '0.00']);
  });

  it('tells which date system the workbook counts by', () => {
    expect(read(row('<c><v>1</v></c>'), { properties: 'date1904="1"' })?.date1904).toBe(true);
    expect(values(row('<c t="d"><v>2024-01-01</v></c>'), { properties: 'date1904="true"' })).toEqual({
      A1: 43830,
    });
  });
});

describe('limits', () => {
  it('refuses a column beyond XFD and a row beyond the last', () => {
    expect(() => values(row('<c r="XFE1"><v>1</v></c>'))).toThrow(/more columns/);
    expect(() => values('<row r="1048577"><c><v>1</v></c></row>')).toThrow(/row that cannot be/);
    expect(values(row('<c r="XFD1"><v>1</v></c>'))).toEqual({ '(16383)1': 1 });
  });

  it('refuses a row that stands twice and a text that is not in the table', () => {
    expect(() => values(row('<c><v>1</v></c>') + row('<c><v>1</v></c>'))).toThrow(/same row twice/);
    expect(() => values(row('<c t="s"><v>3</v></c>'), { strings: '<si><t>x</t></si>' })).toThrow(/not in it/);
  });

  it('refuses a text longer than a cell can hold, by either reader', () => {
    const long = (length: number) => row(`<c t="str"><v>${'x'.repeat(length)}</v></c>`);
    expect(values(long(32_767)).A1).toHaveLength(32_767);
    for (const rows of [
      long(32_768),
      long(500_000),
      `<!-- x -->${long(32_768)}`,
      `<!-- x -->${long(5_000_000)}`,
      `<!-- x -->${' '.repeat(5_000_000)}`,
    ]) {
      expect(() => values(rows)).toThrow(/longer than a cell can hold/);
    }
  });

  it('refuses a part with more elements than a workbook has', () => {
    const merged = '<mergeCell ref="A1:B1"/>'.repeat(1_000_001);
    const sheet = `<worksheet xmlns="${MAIN}"><sheetData>${row('<c><v>1</v></c>')}</sheetData><mergeCells>${merged}</mergeCells></worksheet>`;
    expect(() => values(sheet)).toThrow(/more cells/);
  });

  it('refuses more rows than a list may have', () => {
    const rows = Array.from({ length: 201_001 }, () => '<row><c><v>1</v></c></row>').join('');
    expect(() => values(rows)).toThrow(/200 000 rows/);
  });

  it('refuses rows that reach far to the right and hold nothing between', () => {
    const rows = Array.from(
      { length: 2000 },
      (_, i) => `<row r="${i + 1}"><c r="XFD${i + 1}"><v>1</v></c></row>`,
    ).join('');
    expect(() => values(rows)).toThrow(/more cells/);
  });
});
