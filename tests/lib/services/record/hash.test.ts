import fc from 'fast-check';
import { expect, it } from 'vitest';
import { canonicalJson, entryHash, type SealedEntry } from '@/lib/services/record/hash';

const entry: SealedEntry = {
  office: 'o',
  submission: null,
  sequence: 1,
  at: '2027-03-01T09:00:00.000Z',
  actor: 'u',
  actorName: 'Ada',
  verb: 'comment added',
  audience: 'shared',
  data: { b: 1, a: [null, 'ü'] },
};

it('is one text for one value, whatever the order of names', () => {
  expect(canonicalJson({ b: 1, a: { d: [1, { z: null, y: 'x' }], c: undefined } })).toBe(
    '{"a":{"d":[1,{"y":"x","z":null}]},"b":1}',
  );
  fc.assert(
    fc.property(fc.jsonValue(), (value) => {
      const reversed = (v: unknown): unknown =>
        Array.isArray(v)
          ? v.map(reversed)
          : v !== null && typeof v === 'object'
            ? Object.fromEntries(
                Object.entries(v)
                  .reverse()
                  .map(([k, m]) => [k, reversed(m)]),
              )
            : v;
      expect(canonicalJson(reversed(value))).toBe(canonicalJson(value));
      expect(JSON.parse(canonicalJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
    }),
  );
});

it('changes with any change of the entry or of what stands before it', () => {
  const hash = entryHash('', entry);
  // SHA-256 of the canonical text, taken with another program (openssl dgst).
  expect(hash).toBe('33fc0ef0c01728132d61bd3497698c69f2ab62cc4b29f3f23bc33047ffd266d4');
  const others = [
    entryHash('x', entry),
    ...Object.keys(entry).map((name) => entryHash('', { ...entry, [name]: 'changed' } as SealedEntry)),
  ];
  expect(new Set([hash, ...others]).size).toBe(others.length + 1);
});
