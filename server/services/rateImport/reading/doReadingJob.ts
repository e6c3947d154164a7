import type { ImportedSheet } from '#shared/contracts/rateImport'
import { closeSync, openSync, readFileSync, writeSync } from 'node:fs'
import { proposedMatching } from './proposedMatching'
import { cellText, type ReadRow } from './readRow'
import { readTable } from './readTable'
import type { ReadSheet } from './readWorkbook'
import { TABLE_LIMITS } from './tableLimits'
import type { ReadingJob, ReadingOutcome } from './tableReading'
import { UnreadableFileError } from './unreadable'

const ROWS_AT_ONCE = 2000
/** Characters of a cell that are shown to choose columns by. */
const SHOWN_CHARACTERS = 60

function sampleOf(rows: readonly ReadRow[]): string[][] {
  const shown = rows.filter(({ row }) => row < TABLE_LIMITS.sampleRows)
  const sample: string[][] = Array.from({ length: (shown.at(-1)?.row ?? -1) + 1 }, () => [])
  for (const { row, cells } of shown) sample[row] = cells.map((cell) => cellText(cell).slice(0, SHOWN_CHARACTERS))
  return sample
}

const toSheet = ({ name, rows }: ReadSheet): ImportedSheet => ({
  name: name.slice(0, 100),
  rowCount: rows.length,
  hiddenRowCount: rows.filter(({ isHidden }) => isHidden).length,
  sample: sampleOf(rows),
  proposed: proposedMatching(rows),
})

function writeRows(path: string, sheets: readonly ReadSheet[]): void {
  const file = openSync(path, 'wx', 0o600)
  for (const { rows } of sheets) {
    for (let at = 0; at < rows.length; at += ROWS_AT_ONCE) {
      writeSync(file, rows.slice(at, at + ROWS_AT_ONCE).map((row) => `${JSON.stringify(row)}\n`).join('')) // prettier-ignore
    }
  }
  closeSync(file)
}

/** Reads a table, writes its rows one a line, and says what sheets there are. */
export async function doReadingJob({ filePath, extension, rowsPath }: ReadingJob): Promise<ReadingOutcome> {
  try {
    const sheets = await readTable(readFileSync(filePath), extension)
    if (sheets.every(({ rows }) => rows.length === 0)) throw new UnreadableFileError('The file has no row with anything in it.')
    writeRows(rowsPath, sheets)
    return { kind: 'read', sheets: sheets.map(toSheet) }
  } catch (cause) {
    if (cause instanceof UnreadableFileError) return { kind: 'unreadable', reason: cause.message }
    throw cause
  }
}
