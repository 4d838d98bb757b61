import { describe, expect, it } from 'vitest';
import { chanceLine, finishLine, varianceLine } from '@/components/cord/differences';
import type { Figures } from '@/lib/contract/submission';

const received: Figures = {
  state: 'received',
  computable: true,
  expectedDuration: 112.4,
  finish: '2027-06-21',
  variance: 31.2,
  standardDeviation: Math.sqrt(31.2),
  chanceOfTarget: 0.71,
};
const corrected: Figures = {
  ...received,
  state: 'corrected',
  expectedDuration: 118,
  finish: '2027-06-28',
  variance: 24.83,
  standardDeviation: 4.983,
  chanceOfTarget: 0.38,
};
const none: Figures = {
  state: 'received',
  computable: false,
  expectedDuration: null,
  finish: null,
  variance: null,
  standardDeviation: null,
  chanceOfTarget: null,
};
/** The no-break spaces before units, as plain ones. */
const plain = (text: string | null) => text?.replaceAll(/[\u00a0\u202f]/g, ' ') ?? null;

describe('the differences under the head figures', () => {
  it('bear a sign and a unit', () => {
    expect(plain(finishLine(received, corrected, 'en-GB'))).toBe('+5.6 d · 28 Jun 2027');
    expect(plain(varianceLine(received, corrected, 'en-GB'))).toBe('−6.37 d² · deviation 4.98 d');
    expect(plain(chanceLine(received, corrected, 'en-GB'))).toBe('−33 points · one path, normal');
  });

  it('are left out where nothing differs', () => {
    expect(plain(finishLine(corrected, corrected, 'en-GB'))).toBe('28 Jun 2027');
    expect(plain(chanceLine(corrected, corrected, 'en-GB'))).toBe('one path, normal');
  });

  it('are left out where a state cannot be computed', () => {
    expect(plain(finishLine(none, corrected, 'en-GB'))).toBe('28 Jun 2027');
    expect(finishLine(received, none, 'en-GB')).toBeNull();
    expect(varianceLine(received, none, 'en-GB')).toBeNull();
    expect(chanceLine(received, none, 'en-GB')).toBeNull();
  });

  it('count one point as one', () => {
    const oneLess = { ...received, chanceOfTarget: 0.7 };
    expect(chanceLine(received, oneLess, 'en-GB')).toContain('−1 point ·');
  });
});
