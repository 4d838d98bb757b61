/** What a file may measure at most. */
export const LIMITS = {
  fileBytes: 20 * 1024 * 1024,
  unpackedBytes: 500 * 1000 * 1000,
  /** Of one part of a workbook; more than any list of so many rows needs. */
  partBytes: 300 * 1000 * 1000,
  /** Rows of the list that hold anything. */
  rows: 200_000,
  /** Rows a file may have above and around the list. */
  rowsAround: 1_000,
  /** Entries of all predecessor and successor cells together. */
  links: 2_000_000,
  /** Columns of a sheet, A to XFD. */
  columns: 16_384,
  /** Places in rows, up to each row's last cell that holds anything. */
  cells: 20_000_000,
  /** Characters of a cell. */
  textLength: 32_767,
  /** Bytes that a cell's text may take in a part, references spelled out. */
  textBytes: 400_000,
  sharedStrings: 5_000_000,
  /** Elements of a part that holds the cells or their texts, and of any other part. */
  cellElements: 10_000_000,
  otherElements: 1_000_000,
} as const;
