import { expect, it } from 'vitest';
import { runAudit } from '@/lib/audit';
import { list } from '@/tests/support/networks';

const WAITS = 6000;

it('proposes no fix that would write a monstrous cell anew for each of its entries', () => {
  const waits = new Array<string>(WAITS).fill('A').join(', ');
  const findings = runAudit(list('A 1 2 3', `B 1 2 3 <- ${waits}`, 'C 1 2 3 <- B, B'));
  const repeated = findings.filter(({ rule }) => rule === 'repeated-link');
  expect(repeated).toHaveLength(WAITS);
  const fixed = repeated.filter(({ fix }) => fix);
  expect(fixed.map(({ activityId, fix }) => [activityId, fix?.edits[0]?.to])).toEqual([['C', 'B']]);
});

it('proposes fixes for a milestone that waits for all of a long list', () => {
  const ids = Array.from({ length: 1000 }, (_, index) => `A${index}`);
  const findings = runAudit(list(...ids.map((id) => `${id} 1 2 3`), `END 1 2 3 <- ${ids.join(', ')}, A7`));
  expect(findings.find(({ rule }) => rule === 'repeated-link')?.fix).toBeDefined();
});
