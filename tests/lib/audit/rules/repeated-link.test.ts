import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keysAfter, sentence, writes } from '../helpers';

describe('repeated-link', () => {
  it('removes the link with the smaller lag', () => {
    const received = list('A 1 2 3', 'B 1 2 3 <- A, A FS+2');
    const [finding, ...more] = found('repeated-link', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({
      weight: 'query',
      activityId: 'B',
      cell: 'F3',
      key: 'repeated-link|A|B|FS',
    });
    expect(sentence(finding!)).toBe(
      'B waits for A twice, finish to start: once with a lag of 2 days and once without a lag.',
    );
    expect(writes(finding!.fix)).toEqual([['F3', 'A, A FS+2', 'A FS+2']]);
    expect(finding!.fix?.changes).toEqual([{ kind: 'remove-link', link: 0 }]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('takes a lead for smaller than no lag', () => {
    expect(writes(found('repeated-link', list('A 1', 'B 1 <- A SS, A SS-3'))[0]!.fix)).toEqual([
      ['F3', 'A SS, A SS-3', 'A SS'],
    ]);
  });

  it('removes the later one where both say the same', () => {
    const [finding] = found('repeated-link', list('A 1', 'C 1', 'B 1 <- A, C, A'));
    expect(sentence(finding!)).toBe('B waits for A twice, finish to start, without a lag each time.');
    expect(writes(finding!.fix)).toEqual([['F4', 'A, C, A', 'A, C']]);
  });

  it('finds each that is too many', () => {
    const findings = found('repeated-link', list('A 1', 'B 1 <- A +1, A +3, A +2'));
    expect(findings.map(({ fix }) => fix?.edits[0]?.to)).toEqual(['A +3, A +2', 'A +1, A +3']);
    expect(findings.map(({ key }) => key)).toEqual(['repeated-link|A|B|FS', 'repeated-link|A|B|FS#2']);
  });

  it('leaves alone another relation, a link said from both ends, and IDs that are not in the list', () => {
    expect(found('repeated-link', list('A 1', 'B 1 <- A SS, A FF'))).toEqual([]);
    expect(found('repeated-link', list('A 1 -> B', 'B 1 <- A'))).toEqual([]);
    expect(found('repeated-link', list('A 1', 'B 1 <- X, X'))).toEqual([]);
    expect(found('repeated-link', list('A 1 <- A, A'))).toEqual([]);
  });
});
