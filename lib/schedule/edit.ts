import type { Relation } from './relation';
import type { CellContent } from './sheet';

/** A change to one entry of a predecessor or successor cell; entries are named by their text as written. */
export type ItemChange =
  | { readonly op: 'replace'; readonly item: string; readonly with: string }
  | { readonly op: 'remove'; readonly item: string }
  | { readonly op: 'add'; readonly item: string };

/**
 * A change to one cell. `items` says the same change entry by entry, so that several fixes of one
 * predecessor cell can be adopted together and undone one by one.
 */
export interface CellEdit {
  readonly sheet: string;
  /** Address, such as G23. */
  readonly cell: string;
  readonly from: CellContent;
  readonly to: CellContent;
  readonly items?: readonly ItemChange[];
  /** What stands before an added entry, blanks included; absent: as in the cell, else a comma and a blank. */
  readonly separator?: string;
}

/** What an edit means for the network; lets the finish effect be computed without reading the list again. */
export type NetworkChange =
  | {
      readonly kind: 'estimates';
      readonly activity: number;
      /** Working days. */
      readonly optimistic: number;
      readonly likely: number;
      readonly pessimistic: number;
    }
  | { readonly kind: 'remove-link'; readonly link: number }
  | {
      readonly kind: 'add-link';
      readonly from: number;
      readonly to: number;
      readonly type: Relation;
      readonly lag: number;
    }
  | { readonly kind: 'change-lag'; readonly link: number; readonly lag: number };

/** A proposal: a set of cell edits, with the reason for it. */
export interface Fix {
  /** A plain sentence: why this, and not something else. */
  readonly reason: string;
  readonly edits: readonly CellEdit[];
  /** Empty where it does not touch the network (a free ID for a second row, say). */
  readonly changes: readonly NetworkChange[];
}
