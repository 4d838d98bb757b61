import fc from 'fast-check';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { ErrorValue } from '@/lib/schedule/sheet';
import { UnreadableFile } from '@/parsers/errors';
import { FieldCursor, readCsv, readDialect } from '@/parsers/csv';
import { readSheets } from '@/parsers/read-sheets';

const bytesOf = (text: string, encoding: BufferEncoding = 'utf8') =>
  new Uint8Array(Buffer.from(text, encoding));
const rowsOf = (bytes: Uint8Array) => readCsv(bytes).rows.map(({ number, cells }) => [number, ...cells]);
const read = (text: string) => rowsOf(bytesOf(text));
const codeOf = (bytes: Uint8Array, name = 'list.csv'): string => {
  try {
    readSheets(bytes, name);
  } catch (error) {
    if (error instanceof UnreadableFile) return error.code;
    throw error;
  }
  return 'read';
};

describe('records and fields', () => {
  it('numbers rows as a spreadsheet shows them, blank lines and quoted line breaks included', () => {
    expect(read('ID,m\n\nA,"two\r\nlines"\n,,\nB,3\n\n')).toEqual([
      [1, 'ID', 'm'],
      [3, 'A', 'two\nlines'],
      [5, 'B', '3'],
    ]);
  });

  it('takes every kind of line end, mixed too', () => {
    expect(read('A,1\r\nB,2\nC,"3"\rD,4')).toEqual([
      [1, 'A', '1'],
      [2, 'B', '2'],
      [3, 'C', '3'],
      [4, 'D', '4'],
    ]);
  });

  it('keeps ragged records as they are', () => {
    expect(read('a,b,c\nA\nB,1,2,3,4\n')).toEqual([
      [1, 'a', 'b', 'c'],
      [2, 'A'],
      [3, 'B', '1', '2', '3', '4'],
    ]);
  });

  it('resolves quotation marks, and takes stray ones as a spreadsheet does', () => {
    expect(read('"a ""b""",12" pipe,"Main" hall,"x" ,""\n')).toEqual([
      [1, 'a "b"', '12" pipe', 'Main hall', 'x'],
    ]);
  });

  it('takes ="007" as the text it protects', () => {
    expect(read('="007",b\n')).toEqual([[1, '007', 'b']]);
  });

  it('tells error values from texts', () => {
    const [row] = readCsv(bytesOf('#REF!,#N/A,#DIV/0!,# 4,#N/A!\n')).rows;
    expect(row?.cells.map((value) => (value instanceof ErrorValue ? value.code : value))).toEqual([
      '#REF!',
      '#N/A',
      '#DIV/0!',
      '# 4',
      '#N/A!',
    ]);
    expect(row?.cells.filter((value) => value instanceof ErrorValue)).toHaveLength(3);
  });

  it('refuses a quotation mark that never closes', () => {
    expect(() => read('a,b\nA,"1\nB,2\n')).toThrow(/record 2/);
  });
});

describe('delimiters', () => {
  it('are told from the text', () => {
    for (const delimiter of [',', ';', '\t', '|']) {
      const text = ['Bay bridge', '', 'ID|Name|a|m|b|After', 'A|Pile|1|2|3|', 'B|Cap|2|3|4|A']
        .join('\n')
        .replaceAll('|', delimiter);
      expect(readDialect(bytesOf(text)).dialect.delimiter).toBe(delimiter);
      expect(read(text)[1]).toEqual([3, 'ID', 'Name', 'a', 'm', 'b', 'After']);
    }
  });

  it('are not mistaken for what stands in the cells', () => {
    const delimiterOf = (text: string) => readDialect(bytesOf(text)).dialect.delimiter;
    expect(delimiterOf('ID;Name;a;m;b;After\nA;Pile, north;1,5;2,5;4,5;\nB;Cap;2,5;3,5;4,5;A\n')).toBe(';');
    expect(delimiterOf('ID,Name,m,After\nA,Pile,1,\nB,Cap,2,"A;A;A"\nC,Deck,2,"A;B"\n')).toBe(',');
    expect(delimiterOf('ID\tName\tAfter\nA\tPile, drive, north\t\nB\tCap, cast\tA,A\n')).toBe('\t');
    expect(delimiterOf('one\ntwo\n')).toBe(',');
  });

  it('are as a sep= line says, which is no row', () => {
    const bytes = bytesOf('sep=;\r\nA,1;B\r\n');
    expect(rowsOf(bytes)).toEqual([[1, 'A,1', 'B']]);
    expect(readDialect(bytes).dialect).toMatchObject({
      preamble: 'sep=;\r\n',
      delimiter: ';',
      newline: '\r\n',
    });
  });
});

