import type { SheetRowsView } from '@/lib/contract/sheet-rows';

const cells = ['D-140', 'Drive piles, east', '6', '4', '11', 'D-130'];
const estimates = { optimistic: 6, likely: 4, pessimistic: 11 };

/** One row of a sheet as the bench is given it. */
export const piece: SheetRowsView = {
  sheet: 'Works',
  columns: [
    { index: 0, letters: 'A', field: 'id', title: 'ID' },
    { index: 5, letters: 'F', field: 'name', title: 'Name' },
    { index: 6, letters: 'G', field: 'optimistic', title: 'Optimistic (a)' },
    { index: 7, letters: 'H', field: 'likely', title: 'Most likely (m)' },
    { index: 8, letters: 'I', field: 'pessimistic', title: 'Pessimistic (b)' },
    { index: 9, letters: 'J', field: 'predecessors', title: 'Predecessors' },
  ],
  rows: [{ row: 23, received: { cells, estimates }, corrected: { cells, estimates } }],
};
