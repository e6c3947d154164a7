import Big from 'big.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { compareAllIn } from '#shared/comparison/compareAllIn'
import { compareSchemes } from '#shared/comparison/compareSchemes'
import { ledger } from '#shared/comparison/ledger'
import { unroundedTotal } from '#shared/comparison/unroundedTotal'
import type { Cost, ItemQuantity, SchemeResult } from '#shared/contracts/appraisalResult'
import { markups as markupsContract } from '#shared/contracts/appraisal'
import { cost as costContract } from '#shared/contracts/appraisalResult'
import { allInCost } from '#shared/pricing/allInCost'
import { Decimal } from '#shared/pricing/decimal'
import { minorUnit } from '#shared/pricing/minorUnit'
import { priceScheme } from '#shared/pricing/priceScheme'
import { arbitraryFullRates, arbitraryQuantities } from '../support/arbitraryBill'

const sumOf = (lines: readonly { readonly amount: string }[]) => lines.reduce((sum, { amount }) => sum.plus(amount), new Big(0))

function schemeOf(mark: string, cost: Cost): SchemeResult {
  const deadLoad = { perM2: 0, total: 0 } as unknown as SchemeResult['deadLoad']
  return { mark, kind: 'ribbed', depth: 0, passes: true, checks: [], panels: [], quantities: [], deadLoad, cost }
}

/** Half of the last decimal that a tipping point is printed with. */
const HALF_LAST_DECIMAL = '0.0000005'

describe('markups of every kind', () => {
  it('are charged in their order: 1,000 measured, 10 %, 250, 3.5 weeks of 40, 8 %, 5 %, 20 %', () => {
    const markups = markupsContract.parse({
      preliminariesPercent: '10',
      preliminariesFixed: '250',
      preliminariesPerWeek: '40',
      overheadsAndProfitPercent: '8',
      contingencyPercent: '5',
      taxPercent: '20',
    })
    const quantities: ItemQuantity[] = [{ item: 'concrete.slab', unit: 'm³', net: 10, parts: [] }]
    const cost = priceScheme(quantities, { currency: 'USD', items: { 'concrete.slab': '100' }, markups, weeks: '3.50' }, 50)
    expect(cost.markups).toEqual([
      { name: 'preliminaries', percent: '10', amount: '100.00' },
      { name: 'preliminariesFixed', percent: '0', amount: '250.00' },
      { name: 'preliminariesPerWeek', percent: '0', amount: '140.00', perWeek: '40', weeks: '3.50' },
      { name: 'overheadsAndProfit', percent: '8', amount: '119.20' }, // of 1,490.00
      { name: 'contingency', percent: '5', amount: '80.46' }, // of 1,609.20
      { name: 'tax', percent: '20', amount: '337.93' }, // of 1,689.66: 337.932
    ])
    expect(cost.total).toBe('2027.59')
    expect(unroundedTotal(cost).toFixed()).toBe('2027.592') // 1,490 × 1.08 × 1.05 × 1.2
  })

  it('add up to the total as printed, and charge no sum where nothing is priced', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryFullRates, (quantities, rates) => {
        const cost = costContract.parse(priceScheme(quantities, rates, 100))
        expect(sumOf([...cost.lines, ...cost.markups]).eq(cost.total)).toBe(true)
        if (cost.lines.length === 0) expect(Number(cost.total)).toBe(0)
      }),
      { numRuns: 3000 },
    )
  })

  it('keep the total affine in each rate, and within half a minor unit a line of the printed one', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryFullRates, (quantities, rates) => {
        const cost = priceScheme(quantities, rates, 100)
        const most = new Decimal(cost.lines.length + cost.markups.length)
          .times(new Decimal(10).pow(-minorUnit(cost.currency)))
          .times(2)
        expect(unroundedTotal(cost).minus(cost.total).abs().lessThanOrEqualTo(most)).toBe(true)
        for (const { item } of cost.lines) {
          const at = (rate: number) =>
            unroundedTotal(priceScheme(quantities, { ...rates, items: { ...rates.items, [item]: String(rate) } }, 100))
          expect(
            at(30)
              .minus(at(20))
              .minus(at(20).minus(at(10)))
              .abs()
              .lessThan('1e-20'),
          ).toBe(true)
        }
      }),
      { numRuns: 300 },
    )
  })

  it('leave both schemes alike at every tipping point, their weeks differing', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryQuantities, arbitraryFullRates, (ofFirst, ofSecond, rates) => {
        const later = { ...rates, weeks: '12.25' }
        const first = schemeOf('R1', priceScheme(ofFirst, rates, 100))
        const second = schemeOf('R2', priceScheme(ofSecond, later, 100))
        for (const { item, value } of compareSchemes(first, second)!.tippingPoints) {
          if (value === null) continue
          const items = { ...rates.items, [item]: value }
          const [a, b] = [priceScheme(ofFirst, { ...rates, items }, 100), priceScheme(ofSecond, { ...later, items }, 100)]
          const netOf = (quantities: readonly ItemQuantity[]) => quantities.find((one) => one.item === item)?.net ?? 0
          const slope = new Decimal(netOf(ofFirst)).minus(netOf(ofSecond)).abs().times(4)
          const apart = unroundedTotal(a).minus(unroundedTotal(b)).abs()
          expect(apart.lessThanOrEqualTo(slope.times(HALF_LAST_DECIMAL).plus('1e-20'))).toBe(true)
        }
      }),
      { numRuns: 500 },
    )
  })

  it('are folded into all-in amounts and rates, and the ledgers end at one difference', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryQuantities, arbitraryFullRates, (ofFirst, ofSecond, rates) => {
        const [first, second] = [ofFirst, ofSecond].map((quantities) => priceScheme(quantities, rates, 100)) as [Cost, Cost]
        for (const cost of [first, second]) {
          const allIn = costContract.parse(allInCost(cost))
          expect(allIn.markups).toEqual([])
          expect(sumOf(allIn.lines).eq(cost.total)).toBe(true)
        }
        const difference = new Big(first.total).minus(second.total)
        expect(difference.eq(ledger(first, second).at(-1)?.running ?? 0)).toBe(true)
        const comparison = compareAllIn(schemeOf('R1', first), schemeOf('R2', second))!
        expect(difference.eq(comparison.ledger.at(-1)?.running ?? 0)).toBe(true)
      }),
      { numRuns: 1000 },
    )
  })

  it('prints all-in rates that explain the all-in amounts, sums shared out', () => {
    const markups = markupsContract.parse({ preliminariesPercent: '10', preliminariesFixed: '2000' })
    const quantities: ItemQuantity[] = [
      { item: 'concrete.slab', unit: 'm³', net: 100, parts: [] },
      { item: 'blocks.whole', unit: 'nr', net: 4000, parts: [] },
    ]
    const items = { 'concrete.slab': '150', 'blocks.whole': '1.25' }
    // 20,000 measured × 1.1 + 2,000 = 24,000: 1.2 of each rate
    expect(allInCost(priceScheme(quantities, { currency: 'USD', items, markups }, 500)).lines).toEqual([
      { item: 'concrete.slab', quantity: '100.00', unit: 'm³', rate: '180.00', amount: '18000.00' },
      { item: 'blocks.whole', quantity: '4000', unit: 'nr', rate: '1.500', amount: '6000.00' },
    ])
  })
})
