import { describe, expect, it } from 'vitest';
import { pieceOf, pieceWords, summariseEdits } from '@/components/findings/edit-text';
import { edit } from '@/tests/support/findings';

describe('the part of a cell that changes', () => {
  it('is the whole of a single value', () => {
    expect(pieceOf(edit('G23', 6, 4))).toEqual({ cell: 'G23', was: '6', now: '4' });
    expect(pieceOf(edit('A5', null, 'A-50'))).toEqual({ cell: 'A5', was: null, now: 'A-50' });
    expect(pieceOf(edit('A5', 'A-50', null))).toEqual({ cell: 'A5', was: 'A-50', now: null });
  });

  it('is the entry that differs, where the cell lists several', () => {
    expect(pieceOf(edit('K31', 'D-200, D-2O5; D-207', 'D-200, D-205; D-207'))).toEqual({
      cell: 'K31',
      was: 'D-2O5',
      now: 'D-205',
    });
  });

  it('shows a link removed, a link added, and one of two that are alike', () => {
    expect(pieceOf(edit('K1', 'B and C', 'C'))).toMatchObject({ was: 'B', now: null });
    expect(pieceOf(edit('K1', 'B', 'B, C'))).toMatchObject({ was: null, now: 'C' });
    expect(pieceOf(edit('K1', 'B, B', 'B'))).toMatchObject({ was: 'B', now: null });
  });

  it('falls back to the whole where only the separators differ', () => {
    expect(pieceOf(edit('K1', 'B;C', 'B, C'))).toMatchObject({ was: 'B;C', now: 'B, C' });
  });
});

describe('a fix in the width of a grid cell', () => {
  it('shows up to two pieces', () => {
    const two = summariseEdits([edit('G2', 6, 4), edit('H2', 4, 6)]);
    expect(two.kind === 'pieces' && two.pieces.map(pieceWords)).toEqual(['6 → 4', '4 → 6']);
  });

  it('counts cells beyond that, and where one is long', () => {
    expect(summariseEdits([edit('A1', 1, 2), edit('A2', 1, 2), edit('A3', 1, 2)])).toEqual({
      kind: 'count',
      text: '3 cells changed',
    });
    expect(summariseEdits([edit('A1', 'x'.repeat(70), 'y')])).toEqual({
      kind: 'count',
      text: '1 cell changed',
    });
    expect(summariseEdits([])).toEqual({ kind: 'none' });
  });

  it('says in words what a reader cannot see struck through', () => {
    expect(pieceWords({ cell: 'K1', was: 'B', now: null })).toBe('B removed');
    expect(pieceWords({ cell: 'K1', was: null, now: 'B' })).toBe('B added');
  });
});
