import type { Field, Matching } from '@/lib/schedule/field';
import type { Sheet } from '@/lib/schedule/sheet';
import { isBlank } from '@/parsers/cells/text';
import { assign, type Choice } from './assign';
import { proposeByContent } from './by-content';
import { contentsOf } from './content';
import { findHeader, guessHeader, type Header, headerAt } from './header-row';

export interface DetectedColumn {
  /** 0 = A. */
  readonly index: number;
  readonly header: string;
  readonly field: Field | null;
  /** 0 … 1; 0 where no field was told. */
  readonly confidence: number;
  /** A plain sentence. */
  readonly reason: string;
  /** The unit the header states, as written ways of working time; null where it states none. */
  readonly unit: string | null;
}

export interface DetectedSheet {
  readonly name: string;
  readonly hidden: boolean;
  /** Last row of the header, from 1; 0 where none was found. */
  readonly headerRow: number;
  readonly columns: readonly DetectedColumn[];
  /** Rows below the header to the last that holds anything. */
  readonly rows: number;
}

/** What was told of a file: how each sheet could be read, and how the list would be. */
export interface Detection {
  readonly sheets: readonly DetectedSheet[];
  /** Name of the (first) sheet proposed or chosen; null where none holds anything. */
  readonly proposed: string | null;
  /** How the list is read if nobody says otherwise. */
  readonly matching: Matching;
  /** Whether it can go straight through. */
  readonly sure: boolean;
  /** What is missing or contradictory, in plain sentences; where there is any, the list cannot be read. */
  readonly problems: readonly string[];
}

/** A sheet with its header and the columns told for it. */
export interface SheetReading {
  readonly sheet: Sheet;
  readonly header: Header;
  readonly choices: ReadonlyMap<Field, Choice>;
  readonly problems: readonly string[];
  readonly rows: number;
}

/** Columns of a sheet that are looked at. */
const WIDTH_MAX = 1000;

/** Tells header and columns of a sheet, at a header row that is given or found. */
export function detectSheet(sheet: Sheet, headerRow?: number): SheetReading {
  const header =
    headerRow === undefined
      ? (findHeader(sheet) ?? guessHeader(sheet) ?? { row: 0, columns: [] })
      : headerAt(sheet, headerRow);
  const contents = contentsOf(sheet, header.row, Math.min(sheet.columnCount, WIDTH_MAX));
  const { choices, problems } = assign(header.columns, contents);
  const all = new Map([...choices, ...proposeByContent(contents, choices)]);
  const unheaded =
    header.row === 0 ? ['No row could be told to be the header. Choose it, and the columns.'] : [];
  return {
    sheet,
    header,
    choices: all,
    problems: [...unheaded, ...problems],
    rows: rowsBelow(sheet, header.row),
  };
}

/** Rows below the header to the last that holds anything. */
export function rowsBelow(sheet: Sheet, headerRow: number): number {
  for (let i = sheet.rows.length - 1; i >= 0; i--) {
    const row = sheet.rows[i];
    if (row && row.number > headerRow && row.cells.some((value) => !isBlank(value)))
      return row.number - headerRow;
  }
  return 0;
}

/** The sheet as it is shown: every column that has a header, a field, or a cell in the first rows. */
export function toDetectedSheet({ sheet, header, choices, rows }: SheetReading): DetectedSheet {
  const reasonOf = (reason: string, index: number) =>
    sheet.hiddenColumns.has(index) ? `${reason} The column is hidden in the sheet.` : reason;
  const fieldOf = new Map([...choices].map(([field, choice]) => [choice.column, { field, ...choice }]));
  const width = Math.min(sheet.columnCount, WIDTH_MAX);
  const columns = Array.from({ length: width }, (_, index): DetectedColumn => {
    const told = fieldOf.get(index);
    const reading = header.columns[index];
    const [unit, other] = reading?.unit ?? [];
    return {
      index,
      header: reading?.text ?? '',
      field: told?.field ?? null,
      confidence: told?.confidence ?? 0,
      reason: reasonOf(told?.reason ?? 'Nothing says what it holds; it is not used.', index),
      unit: unit && !other ? unit.unit : null,
    };
  });
  return { name: sheet.name, hidden: sheet.hidden, headerRow: header.row, columns, rows };
}
