'use client';

import type { GetRowIdParams, GridApi } from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { useEffect, useMemo, useState } from 'react';
import { GRID_MODULES, GRID_WORDS } from '@/components/ui/grid-modules';
import { gridTheme } from '@/components/ui/grid-theme';
import { useFormat } from '@/components/ui/locale';
import { useNonce } from '@/components/ui/nonce';
import type { AnalysedActivity } from '@/lib/contract/submission';
import { activityColumns } from './columns';

const rowId = ({ data }: GetRowIdParams<AnalysedActivity>) => data.id;
const ROW_HEIGHT = 34;

/** Every activity with expected duration, variance, the four times and the floats; thousands of rows. */
export function ActivityTable({
  activities,
  near,
  selected,
  onSelect,
}: {
  activities: readonly AnalysedActivity[];
  near: number;
  selected: string | null;
  onSelect: (id: string) => void;
}) {
  const format = useFormat();
  const nonce = useNonce();
  const [api, setApi] = useState<GridApi<AnalysedActivity> | null>(null);
  const rows = useMemo(() => [...activities], [activities]);
  const columns = useMemo(() => activityColumns(format, near), [format, near]);
  useEffect(() => {
    if (!api) return;
    api.deselectAll();
    if (selected !== null) api.getRowNode(selected)?.setSelected(true);
  }, [api, selected]);

  return (
    <div style={{ height: Math.min(640, rows.length * ROW_HEIGHT + 56) }}>
      <AgGridReact<AnalysedActivity>
        modules={GRID_MODULES}
        theme={gridTheme}
        styleNonce={nonce}
        localeText={GRID_WORDS}
        rowData={rows}
        columnDefs={columns}
        getRowId={rowId}
        rowHeight={ROW_HEIGHT}
        headerHeight={40}
        defaultColDef={{ sortable: true, resizable: true, suppressMovable: true }}
        rowSelection={{ mode: 'singleRow', checkboxes: false, enableClickSelection: false }}
        ensureDomOrder
        enableCellTextSelection
        animateRows={false}
        onGridReady={(event) => setApi(event.api)}
        onGridPreDestroyed={() => setApi(null)}
        onRowClicked={({ data }) => data && onSelect(data.id)}
        onCellKeyDown={({ data, event }) => {
          if (data && event instanceof KeyboardEvent && event.key === 'Enter') onSelect(data.id);
        }}
      />
    </div>
  );
}
