import { harmlessText } from '#shared/harmlessText'
import ExcelJS from 'exceljs'
import { setImmediate as pause } from 'node:timers/promises'
import type { Writable } from 'node:stream'
import type { ExportedSheet, SheetCell } from './sheetCell'

const ROWS_AT_ONCE = 300

function valueOf(cell: SheetCell): ExcelJS.CellValue {
  switch (cell.kind) {
    case 'text':
      return harmlessText(cell.text)
    case 'number':
      return Number(cell.decimal)
    case 'day':
      return new Date(`${cell.iso}T00:00:00Z`)
    case 'formula':
      return { formula: cell.formula, result: Number(cell.value), date1904: false }
    case 'empty':
      return null
  }
}

async function writeSheet(workbook: ExcelJS.stream.xlsx.WorkbookWriter, { name, heads, rows }: ExportedSheet): Promise<void> {
  const sheet = workbook.addWorksheet(name, { views: [{ state: 'frozen', ySplit: 1 }] })
  sheet.addRow([...heads]).commit()
  for (const [index, cells] of rows.entries()) {
    const row = sheet.addRow(cells.map(valueOf))
    for (const [at, { kind }] of cells.entries()) if (kind === 'day') row.getCell(at + 1).numFmt = 'yyyy-mm-dd'
    row.commit()
    if (index % ROWS_AT_ONCE === 0) await pause()
  }
  sheet.commit()
}

/** Writes sheets as a workbook into a stream, which it ends; others get their turn in between. */
export async function writeWorkbook(sheets: readonly ExportedSheet[], stream: Writable): Promise<void> {
  const workbook = new ExcelJS.stream.xlsx.WorkbookWriter({ stream, useStyles: true, useSharedStrings: false })
  for (const sheet of sheets) await writeSheet(workbook, sheet)
  await workbook.commit()
}
