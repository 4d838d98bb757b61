import { expect, it } from 'vitest';
import { z } from 'zod';
import { checked, Invalid } from '@/lib/contract/errors';

function sentence(shape: z.ZodType, sent: unknown): string {
  try {
    checked(shape, sent);
  } catch (error) {
    if (error instanceof Invalid) return error.message;
    throw error;
  }
  throw new Error('It was taken.');
}

it('says plainly what is wrong where a shape has no sentence of its own', () => {
  expect(sentence(z.number().min(1), 0)).toBe('This must be at least 1.');
  expect(sentence(z.number().gt(0), 0)).toBe('This must be more than 0.');
  expect(sentence(z.number().lt(1), 1)).toBe('This must be less than 1.');
  expect(sentence(z.string().max(3), 'four')).toBe('This must have at most 3 characters.');
  expect(sentence(z.array(z.string()).max(1), ['a', 'b'])).toBe('This must hold at most 1.');
  expect(sentence(z.union([z.string(), z.null()]), 1)).toBe('This is of another kind than expected.');
  expect(sentence(z.uuid(), 'x')).toBe('This is no id.');
  expect(sentence(z.object({ a: z.number() }), { a: 'x' })).toBe('This must be a number.');
  expect(sentence(z.object({ a: z.string(), b: z.string() }), {})).toBe('2 fields are not as they must be.');
});

it('keeps to a shape’s own sentence where it has one', () => {
  expect(sentence(z.string().min(1, 'Give it a name.'), '')).toBe('Give it a name.');
});
