import { expect, it } from 'vitest';
import { audiencesFor } from '@/components/comments/audience';

it('offers the office its own circle first, and a scheduler the shared one only', () => {
  expect(audiencesFor('analyst')).toEqual(['inside', 'shared']);
  expect(audiencesFor('reviewer')).toEqual(['inside', 'shared']);
  expect(audiencesFor('scheduler')).toEqual(['shared']);
});
