import type { BillLine, Cost } from '#shared/contracts/appraisal'
import type { Rate } from '#shared/contracts/rateBook'
import { Decimal, sumOf } from '#shared/pricing/decimal'
import type { WorkSection } from '../quantity/itemInWords'
import { byWorkSection } from '../quantity/itemInWords'

/** A section of the bill; amounts are exact decimal strings. */
export interface BillSection {
  readonly section: WorkSection
  readonly lines: readonly (BillLine & { readonly source: string | null })[]
  readonly amount: string
}

const amountOf = (rows: readonly { readonly amount: string }[]): Decimal => sumOf(rows.map(({ amount }) => new Decimal(amount)))

/** Lines by work section with the source of each rate, each section with its sum. */
export function billSections({ lines }: Cost, rates: readonly Rate[]): BillSection[] {
  const sourced = lines.map((line) => ({ ...line, source: rates.find(({ item }) => item === line.item)?.source ?? null }))
  return byWorkSection(sourced).map(({ section, rows }) => ({ section, lines: rows, amount: amountOf(rows).toFixed() }))
}

/** Sum of the measured work, before any markup. */
export function measuredWork({ lines }: Cost): string {
  return amountOf(lines).toFixed()
}
