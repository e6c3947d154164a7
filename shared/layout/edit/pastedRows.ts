import type { PanelRowText } from './panelRowText'
import { EMPTY_ROW } from './panelRowText'

/** Rows found in pasted text. `heading` is the line of column heads that was left out, if there was one. */
export interface PastedRows {
  readonly rows: readonly PanelRowText[]
  readonly heading: string | null
}

/** Order of the columns in a pasted row; the last two may be missing. */
const PASTED_COLUMNS = ['mark', 'alongX', 'alongY', 'ribs', 'times'] as const

/**
 * Rows of a spreadsheet as the clipboard gives them: lines, cells apart by tabs, quotes only around cells that hold a tab, a
 * quote or a line break. Columns: mark, along x, along y, ribs run, times. Cells are kept as they are, to be read, and
 * refused, one by one; cells beyond the columns are kept in the last one, so that they show as wrong. A first line without a
 * single digit is a line of heads.
 */
export function pastedRows(text: string): PastedRows {
  const lines = splitCells(text).filter((cells) => cells.some((cell) => cell.trim() !== ''))
  const [first] = lines
  const isHeading = first !== undefined && first.length > 1 && !/\d/.test(first.join(''))
  const rows = (isHeading ? lines.slice(1) : lines).map((cells) => {
    const named = PASTED_COLUMNS.map((column, i) => {
      const isLast = i === PASTED_COLUMNS.length - 1
      const cell = isLast
        ? cells
            .slice(i)
            .filter((each) => each.trim() !== '')
            .join(' ')
        : (cells[i] ?? '')
      return [column, cell.trim()] as const
    })
    return { ...EMPTY_ROW, ...Object.fromEntries(named) }
  })
  return { rows, heading: isHeading ? first.join(' ') : null }
}

/** True where pasted text is more than one cell. */
export function isManyCells(text: string): boolean {
  return /[\t\n]/.test(text.replace(/\r?\n$/, ''))
}

function splitCells(text: string): string[][] {
  const pattern = /(?:"((?:[^"]|"")*)"|([^\t\r\n]*))(\t|\r\n|\n|\r|$)/gy
  const lines: string[][] = [[]]
  for (let match = pattern.exec(text); match !== null; match = pattern.exec(text)) {
    const cell = match[1]?.replaceAll('""', '"') ?? match[2] ?? ''
    lines.at(-1)!.push(cell)
    if (match[3] === '' || pattern.lastIndex >= text.length) break
    if (match[3] !== '\t') lines.push([])
  }
  return lines
}
