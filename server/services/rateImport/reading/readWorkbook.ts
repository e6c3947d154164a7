import ExcelJS from 'exceljs'
import { workbookParts } from './checkedWorkbook'
import type { Cell, ReadRow } from './readRow'
import { storedWorkbook } from './storedWorkbook'
import { TABLE_LIMITS } from './tableLimits'
import { UnreadableFileError } from './unreadable'

/** Parts of a sheet that are of no use here, some of which a few bytes blow up to millions of cells. */
const IGNORED = [
  'dataValidations',
  'conditionalFormatting',
  'extLst',
  'hyperlinks',
  'drawing',
  'legacyDrawing',
  'picture',
  'tableParts',
  'autoFilter',
  'rowBreaks',
  'colBreaks',
  'cols',
  'headerFooter',
  'printOptions',
  'pageMargins',
  'pageSetup',
]
const WANTED =
  /^(\[Content_Types\]\.xml|_rels\/\.rels|xl\/_rels\/workbook\.xml\.rels|xl\/(workbook|sharedStrings|styles)\.xml|xl\/worksheets\/[^/]+\.xml)$/i
const MOST_MERGES = 20_000

/** A sheet of a workbook by name, before its rows. */
export interface ReadSheet {
  readonly name: string
  readonly rows: readonly ReadRow[]
}

const dayOf = (date: Date): string => (Number.isNaN(date.getTime()) ? '' : date.toISOString().slice(0, 10))

/** A cell by what it shows: a formula by the value kept with it, a day as ISO text; an error of a formula by its sign. */
function cellOf(value: ExcelJS.CellValue): Cell {
  if (value === null || value === undefined) return ''
  if (typeof value === 'number') return Number.isFinite(value) ? value : ''
  if (typeof value === 'string') return value.slice(0, TABLE_LIMITS.cellCharacters)
  if (typeof value === 'boolean') return value ? 'TRUE' : 'FALSE'
  if (value instanceof Date) return dayOf(value)
  if ('richText' in value) return value.richText.map(({ text }) => text).join('').slice(0, TABLE_LIMITS.cellCharacters) // prettier-ignore
  if ('error' in value) return value.error
  if ('text' in value) return cellOf(value.text as ExcelJS.CellValue)
  return 'result' in value ? cellOf(value.result as ExcelJS.CellValue) : ''
}

function cellsOf(row: ExcelJS.Row): Cell[] {
  if (row.cellCount > TABLE_LIMITS.columns) {
    throw new UnreadableFileError(
      `Row ${row.number} has ${row.cellCount} columns; at most ${TABLE_LIMITS.columns} are read. Save the list on a sheet of its own.`,
    )
  }
  const cells: Cell[] = []
  row.eachCell({ includeEmpty: false }, (cell, column) => {
    const isCovered = cell.isMerged && cell.master !== cell
    if (!isCovered) cells[column - 1] = cellOf(cell.value)
  })
  return Array.from(cells, (cell) => cell ?? '')
}

function rowsOf(sheet: ExcelJS.Worksheet, index: number): ReadRow[] {
  const rows: ReadRow[] = []
  sheet.eachRow({ includeEmpty: false }, (row, number) => {
    const cells = cellsOf(row)
    if (!cells.some((cell) => cell !== '')) return
    if (rows.length >= TABLE_LIMITS.rows) {
      throw new UnreadableFileError(`The sheet “${sheet.name}” has more than ${TABLE_LIMITS.rows} rows; split it up.`)
    }
    rows.push({ sheet: index, row: number - 1, cells, isHidden: row.hidden })
  })
  return rows
}

/**
 * The sheets of a workbook with their rows. To be called in a process of its own only: its library can be made to take all memory and time.
 * @throws UnreadableFileError
 */
export async function readWorkbook(file: Buffer): Promise<ReadSheet[]> {
  const parts = workbookParts(file, (name) => WANTED.test(name))
  if (!parts.some(({ name }) => name === 'xl/workbook.xml')) {
    throw new UnreadableFileError('The file is an archive, but no workbook of the kind .xlsx.')
  }
  for (const { name, content } of parts) {
    if (content.includes('<!DOCTYPE') || content.includes('<!ENTITY')) throw new UnreadableFileError(`The workbook's part ${name} is not as expected.`) // prettier-ignore
    if (content.toString('latin1').split('<mergeCell ').length > MOST_MERGES) {
      throw new UnreadableFileError(
        `The workbook merges more than ${MOST_MERGES} groups of cells; undo the merging and send it anew.`,
      )
    }
  }
  const workbook = new ExcelJS.Workbook()
  try {
    const stored = storedWorkbook(parts)
    await workbook.xlsx.load(stored.buffer.slice(stored.byteOffset, stored.byteOffset + stored.byteLength) as ArrayBuffer, {
      ignoreNodes: IGNORED,
    })
  } catch (cause) {
    throw new UnreadableFileError(
      `The workbook could not be read. Open it in a spreadsheet and save it again as .xlsx. (${(cause as Error).message.slice(0, 80)})`,
    )
  }
  if (workbook.worksheets.length > TABLE_LIMITS.sheets) {
    throw new UnreadableFileError(
      `The workbook has ${workbook.worksheets.length} sheets; at most ${TABLE_LIMITS.sheets} are read.`,
    )
  }
  return workbook.worksheets.map((sheet, index) => ({ name: sheet.name, rows: rowsOf(sheet, index) }))
}
