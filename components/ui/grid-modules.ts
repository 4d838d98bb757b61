import {
  CellStyleModule,
  ClientSideRowModelApiModule,
  ClientSideRowModelModule,
  ColumnApiModule,
  LocaleModule,
  RowApiModule,
  RowSelectionModule,
  ScrollApiModule,
  ValidationModule,
  type Module,
} from 'ag-grid-community';

/** No more than the findings need; the grid's own checks only while developing. */
export const GRID_MODULES: Module[] = [
  ClientSideRowModelModule,
  ClientSideRowModelApiModule,
  CellStyleModule,
  ColumnApiModule,
  LocaleModule,
  RowApiModule,
  RowSelectionModule,
  ScrollApiModule,
  ...(process.env.NODE_ENV === 'development' ? [ValidationModule] : []),
];

/** What the grid says to those who hear it. */
export const GRID_WORDS: Record<string, string> = {
  ariaRowSelect: 'Press Enter to open it on the bench',
  ariaRowToggleSelection: 'Press Enter to open it on the bench',
};
