'use client';

import type { GetRowIdParams, GridApi, RowHeightParams } from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { useEffect, useMemo, useRef, useState, type CSSProperties, type RefObject } from 'react';
import type { FindingView } from '@/lib/contract/submission';
import { useFormat } from '@/components/ui/locale';
import { useNonce } from '@/components/ui/nonce';
import type { FindingOrder } from '../order';
import { columnsOf, HEADER_ORDERS, type ColumnId } from './columns';
import type { GridContext } from './context';
import { GRID_MODULES, GRID_WORDS } from '@/components/ui/grid-modules';
import { gridTheme } from '@/components/ui/grid-theme';
import { useGridSize } from './use-grid-size';

interface FindingsGridProps {
  /** In the order shown. */
  findings: readonly FindingView[];
  selected: string | null;
  order: FindingOrder;
  severalSheets: boolean;
  onSelect: (id: string) => void;
  /** A row was clicked, or Enter pressed on it: its bench is wanted. */
  onOpen: (id: string, by: 'pointer' | 'key') => void;
  onOrder: (order: FindingOrder) => void;
}

const rowId = ({ data }: GetRowIdParams<FindingView>) => data.id;

export function FindingsGrid({ findings, selected, order, severalSheets, ...on }: FindingsGridProps) {
  const format = useFormat();
  const nonce = useNonce();
  const frame = useRef<HTMLDivElement>(null);
  const [api, setApi] = useState<GridApi<FindingView> | null>(null);
  const { shape, heightOf, contentHeight, readWidths } = useGridSize(frame, api, findings);
  const columns = useMemo(() => columnsOf(shape, order), [shape, order]);
  const context = useMemo<GridContext>(() => ({ format, severalSheets }), [format, severalSheets]);
  const rows = useMemo(() => [...findings], [findings]);
  useShownSelection(frame, api, selected, rows);

  return (
    <div
      ref={frame}
      className="h-(--grid-height) max-h-[max(440px,calc(100dvh-300px))] min-h-28"
      style={{ '--grid-height': `${String(contentHeight)}px` } as CSSProperties}
    >
      <AgGridReact<FindingView>
        modules={GRID_MODULES}
        theme={gridTheme}
        styleNonce={nonce}
        localeText={GRID_WORDS}
        rowData={rows}
        columnDefs={columns}
        context={context}
        getRowId={rowId}
        getRowHeight={({ data }: RowHeightParams<FindingView>) => (data ? heightOf(data) : 36)}
        defaultColDef={{
          sortable: false,
          resizable: false,
          suppressMovable: true,
          wrapText: true,
          wrapHeaderText: true,
        }}
        rowSelection={{ mode: 'singleRow', checkboxes: false, enableClickSelection: false }}
        headerHeight={shape === 'cards' ? 0 : 44}
        suppressOverlays={['noRows', 'loading']}
        suppressScrollOnNewData
        suppressRowHoverHighlight={false}
        ensureDomOrder
        enableCellTextSelection
        animateRows={false}
        onGridReady={(event) => setApi(event.api)}
        onFirstDataRendered={(event) => readWidths(event.api)}
        onNewColumnsLoaded={(event) => readWidths(event.api)}
        onColumnResized={(event) => readWidths(event.api)}
        onGridPreDestroyed={() => setApi(null)}
        onRowClicked={({ data }) => data && on.onOpen(data.id, 'pointer')}
        onCellKeyDown={({ data, event }) => {
          if (data && event instanceof KeyboardEvent && event.key === 'Enter') on.onOpen(data.id, 'key');
        }}
        onCellFocused={({ rowIndex, api: grid }) => {
          const id = rowIndex === null ? undefined : grid.getDisplayedRowAtIndex(rowIndex)?.data?.id;
          if (id !== undefined) on.onSelect(id);
        }}
        onColumnHeaderClicked={({ column }) => {
          const wanted = 'getColId' in column ? HEADER_ORDERS[column.getColId() as ColumnId] : undefined;
          if (wanted) on.onOrder(wanted);
        }}
      />
    </div>
  );
}

/** Marks the selected row and brings it into view; the focus goes with it where the grid has the focus. */
function useShownSelection(
  frame: RefObject<HTMLElement | null>,
  api: GridApi<FindingView> | null,
  selected: string | null,
  rows: readonly FindingView[],
) {
  useEffect(() => {
    const node = selected === null ? undefined : api?.getRowNode(selected);
    if (!api || !node) return;
    node.setSelected(true, true);
    api.ensureNodeVisible(node);
    const focused = api.getFocusedCell();
    const within = frame.current?.contains(document.activeElement);
    if (within && focused && node.rowIndex !== null && node.rowIndex !== focused.rowIndex) {
      api.setFocusedCell(node.rowIndex, focused.column);
    }
  }, [frame, api, selected, rows]);
}