describe('encodings', () => {
  const text = 'ID,Name\nA,Caf\u00e9 \u2013 M\u00fcller\u2019s\n';
  const expected = [
    [1, 'ID', 'Name'],
    [2, 'A', 'Caf\u00e9 \u2013 M\u00fcller\u2019s'],
  ];
  const swapped = (bytes: Uint8Array) => bytes.slice().map((_, i) => bytes[i ^ 1] ?? 0);

  it('are told by their mark or their bytes', () => {
    const wide = bytesOf(text, 'utf16le');
    const windows = bytesOf(text.replace('\u2013', '\u0096').replace('\u2019', '\u0092'), 'latin1');
    for (const [bytes, encoding, mark] of [
      [bytesOf(text), 'utf-8', false],
      [bytesOf(`\ufeff${text}`), 'utf-8', true],
      [bytesOf(`\ufeff${text}`, 'utf16le'), 'utf-16le', true],
      [swapped(bytesOf(`\ufeff${text}`, 'utf16le')), 'utf-16be', true],
      [wide, 'utf-16le', false],
      [swapped(wide), 'utf-16be', false],
      [windows, 'windows-1252', false],
    ] as const) {
      expect(rowsOf(bytes)).toEqual(expected);
      expect(readDialect(bytes).dialect).toMatchObject({ encoding, mark });
    }
  });
});

describe('what is no text', () => {
  it('is refused, whatever it is called', () => {
    expect(codeOf(new Uint8Array())).toBe('empty');
    expect(codeOf(bytesOf(' \r\n\t'))).toBe('empty');
    expect(codeOf(bytesOf('\ufeff'))).toBe('empty');
    expect(codeOf(bytesOf('%PDF-1.7 x'))).toBe('not-a-spreadsheet');
    expect(codeOf(bytesOf('<!DOCTYPE html><table><tr><td>ID</td></tr></table>'))).toBe('not-a-spreadsheet');
    expect(codeOf(bytesOf('<?xml version="1.0"?><Workbook/>'))).toBe('not-a-spreadsheet');
    expect(codeOf(new Uint8Array([0x89, 0x50, 0x4e, 0x47, 13, 10, 26, 10, 0, 0, 0, 13]))).toBe(
      'not-a-spreadsheet',
    );
    expect(
      codeOf(
        Uint8Array.from({ length: 999 }, (_, i) => (i * 7919) % 251),
        'a.xlsx',
      ),
    ).toBe('not-a-spreadsheet');
    expect(codeOf(new Uint8Array(20 * 1024 * 1024 + 1).fill(65))).toBe('too-large');
  });

  it('tells old and encrypted workbooks', () => {
    const compound = (stream: string) => {
      const bytes = new Uint8Array(2048);
      bytes.set([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1]);
      bytes.set(bytesOf(`${stream}\0`, 'utf16le'), 1024 + 128);
      return bytes;
    };
    expect(codeOf(compound('EncryptedPackage'), 'a.xlsx')).toBe('encrypted');
    expect(codeOf(compound('Workbook'), 'a.xls')).toBe('old-format');
    expect(codeOf(compound('WordDocument'), 'a.doc')).toBe('not-a-spreadsheet');
    expect(codeOf(new Uint8Array([9, 4, 6, 0, 0, 0, 16, 0]), 'a.xls')).toBe('old-format');
  });

  it('is taken for text under any name where it is text', () => {
    for (const name of ['list.txt', 'list.tsv', 'list.xlsx', 'list'])
      expect(codeOf(bytesOf('ID,m\nA,1\n'), name)).toBe('read');
  });

  it('has limits', () => {
    expect(codeOf(bytesOf('A\n'.repeat(201_001)))).toBe('too-many-rows');
    expect(codeOf(bytesOf(`${','.repeat(16_384)}A`))).toBe('damaged');
    expect(codeOf(bytesOf(`A,"${'x\n'.repeat(20_000)}"`))).toBe('damaged');
    expect(codeOf(bytesOf(`${'\n'.repeat(1_000_000)}A`))).toBe('read');
  });
});

describe('papaparse as the second reader', () => {
  const field = fc.string({ unit: fc.constantFrom('a', 'B', '7', ' ', '"', ',', ';', '\n', '\u00e9') });

  it('agrees on whatever papaparse writes', () => {
    fc.assert(
      fc.property(
        fc.array(fc.array(field, { minLength: 2, maxLength: 5 }), { minLength: 1, maxLength: 8 }),
        fc.constantFrom(',', ';', '\t', '|'),
        fc.constantFrom('\r\n', '\n'),
        (records, delimiter, newline) => {
          const text = Papa.unparse(records, { delimiter, newline });
          const cursor = new FieldCursor(text, delimiter);
          const ours: string[][] = [[]];
          while (cursor.next()) {
            ours.at(-1)?.push(cursor.value);
            if (cursor.last) ours.push([]);
          }
          expect(ours.slice(0, -1)).toEqual(records);
        },
      ),
      { numRuns: 500 },
    );
  });
});
