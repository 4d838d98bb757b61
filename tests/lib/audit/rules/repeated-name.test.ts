import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, sentence } from '../helpers';

describe('repeated-name', () => {
  it('is one finding a name, whatever its case and blanks', () => {
    const received = list('A "Pour slab" 1', 'B "pour  slab " 1', 'C "Cure" 1', 'D "Cure" 1', 'E "Cure" 1');
    const findings = found('repeated-name', received);
    expect(findings.map(sentence)).toEqual([
      'A and B are both named “Pour slab”.',
      'C, D and E are all named “Cure”.',
    ]);
    expect(findings[0]).toMatchObject({
      weight: 'query',
      activityId: 'B',
      cell: 'B3',
      key: 'repeated-name|pour slab',
    });
  });

  it('leaves a row alone that repeats the ID as well, and rows without a name', () => {
    expect(found('repeated-name', list('A "Pour" 1', 'A "Pour" 1', 'B "" 1', 'C "" 1'))).toEqual([]);
  });
});
