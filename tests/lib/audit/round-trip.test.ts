import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Finding, runAudit } from '@/lib/audit';
import { composeAdoption, contentAt } from '@/lib/corrections';
import type { ReadingOptions } from '@/lib/schedule/activity-list';
import type { Sheet } from '@/lib/schedule/sheet';
import { detectMatching, readActivityList, readSheets } from '@/parsers';
import { drawn } from '@/tests/support/sheets';
import { slippedList } from './clean-lists';

/** Reads and audits, adopts every proposed fix at once, and reads and audits what comes of it. */
function roundTrip(received: readonly Sheet[], options?: ReadingOptions) {
  const { matching } = detectMatching(received);
  const audit = (sheets: readonly Sheet[]) => runAudit(readActivityList(sheets, matching, options));
  const before = audit(received);
  const fixes = before.flatMap(({ key, fix }) => (fix ? [{ id: key, edits: fix.edits }] : []));
  const { sheets, skipped } = composeAdoption(received, fixes);
  return { before, after: audit(sheets), sheets, skipped };
}

const keysOf = (findings: readonly Finding[]) => findings.map(({ key }) => key);
const csv = (text: string) => readSheets(new Uint8Array(Buffer.from(text)), 'list.csv');
const HEAD = 'ID|Activity|Optimistic|Most likely|Pessimistic|Predecessors';

