import type { Detection } from './detection';

/** What is wrong with a matching, and with which field of the form. */
export interface MatchingError {
  /** `sheet`, `headerRow`, `columns` or `columns.<field>`. */
  readonly path: string;
  /** A plain sentence. */
  readonly message: string;
}

/** The columns cannot be told, or what was chosen cannot be: carries what was detected. */
export class UnmatchedColumns extends Error {
  override readonly name = 'UnmatchedColumns';

  constructor(
    readonly detection: Detection,
    readonly errors: readonly MatchingError[],
  ) {
    super(errors.map(({ message }) => message).join(' '));
  }
}
