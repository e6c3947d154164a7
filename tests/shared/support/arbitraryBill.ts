import fc from 'fast-check'
import { itemCode, type Rates } from '#shared/contracts/appraisal'
import { type ItemQuantity } from '#shared/contracts/appraisalResult'
import { unitOf } from '#shared/takeoff/measurementRules'
import { comparingRules } from '#shared/takeoff/rules/comparingRules'
import { roundAsPrinted } from '#shared/takeoff/roundAsPrinted'

const decimalText = (most: number, decimals: number) =>
  fc.tuple(fc.integer({ min: 0, max: most }), fc.integer({ min: 0, max: 10 ** decimals - 1 })).map(([whole, fraction]) => {
    return `${whole}.${String(fraction).padStart(decimals, '0')}`
  })

/** Quantities of some items, each once, rounded as printed. */
export const arbitraryQuantities: fc.Arbitrary<ItemQuantity[]> = fc
  .array(fc.tuple(fc.constantFrom(...itemCode.options), fc.double({ min: 0, max: 50_000, noNaN: true })), { maxLength: 22 })
  .map((entries) =>
    [...new Map(entries)].map(([item, value]) => {
      const unit = unitOf(item)
      return { item, unit, net: roundAsPrinted(value, comparingRules.decimals[unit]), parts: [] }
    }),
  )

/** Rates of some items, with markups up to a third. */
export const arbitraryRates: fc.Arbitrary<Rates> = fc.record({
  currency: fc.constantFrom('USD', 'JPY', 'KWD', 'CLF'),
  items: fc
    .array(fc.tuple(fc.constantFrom(...itemCode.options), decimalText(5000, 4)), { maxLength: 40 })
    .map((entries) => Object.fromEntries(entries)),
  markups: fc.record({
    preliminariesPercent: decimalText(33, 2),
    contingencyPercent: decimalText(33, 4),
    taxPercent: decimalText(33, 2),
    preliminariesFixed: fc.constant('0'),
    preliminariesPerWeek: fc.constant('0'),
    overheadsAndProfitPercent: fc.constant('0'),
  }),
  byScheme: fc.constant({}),
})

/** The same with every kind of markup: sums, so much a week for some weeks, overheads and profit. */
export const arbitraryFullRates: fc.Arbitrary<Rates & { weeks: string }> = fc
  .tuple(arbitraryRates, decimalText(9_000_000, 3), decimalText(50_000, 2), decimalText(33, 2), decimalText(200, 2))
  .map(([rates, preliminariesFixed, preliminariesPerWeek, overheadsAndProfitPercent, weeks]) => ({
    ...rates,
    markups: { ...rates.markups, preliminariesFixed, preliminariesPerWeek, overheadsAndProfitPercent },
    weeks,
  }))
