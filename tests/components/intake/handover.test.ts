import { afterEach, describe, expect, it } from 'vitest';
import { forget, handedOver, handOver } from '@/components/intake/handover';

const file = new File(['x'], 'list.csv');

afterEach(forget);

describe('handing a file over', () => {
  it('keeps it for its project and purpose alone, until it is forgotten', () => {
    handOver('p', file, 'take');
    expect(handedOver('p', 'take')).toBe(file);
    expect(handedOver('p', 'take')).toBe(file);
    expect(handedOver('q', 'take')).toBeNull();
    // What went straight through must not be handed in a second time by merely coming back.
    expect(handedOver('p', 'again')).toBeNull();
    forget();
    expect(handedOver('p', 'take')).toBeNull();
  });
});
