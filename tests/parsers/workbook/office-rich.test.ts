import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { readSheets } from '@/parsers';
import { giveBack } from '@/parsers/workbook';
import { compareParts, malformedParts, partsOf } from './packages';

const bytes = new Uint8Array(readFileSync('fixtures/uploads/workbooks/office-rich.xlsx'));
const edits = [
  { sheet: 'Works', cell: 'C7', from: 6, to: 5 },
  { sheet: 'Works', cell: 'D7', from: 5, to: 6 },
  { sheet: 'Works', cell: 'F8', from: 'L3, L99', to: 'L3' },
];
const changes = [
  {
    ...{ sheet: 'Works', cell: 'C7', activity: 'L4', from: 6, to: 5, rule: 'likely-below-optimistic' },
    ...{ reason: 'The two were exchanged.', by: 'I. Okafor', at: '2027-03-12T09:30:00Z' },
  },
];
const given = giveBack({ bytes, fileName: 'north-mole.xlsx', corrections: edits, changes });
const before = partsOf(bytes);
const after = partsOf(given.bytes);
const of = (name: string) => after.get(name)?.content ?? '';

describe('a workbook with a chart, a picture, a pivot table, a table, notes, validation and protection', () => {
  it('comes back with every correction', () => {
    expect(given.check.sentence).toBe('3 of 3 corrections found in the file.');
    expect(given.fileName).toBe('north-mole (corrected).xlsx');
  });

  it('keeps every part that has nothing to do with them, byte for byte', () => {
    const { changed, added, gone } = compareParts(bytes, given.bytes);
    expect(gone).toEqual([]);
    expect(added).toEqual(['xl/worksheets/sheet4.xml']);
    // Sheet 3 reads the corrected cells by formula.
    expect([...changed].sort()).toEqual([
      '[Content_Types].xml',
      'xl/_rels/workbook.xml.rels',
      'xl/comments1.xml',
      'xl/drawings/vmlDrawing1.vml',
      'xl/styles.xml',
      'xl/workbook.xml',
      'xl/worksheets/sheet1.xml',
      'xl/worksheets/sheet3.xml',
    ]);
    expect([...after.keys()].slice(0, before.size)).toEqual([...before.keys()]);
  });

  it('changes nothing of the sheet but the cells and the results that depend on them', () => {
    const cell = /<c r="(\w+)"[^>]*?(?:\/>|>.*?<\/c>)/g;
    const cellsOf = (xml: string) =>
      new Map([...xml.matchAll(cell)].map(([whole, address]) => [address, whole]));
    const [old, now] = [
      cellsOf(before.get('xl/worksheets/sheet1.xml')?.content ?? ''),
      cellsOf(of('xl/worksheets/sheet1.xml')),
    ];
    const different = [...now]
      .filter(([address, whole]) => old.get(address) !== whole)
      .map(([address]) => address);
    expect(different).toEqual(['C7', 'D7', 'G7', 'F8', 'G14']);
    const without = (xml: string) => xml.replace(cell, '');
    expect(without(of('xl/worksheets/sheet1.xml'))).toBe(
      without(before.get('xl/worksheets/sheet1.xml')?.content ?? ''),
    );
  });

  it('adds to the styles and to the notes, and changes none that were there', () => {
    const xfs = (xml: string) =>
      [...(/<cellXfs.*<\/cellXfs>/s.exec(xml)?.[0].matchAll(/<xf .*?<\/xf>/gs) ?? [])].map(([xf]) => xf);
    const [old, now] = [xfs(before.get('xl/styles.xml')?.content ?? ''), xfs(of('xl/styles.xml'))];
    expect(now.slice(0, old.length)).toEqual(old);
    expect(of('xl/comments1.xml')).toContain('After dark only.');
    expect(of('xl/comments1.xml')).toMatch(/Agreed with the ring.*Corrected: was “5”, is now “6”\./s);
    expect(of('xl/comments1.xml')).toMatch(
      /The two were exchanged\. Rule: likely-below-optimistic\. \(I\. Okafor, 12 Mar 2027, 09:30 UTC\)/,
    );
    expect(of('xl/drawings/vmlDrawing1.vml').match(/<x:Row>/g)).toHaveLength(4);
  });

  it('is well-formed in every part', () => {
    expect(malformedParts(given.bytes)).toEqual([]);
  });

  it('lists the changes on a sheet of its own, linked to the cells', () => {
    const sheets = readSheets(given.bytes, 'x.xlsx');
    expect(sheets.map((sheet) => sheet.name)).toEqual(['Works', 'Pivot', "Yard's days", 'Corrected cells']);
    expect(sheets[3]?.rows.map((row) => row.cells.slice(0, 6))).toEqual([
      ['Sheet', 'Cell', 'Activity', 'Was', 'Is now', 'Rule'],
      ['Works', 'C7', 'L4', 6, 5, 'likely-below-optimistic'],
      ['Works', 'D7', null, 5, 6, 'edit by hand'],
      ['Works', 'F8', null, 'L3, L99', 'L3', 'edit by hand'],
    ]);
    expect(of('xl/worksheets/sheet4.xml')).toContain(`location="'Works'!C7"`);
  });

  it('keeps the headings of a table the same in its cells and in its part', () => {
    const heading = { sheet: 'Works', cell: 'F3', from: 'After', to: 'Waits for' };
    const renamed = giveBack({ bytes, fileName: 'x.xlsx', corrections: [heading], changes: [] });
    const table = partsOf(renamed.bytes).get('xl/tables/table1.xml')?.content;
    expect(table).toContain('name="Waits for"');
    expect(table?.replace('Waits for', 'After')).toBe(before.get('xl/tables/table1.xml')?.content);
  });

  it('can be corrected again', () => {
    const again = giveBack({
      bytes: given.bytes,
      fileName: 'north-mole.xlsx',
      corrections: [{ sheet: 'Works', cell: 'C7', from: 5, to: 4 }],
      changes: [],
    });
    expect(again.check.found).toBe(1);
    const names = readSheets(again.bytes, 'x.xlsx').map((sheet) => sheet.name);
    expect(names.slice(3)).toEqual(['Corrected cells', 'Corrected cells (2)']);
    expect(partsOf(again.bytes).get('xl/comments1.xml')?.content).toMatch(
      /“6”, is now “5”.*“5”, is now “4”/s,
    );
  });
});
