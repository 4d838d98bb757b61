import { describe, expect, it } from 'vitest';
import type { CellContent } from '@/lib/schedule/sheet';
import { readSheets } from '@/parsers';
import { changesCsv, giveBack } from '@/parsers/workbook';

const edit = (cell: string, to: CellContent) => ({ sheet: 'CSV', cell, from: null, to });
const give = (bytes: Uint8Array, ...corrections: ReturnType<typeof edit>[]) =>
  giveBack({ bytes, fileName: 'list.csv', corrections, changes: [] });
const utf8 = (text: string) => new Uint8Array(Buffer.from(text, 'utf8'));
const after = (text: string, ...corrections: ReturnType<typeof edit>[]) => {
  const { bytes, check } = give(utf8(text), ...corrections);
  expect(check.found).toBe(corrections.length);
  return Buffer.from(bytes).toString('utf8');
};

describe('a CSV with cells corrected', () => {
  it('changes only the bytes of the corrected fields', () => {
    expect(after('id, name ,m\r\nA,"x, y" ,4\r\n\r\nB, z,5', edit('C2', 6), edit('A4', 'B1'))).toBe(
      'id, name ,m\r\nA,"x, y" ,6\r\n\r\nB1, z,5',
    );
  });

  it.each([
    ['id;m;after\nA;1,5;\nB;2,5;A\n', edit('B3', 3.25), 'id;m;after\nA;1,5;\nB;3,25;A\n'],
    ['id\tm\rA\t1\r', edit('B2', 2), 'id\tm\rA\t2\r'],
    ['id|m\nA|1', edit('B2', 'x|y'), 'id|m\nA|"x|y"'],
    ['sep=;\r\nid;m\r\nA;1\r\n', edit('B2', 2), 'sep=;\r\nid;m\r\nA;2\r\n'],
    ['"id","m"\n"A","1"\n', edit('B2', 2), '"id","m"\n"A","2"\n'],
    ['"id","m"\n"A",\n', edit('B2', 2), '"id","m"\n"A","2"\n'],
    ['id,m,n\nA,"1",x\n', edit('B2', 'say "so"'), 'id,m,n\nA,"say ""so""",x\n'],
    ['id,m\nA,one\n', edit('B2', 'two\nlines'), 'id,m\nA,"two\nlines"\n'],
    ['id,m\nA,one\n', edit('B2', null), 'id,m\nA,\n'],
    ['id,m\nA,"one"\n', edit('B2', null), 'id,m\nA,""\n'],
    ['id,m\n="007",1\n', edit('A2', '008'), 'id,m\n="008",1\n'],
    ['id,m\n"=""007""",1\n', edit('A2', '008'), 'id,m\n"=""008""",1\n'],
    ['id,m\nA,"two\r\nlines"\nB,2\n', edit('B3', 3), 'id,m\nA,"two\r\nlines"\nB,3\n'],
  ])('%j with %j is %j', (text, correction, expected) => {
    expect(after(text, correction)).toBe(expected);
  });

  it('adds fields to a short record, and records below the last', () => {
    expect(after('id,m,after\nA\nB,2\n', edit('C2', 'Z'), edit('D3', 'w'), edit('B6', 5))).toBe(
      'id,m,after\nA,,Z\nB,2,,w\n\n\n,5\n',
    );
    expect(after('id,m\r\nA,1', edit('A3', 'B'))).toBe('id,m\r\nA,1\r\nB');
    expect(after('id,m\n\nB,2\n', edit('A2', 'A'), edit('C2', 'c'))).toBe('id,m\nA,,c\nB,2\n');
    expect(after('"id","m"\n"A"\n', edit('B2', 1))).toBe('"id","m"\n"A","1"\n');
  });

  it.each([
    [
      'UTF-8 with a mark',
      Buffer.from('\ufeffid,n\r\nÄ,é\r\n', 'utf8'),
      Buffer.from('\ufeffid,n\r\nÄ,ž\r\n', 'utf8'),
    ],
    [
      'UTF-16, little end first',
      Buffer.from('\ufeffid,n\r\nÄ,é\r\n', 'utf16le'),
      Buffer.from('\ufeffid,n\r\nÄ,ž\r\n', 'utf16le'),
    ],
    [
      'UTF-16, big end first',
      Buffer.from('\ufeffid,n\r\nÄ,é\r\n', 'utf16le').swap16(),
      Buffer.from('\ufeffid,n\r\nÄ,ž\r\n', 'utf16le').swap16(),
    ],
    [
      'Windows-1252',
      Buffer.from('id,n\r\n\xc4,\xe9\x96\r\n', 'latin1'),
      Buffer.from('id,n\r\n\xc4,\x9e\r\n', 'latin1'),
    ],
  ])('keeps its encoding: %s', (_, before, expected) => {
    const { bytes, check } = give(new Uint8Array(before), edit('B2', 'ž'));
    expect(check.found).toBe(1);
    expect(Buffer.from(bytes).equals(expected)).toBe(true);
  });

  it('says which character an encoding lacks, and writes the rest', () => {
    const before = Buffer.from('id,n\r\n\xc4,\xe9\r\n', 'latin1');
    const { bytes, check, contentType } = give(new Uint8Array(before), edit('B2', 'Łódź'), edit('A2', 'Ö'));
    expect(Buffer.from(bytes).toString('latin1')).toBe('id,n\r\n\xd6,\xe9\r\n');
    expect(check.sentence).toBe('1 of 2 corrections found in the file.');
    expect(check.missing).toEqual([
      {
        sheet: 'CSV',
        cell: 'B2',
        reason: "B2 has a character that the file's encoding (windows-1252) lacks.",
      },
    ]);
    expect(contentType).toBe('text/csv; charset=windows-1252');
  });

  it('keeps bytes that are no text in its encoding', () => {
    const rows = 'C,3\n'.repeat(3000);
    const before = Buffer.from(`\xef\xbb\xbfid,n\nA,\xffx\nB,2\n${rows}\x1a`, 'latin1');
    const { bytes } = give(new Uint8Array(before), edit('B3', 4));
    const expected = Buffer.from(before.toString('latin1').replace('B,2', 'B,4'), 'latin1');
    expect(Buffer.from(bytes).equals(expected)).toBe(true);
  });
});

