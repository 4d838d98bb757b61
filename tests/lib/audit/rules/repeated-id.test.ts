import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keysAfter, sentence, withActivity, writes } from '../helpers';

const ids = (...rows: string[]) => found('repeated-id', list(...rows));

describe('repeated-id', () => {
  it('finds the later row and proposes the next ID of the pattern', () => {
    const received = list(
      'T-007 1 2 3',
      'T-008 1 2 3 <- T-007',
      'T-009 1 2 3 <- T-008',
      'T-009 1 2 3 <- T-008',
    );
    const [finding, ...more] = found('repeated-id', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'blocks', activityId: 'T-009', row: 5, cell: 'A5' });
    expect(sentence(finding!)).toBe(
      'T-009 is the ID of row 4 and again of row 5: a link to it could mean either.',
    );
    expect(writes(finding!.fix)).toEqual([['A5', 'T-009', 'T-010']]);
    expect(finding!.fix?.reason).toBe("T-010 is free, and follows T-009 in the list's pattern.");
    expect(keysAfter(received, finding!.fix)).not.toContain(finding!.key);
  });

  it('takes the ID that is missing between its neighbours, if one is', () => {
    expect(writes(ids('A1 1', 'A2 1', 'A2 1', 'A4 1')[0]!.fix)).toEqual([['A4', 'A2', 'A3']]);
    expect(writes(ids('A10 1', 'A20 1', 'A20 1', 'A40 1')[0]!.fix)).toEqual([['A4', 'A20', 'A30']]);
  });

  it('goes on after the last of the series where the list leaves no gap', () => {
    expect(writes(ids('A1 1', 'A2 1', 'A3 1', 'A2 1', 'A4 1')[0]!.fix)).toEqual([['A5', 'A2', 'A5']]);
    expect(writes(ids('A10 1', 'A20 1', 'A30 1', 'A10 1')[0]!.fix)).toEqual([['A5', 'A10', 'A40']]);
    expect(writes(ids('A 1', 'B 1', 'Z 1', 'A 1', 'B9 1')[0]!.fix)).toEqual([['A5', 'A', 'AA']]);
  });

  it('gives each of several rows an ID of its own', () => {
    const findings = ids('7 1', '7 1', '7 1');
    expect(findings.flatMap(({ fix }) => writes(fix))).toEqual([
      ['A3', '7', '8'],
      ['A4', '7', '9'],
    ]);
    expect(new Set(findings.map(({ key }) => key)).size).toBe(2);
  });

  it('counts on after a word', () => {
    expect(writes(ids('START 1', 'START 1', 'START-2 1')[0]!.fix)).toEqual([['A3', 'START', 'START-3']]);
  });

  it('keeps a number a number', () => {
    const received = withActivity(list('7 1', '7 1'), 1, () => ({ idContent: 7 }));
    expect(writes(found('repeated-id', received)[0]!.fix)).toEqual([['A3', 7, 8]]);
  });

  it('never proposes an ID that a link names already, unless it is the one missing there', () => {
    const elsewhere = list('A1 1', 'A2 1', 'A1 1 <- A3', 'A9 1');
    expect(writes(found('repeated-id', elsewhere)[0]!.fix)).toEqual([['A4', 'A1', 'A3']]);
    const atTheEnd = list('A1 1', 'B1 1', 'A1 1', 'C1 1 <- A2');
    expect(writes(found('repeated-id', atTheEnd)[0]!.fix)).toEqual([['A4', 'A1', 'A3']]);
  });

  it('leaves alone 7 and 007, and IDs in another case', () => {
    expect(ids('7 1', '007 1', 'a 1', 'A 1')).toEqual([]);
  });

  it('does not cascade: a row that no link can name is no open end', () => {
    const received = list('A 1 2 3', 'B 1 2 3 <- A', 'B 1 2 3 <- A', 'C 1 2 3 <- B');
    expect(found('open-finish', received)).toEqual([]);
    expect(found('open-start', received)).toEqual([]);
  });
});
