import { describe, expect, it } from 'vitest';
import {
  adoptedFix,
  withAdopted,
  withCommentCounts,
  withFix,
  withResult,
  type Findings,
} from '@/lib/client/findings';
import { finding, fix, id } from '@/tests/support/findings';

const findings: Findings = {
  items: [finding(1, { fix: fix(11), alternatives: [fix(12)] }), finding(2, { fix: fix(21) }), finding(3)],
};

describe('an answer put into the list', () => {
  const changed = finding(2, { state: 'corrected' });
  const made = finding(9, { origin: 'correction' });
  const after = withResult(findings, { changed: [changed, made], gone: [id(3)] });

  it('replaces what changed, adds what is new, drops what is gone', () => {
    expect(after.items.map((item) => item.id)).toEqual([id(1), id(2), id(9)]);
    expect(after.items[1]).toBe(changed);
  });

  it('leaves the very same objects where nothing changed', () => {
    expect(after.items[0]).toBe(findings.items[0]);
  });
});

describe('what is shown until the answer is here', () => {
  it('marks the fix adopted and its finding corrected, an alternative as well', () => {
    const after = withAdopted(findings, new Set([id(12), id(21)]));
    expect(after.items.map(({ state }) => state)).toEqual(['corrected', 'corrected', 'open']);
    expect(after.items[0] && adoptedFix(after.items[0])?.id).toBe(id(12));
    expect(after.items[0]?.fix?.state).toBe('proposed');
    expect(after.items[2]).toBe(findings.items[2]);
  });

  it('declines one fix and nothing else', () => {
    const after = withFix(findings, id(21), 'declined');
    expect(after.items[1]).toMatchObject({ state: 'open', fix: { state: 'declined' } });
    expect(after.items[0]).toBe(findings.items[0]);
  });

  it('is the same list where the fix is unknown', () => {
    expect(withAdopted(findings, new Set([id(99)]))).toBe(findings);
  });
});

it('counts comments, and changes only the findings whose number differs', () => {
  const after = withCommentCounts(findings, new Map([[id(2), 3]]));
  expect(after.items.map(({ comments }) => comments)).toEqual([0, 3, 0]);
  expect(after.items[0]).toBe(findings.items[0]);
  expect(withCommentCounts(after, new Map([[id(2), 3]]))).toBe(after);
});
