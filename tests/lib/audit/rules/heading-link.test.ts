import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, writes } from '../helpers';

const rows = ['A 1 2 3', '# H1 "Piers"', 'P1 1 2 3 <- A', 'P2 1 2 3 <- P1', 'P3 1 2 3 <- P1', '# H2 "Deck"'];

describe('heading-link', () => {
  it('proposes the last activities under a heading that is waited for', () => {
    const received = list(...rows, 'D1 1 2 3 <- H1 FS+2');
    const [finding] = found('heading-link', received);
    expect(keys(received)).toEqual(['heading-link|D1|H1']);
    expect(finding).toMatchObject({ weight: 'distorts', activityId: 'D1', cell: 'F8' });
    expect(sentence(finding!)).toBe('D1 waits for H1, which is the heading “Piers” in row 3.');
    expect(writes(finding!.fix)).toEqual([['F8', 'H1 FS+2', 'P2 FS+2, P3 FS+2']]);
    expect(finding!.fix?.reason).toBe('What stands under H1 ends with P2 and P3.');
    expect(finding!.fix?.changes).toEqual([
      { kind: 'remove-link', link: 3 },
      { kind: 'add-link', from: 2, to: 4, type: 'FS', lag: 2 },
      { kind: 'add-link', from: 3, to: 4, type: 'FS', lag: 2 },
    ]);
    expect(finding!.alternatives?.map((fix) => writes(fix))).toEqual([[['F8', 'H1 FS+2', null]]]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('proposes the first activities under a heading that is to follow', () => {
    const received = list('A 1 2 3 -> H1', '# H1 "Piers"', 'P1 1 2 3 -> P3', 'P2 1 2 3 -> P3', 'P3 1 2 3');
    const [finding] = found('heading-link', received);
    expect(keys(received)).toEqual(['heading-link|A|H1']);
    expect(sentence(finding!)).toBe('A is to be followed by H1, which is the heading “Piers” in row 3.');
    expect(writes(finding!.fix)).toEqual([['G2', 'H1', 'P1, P2']]);
  });

  it('goes down to the next heading that lies no deeper', () => {
    const received = list(
      '# H1 "Piers"',
      'P1 1',
      '# H2 "Formwork"',
      'F1 1 <- P1',
      '# H3 "Deck"',
      'D1 1 <- H1',
    );
    const headings = received.headings.map((heading) => ({
      ...heading,
      outline: heading.id === 'H2' ? 1 : 0,
    }));
    const [finding] = found('heading-link', { ...received, headings });
    expect(finding!.fix?.edits[0]?.to).toBe('F1');
  });

  it('reckons with a link under the heading that is meant and wrongly written', () => {
    const received = list('# H1 "Piers"', 'P1 1', 'P2 1 <- p1', '# H2 "Deck"', 'D1 1 <- H1');
    expect(found('heading-link', received)[0]!.fix?.edits[0]?.to).toBe('P2');
  });

  it('offers the removal alone where the activity itself stands under the heading, or nothing does', () => {
    const own = found('heading-link', list('# H1 "Piers"', 'P1 1 2 3', 'P2 1 2 3 <- H1, P1'))[0]!;
    expect(own).not.toHaveProperty('fix');
    expect(own.alternatives?.map((fix) => fix.edits[0]?.to)).toEqual(['P1']);
    const empty = found('heading-link', list('A 1', 'B 1 <- A, H9', '# H9 "Later"'))[0]!;
    expect(empty).not.toHaveProperty('fix');
  });

  it('takes what is an ID of an activity for that', () => {
    expect(found('heading-link', list('# A "Piers"', 'A 1', 'B 1 <- A'))).toEqual([]);
  });
});
