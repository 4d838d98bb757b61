import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, writes } from '../helpers';

const only = (...rows: string[]) => found('unknown-predecessor', list(...rows))[0]!;

describe('unknown-predecessor', () => {
  it('proposes the nearest ID, and offers the removal beside it', () => {
    const received = list('A 1 2 3', 'Z6 1 2 3 <- A', 'B 1 2 3 <- A, Z9 SS+2');
    const [finding] = found('unknown-predecessor', received);
    expect(finding).toMatchObject({
      weight: 'distorts',
      activityId: 'B',
      cell: 'F4',
      key: 'unknown-predecessor|B|Z9',
    });
    expect(sentence(finding!)).toBe('B waits for Z9, and there is no Z9 in this list. Z6 is the nearest.');
    expect(writes(finding!.fix)).toEqual([['F4', 'A, Z9 SS+2', 'A, Z6 SS+2']]);
    expect(finding!.fix?.edits[0]?.items).toEqual([{ op: 'replace', item: 'Z9 SS+2', with: 'Z6 SS+2' }]);
    expect(finding!.fix?.changes).toEqual([
      { kind: 'remove-link', link: 2 },
      { kind: 'add-link', from: 1, to: 2, type: 'SS', lag: 2 },
    ]);
    expect(finding!.alternatives?.map(writes)).toEqual([[['F4', 'A, Z9 SS+2', 'A']]]);
    expect(keys(received)).toEqual([finding!.key]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it.each([
    ['case', 'PIER-3', 'pier-3'],
    ['leading zeros', 'T-012', 'T-12'],
    ['zeros left out', 'T-12', 'T-0012'],
    ['O for 0', 'D-205', 'D-2O5'],
    ['l for 1', 'K1', 'Kl'],
    ['I for 1', 'K10', 'KI0'],
    ['a kind of dash', 'D-205', 'D–205'],
    ['one character less', 'CRANE', 'CRNE'],
    ['one character more', 'CRANE', 'CRAANE'],
    ['one other character', 'CRANE', 'CRATE'],
    ['two exchanged', 'CRANE', 'CARNE'],
  ])('takes %s for a slip: %s for %s', (_, meant, written) => {
    const finding = only(`${meant} 1 2 3`, `End 1 2 3 <- ${written}`);
    expect(writes(finding.fix)).toEqual([['F3', written, meant]]);
  });

  it('prefers a slip in case to one in zeros, and that to another key', () => {
    expect(writes(only('a1 1', 'A01 1', 'A2 1', 'End 1 <- A1').fix)).toEqual([['F5', 'A1', 'a1']]);
    expect(writes(only('A01 1', 'A2 1', 'End 1 <- A1').fix)).toEqual([['F4', 'A1', 'A01']]);
    expect(writes(only('Z6 1', 'A9 1', 'End 1 <- Z9').fix)).toEqual([['F4', 'Z9', 'Z6']]);
  });

  it('says so where several are equally near, and offers each', () => {
    const finding = only('Z6 1 2 3', 'Z7 1 2 3 <- Z6', 'B 1 2 3 <- Z9', 'C 1 2 3 <- Z7, B');
    expect(sentence(finding)).toBe(
      'B waits for Z9, and there is no Z9 in this list. Z7 and Z6 are equally near.',
    );
    expect(finding.fix?.reason).toBe('Z7 is as near as Z6; which of them is meant must be asked.');
    expect([finding.fix, ...(finding.alternatives ?? [])].map((fix) => writes(fix))).toEqual([
      [['F4', 'Z9', 'Z7']],
      [['F4', 'Z9', 'Z6']],
      [['F4', 'Z9', null]],
    ]);
  });

  it('removes the link where no ID is near', () => {
    const finding = only('A 1 2 3', 'B 1 2 3 <- A, SURVEY');
    expect(sentence(finding)).toBe(
      'B waits for SURVEY, and there is no SURVEY in this list. No ID is near to it.',
    );
    expect(writes(finding.fix)).toEqual([['F3', 'A, SURVEY', 'A']]);
    expect(finding.alternatives).toEqual([]);
  });

  it('takes no single letter for near to another', () => {
    expect(writes(only('A 1', 'B 1 <- A', 'C 1 <- B, X').fix)).toEqual([['F4', 'B, X', 'B']]);
  });

  it.each([
    ['itself', ['A 1', 'Bo 1 <- A, bo'], 'The nearest, Bo, is the activity itself.', 'A'],
    ['linked', ['A1 1', 'B 1 <- A1, a1'], 'The nearest, A1, is linked to it already.', 'A1'],
    ['a loop', ['A1 1 <- b2', 'B2 1 <- A1'], 'The nearest, B2, would close a loop.', null],
  ])('does not propose the nearest where it is %s', (_, rows, end, left) => {
    const finding = only(...rows);
    expect(sentence(finding)).toContain(end);
    expect(finding.fix?.edits[0]?.to).toBe(left);
  });

  it('takes a row without an ID for the one that is named', () => {
    const received = list('A1 1 2 3', '_ "Brace" 1 2 3 <- A1', 'A3 1 2 3 <- A2');
    const [finding] = found('unknown-predecessor', received);
    expect(sentence(finding!)).toBe(
      'A3 waits for A2, and there is no A2 in this list. Row 3 has no ID of its own, and may be meant.',
    );
    expect(writes(finding!.fix)).toEqual([['A3', null, 'A2']]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('reads successors the other way round', () => {
    const received = list('A1 1 2 3 -> B2', 'B2 1 2 3 -> c3', 'C3 1 2 3');
    const [finding] = found('unknown-predecessor', received);
    expect(sentence(finding!)).toBe(
      'B2 is to be followed by c3, and there is no c3 in this list. C3 is the nearest.',
    );
    expect(writes(finding!.fix)).toEqual([['G3', 'c3', 'C3']]);
    expect(finding!.fix?.changes[1]).toEqual({ kind: 'add-link', from: 1, to: 2, type: 'FS', lag: 0 });
    expect(keys(received)).toEqual([finding!.key]);
  });

  it('tells two unknown predecessors of one activity apart, and one named twice', () => {
    const findings = found('unknown-predecessor', list('A 1', 'B 1 <- X1, Y22, X1 SS'));
    expect(findings.map(({ key }) => key)).toEqual([
      'unknown-predecessor|B|X1',
      'unknown-predecessor|B|Y22',
      'unknown-predecessor|B|X1#2',
    ]);
  });

  it('leaves a heading to that rule', () => {
    expect(found('unknown-predecessor', list('# H1 "Site"', 'A 1', 'B 1 <- H1'))).toEqual([]);
  });
});
