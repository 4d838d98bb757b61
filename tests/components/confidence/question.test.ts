import { describe, expect, it } from 'vitest';
import { firstQuestion, readQuestion } from '@/components/confidence/question';

describe('readQuestion', () => {
  it('reads the three ways of asking', () => {
    expect(readQuestion({ way: 'date', value: '2027-06-25' })).toEqual({ date: '2027-06-25' });
    expect(readQuestion({ way: 'days', value: '116,5 d' })).toEqual({ days: 116.5 });
    expect(readQuestion({ way: 'confidence', value: '80 %' })).toEqual({ confidence: 0.8 });
  });

  it.each([
    ['date', '2027-13-01'],
    ['date', '2027-02-30'],
    ['date', 'soon'],
    ['days', '-1'],
    ['days', 'ten'],
    ['confidence', '0'],
    ['confidence', '100'],
    ['confidence', ''],
  ] as const)('says why %s “%s” is no question', (way, value) => {
    expect(readQuestion({ way, value })).toMatch(/\.$/);
  });

  it('begins with the target, else with 80 %', () => {
    expect(firstQuestion('2027-06-25')).toEqual({ way: 'date', value: '2027-06-25' });
    expect(firstQuestion(null)).toEqual({ way: 'confidence', value: '80' });
  });
});