describe('a list that is read, audited, corrected and read again', () => {
  it('has none of the findings whose fixes were adopted', () => {
    const received = [
      drawn(`${HEAD}
        T-01|Set out|1|2|3|
        T-02|Dig|6|4|11|T-01
        T-03|Pour|4|60|9|t-02
        |Cure|1|2|3|T-03
        T-05|Strike|-1|2|4|T-04; T-05
        T-06|Backfill|2|3|4|T-05; T-05 FS+1
        T-06|Drain|2|3|5|T-O6
        T-07|Pave|2|3|4|T-06; T-08
        T-08|Hand over|2|3|4|T-07`),
    ];
    const { before, after } = roundTrip(received, { unit: 'day', hoursPerDay: 8, daysPerWeek: 5 });
    const fixed = new Set(before.filter(({ fix }) => fix).map(({ key }) => key));
    expect(before.map(({ rule }) => rule)).toEqual(
      expect.arrayContaining([
        'missing-id',
        'repeated-id',
        'self-link',
        'loop',
        'unknown-predecessor',
        'repeated-link',
      ]),
    );
    expect(keysOf(after).filter((key) => fixed.has(key))).toEqual([]);
    expect(after.filter(({ weight }) => weight !== 'query')).toEqual([]);
  });

  it('keeps units, decimal commas and separators as the contractor writes them', () => {
    const received = csv(
      [
        'Task no.;Name;a;m;b;Depends on',
        '7;Survey;8 h;1,5 d;1 wk;',
        '8;Piling;2,5 d;1,5 d;4 d;07 SS+2 d',
        '9;Capping;3 d;4 d;5,5 d;7 & 8 FS+1',
        '9;Deck;16 h;3 d;4 d;9',
        '11;Handover;2 d;3 d;-4 d;9, 9 SS',
      ].join('\r\n'),
    );
    const { before, sheets, after } = roundTrip(received);
    const at = (cell: string) => contentAt(sheets, sheets[0]?.name ?? '', cell);
    expect([at('C3'), at('D3')]).toEqual(['1,5 d', '2,5 d']);
    expect(at('F3')).toBe('7 SS+2 d');
    expect(String(at('A5'))).toBe('10');
    expect(at('E6')).toBe('4 d');
    const fixed = new Set(before.filter(({ fix }) => fix).map(({ key }) => key));
    expect(keysOf(after).filter((key) => fixed.has(key))).toEqual([]);
  });

  it('links open ends in the column the list has for links', () => {
    const { before, after, sheets } = roundTrip([
      drawn('ID|Duration (days)|Followed by\nA|2|C\nB|3|C\nC|1|\nD|4|'),
    ]);
    const expected = ['no-spread|list', 'open-finish|C', 'open-start|B', 'open-start|D'];
    expect(keysOf(before).toSorted()).toEqual(expected);
    expect(keysOf(after)).toEqual(['no-spread|list']);
    expect(contentAt(sheets, 'Works', 'C2')).toBe('C, B, D');
  });

  it('empties relation and lag with the last entry, and spells them out where some stay', () => {
    const { before, after, sheets } = roundTrip([
      drawn(`ID|a|m|b|Predecessors|Relation|Lag
        A|1|2|3|||
        B|1|2|3|B|SS|2
        C|1|2|4|A, C, B|SS, FS, FF|1
        D|1|2|5|C, B|FS|`),
    ]);
    expect(before.filter(({ rule }) => rule === 'self-link')).toHaveLength(2);
    expect(keysOf(after).filter((key) => /self-link|unreadable|refused/.test(key))).toEqual([]);
    expect(contentAt(sheets, 'Works', 'F3')).toBeNull();
    expect(contentAt(sheets, 'Works', 'G3')).toBeNull();
    expect(contentAt(sheets, 'Works', 'E4')).toBe('A SS+1d, B FF+1d');
  });

  it('cuts a loop at both of its ends where the list says each link twice', () => {
    const { before, after } = roundTrip([
      drawn(`ID|a|m|b|Predecessors|Successors
        A|1|2|3|C|B
        B|1|2|3|A|C
        C|1|2|4|B|A, D
        D|1|2|5|C|`),
    ]);
    expect(keysOf(before)).toContain('loop|A B C');
    expect(keysOf(after).filter((key) => key.startsWith('loop'))).toEqual([]);
  });

  it('keeps numbers numbers, whatever their format shows', () => {
    const { before, after, sheets } = roundTrip([
      drawn(`No.|a|m|b|After
        10|1|2|3|
        20|1|2|3|10
        20|1|2|4|11
        40|1|2|5|30`),
    ]);
    expect(before.map(({ rule }) => rule)).toEqual(
      expect.arrayContaining(['repeated-id', 'unknown-predecessor']),
    );
    expect(contentAt(sheets, 'Works', 'A4')).toBe(30);
    expect(contentAt(sheets, 'Works', 'E4')).toBe(10);
    expect(after.filter(({ weight }) => weight !== 'query')).toEqual([]);
  });

  it('takes an ID with a blank in it for the one it is meant to be', () => {
    const { before, sheets, after } = roundTrip([
      drawn('ID|a|m|b|After\nA1|1|2|3|\nA2|1|2|4|A1\nA3|1|2|5|A 2 SS+1'),
    ]);
    expect(keysOf(before)).toContain('unknown-predecessor|A3|A 2');
    expect(contentAt(sheets, 'Works', 'E4')).toBe('A2 SS+1');
    expect(after.filter(({ weight }) => weight !== 'query')).toEqual([]);
  });

  it('ends without a defect that blocks, whatever was wrong with it', () => {
    fc.assert(
      fc.property(slippedList, (rows) => {
        const lines = rows.map(({ id, name, numbers, before }) =>
          [id === '_' ? '' : id, name, ...numbers, before.join('; ')].join('|'),
        );
        let sheets: readonly Sheet[] = [drawn([HEAD, ...lines].join('\n'))];
        let findings: readonly Finding[] = [];
        for (let round = 0; round < 6; round++) {
          const { before, sheets: next, after } = roundTrip(sheets);
          expect(
            before.every(
              ({ fix }) =>
                fix?.edits.every(({ from, cell, sheet }) => contentAt(sheets, sheet, cell) === from) ?? true,
            ),
          ).toBe(true);
          [sheets, findings] = [next, after];
        }
        expect(findings.filter(({ weight }) => weight === 'blocks')).toEqual([]);
        expect(findings.filter(({ fix }) => fix)).toEqual([]);
      }),
      { numRuns: 60 },
    );
  });
});
