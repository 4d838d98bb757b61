import { expect, it } from 'vitest';
import { deedSentence } from '@/lib/client/record';

const entry = { sequence: 4, at: '2027-03-09T10:12:00.000Z', by: 'Piet Ostra', verb: 'adopt', hash: 'ab' };

it('tells what someone did as a sentence about them', () => {
  expect(deedSentence({ ...entry, summary: 'Adopted 3 fixes in 4 cells.' })).toBe(
    'Piet Ostra adopted 3 fixes in 4 cells.',
  );
});

it('leaves a sentence about the revision as it is', () => {
  expect(deedSentence({ ...entry, summary: 'Rev 2 came in and supersedes this one.' })).toBe(
    'Piet Ostra: Rev 2 came in and supersedes this one.',
  );
});
