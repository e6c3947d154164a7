import { CsvError, parse } from 'csv-parse/sync'
import { decodedText } from './decodedText'
import { delimiterOf } from './delimiterOf'
import type { ReadRow } from './readRow'
import type { ReadSheet } from './readWorkbook'
import { TABLE_LIMITS } from './tableLimits'
import { UnreadableFileError } from './unreadable'

const MOST_RECORD_CHARACTERS = 200_000

function recordsOf(text: string): string[][] {
  try {
    return parse(text, {
      delimiter: delimiterOf(text),
      relax_column_count: true,
      relax_quotes: true,
      skip_empty_lines: false,
      max_record_size: MOST_RECORD_CHARACTERS,
      to: TABLE_LIMITS.rows + 1,
    })
  } catch (cause) {
    if (!(cause instanceof CsvError)) throw cause
    throw new UnreadableFileError(`The text is not a table: ${cause.message.slice(0, 160)}`)
  }
}

/** A text of columns as one sheet. @throws UnreadableFileError */
export function readText(file: Buffer): ReadSheet[] {
  const records = recordsOf(decodedText(file))
  if (records.length > TABLE_LIMITS.rows) {
    throw new UnreadableFileError(`The file has more than ${TABLE_LIMITS.rows} rows; split it up.`)
  }
  const rows: ReadRow[] = []
  for (const [row, record] of records.entries()) {
    if (record.length > TABLE_LIMITS.columns) {
      throw new UnreadableFileError(`Row ${row + 1} has ${record.length} columns; at most ${TABLE_LIMITS.columns} are read.`)
    }
    const cells = record.map((cell) => cell.slice(0, TABLE_LIMITS.cellCharacters))
    if (cells.some((cell) => cell.trim() !== '')) rows.push({ sheet: 0, row, cells, isHidden: false })
  }
  return [{ name: 'Text', rows }]
}
