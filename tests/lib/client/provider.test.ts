import { describe, expect, it } from 'vitest';
import { toClientError, unreachable } from '@/lib/client/error';
import { worthAnotherTry } from '@/lib/client/provider';

describe('worthAnotherTry', () => {
  it('takes a refusal for an answer', () => {
    for (const status of [400, 401, 403, 404, 409, 422, 429]) {
      expect(worthAnotherTry(0, toClientError(status, ''))).toBe(false);
    }
  });

  it('asks a stumbling server or a lost connection twice more', () => {
    for (const error of [toClientError(503, ''), unreachable(), new TypeError('x')]) {
      expect([0, 1, 2].map((failures) => worthAnotherTry(failures, error))).toEqual([true, true, false]);
    }
  });
});
