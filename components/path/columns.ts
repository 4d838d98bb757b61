import type { ColDef } from 'ag-grid-community';
import type { Format } from '@/components/ui/locale';
import type { AnalysedActivity } from '@/lib/contract/submission';
import { standing, type Standing } from './rows';

type NumberField = {
  [K in keyof AnalysedActivity]: AnalysedActivity[K] extends number ? K : never;
}[keyof AnalysedActivity];

const WORDS: Record<Standing, string> = { critical: '═ critical', near: '╌ near-critical', slack: '' };

/** The table's columns: what was put in, what was computed, how it stands to the finish. */
export function activityColumns(format: Format, near: number): ColDef<AnalysedActivity>[] {
  const number = (
    field: NumberField,
    headerName: string,
    decimals: number,
    width = 84,
  ): ColDef<AnalysedActivity> => ({
    field,
    headerName,
    width,
    valueFormatter: ({ value }: { value: number }) => format.number(value, decimals),
    cellClass: 'text-right',
    headerClass: 'ag-right-aligned-header',
  });
  return [
    { field: 'id', headerName: 'ID', width: 96, cellClassRules: { 'font-semibold': isCritical } },
    {
      field: 'name',
      headerName: 'Name',
      minWidth: 160,
      flex: 1,
      cellClassRules: { 'font-semibold': isCritical },
    },
    number('optimistic', 'a', 1, 66),
    number('likely', 'm', 1, 66),
    number('pessimistic', 'b', 1, 66),
    number('expected', 'Expected', 2, 92),
    number('variance', 'Variance', 2, 92),
    number('earlyStart', 'Early start', 1, 98),
    number('earlyFinish', 'Early finish', 1, 102),
    number('lateStart', 'Late start', 1, 94),
    number('lateFinish', 'Late finish', 1, 98),
    number('totalFloat', 'Total float', 1, 98),
    number('freeFloat', 'Free float', 1, 94),
    {
      colId: 'standing',
      headerName: 'Path',
      width: 132,
      valueGetter: ({ data }) => (data ? WORDS[standing(data, near)] : ''),
      cellClassRules: {
        'font-semibold text-umber': isCritical,
        'text-brass': ({ data }) => data !== undefined && standing(data, near) === 'near',
      },
    },
    {
      field: 'startDate',
      headerName: 'Starts',
      width: 118,
      valueFormatter: ({ value }: { value: string }) => format.date(value),
    },
    {
      field: 'finishDate',
      headerName: 'Finishes',
      width: 118,
      valueFormatter: ({ value }: { value: string }) => format.date(value),
    },
  ];
}

function isCritical({ data }: { data?: AnalysedActivity | undefined }): boolean {
  return data?.critical === true;
}
