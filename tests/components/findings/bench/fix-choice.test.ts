import { describe, expect, it } from 'vitest';
import {
  adoptable,
  BY_HAND,
  chosenFix,
  chosenOption,
  closedReason,
  handCells,
} from '@/components/findings/bench/fix-choice';
import { edit, finding, fix, id } from '@/tests/support/findings';

const two = finding(23, { fix: fix(1), alternatives: [fix(2, { edits: [edit('h23', 4, 6)] })] });

describe('the option that is chosen', () => {
  it('is the proposed fix, or the adopted one', () => {
    expect(chosenOption(two, null)).toBe(id(1));
    expect(chosenOption({ ...two, alternatives: [fix(2, { state: 'adopted' })] }, null)).toBe(id(2));
  });

  it('is what was picked while it is still there', () => {
    expect(chosenOption(two, id(2))).toBe(id(2));
    expect(chosenOption(two, BY_HAND)).toBe(BY_HAND);
    expect(chosenOption(two, id(99))).toBe(id(1));
  });

  it('is the hand where nothing is proposed', () => {
    expect(chosenOption(finding(23), null)).toBe(BY_HAND);
    expect(chosenFix(two, BY_HAND)).toBeNull();
    expect(chosenFix(two, id(2))?.id).toBe(id(2));
  });
});

it('offers the finding’s own cell first for editing by hand, each cell once and on its sheet only', () => {
  const elsewhere = { ...edit('K9', 1, 2), sheet: 'Other' };
  const touched = finding(23, { fix: fix(1, { edits: [edit('H23', 1, 2), edit('G23', 6, 4), elsewhere] }) });
  expect(handCells(touched)).toEqual(['G23', 'H23']);
  expect(handCells(finding(23, { cell: null, sheet: null }))).toEqual([]);
});

it('adopts of a rule what is open and still proposed', () => {
  const findings = [
    finding(1, { fix: fix(1) }),
    finding(2, { fix: fix(2, { state: 'declined' }) }),
    finding(3, { fix: fix(3), state: 'corrected' }),
    finding(4, { fix: fix(4), rule: 'lead' }),
    finding(5),
  ];
  expect(adoptable(findings, 'likely-below-optimistic').map((found) => found.id)).toEqual([id(1)]);
});

it('says why a revision takes no corrections any more', () => {
  expect(closedReason('under review')).toBeNull();
  expect(closedReason('superseded')).toContain('superseded');
  expect(closedReason('accepted')).toContain('accepted');
});
