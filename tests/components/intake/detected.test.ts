import { describe, expect, it } from 'vitest';
import { detectedIn, existingIn } from '@/components/intake/detected';
import { toClientError } from '@/lib/client/error';

const found = { sheets: [], proposed: null, sure: false, problems: [], sample: [], preview: [] };

describe('detectedIn', () => {
  it('finds what was detected in the refusal of a submission', () => {
    expect(detectedIn(toClientError(422, JSON.stringify({ title: 'No', detected: found })))).toEqual(found);
    expect(detectedIn(toClientError(422, JSON.stringify({ title: 'No', ...found })))).toMatchObject(found);
  });

  it('finds nothing in other refusals', () => {
    expect(detectedIn(toClientError(422, JSON.stringify({ title: 'No' })))).toBeNull();
    expect(detectedIn(toClientError(409, JSON.stringify({ title: 'No', detected: found })))).toBeNull();
    expect(detectedIn(new Error('x'))).toBeNull();
  });
});

describe('existingIn', () => {
  it('finds the revision that the same file is already', () => {
    const body = JSON.stringify({ title: 'No', submission: 's', revision: 2 });
    expect(existingIn(toClientError(409, body))).toEqual({ id: 's', revision: 2 });
    expect(existingIn(toClientError(409, '{}'))).toBeNull();
    expect(existingIn(toClientError(422, body))).toBeNull();
  });
});
