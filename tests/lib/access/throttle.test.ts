import { expect, it } from 'vitest';
import { createThrottle } from '@/lib/access/throttle';

function throttleAt() {
  const clock = { now: 0 };
  return { clock, throttle: createThrottle({ failures: 3, windowMs: 1000 }, () => clock.now) };
}

it('lets so many failures through, then has the next wait for the first to lapse', () => {
  const { clock, throttle } = throttleAt();
  for (const at of [0, 100, 200]) {
    clock.now = at;
    expect(throttle.wait('a')).toBe(0);
    throttle.failed('a');
  }
  expect(throttle.wait('a')).toBe(800);
  expect(throttle.wait('b')).toBe(0);
  clock.now = 1001;
  expect(throttle.wait('a')).toBe(0);
  throttle.failed('a');
  expect(throttle.wait('a')).toBe(99);
});

it('forgets the failures of who succeeds', () => {
  const { throttle } = throttleAt();
  for (let i = 0; i < 3; i += 1) throttle.failed('a');
  throttle.succeeded('a');
  expect(throttle.wait('a')).toBe(0);
});
