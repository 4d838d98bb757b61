import { describe, expect, it } from 'vitest';
import { expectedWorking, pathVarianceWorking, varianceWorking } from '@/components/path/workings';
import type { Format } from '@/components/ui/locale';
import { formatDays, formatNumber } from '@/lib/client/format';
import { activity } from './activity';

const format = {
  number: (value: number, decimals: number) => formatNumber(value, decimals),
  days: (value: number, decimals?: number) => formatDays(value, undefined, decimals),
} as Format;

describe('worked lines', () => {
  it('put the figures of the activity into the formula', () => {
    const work = activity('A', {
      optimistic: 2,
      likely: 4.5,
      pessimistic: 10,
      expected: 5,
      variance: 16 / 9,
    });
    expect(expectedWorking(work, format)).toMatchObject({
      figures: '(2 + 4 × 4.5 + 10) / 6',
      result: '5.0000\u00a0d',
    });
    expect(varianceWorking(work, format)).toMatchObject({ figures: '((10 − 2) / 6)²', result: '1.7778 d²' });
  });

  it('write a long sum by its ends and count the rest', () => {
    const path = Array.from({ length: 40 }, (_, i) => activity(String(i), { variance: 1 }));
    expect(pathVarianceWorking(path, 40, format).figures).toContain('(28 more)');
  });

  it('say 0 where nothing varies', () => {
    expect(pathVarianceWorking([activity('A')], 0, format).figures).toBe('0');
  });
});
