import { describe, expect, it } from 'vitest';
import { handProblem, handValue } from '@/components/findings/hand-value';

describe('what is typed by hand', () => {
  it('stays a number where a number stood, or nothing', () => {
    expect(handValue(' 4.5 ', 6)).toBe(4.5);
    expect(handValue('-2', null)).toBe(-2);
    expect(handValue('−2', 1)).toBe(-2);
  });

  it('stays text where text stood, zeros and all', () => {
    expect(handValue('007', '7a')).toBe('007');
    expect(handValue('7', '7 wk')).toBe('7');
    expect(handValue('007', null)).toBe('007');
    expect(handValue('4,5', 6)).toBe('4,5');
  });

  it('empties the cell', () => {
    expect(handValue('   ', 6)).toBeNull();
  });

  it('is refused only where it changes nothing or is too long', () => {
    expect(handProblem('6', 6)).toBe('This is what the cell holds already.');
    expect(handProblem('', null)).toBe('This is what the cell holds already.');
    expect(handProblem('x'.repeat(2001), 'a')).toBe('A cell takes at most 2 000 characters here.');
    expect(handProblem('5', 6)).toBeNull();
  });
});
