import type { BillLine, Cost, ItemLine } from '#shared/contracts/appraisal'
import type { Rate } from '#shared/contracts/rateBook'
import { Decimal, sumOf } from '#shared/pricing/decimal'
import type { WorkSection } from '../quantity/itemInWords'
import { byWorkSection } from '../quantity/itemInWords'

/** A line with the source of its rate in the edition, and so the lines that it adds up; null where the edition has none. */
export interface SourcedLine extends Omit<BillLine, 'analysis'> {
  readonly source: string | null
  readonly analysis?: readonly (ItemLine & { readonly source: string | null })[]
}

/** A section of the bill; amounts are exact decimal strings. */
export interface BillSection {
  readonly section: WorkSection
  readonly lines: readonly SourcedLine[]
  readonly amount: string
}

const amountOf = (rows: readonly { readonly amount: string }[]): Decimal => sumOf(rows.map(({ amount }) => new Decimal(amount)))

/** Lines by work section with the source of each rate, each section with its sum. */
export function billSections({ lines }: Cost, rates: readonly Rate[]): BillSection[] {
  const withSource = <Line extends ItemLine>(line: Line) => ({
    ...line,
    source: rates.find(({ item }) => item === line.item)?.source ?? null,
  })
  const sourced = lines.map(({ analysis, ...line }): SourcedLine => ({
    ...withSource(line),
    ...(analysis === undefined ? {} : { analysis: analysis.map(withSource) }),
  }))
  return byWorkSection(sourced).map(({ section, rows }) => ({ section, lines: rows, amount: amountOf(rows).toFixed() }))
}

/** Sum of the measured work, before any markup. */
export function measuredWork({ lines }: Cost): string {
  return amountOf(lines).toFixed()
}
