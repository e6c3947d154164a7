/** Bounds of an uploaded table: what goes beyond is refused as a whole, never cut off. */
export const TABLE_LIMITS = {
  fileBytes: 20 * 1024 * 1024,
  /** Of all entries of a workbook together. */
  inflatedBytes: 160 * 1024 * 1024,
  entries: 500,
  sheets: 100,
  rows: 100_000,
  columns: 200,
  /** Characters of a cell that are looked at: no field of ours is longer than 400. */
  cellCharacters: 1000,
  /** First rows of a sheet that people see. */
  sampleRows: 40,
} as const
