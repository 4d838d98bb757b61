import { describe, expect, it } from 'vitest';
import { renderMessage, runAudit } from '@/lib/audit';
import { compile } from '@/lib/network';
import { list } from '@/tests/support/networks';

const broken = list(
  'A 1 2 3',
  'B 6 4 11 <- A, Q77',
  'C 5 5 5 <- B, C',
  'D -1 2 3 <- C',
  'D 1 2 3 <- C',
  'E 1 - 3 <- D',
);

describe('runAudit', () => {
  it('sorts by weight, then as the list runs', () => {
    const order = runAudit(broken).map(({ weight, row, cell }) => [weight, row, cell]);
    expect(order).toEqual([
      ['blocks', 4, 'F4'],
      ['blocks', 6, 'A6'],
      ['blocks', 7, 'D7'],
      ['distorts', 3, 'C3'],
      ['distorts', 3, 'F3'],
      ['distorts', 5, 'C5'],
      ['query', 4, 'D4'],
    ]);
  });

  it('puts what is about the whole list first among its weight, and follows the order of the sheets', () => {
    const onTwo = list('A 5', 'B 5 <- A', 'C "" 5 <- B', 'D "" 5 <- C');
    const activities = onTwo.activities.map((activity) =>
      activity.id === 'C'
        ? { ...activity, sheet: 'Later', nameCell: { sheet: 'Later', row: 2, column: 1 } }
        : activity,
    );
    const matching = [
      ...onTwo.matching,
      { sheet: 'Later', headerRow: 1, columns: { id: 0, name: 1, duration: 2 } },
    ];
    expect(runAudit({ ...onTwo, activities, matching }).map(({ key }) => key)).toEqual([
      'no-spread|list',
      'missing-name|D',
      'missing-name|C',
    ]);
  });

  it('gives each finding a key of its own', () => {
    const keys = runAudit(broken).map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
  });

  it('says the same with a network at hand', () => {
    expect(runAudit(broken, compile(broken))).toEqual(runAudit(broken));
  });

  it('leaves out a rule that the rule book puts off, and weighs as the book says', () => {
    const book = { 'no-spread': { off: true }, 'negative-estimate': { weight: 'query' } } as const;
    const findings = runAudit(broken, undefined, book);
    expect(findings.some(({ rule }) => rule === 'no-spread')).toBe(false);
    expect(findings.find(({ rule }) => rule === 'negative-estimate')?.weight).toBe('query');
  });

  it('does not let a rule book say that a network can be computed which cannot', () => {
    const book = { 'self-link': { weight: 'query' }, 'missing-estimate': { weight: 'query' } } as const;
    const weights = runAudit(broken, undefined, book).filter(({ rule }) => rule in book);
    expect(weights.map(({ weight }) => weight)).toEqual(['blocks', 'blocks']);
  });

  it('keeps findings that can be stored: plain data, and a sentence for each', () => {
    for (const finding of runAudit(broken)) {
      expect(JSON.parse(JSON.stringify(finding))).toEqual(finding);
      const text = renderMessage(finding.rule, finding.message, finding.data);
      expect(text).toMatch(/^\S.*\.$/);
      expect(text).not.toMatch(/undefined|null|NaN|invalid/i);
    }
  });

  it('finds nothing in an empty list', () => {
    expect(runAudit(list())).toEqual([]);
  });
});

describe('renderMessage', () => {
  it('says so of a rule or a message that is no more', () => {
    const gone = 'This was found by the rule “old-rule”, which is no longer in use.';
    expect(renderMessage('old-rule', 'any', {})).toBe(gone);
    expect(renderMessage('loop', 'any', {})).toContain('loop');
  });
});
