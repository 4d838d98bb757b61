import { describe, expect, it } from 'vitest';
import { written } from '@/lib/audit/support/written';
import type { Estimate } from '@/lib/schedule/activity';
import { list } from '@/tests/support/networks';
import { withEstimate } from '../helpers';

/** What is written for so many days into the likely cell of B. */
function write(days: number, cell: Partial<Estimate>, others: Partial<Estimate> = {}) {
  const base = list('A 1 2 3', 'B 1 2 3');
  const received = withEstimate(withEstimate(base, 1, 'likely', cell), 0, 'likely', others);
  const activity = received.activities[1]!;
  return written(days, activity.likely, activity, received);
}

describe('what a fix writes into an estimate', () => {
  it.each<[string, number, Partial<Estimate>, string | number]>([
    ['a number where the cell keeps one', 6, { days: 5, content: 5 }, 6],
    ['a number in hours', 2, { days: 1, content: 8, unit: 'hour' }, 16],
    ['a number in weeks', 10, { days: 5, content: 1, unit: 'week' }, 2],
    ['a text with its unit', 6, { days: 5, content: '5 d', unit: 'day' }, '6 d'],
    ['a text with its words', 6, { days: 5, content: ' 5 working days', unit: 'day' }, ' 6 working days'],
    ['a text in hours', 1.5, { days: 2, content: '16h', unit: 'hour' }, '12h'],
    ['minutes, of which no estimate speaks', 2, { days: 1, content: '480 min', unit: 'hour' }, '960 min'],
    ['the share of a day that a clock shows', 2, { days: 1, content: 1 / 3, unit: 'hour' }, 0.666666666667],
    ['a decimal comma', 5.25, { days: 2.5, content: '2,5' }, '5,25'],
    ['a number that grouped thousands', 2000, { days: 1200, content: '1,200' }, '2000'],
    ['several units in one', 10, { days: 8, content: '1w 3d', unit: 'week' }, '2 w'],
    ['nothing that a division leaves', 0.3, { days: 1, content: 1 }, 0.3],
    ['an unreadable text anew', 5, { days: null, content: '5 dayz', problem: 'unreadable' }, 5],
    [
      'an unreadable text in its unit',
      5,
      { days: null, content: '~1 wk', problem: 'unreadable', unit: 'week' },
      '1 w',
    ],
    ['a number that its format makes a date', 5, { days: null, content: 5, problem: 'unreadable' }, '5 d'],
    ['an empty cell', 5, { days: null, content: null, problem: 'empty' }, 5],
  ])('%s', (_, days, cell, expected) => {
    expect(write(days, cell)).toBe(expected);
  });

  it('follows the column where the cell shows no decimal mark', () => {
    expect(write(2.5, { days: 5, content: '5' }, { days: 1.5, content: '1,5' })).toBe('2,5');
    expect(write(2.5, { days: 5, content: '5' })).toBe('2.5');
  });

  it('writes three decimals so that no one takes them for thousands', () => {
    expect(write(1.125, { days: 5, content: '5 d' })).toBe('1.1250 d');
    expect(write(0.125, { days: 5, content: '5 d' })).toBe('0.125 d');
  });

  it('fills an empty cell in the unit of the numbers beside it', () => {
    const received = withEstimate(
      withEstimate(list('A 1 2 3'), 0, 'optimistic', {
        days: null,
        content: null,
        problem: 'empty',
        unit: 'hour',
      }),
      0,
      'likely',
      { days: 1, content: 480, unit: 'hour' },
    );
    const activity = received.activities[0]!;
    expect(written(2, activity.optimistic, activity, received)).toBe(960);
  });
});
