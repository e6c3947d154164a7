import Big from 'big.js'
import fc from 'fast-check'
import { expect, it } from 'vitest'
import type { Rates } from '#shared/contracts/appraisal'
import type { ItemQuantity } from '#shared/contracts/appraisalResult'
import { cost as costContract } from '#shared/contracts/appraisalResult'
import { minorUnit } from '#shared/pricing/minorUnit'
import { priceScheme } from '#shared/pricing/priceScheme'
import { arbitraryQuantities, arbitraryRates } from '../support/arbitraryBill'

const BILLS = 10_000

/** The same bill by another decimal library, written out step by step. */
function billByBig(quantities: readonly ItemQuantity[], { items, markups, currency }: Rates) {
  const places = minorUnit(currency)
  const round = (amount: Big) => amount.round(places, Big.roundHalfUp)
  const amounts = quantities
    .filter(({ item }) => items[item] !== undefined)
    .map(({ item, net }) => round(new Big(String(net)).times(items[item]!)))
  const measured = amounts.reduce((sum, amount) => sum.plus(amount), new Big(0))
  const preliminaries = round(measured.times(markups.preliminariesPercent).div(100))
  const contingency = round(measured.plus(preliminaries).times(markups.contingencyPercent).div(100))
  const tax = round(measured.plus(preliminaries).plus(contingency).times(markups.taxPercent).div(100))
  return {
    amounts: amounts.map((amount) => amount.toFixed(places)),
    markups: [preliminaries, contingency, tax].map((amount) => amount.toFixed(places)),
    total: measured.plus(preliminaries).plus(contingency).plus(tax).toFixed(places),
  }
}

it('prices ten thousand bills as a second decimal library does, and each adds up to the last minor unit', () => {
  Big.DP = 60
  fc.assert(
    fc.property(arbitraryQuantities, arbitraryRates, (quantities, rates) => {
      const cost = costContract.parse(priceScheme(quantities, rates, 257.22))
      const expected = billByBig(quantities, rates)
      expect(cost.lines.map(({ amount }) => amount)).toEqual(expected.amounts)
      expect(cost.markups.map(({ amount }) => amount)).toEqual(expected.markups)
      expect(cost.total).toBe(expected.total)
      const printed = [...cost.lines, ...cost.markups].reduce((sum, { amount }) => sum.plus(amount), new Big(0))
      expect(printed.eq(cost.total)).toBe(true)
    }),
    { numRuns: BILLS },
  )
})

it('never gets cheaper when a rate rises', () => {
  fc.assert(
    fc.property(arbitraryQuantities, arbitraryRates, fc.nat(1_000_000), (quantities, rates, riseMillionths) => {
      const before = new Big(priceScheme(quantities, rates, 100).total)
      for (const [item, rate] of Object.entries(rates.items)) {
        const dearer = new Big(rate).plus(new Big(riseMillionths).div(1_000_000)).toFixed(6)
        const after = priceScheme(quantities, { ...rates, items: { ...rates.items, [item]: dearer } }, 100).total
        expect(before.lte(after)).toBe(true)
      }
    }),
    { numRuns: 300 },
  )
})
