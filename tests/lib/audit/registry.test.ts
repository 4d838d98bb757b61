import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { ruleById, RULES } from '@/lib/audit';
import { WEIGHTS } from '@/lib/schedule/weight';

const folder = join(import.meta.dirname, '../../../lib/audit/rules');
const files = readdirSync(folder).map((file) => file.replace(/\.ts$/, ''));

describe('the registry', () => {
  it('has every rule file, each once', () => {
    expect(RULES.map(({ id }) => id).toSorted()).toEqual(files.toSorted());
  });

  it.each(files)('%s is named after its id, and has a test', async (id) => {
    const { rule } = (await import(`../../../lib/audit/rules/${id}.ts`)) as { rule: unknown };
    expect(rule).toBe(ruleById(id));
    expect(existsSync(join(import.meta.dirname, `rules/${id}.test.ts`))).toBe(true);
  });

  it.each(RULES.map((rule) => [rule.id, rule] as const))(
    '%s says what it finds and where it comes from',
    (_, { meta, limits }) => {
      expect(Object.keys(WEIGHTS)).toContain(meta.weight);
      for (const text of [meta.title, meta.about, meta.source])
        expect(text.trim().length).toBeGreaterThan(10);
      expect(meta.about).toMatch(/\.$/);
      expect(meta.title).not.toMatch(/invalid|\.$/i);
      expect(Object.keys(meta.messages).length).toBeGreaterThan(0);
      for (const limit of Object.values(limits)) expect(Number.isFinite(limit.default)).toBe(true);
    },
  );

  it('runs in the order in which the rules are described', () => {
    expect(RULES.map(({ id }) => id)).toEqual([
      'repeated-id',
      'missing-id',
      'unknown-predecessor',
      'unreadable-predecessor',
      'self-link',
      'loop',
      'repeated-link',
      'open-start',
      'open-finish',
      'detached-group',
      'missing-estimate',
      'unreadable-estimate',
      'negative-estimate',
      'likely-below-optimistic',
      'pessimistic-below-likely',
      'no-spread',
      'copied-spread',
      'error-cell',
      'ambiguous-number',
      'unit-assumed',
      'hidden-row',
      'heading-link',
      'milestone-with-duration',
      'missing-name',
      'repeated-name',
      'refused-row',
    ]);
  });
});
