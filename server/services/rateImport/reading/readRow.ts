/** A cell: text, or the number of a workbook's cell; a day is ISO text. */
export type Cell = string | number

/** A row with something in it, as it was read. */
export interface ReadRow {
  readonly sheet: number
  /** Counted from 0. */
  readonly row: number
  readonly cells: readonly Cell[]
  readonly isHidden: boolean
}

/** A cell as people see it. */
export const cellText = (cell: Cell | undefined): string => (cell === undefined ? '' : String(cell).trim())
