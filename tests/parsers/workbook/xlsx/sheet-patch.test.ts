import { describe, expect, it } from 'vitest';
import { readSheets } from '@/parsers';
import { edit, give, sheetXml, withList } from '../giving';
import { makeWorkbook, partsOf } from '../packages';

/** Gives a sheet back, and returns what the part then holds between its rows' tags. */
function rowsAfter(content: string, ...corrections: ReturnType<typeof edit>[]): string {
  const { bytes, check } = give(withList(content), ...corrections);
  expect(check.found).toBe(corrections.length);
  return /<sheetData>(.*)<\/sheetData>/s.exec(sheetXml(bytes))?.[1] ?? '';
}

describe('cells', () => {
  it('keeps what a cell of its own row and neighbours says', () => {
    const rows = rowsAfter(
      '<sheetData><row r="2" spans="1:2" ht="20"><c r="A2" s="1"><v>4</v></c><c r="B2" t="str"><v>x</v></c></row></sheetData>',
      edit('A2', 5),
    );
    expect(rows).toBe(
      '<row r="2" spans="1:2" ht="20"><c r="A2" s="3"><v>5</v></c><c r="B2" t="str"><v>x</v></c></row>',
    );
  });

  it('puts missing cells and rows in at their places', () => {
    const rows = rowsAfter(
      '<sheetData><row r="2" spans="2:2"><c r="B2"><v>1</v></c></row><row r="5"/><row r="9"><c r="A9"><v>1</v></c></row></sheetData>',
      edit('D2', 'd'),
      edit('A2', 1),
      edit('C5', 5),
      edit('B7', 7),
      edit('A1', 'top'),
      edit('A12', 12),
    );
    const addresses = [...rows.matchAll(/<(?:row|c) r="(\w+)"/g)].map(([, address]) => address);
    expect(addresses).toEqual([
      '1',
      'A1',
      '2',
      'A2',
      'B2',
      'D2',
      '5',
      'C5',
      '7',
      'B7',
      '9',
      'A9',
      '12',
      'A12',
    ]);
    expect(rows).toContain('spans="1:4"');
  });

  it('opens a sheet without rows', () => {
    const bytes = makeWorkbook({
      sheets: { Other: '<sheetData><row><c><v>1</v></c></row></sheetData>', List: '<sheetData/>' },
    });
    const { bytes: after, check } = give(bytes, edit('B3', 'x'), edit('B2', 2));
    expect(check.sentence).toBe('2 of 2 corrections found in the file.');
    expect(sheetXml(after, 2)).toMatch(/<sheetData><row r="2">.*<\/row><row r="3">.*<\/row><\/sheetData>/);
  });

  it('counts rows and cells that tell no address', () => {
    const rows = rowsAfter(
      '<sheetData><row><c><v>1</v></c><c><v>2</v></c></row><row><c><v>3</v></c><c r="D2"><v>4</v></c></row></sheetData>',
      edit('B1', 20),
      edit('C2', 30),
    );
    expect(rows).toContain('<c><v>1</v></c><c r="B1" s="3"><v>20</v></c>');
    expect(rows).toContain('<c><v>3</v></c><c r="C2" s="3"><v>30</v></c><c r="D2"><v>4</v></c>');
  });

  it('passes over comments and CDATA that look like cells', () => {
    const rows = rowsAfter(
      '<sheetData><!-- <row r="2"><c r="A2"><v>9</v></c></row> --><row r="1"><c r="A1" t="inlineStr"><is><t><![CDATA[<row r="2">]]></t></is></c></row><row r="2"><c r="A2"><v>2</v></c></row></sheetData>',
      edit('A2', 3),
    );
    expect(rows).toContain('<!-- <row r="2"><c r="A2"><v>9</v></c></row> -->');
    expect(rows).toContain('<![CDATA[<row r="2">]]>');
    expect(rows).toContain('<c r="A2" s="3"><v>3</v></c>');
  });

  it('empties a cell, and keeps it', () => {
    const rows = rowsAfter(
      '<sheetData><row r="1"><c r="A1" s="2" t="str"><v>x</v></c><c r="B1"><v>1</v></c></row></sheetData>',
      edit('A1', null),
    );
    expect(rows).toContain('<c r="A1" s="3"/>');
  });

  it('writes to the top-left cell of a merged range', () => {
    const content =
      '<sheetData><row r="1"><c r="A1" t="str"><v>x</v></c><c r="C1"><v>1</v></c></row></sheetData><mergeCells count="1"><mergeCell ref="A1:B2"/></mergeCells>';
    const { bytes, check } = give(withList(content), edit('B2', 'y'));
    expect(check.found).toBe(1);
    expect(readSheets(bytes, 'x.xlsx')[0]?.rows[0]?.cells[0]).toBe('y');
  });

  it('takes the style of the row, else of the column, for a new cell', () => {
    const content =
      '<cols><col min="2" max="3" style="1"/></cols><sheetData><row r="1" s="2" customFormat="1"><c r="A1"><v>1</v></c></row><row r="2"><c r="A2"><v>1</v></c></row></sheetData>';
    const { bytes } = give(withList(content), edit('B1', 'in the row'), edit('B2', 2));
    const formats = [...(partsOf(bytes).get('xl/styles.xml')?.content ?? '').matchAll(/<xf [^>]*>/g)].map(
      ([xf]) => xf,
    );
    const style = (cell: string) =>
      formats[Number(new RegExp(`r="${cell}" s="(\\d+)"`).exec(sheetXml(bytes))?.[1])];
    expect(style('B1')).toContain('numFmtId="49"');
    expect(style('B2')).toContain('numFmtId="2"');
  });

  it.each(['=1+1', '+1', '-x', '@a', '\tx', '\rx', '-5A'])('writes %j as text that stays text', (text) => {
    const { bytes, check } = give(
      withList('<sheetData><row r="1"><c r="A1" t="str"><v>x</v></c></row></sheetData>'),
      edit('A1', text),
    );
    expect(check.found).toBe(1);
    expect(sheetXml(bytes)).toMatch(/<c r="A1" s="3" t="inlineStr">/);
    expect(sheetXml(bytes)).not.toContain('<f>');
    expect(partsOf(bytes).get('xl/styles.xml')?.content).toMatch(/<xf [^>]*quotePrefix="1"/);
  });

  it.each(['a & b <c> "d"', '_x0041_', 'line\nbreak', '  blanks  ', 'Ωé🙂', ']]>', 'a\u0001b'])(
    'writes and reads %j',
    (text) => {
      const bytes = withList('<sheetData><row r="1"><c r="A1" t="str"><v>ß</v></c></row></sheetData>');
      expect(readSheets(give(bytes, edit('A1', text)).bytes, 'x.xlsx')[0]?.rows[0]?.cells[0]).toBe(text);
    },
  );

  it('grows the used range that the sheet states', () => {
    const { bytes } = give(
      withList('<dimension ref="B2:B2"/><sheetData><row r="2"><c r="B2"><v>1</v></c></row></sheetData>'),
      edit('D9', 1),
    );
    expect(sheetXml(bytes)).toContain('<dimension ref="B2:D9"/>');
  });
});
