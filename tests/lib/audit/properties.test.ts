import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Finding, runAudit } from '@/lib/audit';
import type { Fix } from '@/lib/schedule/edit';
import { list } from '@/tests/support/networks';
import { cleanList, slippedList, written } from './clean-lists';
import { corrected } from './helpers';

const ENDS = ['open-start', 'open-finish', 'detached-group'];

/** A link that goes may leave an end open, an ID that comes makes its row one that can be named. */
function mayFollow(finding: Finding, fix: Fix): readonly string[] {
  const kinds = new Set(fix.changes.map(({ kind }) => kind));
  const namesARow = fix.edits.some(({ cell }) => cell.startsWith('A'));
  // With an ID come the links that name it, and what is wrong with them.
  if (namesARow) return [...ENDS, 'loop', 'self-link', 'repeated-link'];
  if (kinds.has('remove-link') && !kinds.has('add-link')) return ENDS;
  // Two that stood alone, linked to one another, are a group until the next of these fixes is adopted.
  if (finding.rule.startsWith('open-')) return ['detached-group'];
  // A sign taken off where a ≤ m ≤ b does not hold without it either: the reason says so.
  if (fix.reason.includes('does not hold')) return ['likely-below-optimistic', 'pessimistic-below-likely'];
  return kinds.has('estimates') ? ['no-spread'] : [];
}

const counts = (findings: readonly Finding[]) => {
  const byRule = new Map<string, number>();
  for (const { rule } of findings) byRule.set(rule, (byRule.get(rule) ?? 0) + 1);
  return byRule;
};

describe('the audit of random lists', () => {
  it('finds nothing that blocks or distorts in a clean one', () => {
    fc.assert(
      fc.property(cleanList, (rows) => {
        const findings = runAudit(list(...rows.map(written)));
        expect(findings.filter(({ weight, rule }) => weight !== 'query' || rule.startsWith('open'))).toEqual(
          [],
        );
      }),
    );
  });

  it('clears a finding by its fix, and each of the others that are offered, and makes nothing new', () => {
    fc.assert(
      fc.property(slippedList, (rows) => {
        const received = list(...rows.map(written));
        const before = runAudit(received);
        const had = counts(before);
        // Where several IDs are equally near, ends are reckoned by a guess, and a fix may change the guess.
        const guessed = before.some(({ message }) => message === 'several' || message === 'unnamed');
        for (const finding of before) {
          for (const fix of [finding.fix, ...(finding.alternatives ?? [])]) {
            if (!fix) continue;
            const after = runAudit(corrected(received, fix.edits));
            const has = counts(after);
            expect(has.get(finding.rule) ?? 0).toBeLessThan(had.get(finding.rule) ?? 0);
            const grown = [...has]
              .filter(([rule, count]) => count > (had.get(rule) ?? 0))
              .map(([rule]) => rule);
            const allowed = guessed ? [...ENDS, ...mayFollow(finding, fix)] : mayFollow(finding, fix);
            expect(grown.filter((rule) => !allowed.includes(rule))).toEqual([]);
          }
        }
      }),
      { numRuns: 150 },
    );
  });

  it('comes to an end where the proposed fixes are adopted one after the other', () => {
    fc.assert(
      fc.property(slippedList, (rows) => {
        let now = list(...rows.map(written));
        for (let step = 0; step < 60; step++) {
          const next = runAudit(now).find(({ fix }) => fix);
          if (!next?.fix) break;
          now = corrected(now, next.fix.edits);
        }
        expect(runAudit(now).filter(({ fix }) => fix)).toEqual([]);
        expect(runAudit(now).filter(({ weight }) => weight === 'blocks')).toEqual([]);
      }),
      { numRuns: 100 },
    );
  });
});
