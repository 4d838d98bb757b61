import type { ColDef } from 'ag-grid-community';
import type { FindingView } from '@/lib/contract/submission';
import type { FindingOrder } from '../order';
import {
  AboutAndMessageCell,
  AboutCell,
  CardCell,
  EffectCell,
  FixCell,
  MessageCell,
  PlaceCell,
  StateCell,
  WeightCell,
} from './cells';
import type { GridShape } from './context';

/** Ids of columns, in reading order. */
export type ColumnId = 'weight' | 'place' | 'about' | 'message' | 'fix' | 'effect' | 'state' | 'card';

type Column = ColDef<FindingView> & { readonly colId: ColumnId };

/** Which order a click on a header asks for. */
export const HEADER_ORDERS: Partial<Record<ColumnId, FindingOrder>> = {
  weight: 'weight',
  place: 'row',
  about: 'activity',
  effect: 'costliest',
};

const weight: Column = { colId: 'weight', headerName: 'Weight', width: 98, cellRenderer: WeightCell };
const place: Column = { colId: 'place', headerName: 'Cell', width: 82, cellRenderer: PlaceCell };
const about: Column = {
  colId: 'about',
  headerName: 'Activity',
  flex: 2,
  minWidth: 110,
  cellRenderer: AboutCell,
};
const message: Column = {
  colId: 'message',
  headerName: 'What is wrong',
  flex: 5,
  minWidth: 180,
  cellRenderer: MessageCell,
};
const fix: Column = { colId: 'fix', headerName: 'Fix', width: 138, cellRenderer: FixCell };
const effect: Column = {
  colId: 'effect',
  headerName: 'Finish effect',
  width: 84,
  cellRenderer: EffectCell,
  cellClass: 'text-right',
  headerClass: 'ag-right-aligned-header',
};
const state: Column = { colId: 'state', headerName: 'State', width: 102, cellRenderer: StateCell };

const SHAPES: Record<GridShape, readonly Column[]> = {
  wide: [weight, place, about, message, fix, effect, state],
  fair: [
    weight,
    place,
    { ...message, headerName: 'Activity, and what is wrong', cellRenderer: AboutAndMessageCell },
    fix,
    effect,
    state,
  ],
  cards: [{ colId: 'card', headerName: 'Findings', flex: 1, cellRenderer: CardCell }],
};

/** The columns of a shape; the one the rows are ordered by says so in its header. */
export function columnsOf(shape: GridShape, order: FindingOrder): Column[] {
  return SHAPES[shape].map((column) =>
    HEADER_ORDERS[column.colId] === order
      ? { ...column, headerName: `${column.headerName ?? ''} ${order === 'costliest' ? '↓' : '↑'}` }
      : column,
  );
}
