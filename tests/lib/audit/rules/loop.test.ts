import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, writes } from '../helpers';

describe('loop', () => {
  it('shows the ring in a sentence and cuts one link', () => {
    const received = list('S 1 2 3', 'A 1 2 3 <- S, C', 'B 1 2 3 <- A', 'C 1 2 3 <- B', 'E 1 2 3 <- C');
    const [finding, ...more] = found('loop', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'blocks', key: 'loop|A B C', data: { loop: ['A', 'B', 'C'] } });
    expect(sentence(finding!)).toBe('A waits for C, C for B, and B for A.');
    const ways = [finding!.fix!, ...(finding!.alternatives ?? [])];
    expect(ways.map((fix) => fix.changes)).toHaveLength(3);
    for (const fix of ways) {
      expect(fix.edits).toHaveLength(1);
      expect(keysAfter(received, fix).filter((key) => key.startsWith('loop'))).toEqual([]);
    }
    expect(finding!.cell).toBe(finding!.fix!.edits[0]?.cell);
  });

  it('cuts the link that two loops share', () => {
    const received = list('A 1 2 3 <- D', 'B 1 2 3 <- A', 'C 1 2 3 <- A', 'D 1 2 3 <- B, C');
    const [finding, ...more] = found('loop', received);
    expect(more).toEqual([]);
    expect(writes(finding!.fix)).toEqual([['F2', 'D', null]]);
    expect(finding!.alternatives).toEqual([]);
    expect(sentence(finding!)).toMatch(
      /^.*\. This is the shortest loop among 4 activities that wait for one another\.$/,
    );
  });

  it('names two links where one is not enough, and edits each cell once', () => {
    const received = list('A 1 2 3 <- B, C', 'B 1 2 3 <- A', 'C 1 2 3 <- A');
    const [finding] = found('loop', received);
    expect(sentence(finding!)).toMatch(/^A waits for (B and B|C and C) for A\. This is the shortest/);
    expect(finding!.fix!.changes).toHaveLength(2);
    expect(finding!.fix!.reason).toContain('no smaller number of links would do');
    expect(new Set(finding!.fix!.edits.map(({ cell }) => cell)).size).toBe(finding!.fix!.edits.length);
    expect(keysAfter(received, finding!.fix).filter((key) => key.startsWith('loop'))).toEqual([]);
  });

  it('is one finding a tangle', () => {
    const received = list('A 1 <- B', 'B 1 <- A', 'C 1 <- D', 'D 1 <- C, B');
    expect(found('loop', received).map(({ key }) => key)).toEqual(['loop|A B', 'loop|C D']);
  });

  it('edits the successors where the list gives those', () => {
    const received = list('A 1 -> B', 'B 1 -> C', 'C 1 -> A, D', 'D 1');
    const [finding] = found('loop', received);
    expect(sentence(finding!)).toBe('A waits for C, C for B, and B for A.');
    expect(finding!.fix!.edits[0]?.cell).toMatch(/^G/);
    expect(keysAfter(received, finding!.fix).filter((key) => key.startsWith('loop'))).toEqual([]);
  });

  it('shortens a long ring in its sentence and in its key, not in its data', () => {
    const rows = Array.from({ length: 40 }, (_, i) => `T${i + 10} 1 <- T${i === 0 ? 49 : i + 9}`);
    const [finding] = found('loop', list(...rows));
    expect(sentence(finding!)).toBe(
      'T10 waits for T49, T49 for T48, T48 for T47, T47 for T46, T46 for T45, T45 for T44, 33 more like them, and T11 for T10.',
    );
    expect(finding!.key).toMatch(/^loop\|T10 T11 .* \+28$/);
    expect(finding!.data.loop).toHaveLength(40);
  });

  it('keeps its key whatever row the list begins with', () => {
    const one = found('loop', list('A 1 <- C', 'B 1 <- A', 'C 1 <- B'));
    const other = found('loop', list('C 1 <- B', 'B 1 <- A', 'A 1 <- C'));
    expect(other.map(({ key }) => key)).toEqual(one.map(({ key }) => key));
  });

  it('finds none in an order, whatever the relations', () => {
    expect(keys(list('A 1 2 3', 'B 1 2 3 <- A SS+1, A FF', 'C 1 2 3 <- B SF+9'))).toEqual([]);
    expect(found('loop', list('A 1 <- B SS', 'B 1 <- A FF'))).toHaveLength(1);
  });
});
