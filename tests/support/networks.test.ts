import { describe, expect, it } from 'vitest';
import { list } from './networks';

describe('the short notation', () => {
  it('reads names, estimates and links of each relation', () => {
    const { activities, links, rows, singleDuration } = list(
      'A "Dig the pit" 2 4 6',
      'B 1 2 3 <- A SS+1.5, C FF-2, Z9',
      'C 1 - x -> A',
      '# H1 "Site"',
    );
    expect(activities.map(({ id, name, row }) => [id, name, row])).toEqual([
      ['A', 'Dig the pit', 2],
      ['B', 'Activity B', 3],
      ['C', 'Activity C', 4],
    ]);
    expect(activities[2]?.likely).toMatchObject({ days: null, text: '', problem: 'empty' });
    expect(activities[2]?.pessimistic).toMatchObject({ days: null, text: 'x', problem: 'unreadable' });
    expect(
      links.map(({ from, to, fromIndex, toIndex, type, lag }) => [from, to, fromIndex, toIndex, type, lag]),
    ).toEqual([
      ['A', 'B', 0, 1, 'SS', 1.5],
      ['C', 'B', 2, 1, 'FF', -2],
      ['Z9', 'B', -1, 1, 'FS', 0],
      ['C', 'A', 2, 0, 'FS', 0],
    ]);
    expect(rows).toMatchObject({ read: 4, activities: 3, headings: 1 });
    expect(singleDuration).toBe(false);
  });

  it('takes one number on every row as a single duration column', () => {
    const { activities, singleDuration } = list('A 2', 'B 3 <- A', '_ "No ID" 4 <- after B');
    expect(singleDuration).toBe(true);
    expect(activities[1]?.pessimistic).toMatchObject({ days: 3, cell: { row: 3, column: 2 } });
    expect(activities[2]).toMatchObject({ id: '', name: 'No ID' });
  });

  it('keeps an entry that cannot be read as one without a link', () => {
    const { linkCells, links } = list('A 2', 'B 3 <- A, see note 4 of A');
    expect(linkCells[0]?.items.map((item) => item.link?.id ?? null)).toEqual(['A', null]);
    expect(links).toHaveLength(1);
  });

  it('takes what is literally an ID as that ID', () => {
    expect(list('A-1 2', 'A 1', 'B 3 <- A-1 FF+2, A').links.map(({ from, type }) => [from, type])).toEqual([
      ['A-1', 'FF'],
      ['A', 'FS'],
    ]);
  });
});
