import { describe, expect, it } from 'vitest';
import {
  correctionOf,
  effectRange,
  inapplicableSentence,
  skippedSentence,
} from '@/components/findings/outcome';
import type { CorrectionView } from '@/lib/contract/submission';
import { edit, finding, fix, id } from '@/tests/support/findings';

function correction(number: number, given: Partial<CorrectionView> = {}): CorrectionView {
  const at = `2027-03-09T10:${String(number).padStart(2, '0')}:00.000Z`;
  return {
    id: id(number),
    batch: id(100),
    fix: null,
    finding: null,
    edits: [],
    by: 'Piet Ostra',
    at,
    ...given,
  };
}

describe('the correction that settles a finding', () => {
  const about = finding(23);

  it('is that of its adopted fix before any other', () => {
    const corrections = [correction(1, { fix: id(7) }), correction(2, { finding: about.id })];
    expect(correctionOf(corrections, about, fix(7))?.id).toBe(id(1));
    expect(correctionOf(corrections, about, null)?.id).toBe(id(2));
  });

  it('is the latest made for it, else the latest that changed its cell', () => {
    const twice = [correction(3, { finding: about.id }), correction(2, { finding: about.id })];
    expect(correctionOf(twice, about, null)?.id).toBe(id(3));
    const elsewhere = [
      correction(1, { edits: [edit('G23', 6, 4)] }),
      correction(2, { edits: [edit('G24', 1, 2)] }),
    ];
    expect(correctionOf(elsewhere, about, null)?.id).toBe(id(1));
    expect(correctionOf([], about, null)).toBeNull();
  });
});

describe('what is said of a step', () => {
  const reason = 'The cell was changed by hand since.';

  it('names each reason once', () => {
    expect(skippedSentence({ skipped: [{ fix: id(1), reason }] })).toBe(`One fix was left out. ${reason}`);
    expect(
      skippedSentence({
        skipped: [
          { fix: id(1), reason },
          { fix: id(2), reason },
        ],
      }),
    ).toBe(`2 fixes were left out. ${reason}`);
    expect(inapplicableSentence({ inapplicable: [{ correction: id(1), reason }] })).toBe(
      `One other correction no longer applies. ${reason}`,
    );
  });

  it('gives the range of effects that are known', () => {
    const effect = (days: number) => fix(1, { effect: { expectedDuration: days, variance: 0 } });
    expect(effectRange([effect(2), fix(2, { effect: null }), effect(-1)])).toEqual({ least: -1, most: 2 });
    expect(effectRange([fix(2, { effect: null })])).toBeNull();
  });
});
