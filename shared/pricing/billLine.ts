import type { Rates } from '../contracts/appraisal'
import type { BillLine, ItemLine, ItemQuantity, Quantity } from '../contracts/appraisalResult'
import { type MeasurementRules, unitOf } from '../takeoff/measurementRules'
import { Decimal, sumOf } from './decimal'
import { minorUnit } from './minorUnit'
import { printMoney } from './money'
import { toQuantity } from './toQuantity'

const KG_PER_T = 1000
/** Most decimals of a rate in a bill. */
const MOST_RATE_DECIMALS = 9

type ItemRates = Pick<Rates, 'items' | 'currency'>
type Decimals = MeasurementRules['decimals']

/**
 * A line of the bill: the printed quantity × rate, rounded. Bars in kilograms take the thousandth of the rate per tonne, exactly. A
 * composite adds up the lines that it is made up of, so that it costs what they cost; its rate is its amount by its quantity. Null
 * where nothing of it has a rate.
 *
 * Source: project rule, the total is the same whatever the rules bill apart or together
 */
export function billLine(quantity: Quantity, rates: ItemRates, decimals: Decimals): BillLine | null {
  const { item, unit, net, bands, analysis } = quantity
  if (analysis === undefined) return itemLine(quantity as ItemQuantity, rates, decimals)
  const lines = analysis.flatMap((each) => itemLine(each, rates, decimals) ?? [])
  if (lines.length === 0) return null
  const amount = sumOf(lines.map((line) => new Decimal(line.amount)))
  const printed = toQuantity(net, decimals[unit])
  return {
    item,
    quantity: printed,
    unit,
    rate: rateBehind(amount, new Decimal(printed), rates.currency),
    amount: printMoney(amount, rates.currency),
    ...(bands === undefined ? {} : { bands }),
    analysis: lines,
  }
}

function itemLine({ item, unit, net, bands }: ItemQuantity, { items, currency }: ItemRates, decimals: Decimals): ItemLine | null {
  const bookRate = items[item]
  if (bookRate === undefined) return null
  const isPerThousand = unit === 'kg' && unitOf(item) === 't'
  const rate = isPerThousand ? new Decimal(bookRate).div(KG_PER_T).toFixed() : bookRate
  const quantity = toQuantity(net, decimals[unit])
  const amount = printMoney(new Decimal(quantity).times(rate), currency)
  return { item, quantity, unit, rate, amount, ...(bands === undefined ? {} : { bands }) }
}

/** The shortest rate that, times the quantity and rounded, makes the amount; of a quantity that prints as nothing, the amount. */
function rateBehind(amount: Decimal, quantity: Decimal, currency: string): string {
  const least = minorUnit(currency)
  if (quantity.isZero()) return printMoney(amount, currency)
  const exact = amount.div(quantity)
  for (let decimals = least; decimals < MOST_RATE_DECIMALS; decimals++) {
    const rate = exact.toDecimalPlaces(decimals)
    if (rate.times(quantity).toDecimalPlaces(least).equals(amount)) return rate.toFixed(decimals)
  }
  return exact.toFixed(MOST_RATE_DECIMALS)
}
