import { strToU8, unzipSync, zipSync } from 'fflate';
import { beforeAll, describe, expect, it } from 'vitest';
import {
  detectMatching,
  matchingFrom,
  readActivityList,
  readSheets,
  UnmatchedColumns,
  UnreadableFile,
} from '@/parsers';
import { randomFrom, syntheticList, toCsv, toXlsx } from '../support/lists';
import { handMade, MAIN } from '../support/xlsx';

type Random = (below: number) => number;
const SNIPPETS = [
  '<',
  '>',
  '&',
  '"',
  '<!--',
  '-->',
  '<![CDATA[',
  ']]>',
  '<?x?>',
  '</c>',
  '<c r="',
  '<row>',
  '</row>',
  '<v>',
  '&#0;',
  '&lt;',
  'r="ZZZ9"',
  't="s"',
  ' s="999999"',
  '<f>A1</f>',
  'si="0"',
  '1e999',
  '-',
  '\u0000',
  'xmlns="urn:x"',
  '<!DOCTYPE a [<!ENTITY b "c">]>',
];

/** Reads a file to the end; how it ended. */
function outcome(bytes: Uint8Array, name: string): 'read' | 'refused' {
  try {
    const sheets = readSheets(bytes, name);
    detectMatching(sheets, { sheet: ['Works', 'Activities'], columns: { id: 0, likely: 3 }, headerRow: 1 });
    const list = readActivityList(sheets, matchingFrom({}, sheets));
    const { read, ...kinds } = list.rows;
    expect(Object.values(kinds).reduce((sum, count) => sum + count, 0)).toBe(read);
    return 'read';
  } catch (error) {
    if (error instanceof UnreadableFile || error instanceof UnmatchedColumns) {
      expect(error.message).toMatch(/^[A-Z\u201c].*\.$/s);
      return 'refused';
    }
    throw error;
  }
}

const flipped = (bytes: Uint8Array, random: Random) => {
  const changed = bytes.slice();
  for (let i = 0; i <= random(6); i++) changed[random(changed.length)] = random(256);
  return changed;
};
const cut = (bytes: Uint8Array, random: Random) => {
  const start = random(bytes.length);
  const end = start + random(bytes.length - start);
  return random(2) === 0
    ? bytes.subarray(0, start)
    : new Uint8Array([...bytes.subarray(0, start), ...bytes.subarray(end)]);
};
const spliced = (bytes: Uint8Array, random: Random) => {
  const text = new TextDecoder().decode(bytes);
  const at = random(text.length);
  const dropped = random(3) === 0 ? random(40) : 0;
  const put =
    random(4) === 0
      ? text.slice(random(text.length)).slice(0, random(80))
      : (SNIPPETS[random(SNIPPETS.length)] ?? '');
  return strToU8(text.slice(0, at) + put + text.slice(at + dropped));
};
const repacked = (bytes: Uint8Array, random: Random) => {
  const parts: Record<string, Uint8Array> = unzipSync(bytes);
  const names = Object.keys(parts);
  const name = names[random(names.length)] ?? '';
  const part = parts[name] ?? new Uint8Array();
  const kind = random(5);
  if (kind === 0) delete parts[name];
  else if (kind === 1) parts[name.toUpperCase()] = part;
  else if (kind === 2) parts[`../../${name}`] = part;
  else if (part.length > 0) parts[name] = spliced(part, random);
  return zipSync(parts, { level: 1 });
};

const HAND = handMade({
  sheets: [
    {
      name: 'Works',
      rows: `<worksheet xmlns="${MAIN}"><cols><col min="9" max="9" hidden="1"/></cols><sheetData><row r="1"><c t="s"><v>0</v></c><c t="s"><v>1</v></c><c t="s"><v>2</v></c></row><row r="2" outlineLevel="1"><c r="A2" t="inlineStr"><is><r><t>A</t></r></is></c><c r="B2" s="1"><f t="shared" si="0" ref="B2:B3">1+1</f><v>2</v></c></row><row r="3"><c r="A3" t="str"><v>B</v></c><c r="B3"><f t="shared" si="0"/></c><c r="C3" t="str"><v>A SS+1</v></c></row></sheetData><mergeCells><mergeCell ref="D1:E1"/></mergeCells></worksheet>`,
    },
  ],
  strings:
    '<si><t>ID</t></si><si><t>Duration</t></si><si><r><t>Pre</t></r><r><t>ds</t></r><rPh sb="0" eb="1"><t>x</t></rPh></si>',
  styles:
    '<numFmts count="1"><numFmt numFmtId="164" formatCode="0&quot; d&quot;"/></numFmts><cellXfs><xf numFmtId="0"/><xf numFmtId="164"/></cellXfs>',
});

describe('a file that came to harm is read or refused, and never crashes', () => {
  let written: Uint8Array;
  const csv = strToU8(toCsv(syntheticList(40, 3)));
  const limitMs = 4000;

  beforeAll(async () => {
    written = await toXlsx(syntheticList(40, 3));
  });

  it('unharmed they are read', () => {
    expect([written, HAND].map((bytes) => outcome(bytes, 'a.xlsx'))).toEqual(['read', 'read']);
    expect(outcome(csv, 'a.csv')).toBe('read');
  });

  const run = (count: number, seed: number, mutate: (random: Random, i: number) => [Uint8Array, string]) => {
    const source = randomFrom(seed);
    const random: Random = (below) => Math.floor(source() * Math.max(1, below));
    const ends = { read: 0, refused: 0 };
    for (let i = 0; i < count; i++) {
      const [bytes, name] = mutate(random, i);
      const start = performance.now();
      ends[outcome(bytes, name)]++;
      expect(performance.now() - start).toBeLessThan(limitMs);
    }
    return ends;
  };

  it('with bytes changed or cut out', () => {
    const ends = run(400, 11, (random, i) => {
      const bytes = i % 2 === 0 ? written : HAND;
      return [i % 3 === 0 ? cut(bytes, random) : flipped(bytes, random), 'a.xlsx'];
    });
    expect(ends.refused).toBeGreaterThan(100);
  });

  it('with parts broken, dropped, doubled or misnamed', () => {
    const ends = run(500, 12, (random, i) => [repacked(i % 2 === 0 ? written : HAND, random), 'a.xlsx']);
    expect(ends.refused).toBeGreaterThan(100);
    expect(ends.read).toBeGreaterThan(50);
  });

  it('as text', () => {
    const ends = run(400, 13, (random, i) => [[spliced, cut, flipped][i % 3]?.(csv, random) ?? csv, 'a.csv']);
    expect(ends.read).toBeGreaterThan(100);
  });

  it('and bytes that mean nothing are refused', () => {
    const ends = run(200, 14, (random, i) => {
      const noise = Uint8Array.from({ length: random(400) }, () => random(256));
      return [i % 2 === 0 ? noise : new Uint8Array([0x50, 0x4b, 3, 4, ...noise]), 'a.xlsx'];
    });
    expect(ends.read).toBe(0);
  });
});
