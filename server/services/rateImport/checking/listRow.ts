import { typedText } from '#shared/harmlessText'
import type { ImportField, ImportMatching } from '#shared/contracts/rateImport'
import { readDay } from './readDay'
import { readPrice } from './readPrice'
import { cellText, type Cell, type ReadRow } from '../reading/readRow'

/** Fields of a row as text: prices as decimals, days as ISO dates; what its cells leave open is absent. */
export type ListFields = Partial<Record<ImportField, string>>

/** A row of a list by the columns matched to fields, or why it is none. */
export type ListRow =
  | { readonly kind: 'leftOut' }
  | { readonly kind: 'refused'; readonly row: number; readonly code: string; readonly reason: string }
  | { readonly kind: 'row'; readonly row: number; readonly code: string; readonly fields: ListFields; readonly notes: string[] }

const NUMBERS: readonly ImportField[] = ['low', 'likely', 'high', 'contains']
const DAYS: readonly ImportField[] = ['day', 'validUntil', 'sourceDate']
const MOST: Partial<Record<ImportField, number>> = {
  code: 40,
  description: 200,
  unit: 10,
  supplier: 120,
  reference: 120,
  source: 400,
}
const NAMES: Partial<Record<ImportField, string>> = {
  low: 'low price',
  likely: 'price',
  high: 'high price',
  contains: 'content',
  validUntil: 'day it holds until',
  sourceDate: 'date of the source',
}
const SUM =
  /^(sub|grand)?[ -]?(total|sum)s?\b|^(zwischen|gesamt)?summe\b|^gesamt\b|^(sous-)?total\b|^(sub)?totale?\b|^carried forward\b/i

/** Field in words of the trade. */
export const fieldName = (field: ImportField): string => NAMES[field] ?? field

const textOf = (cell: Cell | undefined): string => typedText(cellText(cell)).replace(/\s+/g, ' ').trim()

/** Text of one field, or why it cannot be one. */
function readField(field: ImportField, cell: Cell, mark: '.' | ',', notes: string[]): { text: string } | { reason: string } {
  const text = textOf(cell)
  if (NUMBERS.includes(field)) {
    const read = readPrice(cell, mark)
    if (read.kind === 'refused') return { reason: `${fieldName(field)}: ${read.reason}` }
    if (read.isRounded) notes.push(`${fieldName(field)} rounded to six decimals`)
    return { text: read.text }
  }
  if (DAYS.includes(field)) {
    const day = readDay(text)
    return day === null
      ? { reason: `${fieldName(field)}: expected a day, as 2026-12-31, got “${text.slice(0, 30)}”` }
      : { text: day }
  }
  const most = MOST[field]
  if (most !== undefined && text.length > most) return { reason: `${fieldName(field)}: longer than ${most} characters` }
  if (/[\p{Cc}\p{Cs}]/u.test(text)) return { reason: `${fieldName(field)}: broken characters` }
  return { text }
}

/** Titles, repeated heads, subtotals: rows in a list that are no rows of it. */
function isLeftOut({ cells }: ReadRow, { columns }: ImportMatching, heads: readonly string[]): boolean {
  const at = (field: ImportField) => (columns[field] === undefined ? '' : textOf(cells[columns[field]]))
  const filled = cells.map(textOf).filter((text) => text !== '')
  const isHead = filled.length > 1 && filled.every((text) => heads.includes(text))
  const hasNumber = NUMBERS.some((field) => at(field) !== '')
  const isSum = filled.some((text) => SUM.test(text)) && (at('code') === '' || SUM.test(at('code')))
  return isHead || isSum || (at('code') === '' && !hasNumber)
}

/**
 * A row below the heads by the matched columns.
 * @param heads - texts of the row of heads
 */
export function listRow(read: ReadRow, matching: ImportMatching, heads: readonly string[]): ListRow {
  if (isLeftOut(read, matching, heads)) return { kind: 'leftOut' }
  const row = read.row + 1
  const notes = read.isHidden ? ['hidden in the sheet'] : []
  const fields: ListFields = {}
  const reasons: string[] = []
  for (const [field, index] of Object.entries(matching.columns) as [ImportField, number][]) {
    const cell = read.cells[index]
    if (cell === undefined || textOf(cell) === '') continue
    const found = readField(field, cell, matching.decimalMark, notes)
    if ('text' in found) fields[field] = found.text
    else reasons.push(found.reason)
  }
  const { columns } = matching
  const code = fields.code ?? (columns.code === undefined ? '' : textOf(read.cells[columns.code]).slice(0, 40))
  if (code === '') reasons.unshift('missing code')
  if (fields.likely === undefined && reasons.length === 0) reasons.push('missing price')
  if (reasons.length > 0) return { kind: 'refused', row, code, reason: reasons.join('; ').slice(0, 500) }
  return { kind: 'row', row, code, fields, notes }
}
