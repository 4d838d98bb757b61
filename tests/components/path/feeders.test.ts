import { describe, expect, it } from 'vitest';
import { feedersOf } from '@/components/path/feeders';
import { activity, after } from './activity';

describe('feedersOf', () => {
  const list = [
    activity('A'),
    activity('B', { predecessors: after('A', 'X') }),
    activity('C', { predecessors: after('B', 'Y', 'gone') }),
    activity('X', { totalFloat: 3, predecessors: after('W') }),
    activity('W', { totalFloat: 3, predecessors: after('A') }),
    activity('Y', { totalFloat: 1, predecessors: after('X') }),
  ];
  const byId = new Map(list.map((each) => [each.id, each]));

  it('counts each activity once, where it first reaches the chain', () => {
    const [a, b, c] = feedersOf(['A', 'B', 'C'], byId);
    expect(a?.activities).toEqual([]);
    expect(a?.leastFloat).toBe(Infinity);
    expect(b?.activities.map((each) => each.id).sort()).toEqual(['W', 'X']);
    expect(c?.activities.map((each) => each.id)).toEqual(['Y']);
    expect(c?.leastFloat).toBe(1);
  });

  it('goes through a long chain without recursion', () => {
    const long = Array.from({ length: 50_000 }, (_, i) =>
      activity(`N${i}`, { predecessors: i > 0 ? after(`N${i - 1}`) : [] }),
    );
    const end = activity('END', { predecessors: after('N49999') });
    const found = feedersOf(['END'], new Map([...long, end].map((each) => [each.id, each])));
    expect(found[0]?.activities).toHaveLength(50_000);
  });
});
