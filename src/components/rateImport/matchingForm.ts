import type { ImportField, ImportMatching, RateImport } from '#shared/contracts/rateImport'
import { FIELDS } from './importWords'

/** A column that no field has. */
export const NONE = -1

/** Letters of a column counted from 0, as a spreadsheet has them. */
export function columnName(index: number): string {
  const rest = Math.floor(index / 26)
  return `${rest === 0 ? '' : columnName(rest - 1)}${String.fromCharCode(65 + (index % 26))}`
}

/** Sheet that looks most like a list; the first where none does. */
export function likelySheet({ sheets }: RateImport): number {
  const scored = sheets.map(({ proposed, rowCount }, index) => ({
    index,
    score: proposed === null ? -1 : Object.keys(proposed.columns).length * 1e6 + rowCount,
  }))
  return scored.sort((a, b) => b.score - a.score || a.index - b.index)[0]?.index ?? 0
}

/** Matching as the file proposes it for a sheet. @param today - ISO date, for rows that name no day */
export function proposedFor({ sheets }: RateImport, sheet: number, today: string): ImportMatching {
  const proposed = sheets[sheet]?.proposed ?? { target: 'resources' as const, headRow: 0, columns: {}, decimalMark: '.' as const }
  return withoutForeign({ ...proposed, sheet, defaults: { kind: 'material', unit: '', supplier: '', day: today } })
}

/** Without columns for fields that the target does not know. */
export function withoutForeign(matching: ImportMatching): ImportMatching {
  const known = FIELDS[matching.target].map(({ field }) => field)
  const kept = (Object.entries(matching.columns) as [ImportField, number][]).filter(([field]) => known.includes(field))
  return { ...matching, columns: Object.fromEntries(kept) }
}

/** With a field on another column; that of a field that had it is freed. */
export function withColumn(matching: ImportMatching, field: ImportField, column: number): ImportMatching {
  const others = (Object.entries(matching.columns) as [ImportField, number][]).filter(
    ([other, at]) => other !== field && at !== column,
  )
  return { ...matching, columns: Object.fromEntries(column === NONE ? others : [...others, [field, column]]) }
}

/** What a matching still lacks, in words; null: the rows can be checked. */
export function lacking({ target, columns, defaults }: ImportMatching): string | null {
  const missing = FIELDS[target].filter(({ field, isNeeded }) => isNeeded && columns[field] === undefined)
  if (missing.length > 0) return `Choose the column of: ${missing.map(({ label }) => label).join('; ')}.`
  if (target === 'quotations' && columns.supplier === undefined && defaults.supplier === '') return 'Name the supplier.'
  return null
}
