import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, sentence, withEstimate } from '../helpers';

const assumed = { ...list('A 1', 'B 0 <- A', 'C 2 <- B'), unit: { value: 'day', from: 'assumed' } } as const;

describe('unit-assumed', () => {
  it('is one finding where nothing states the unit', () => {
    const [finding, ...more] = found('unit-assumed', assumed);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'query', key: 'unit-assumed|list', row: null });
    expect(sentence(finding!)).toBe(
      'No unit is stated for the durations of 2 activities, and none is set for the project: they are read as working days.',
    );
  });

  it('says nothing where the header or the project states it, or every cell that needs one', () => {
    expect(found('unit-assumed', list('A 1', 'B 2 <- A'))).toEqual([]);
    const parts = ['optimistic', 'likely', 'pessimistic'] as const;
    const stated = [0, 2].flatMap((index) => parts.map((part) => [index, part] as const));
    const all = stated.reduce(
      (audited, [index, part]) => withEstimate(audited, index, part, { unit: 'day' }),
      assumed as ReturnType<typeof list>,
    );
    expect(found('unit-assumed', all)).toEqual([]);
  });
});
