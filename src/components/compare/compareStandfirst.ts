import type { Comparison, SchemeResult, TippingPoint } from '#shared/contracts/appraisalResult'
import type { Rate } from '#shared/contracts/rateBook'
import { Decimal } from '#shared/pricing/decimal'
import { unitOf } from '#shared/takeoff/measurementRules'
import { formatDecimal } from '../base/formatDecimal'
import { itemInSentence } from '../quantity/itemInWords'
import { costDifference } from './compareAnswer'
import type { Pair } from './phrase'

/** A tipping point that exists, with its change against the rate of today as a share. */
export interface Tip {
  readonly point: TippingPoint & { readonly value: string }
  readonly change: number
  /** Low, likely and high of the book, where the edition is at hand. */
  readonly book: Rate | null
  readonly isInsideBook: boolean
}

/** Tipping points that exist, the nearest first. */
export function tipsOf(comparison: Comparison | null, rates: readonly Rate[]): Tip[] {
  return (comparison?.tippingPoints ?? [])
    .flatMap((point) => {
      if (point.value === null || Number(point.rate) === 0) return []
      const book = rates.find(({ item }) => item === point.item) ?? null
      const tip = new Decimal(point.value)
      const isInsideBook = book !== null && tip.greaterThanOrEqualTo(book.low) && tip.lessThanOrEqualTo(book.high)
      return [{ point: { ...point, value: point.value }, change: tip.div(point.rate).minus(1).toNumber(), book, isInsideBook }]
    })
    .sort((a, b) => Math.abs(a.change) - Math.abs(b.change))
}

/**
 * What stands behind the answer and what would turn it, in sentences: shares and totals as priced, then the nearest tipping point.
 */
export function compareStandfirst(pair: Pair<SchemeResult>, comparison: Comparison | null, rates: readonly Rate[]): string[] {
  const { ribbed, solid } = pair
  if (ribbed.cost === null || solid.cost === null)
    return ['Choose an edition of a rate book in the brief, and both floors are priced at once.']
  const [nearest] = tipsOf(comparison, rates)
  return [saving(pair), nearest ? turn(nearest, ribbed.cost.currency) : 'No single rate turns the order by itself.']
}

function saving(pair: Pair<SchemeResult>): string {
  const difference = costDifference(pair)
  const [ribbed, solid] = [pair.ribbed.cost!, pair.solid.cost!]
  if (difference === null || difference.isZero())
    return `Both total ${formatDecimal(ribbed.total, { decimals: 0 })} ${ribbed.currency}.`
  const isRibbed = difference.isNegative()
  const [cheaper, dearer] = isRibbed ? [ribbed, solid] : [solid, ribbed]
  const totals = `${formatDecimal(cheaper.total, { decimals: 0 })} against ${formatDecimal(dearer.total, { decimals: 0 })} ${ribbed.currency}`
  const share = difference.abs().div(dearer.total).times(100).toNumber()
  return `${isRibbed ? 'Ribbed' : 'Solid'} saves ${share < 10 ? share.toFixed(1) : Math.round(share)}% of the dearer floors: ${totals}, at the likely rates of the book.`
}

function turn({ point, change, isInsideBook }: Tip, currency: string): string {
  const name = itemInSentence(point.item)
  const at = `${formatDecimal(point.value, { decimals: 2 })} ${currency}/${unitOf(point.item)}`
  const way = change > 0 ? 'rises' : 'falls'
  const inside = isInsideBook ? ' That lies inside the range of the book.' : ''
  return `The order turns if the rate of ${name} ${way} by ${Math.abs(change * 100).toFixed(0)}%, to ${at}, all else as it is.${inside}`
}
