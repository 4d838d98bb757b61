import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FindingRow } from '@/db/queries/findings';
import type { FixRow, FixValues } from '@/db/queries/fixes';
import { firstFindings, reconcile, type Kept, type Reconciliation } from '@/lib/services/findings/reconcile';
import type { FindingDraft } from '@/lib/services/findings/rows';

const fix = (rank: number, to: number): FindingDraft['fixes'][number] => ({
  rank,
  reason: `Set it to ${to}.`,
  edits: [{ sheet: 'S', cell: 'C2', from: 1, to }],
  effect_expected: to,
  effect_variance: 0,
});

const draft = (key: string, fixes: FindingDraft['fixes'] = [fix(0, 2), fix(1, 3)]): FindingDraft => ({
  key,
  rule: 'no-spread',
  weight: 'query',
  message_id: 'm',
  data: { key, nested: ['a'] },
  activity_id: key,
  activity_name: null,
  sheet: 'S',
  row: 2,
  cell: 'C2',
  fixes,
});

const toFixRow = (values: FixValues): FixRow => ({
  id: values.id,
  finding: values.finding_id,
  rank: values.rank,
  reason: values.reason,
  edits: values.edits,
  effectExpected: values.effect_expected,
  effectVariance: values.effect_variance,
  state: values.state,
});

type Rows = Pick<Kept, 'findings' | 'fixes'>;

function toRow(values: Reconciliation['findings']['insert'][number]): FindingRow {
  const { message_id: messageId, activity_id: activityId, activity_name: activityName, ...same } = values;
  return { ...same, messageId, activityId, activityName, state: 'open' };
}

function first(drafts: readonly FindingDraft[]): Rows {
  const { findings, fixes } = firstFindings(drafts);
  return { findings: findings.map(toRow), fixes: fixes.map(toFixRow) };
}

/** The rows as they are once the reconciliation is written. */
function written(rows: Rows, { findings, fixes }: Reconciliation): Rows {
  const changes = new Map(findings.update.map((change) => [change.id, change]));
  const values = new Map(fixes.update.map((change) => [change.id, change]));
  return {
    findings: [
      ...rows.findings
        .filter(({ id }) => !findings.erase.includes(id))
        .map((row) => {
          const change = changes.get(row.id);
          if (!change) return row;
          const { message_id: messageId, activity_name: activityName, ...same } = change;
          return { ...row, ...same, messageId, activityName };
        }),
      ...findings.insert.map(toRow),
    ],
    fixes: [
      ...rows.fixes
        .filter(({ id, finding }) => !fixes.erase.includes(id) && !findings.erase.includes(finding))
        .map((row) => {
          const change = values.get(row.id);
          return change ? toFixRow(change) : row;
        }),
      ...fixes.insert.map(toFixRow),
    ],
  };
}

const none = { adopted: new Set<string>(), needed: new Set<string>() };
const states = ({ findings }: Rows) => Object.fromEntries(findings.map(({ key, state }) => [key, state]));

describe('an audit that finds the same', () => {
  it('changes nothing', () => {
    const drafts = [draft('a'), draft('b', [])];
    const result = reconcile({ ...first(drafts), ...none }, structuredClone(drafts));
    expect(result.changed.size).toBe(0);
    expect(Object.values(result.findings).flat()).toEqual([]);
    expect(Object.values(result.fixes).flat()).toEqual([]);
  });
});

describe('a finding', () => {
  const rows = first([draft('a'), draft('b')]);
  const id = (key: string) => rows.findings.find((row) => row.key === key)?.id ?? '';
  const fixesOf = (key: string, { fixes } = rows) => fixes.filter(({ finding }) => finding === id(key));

  it('that is found no more is corrected, with the fix that did it adopted; once back it is open and proposed', () => {
    const adopted = new Set([fixesOf('a')[0]?.id ?? '']);
    const mended = written(rows, reconcile({ ...rows, ...none, adopted }, [draft('b')]));
    expect(states(mended)).toEqual({ a: 'corrected', b: 'open' });
    expect(fixesOf('a', mended).map(({ state }) => state)).toEqual(['adopted', 'proposed']);
    const back = written(mended, reconcile({ ...mended, ...none }, [draft('a'), draft('b')]));
    expect(back).toEqual(rows);
  });

  it('that a correction made goes again, unless it is needed', () => {
    const result = reconcile({ ...rows, ...none }, [draft('a'), draft('b'), draft('c')]);
    expect(result.findings.insert).toMatchObject([{ key: 'c', origin: 'correction', position: 2 }]);
    const made = written(rows, result);
    const without = [draft('a'), draft('b')];
    expect(states(written(made, reconcile({ ...made, ...none }, without)))).toEqual({ a: 'open', b: 'open' });
    const needed = new Set(made.findings.map((row) => row.id));
    expect(states(written(made, reconcile({ ...made, ...none, needed }, without)))).toMatchObject({
      c: 'corrected',
    });
  });

  it('takes over what its fixes now are; a declined one stays declined, one no longer proposed goes', () => {
    const declined = { ...rows, fixes: rows.fixes.map((row) => ({ ...row, state: 'declined' as const })) };
    const result = reconcile({ ...declined, ...none }, [draft('a', [fix(0, 9)]), draft('b')]);
    const after = written(declined, result);
    expect(fixesOf('a', after)).toMatchObject([{ rank: 0, state: 'declined', effectExpected: 9 }]);
    expect([...result.changed]).toEqual([id('a')]);
    expect([...result.declined].sort()).toEqual(['a', 'b']);
  });
});

it('comes back to where it was, whatever was found in between', () => {
  const keys = fc.uniqueArray(fc.constantFrom('a', 'b', 'c', 'd', 'e', 'f'));
  fc.assert(
    fc.property(keys, fc.array(keys, { maxLength: 4 }), (begin, between) => {
      const rows = first(begin.map((key) => draft(key)));
      let now = rows;
      for (const found of [...between, begin]) {
        const drafts = found.map((key) => draft(key));
        now = written(now, reconcile({ ...now, ...none }, drafts));
        const open = now.findings.filter(({ state }) => state === 'open').map(({ key }) => key);
        expect(open.sort()).toEqual([...found].sort());
      }
      expect(now).toEqual(rows);
    }),
  );
});
