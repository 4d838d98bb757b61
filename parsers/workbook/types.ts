import type { Corrections } from '@/lib/corrections';
import type { CellContent, Sheet } from '@/lib/schedule/sheet';

/** One line of what changed and why, as it is listed and noted in the workbook. */
export interface ListedChange {
  readonly sheet: string;
  /** Address, such as G23. */
  readonly cell: string;
  /** ID of the activity in whose row the cell stands; '' where there is none. */
  readonly activity: string;
  readonly from: CellContent;
  readonly to: CellContent;
  /** The rule that was broken; '' for an edit by hand. */
  readonly rule: string;
  /** A plain sentence. */
  readonly reason: string;
  readonly by: string;
  /** When it was adopted, ISO 8601. */
  readonly at: string;
}

export interface GiveBackInput {
  /** The file as it was received. */
  readonly bytes: Uint8Array;
  readonly fileName: string;
  readonly corrections: Corrections;
  readonly changes: readonly ListedChange[];
  /** What `readSheets` gave for these bytes, where they are read already. */
  readonly sheets?: readonly Sheet[];
}

export interface GivenBack {
  readonly bytes: Uint8Array;
  readonly fileName: string;
  readonly contentType: string;
  readonly check: Check;
}

/** What was found when the file was read again before it is handed out. */
export interface Check {
  /** Corrections that the file should hold, and those it was found to hold. */
  readonly expected: number;
  readonly found: number;
  readonly missing: readonly { readonly sheet: string; readonly cell: string; readonly reason: string }[];
  /** What else the receiver ought to know, in plain sentences. */
  readonly remarks: readonly string[];
  /** "12 of 12 corrections found in the file." */
  readonly sentence: string;
}

/** A cell whose content differs between the file as received and as corrected. */
export interface ChangedCell {
  readonly sheet: string;
  /** From 1. */
  readonly row: number;
  /** 0 = A. */
  readonly column: number;
  readonly cell: string;
  readonly from: CellContent;
  readonly to: CellContent;
}

/** A file with the cells changed, not yet read again. */
export interface Patched {
  readonly bytes: Uint8Array;
  readonly remarks: readonly string[];
  /** Cells that the file cannot be made to hold, and why. */
  readonly refused: readonly { readonly sheet: string; readonly cell: string; readonly reason: string }[];
}
