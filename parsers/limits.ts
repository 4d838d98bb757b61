/** What a file may measure at most. */
export const LIMITS = {
  fileBytes: 20 * 1024 * 1024,
  unpackedBytes: 500 * 1000 * 1000,
  /** Rows of the list that hold anything. */
  rows: 200_000,
  /** Rows a file may have above and around the list. */
  rowsAround: 1_000,
  /** Columns of a sheet, A to XFD. */
  columns: 16_384,
  /** Places in rows, up to each row's last cell that holds anything. */
  cells: 20_000_000,
  textLength: 32_767,
} as const;
