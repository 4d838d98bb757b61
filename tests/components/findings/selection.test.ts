import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { neighbour, placeOf, reselect } from '@/components/findings/selection';

describe('moving with j and k', () => {
  it('goes one on, and holds at the ends', () => {
    expect(neighbour(['x', 'y', 'z'], 'x', 1)).toBe('y');
    expect(neighbour(['x', 'y', 'z'], 'z', 1)).toBe('z');
    expect(neighbour(['x', 'y', 'z'], 'x', -1)).toBe('x');
  });

  it('starts at the near end where nothing shown is selected', () => {
    expect(neighbour(['x', 'y'], null, 1)).toBe('x');
    expect(neighbour(['x', 'y'], 'gone', -1)).toBe('y');
    expect(neighbour([], 'x', 1)).toBeNull();
  });
});

describe('what stays selected when the list changes', () => {
  it('keeps the finding while it is shown', () => {
    expect(reselect(['x', 'y', 'z'], ['z', 'y'], 'y')).toBe('y');
  });

  it('takes the next that followed, else the nearest before', () => {
    expect(reselect(['w', 'x', 'y', 'z'], ['w', 'z'], 'x')).toBe('z');
    expect(reselect(['w', 'x', 'y'], ['w'], 'y')).toBe('w');
  });

  it('always selects something that is shown, where anything is', () => {
    const shown = fc.uniqueArray(fc.constantFrom('p', 'q', 'r', 's', 't', 'u'));
    fc.assert(
      fc.property(shown, shown, fc.option(fc.constantFrom('p', 'q', 'r', 'v')), (before, after, current) => {
        const selected = reselect(before, after, current);
        if (after.length === 0) expect(selected).toBeNull();
        else expect(after).toContain(selected);
      }),
    );
  });
});

it('says the place among those shown', () => {
  expect(placeOf(['x', 'y', 'z'], 'y')).toEqual({ at: 2, of: 3 });
  expect(placeOf(['x'], 'y')).toBeNull();
  expect(placeOf(['x'], null)).toBeNull();
});
