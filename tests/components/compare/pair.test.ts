import { describe, expect, it } from 'vitest';
import { defaultOther, orderedPair } from '@/components/compare/pair';

const rev = (revision: number) => ({ id: `r${String(revision)}`, revision });

describe('which revision is compared with', () => {
  it('is the one before, wherever it stands in the list', () => {
    expect(defaultOther([rev(3), rev(0), rev(1)], rev(2))).toEqual(rev(1));
  });

  it('is the next where this is the first, and none where it is alone', () => {
    expect(defaultOther([rev(2), rev(1)], rev(0))).toEqual(rev(1));
    expect(defaultOther([], rev(0))).toBeUndefined();
  });

  it('is read from the earlier to the later', () => {
    expect(orderedPair(rev(2), rev(1))).toEqual({ earlier: rev(1), later: rev(2) });
    expect(orderedPair(rev(1), rev(2))).toEqual({ earlier: rev(1), later: rev(2) });
  });
});
