import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, sentence } from '../helpers';

describe('detached-group', () => {
  const received = list('A 1', 'B 1 <- A', 'X 1', 'C 1 <- B', 'Y 1 <- X');

  it('finds the group that has no link to the rest, and proposes nothing', () => {
    const [finding, ...more] = found('detached-group', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({
      weight: 'distorts',
      key: 'detached-group|X',
      row: 4,
      data: { ids: ['X', 'Y'] },
    });
    expect(sentence(finding!)).toBe(
      'X and Y are linked to one another, and to none of the other 3 activities.',
    );
    expect(finding).not.toHaveProperty('fix');
  });

  it('takes the first of two that are as large for the list itself', () => {
    expect(found('detached-group', list('A 1', 'B 1 <- A', 'X 1', 'Y 1 <- X')).map(({ key }) => key)).toEqual(
      ['detached-group|X'],
    );
  });

  it('counts the activities that its sentence does not name', () => {
    const main = Array.from({ length: 70 }, (_, i) => `M${i} 1 <- M${i + 1}`);
    const group = Array.from({ length: 60 }, (_, i) => `G${i} 1${i === 0 ? '' : ` <- G${i - 1}`}`);
    const [finding] = found('detached-group', list(...main, 'M70 1', ...group));
    expect(sentence(finding!)).toBe(
      'G0, G1, G2, G3, G4 and 55 more are linked to one another, and to none of the other 71 activities.',
    );
  });

  it('is no group where one activity stands alone', () => {
    expect(found('detached-group', list('A 1', 'B 1 <- A', 'X 1'))).toEqual([]);
  });

  it('joins by links in either direction and of any relation, loops too', () => {
    expect(
      found(
        'detached-group',
        list('A 1', 'B 1 <- A SS', 'C 1 <- B FF', 'D 1 -> C', 'E 1 <- F', 'F 1 <- E, A'),
      ),
    ).toEqual([]);
  });

  it('leaves a group whose link is there and wrong to the rule that says so', () => {
    expect(found('detached-group', list('A1 1', 'B1 1 <- A1', 'X 1 <- a1', 'Y 1 <- X'))).toEqual([]);
    expect(found('detached-group', list('A1 1', 'B1 1 <- A1', 'X 1 <- GATE', 'Y 1 <- X'))).toEqual([]);
    expect(found('detached-group', list('A1 1', 'B1 1 <- A1', 'X 1 <- see plan 4', 'Y 1 <- X'))).toEqual([]);
    expect(found('detached-group', list('A1 1', 'B1 1 <- A1', 'X1 1', 'Y 1 <- x1'))).toHaveLength(1);
  });
});
