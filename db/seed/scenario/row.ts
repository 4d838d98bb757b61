/** What a demo list holds in one row; estimates and links are written to the sheet as they stand here. */
export type Written = string | number | { readonly error: string } | null;

export interface DemoRow {
  readonly id: string | null;
  readonly name: string | null;
  readonly a: Written;
  readonly m: Written;
  readonly b: Written;
  readonly after: Written;
  readonly hidden?: boolean;
}

export interface DemoList {
  readonly title: string;
  readonly subtitle: string;
  readonly sheet: string;
  readonly header: readonly [string, string, string, string, string, string];
  readonly rows: readonly DemoRow[];
  /** Remarks below the list. */
  readonly foot: readonly string[];
}

export function heading(id: string | null, name: string): DemoRow {
  return { id, name, a: null, m: null, b: null, after: null };
}

export function work(
  id: string | null,
  name: string | null,
  [a, m, b]: readonly [Written, Written, Written],
  after: Written = null,
): DemoRow {
  return { id, name, a, m, b, after };
}

/** The same spread for every row: what an estimator does who fills a and b by a percentage. */
export function likely(m: number): readonly [number, number, number] {
  return [m * 0.8, m, m * 1.4];
}
