import type { BillLine, Cost, ItemLine } from '#shared/contracts/appraisalResult'
import type { EditionWithRates } from '#shared/contracts/rateBook'
import type { RateOverride } from '#shared/contracts/rateOverride'
import { Decimal, sumOf } from '#shared/pricing/decimal'
import type { WorkSection } from '../quantity/itemInWords'
import { byWorkSection } from '../quantity/itemInWords'

/** Where the rate of a line comes from. */
export interface RateSource {
  /** In the edition; null where the edition has no rate of it. */
  readonly source: string | null
  /** The edition's rate, in the unit of the line, where the project has its own in its place. */
  readonly bookRate: string | null
  /** The project's own rate. */
  readonly override: RateOverride | null
  /** Built up with the scheme's own block. */
  readonly isOfBlock: boolean
}

/** A line with the source of its rate, and so the lines that it adds up. */
export interface SourcedLine extends Omit<BillLine, 'analysis'>, RateSource {
  readonly analysis?: readonly (ItemLine & RateSource)[]
}

/** A section of the bill; amounts are exact decimal strings. */
export interface BillSection {
  readonly section: WorkSection
  readonly lines: readonly SourcedLine[]
  readonly amount: string
}

const amountOf = (rows: readonly { readonly amount: string }[]): Decimal => sumOf(rows.map(({ amount }) => new Decimal(amount)))

/** What the rates of a scheme rest on: its edition, the project's own rates, the block it is built with. */
export interface RatesBehind {
  readonly edition: EditionWithRates
  readonly overrides: readonly RateOverride[]
  readonly blockId: string | null
}

const KG_PER_T = 1000

function sourceOf({ item, unit }: ItemLine, { edition, overrides, blockId }: RatesBehind): RateSource {
  const book = edition.rates.find((rate) => rate.item === item)
  const override = overrides.find((each) => each.item === item) ?? null
  const isPerThousand = unit === 'kg' && book?.unit !== 'kg'
  const likely = book && (isPerThousand ? new Decimal(book.likely).div(KG_PER_T).toFixed() : book.likely)
  return {
    source: book?.source ?? null,
    bookRate: override === null ? null : (likely ?? null),
    override,
    isOfBlock: override === null && edition.blockRates.some((rate) => rate.blockId === blockId && rate.item === item),
  }
}

/** Lines by work section with the source of each rate, each section with its sum. */
export function billSections({ lines }: Cost, behind: RatesBehind): BillSection[] {
  const withSource = <Line extends ItemLine>(line: Line) => ({ ...line, ...sourceOf(line, behind) })
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
