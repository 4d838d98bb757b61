import { describe, expect, it } from 'vitest';
import { composeAdoption, contentAt, replay, withdraw } from '@/lib/corrections';
import type { CellEdit, ItemChange } from '@/lib/schedule/edit';
import { sheetOf } from './sheets';

const list = sheetOf([
  ['ID', 'After'],
  ['A', null],
  ['B', 'Z1, Z2'],
]);
const change = (id: string, ...items: ItemChange[]) => ({
  id,
  edits: [{ sheet: 'List', cell: 'B3', from: null, to: null, items } satisfies CellEdit],
});
const first = change('first', { op: 'replace', item: 'Z1', with: 'A' });
const second = change('second', { op: 'remove', item: 'Z2' });

describe('replay', () => {
  it('works every event out afresh', () => {
    const { events, inapplicable, sheets } = replay([list], [first, second]);
    expect(events.map(({ edits }) => [edits[0]?.from, edits[0]?.to])).toEqual([
      ['Z1, Z2', 'A, Z2'],
      ['A, Z2', 'A'],
    ]);
    expect(inapplicable).toEqual([]);
    expect(contentAt(sheets, 'List', 'B3')).toBe('A');
  });

  it('gives the same as adopting did', () => {
    const { adopted, sheets } = composeAdoption([list], [first, second]);
    expect(replay([list], adopted)).toEqual({ events: adopted, inapplicable: [], sheets });
  });
});

describe('withdraw', () => {
  it('takes back one of two fixes of a cell', () => {
    const { events, sheets } = withdraw([list], [first, second], 'first');
    expect(events).toHaveLength(1);
    expect(events[0]?.edits[0]).toMatchObject({ from: 'Z1, Z2', to: 'Z1' });
    expect(contentAt(sheets, 'List', 'B3')).toBe('Z1');
  });

  it('tells of an event that hung on the one taken back', () => {
    const later = change('later', { op: 'replace', item: 'A', with: 'A SS' });
    const { events, inapplicable } = withdraw([list], [first, later], 'first');
    expect(inapplicable).toEqual([{ id: 'later', reason: 'B3 no longer names “A”.' }]);
    expect(events[0]?.edits[0]).toMatchObject({ from: 'Z1, Z2', to: 'Z1, Z2' });
  });

  it('tells of an event whose sheet is not there', () => {
    const astray = { id: 'astray', edits: [{ sheet: 'X', cell: 'B3', from: 'a', to: 'b' }] };
    expect(replay([list], [astray]).inapplicable).toEqual([
      { id: 'astray', reason: 'There is no cell B3 on a sheet “X”.' },
    ]);
  });
});
