'use client';

import { ErrorState } from '@/components/ui/states';
import type { FindingView } from '@/lib/contract/submission';
import { BenchSection } from './bench-section';
import { markedCells, MOST_ROWS } from './sheet-cells';
import { SheetPiece } from './sheet-piece';
import type { BenchState } from './use-bench';

interface CellsSectionProps {
  finding: FindingView;
  /** Name of the file it came in. */
  file: string;
  bench: BenchState;
}

/** The cells a finding is about, as they stand in the sheet; nothing where it is about the whole list. */
export function CellsSection({ finding, file, bench }: CellsSectionProps) {
  const { rows, piece, rowsAnswer, edits, proposed } = bench;
  if (rows.length === 0) return null;
  const workbook = /\.xls[a-z]?$/i.test(file);
  return (
    <BenchSection title={workbook ? `In the workbook, sheet “${finding.sheet ?? ''}”` : 'In the file'}>
      {piece && (
        <SheetPiece piece={piece} rows={rows} marked={markedCells(finding, edits)} proposed={proposed} />
      )}
      {!piece && rowsAnswer.error && (
        <ErrorState
          error={rowsAnswer.error}
          title="The cells could not be fetched"
          retry={() => void rowsAnswer.refetch()}
        />
      )}
      {!piece && !rowsAnswer.error && <p className="text-slate">Fetching the cells …</p>}
      {rows.length > MOST_ROWS && (
        <p className="text-slate">and {rows.length - MOST_ROWS} more rows that it touches.</p>
      )}
    </BenchSection>
  );
}
