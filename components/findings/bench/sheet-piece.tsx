'use client';

import { Change } from '@/components/ui/change';
import { classes } from '@/components/ui/classes';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import { addressOf, cellShown, columnHeading, columnsToShow, type CellShown } from './sheet-cells';

interface SheetPieceProps {
  piece: SheetRowsView;
  /** Rows wanted; those the piece does not have are left out. */
  rows: readonly number[];
  marked: ReadonlySet<string>;
  /** By address: what the chosen fix, or the hand, would write. */
  proposed: ReadonlyMap<string, string>;
}

/** The cells as they stand in the sheet: row numbers, letters, what each column holds, and what changes. */
export function SheetPiece({ piece, rows, marked, proposed }: SheetPieceProps) {
  const columns = columnsToShow(piece.columns, marked);
  const shown = piece.rows.filter(({ row }) => rows.includes(row));
  return (
    <div
      role="region"
      aria-label={`Cells of the sheet ${piece.sheet}`}
      tabIndex={0}
      className="max-w-full overflow-x-auto"
    >
      <table className="w-full border-collapse border border-hair">
        <thead>
          <tr className="bg-lime text-slate">
            <th scope="col" className="border border-hair px-2">
              <span className="sr-only">Row</span>
            </th>
            {columns.map((column) => (
              <th
                key={column.index}
                scope="col"
                title={column.title}
                className="border border-hair px-2 py-0.5 text-center font-semibold whitespace-nowrap"
              >
                {column.letters} · {columnHeading(column)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {shown.map(({ row, received, corrected }) => (
            <tr key={row}>
              <th scope="row" className="border border-hair bg-lime px-2 font-semibold text-slate">
                {row}
              </th>
              {columns.map((column) => {
                const at = piece.columns.indexOf(column);
                const address = addressOf(column, row);
                return (
                  <Cell
                    key={address}
                    marked={marked.has(address)}
                    shown={cellShown(
                      received.cells[at] ?? '',
                      corrected.cells[at] ?? '',
                      proposed.get(address),
                    )}
                  />
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Cell({ marked, shown }: { marked: boolean; shown: CellShown }) {
  return (
    <td
      className={classes(
        'border border-hair px-2 py-1 align-top break-words',
        marked && 'outline-2 -outline-offset-2 outline-umber',
      )}
    >
      {shown.kind === 'same' ? (
        shown.text
      ) : (
        <span className={classes(isShort(shown) && 'whitespace-nowrap')}>
          <Change from={shown.from} to={shown.to} />
        </span>
      )}
      {marked && <span className="sr-only"> (this cell is what the finding is about)</span>}
    </td>
  );
}

/** Fits beside the other estimates without a break. */
function isShort({ from, to }: { from: string; to: string }): boolean {
  return from.length + to.length <= 8;
}
