import { harmlessText } from '#shared/harmlessText'
import { Readable, type Writable } from 'node:stream'
import { pipeline } from 'node:stream/promises'
import type { ExportedSheet, SheetCell } from './sheetCell'

const quoted = (text: string): string => (/[",;\r\n]|^\s|\s$/.test(text) ? `"${text.replaceAll('"', '""')}"` : text)

function textOf(cell: SheetCell): string {
  switch (cell.kind) {
    case 'text':
      return quoted(harmlessText(cell.text))
    case 'number':
      return cell.decimal
    case 'day':
      return cell.iso
    case 'formula':
      return cell.value
    case 'empty':
      return ''
  }
}

/** A sheet as text of columns: commas between, a point as decimal mark, UTF-8 with a mark, values instead of formulas. Source: RFC 4180 */
function* csvText({ heads, rows }: ExportedSheet): Generator<string> {
  yield `\uFEFF${heads.map(quoted).join(',')}\r\n`
  for (const row of rows) yield `${row.map(textOf).join(',')}\r\n`
}

/** Writes a sheet as text of columns into a stream, which it ends. */
export async function writeTable(sheet: ExportedSheet, stream: Writable): Promise<void> {
  await pipeline(Readable.from(csvText(sheet)), stream)
}
