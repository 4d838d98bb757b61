import { expect, it } from 'vitest';
import { Lru } from '@/lib/services/schedule/lru';

it('drops what was used longest ago once it is over its weight', () => {
  const lru = new Lru<number>(10, (weight) => weight);
  lru.set('a', 4);
  lru.set('b', 4);
  expect(lru.get('a')).toBe(4);
  lru.set('c', 4);
  expect([lru.get('a'), lru.get('b'), lru.get('c')]).toEqual([4, undefined, 4]);
});

it('counts a replaced entry once, and keeps one that is too heavy alone', () => {
  const lru = new Lru<number>(10, (weight) => weight);
  lru.set('a', 6);
  lru.set('a', 5);
  lru.set('b', 5);
  expect([lru.get('a'), lru.get('b')]).toEqual([5, 5]);
  lru.set('c', 99);
  expect([lru.get('a'), lru.get('b'), lru.get('c')]).toEqual([undefined, undefined, 99]);
});