describe('formula injection', () => {
  it.each(['=1+1', '+1', '-1+2', '@x', '\tx', '-5A'])(
    '%j is written so that it stays text, and read back',
    (text) => {
      const { bytes, check } = give(utf8('id,m\nA,x\n'), edit('B2', text));
      expect(check.found).toBe(1);
      expect(Buffer.from(bytes).toString()).toBe(`id,m\nA,'${text}\n`);
      expect(readSheets(bytes, 'x.csv')[0]?.rows[1]?.cells[1]).toBe(text);
    },
  );

  it.each(['-5', '-5.25', '-1,234.5'])('%j stays the number that it is', (text) => {
    expect(after('id;m\nA;x\n', edit('B2', text))).toBe(`id;m\nA;${text}\n`);
  });

  it('keeps an apostrophe that a text has itself', () => {
    const { bytes } = give(utf8('id,m\nA,x\n'), edit('B2', "'=x"));
    expect(readSheets(bytes, 'x.csv')[0]?.rows[1]?.cells[1]).toBe("'=x");
  });

  it('copies what the file holds as it is', () => {
    expect(after('id,after\n-5A,\nB,x\n', edit('B3', '-5A'))).toBe('id,after\n-5A,\nB,-5A\n');
  });

  it('guards the list of changes', () => {
    const change = {
      sheet: 'CSV',
      cell: 'B2',
      activity: '@A',
      from: '=x',
      to: -5,
      rule: '',
      reason: 'a, "b"',
      by: '',
      at: '',
    };
    expect(Buffer.from(changesCsv([change])).toString()).toBe(
      `\ufeffSheet,Cell,Activity,Was,Is now,Rule,Why,By,When\r\nCSV,B2,'@A,'=x,-5,edit by hand,"a, ""b""",,\r\n`,
    );
  });
});
