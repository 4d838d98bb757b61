import { describe, expect, it } from 'vitest';
import {
  cellShown,
  columnHeading,
  columnsToShow,
  columnTitle,
  currentText,
  markedCells,
  proposedTexts,
  rowsToShow,
} from '@/components/findings/bench/sheet-cells';
import { edit, finding } from '@/tests/support/findings';
import { piece } from './piece';

const swap = [edit('G23', 6, 4), edit('H23', 4, 6)];

describe('which cells the bench shows', () => {
  it('outlines the faulty cell and those the fix would change', () => {
    expect([...markedCells(finding(23), swap)]).toEqual(['G23', 'H23']);
    expect([...markedCells(finding(23), [{ ...edit('k9', 1, 2), sheet: 'Other' }])]).toEqual(['G23']);
  });

  it('shows the rows of all edits on the sheet, in order', () => {
    expect(rowsToShow(finding(23), [edit('K41', 'B', null), edit('K9', 'C', null)])).toEqual([9, 23, 41]);
    expect(rowsToShow(finding(23, { row: null }), [])).toEqual([]);
  });

  it('shows the name, what is marked, and the estimates together', () => {
    const titles = (marked: string[]) =>
      columnsToShow(piece.columns, new Set(marked)).map(({ field }) => field);
    expect(titles(['G23'])).toEqual(['name', 'optimistic', 'likely', 'pessimistic']);
    expect(titles(['J23'])).toEqual(['name', 'predecessors']);
    expect(titles(['A23'])).toEqual(['id', 'name']);
    expect(columnsToShow(piece.columns.slice(0, 1), new Set()).map(({ field }) => field)).toEqual(['id']);
    expect(piece.columns.slice(0, 3).map(columnHeading)).toEqual(['ID', 'Name', 'a']);
  });
});

describe('what a cell shows', () => {
  it('is a proposal over what is there now', () => {
    expect(cellShown('6', '5', '4')).toEqual({ kind: 'proposed', from: '5', to: '4' });
  });

  it('is what corrections made, once the proposal is in force', () => {
    expect(cellShown('6', '4', '4')).toEqual({ kind: 'made', from: '6', to: '4' });
    expect(cellShown('6', '4', undefined)).toEqual({ kind: 'made', from: '6', to: '4' });
  });

  it('is its content where nothing changed', () => {
    expect(cellShown('6', '6', undefined)).toEqual({ kind: 'same', text: '6' });
  });

  it('takes the texts of a fix by address, on this sheet only', () => {
    const edits = [edit('g23', 6, 4), edit('H23', 4, null), { ...edit('A1', 1, 2), sheet: 'Other' }];
    expect([...proposedTexts(edits, 'Works')]).toEqual([
      ['G23', '4'],
      ['H23', ''],
    ]);
  });

  it('can be looked up by address', () => {
    expect(currentText(piece, 'G23')).toBe('6');
    expect(currentText(piece, 'G99')).toBeUndefined();
    expect(columnTitle(piece, 'H23')).toBe('Most likely (m)');
    expect(columnTitle(piece, 'not an address')).toBeUndefined();
  });
});
