import Big from 'big.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { markups, itemCode, type ItemCode, type Rates } from '#shared/contracts/appraisal'
import { comparison as comparisonContract, type Quantity, type SchemeResult } from '#shared/contracts/appraisalResult'
import { compareMarks, compareSchemes } from '#shared/comparison/compareSchemes'
import { compareAllIn } from '#shared/comparison/compareAllIn'
import { unroundedTotal } from '#shared/comparison/unroundedTotal'
import { Decimal } from '#shared/pricing/decimal'
import { minorUnit } from '#shared/pricing/minorUnit'
import { priceScheme } from '#shared/pricing/priceScheme'
import { arbitraryQuantities, arbitraryRates } from '../support/arbitraryBill'

/** A tipping point is printed to six decimals: half of the last one. */
const HALF_LAST_DECIMAL = new Decimal('0.0000005')
/** Three markups below 34 % each multiply the rounding of a line by less than this. */
const LARGEST_FACTOR = 1.34 ** 3

function schemeOf(mark: string, kind: SchemeResult['kind'], quantities: readonly Quantity[], rates: Rates | null): SchemeResult {
  return {
    mark,
    kind,
    depth: 250,
    passes: true,
    checks: [],
    panels: [],
    quantities: [...quantities],
    deadLoad: { perArea: 0, total: 0 },
    cost: rates && priceScheme(quantities, rates, 100),
  }
}

const simpleRates: Rates = {
  currency: 'USD',
  items: { 'concrete.slab': '100', 'blocks.whole': '1' },
  byScheme: {},
  markups: markups.parse({ preliminariesPercent: '10' }),
}
const quantity = (item: ItemCode, net: number): Quantity => ({
  item,
  unit: item === 'blocks.whole' ? 'nr' : 'm³',
  net,
  parts: [],
})
const ribbed = schemeOf('R1', 'ribbed', [quantity('concrete.slab', 90), quantity('blocks.whole', 2000)], simpleRates)
const solid = schemeOf('S1', 'solid', [quantity('concrete.slab', 120)], simpleRates)

describe('compareSchemes', () => {
  it('lists differences by size and runs to the difference of the totals', () => {
    expect(compareSchemes(ribbed, solid)!.ledger).toEqual([
      { item: 'concrete.slab', first: '9000.00', second: '12000.00', difference: '-3000.00', running: '-3000.00' },
      { item: 'blocks.whole', first: '2000.00', second: '0.00', difference: '2000.00', running: '-1000.00' },
      { item: 'preliminaries', first: '1100.00', second: '1200.00', difference: '-100.00', running: '-1100.00' },
    ])
  })

  it('finds the rate at which both cost the same, and who is cheaper below it', () => {
    expect(compareSchemes(ribbed, solid)!.tippingPoints).toEqual([
      // 90 r + 2000 = 120 r
      { item: 'concrete.slab', rate: '100', value: '66.666667', cheaperBelow: 'S1' },
      // 9000 + 2000 r = 12000
      { item: 'blocks.whole', rate: '1', value: '1.5', cheaperBelow: 'R1' },
    ])
  })

  it('has no tipping point where both take the same, or where it would be at or below zero', () => {
    const same = schemeOf('S2', 'solid', [quantity('concrete.slab', 90)], simpleRates)
    expect(compareSchemes(ribbed, same)!.tippingPoints).toEqual([
      { item: 'concrete.slab', rate: '100', value: null, cheaperBelow: null },
      { item: 'blocks.whole', rate: '1', value: null, cheaperBelow: null }, // they meet only where blocks are free
    ])
  })

  it('prices both schemes alike at every tipping point', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryQuantities, arbitraryRates, (ofFirst, ofSecond, rates) => {
        const [first, second] = [schemeOf('R1', 'ribbed', ofFirst, rates), schemeOf('S1', 'solid', ofSecond, rates)]
        for (const { item, value, cheaperBelow } of compareSchemes(first, second)!.tippingPoints) {
          if (value === null) continue
          const at = { ...rates, items: { ...rates.items, [item]: value } }
          const [a, b] = [priceScheme(ofFirst, at, 100), priceScheme(ofSecond, at, 100)]
          const apart = unroundedTotal(a).minus(unroundedTotal(b)).abs()
          const netOf = (quantities: readonly Quantity[]) => quantities.find((one) => one.item === item)?.net ?? 0
          const markups = unroundedTotal({ ...a, lines: [{ item, quantity: '1', unit: '', rate: '1', amount: '0' }] })
          const slope = markups
            .times(netOf(ofFirst))
            .minus(markups.times(netOf(ofSecond)))
            .abs()
          expect(apart.lessThanOrEqualTo(slope.times(HALF_LAST_DECIMAL).plus('1e-20'))).toBe(true)
          expect(cheaperBelow).toBe(netOf(ofFirst) > netOf(ofSecond) ? 'R1' : 'S1')
        }
      }),
      { numRuns: 500 },
    )
  })

  it('agrees with the printed totals within half a minor unit a line and markup', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryRates, (quantities, rates) => {
        const cost = priceScheme(quantities, rates, 100)
        const apart = unroundedTotal(cost).minus(cost.total).abs()
        const halves = cost.lines.length + cost.markups.length
        const most = new Decimal(halves)
          .div(2)
          .times(new Decimal(10).pow(-minorUnit(cost.currency)))
          .times(LARGEST_FACTOR)
        expect(apart.lessThanOrEqualTo(most)).toBe(true)
      }),
      { numRuns: 500 },
    )
  })

  it('always ends at the difference of the totals, the largest line first', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryQuantities, arbitraryRates, (ofFirst, ofSecond, rates) => {
        const [first, second] = [schemeOf('R1', 'ribbed', ofFirst, rates), schemeOf('S1', 'solid', ofSecond, rates)]
        const { ledger } = comparisonContract.parse(compareSchemes(first, second))
        const sizes = ledger.map(({ difference }) => new Big(difference).abs())
        sizes.slice(1).forEach((size, index) => expect(size.lte(sizes[index]!)).toBe(true))
        const end = new Big(ledger.at(-1)?.running ?? 0)
        expect(end.eq(new Big(first.cost!.total).minus(second.cost!.total))).toBe(true)
      }),
      { numRuns: 1000 },
    )
  })
})

describe('which schemes are compared', () => {
  const other = schemeOf('R2', 'ribbed', [quantity('concrete.slab', 80)], simpleRates)

  it('compares nothing where the rates are missing', () => {
    expect(compareSchemes(ribbed, schemeOf('S1', 'solid', [], null))).toBeNull()
  })

  it('compares any pair by its marks and refuses a mark that is not there', () => {
    expect(compareMarks([solid, ribbed, other], ['R2', 'R1'])!.between).toEqual(['R2', 'R1'])
    expect(() => compareMarks([solid, ribbed], ['R9', 'S1'])).toThrow(/S1, R1; got R9/)
  })

  it('knows every item of the contract', () => {
    const all = itemCode.options.map((item) => quantity(item, 1))
    const rates = { ...simpleRates, items: Object.fromEntries(itemCode.options.map((item) => [item, '1'])) }
    const { tippingPoints } = compareSchemes(schemeOf('R1', 'ribbed', all, rates), schemeOf('S1', 'solid', [], rates))!
    expect(tippingPoints.map(({ item }) => item)).toEqual(itemCode.options)
  })
})

describe('compareAllIn', () => {
  it('folds the markups in and ends at the same difference', () => {
    // all-in: 90 m³ at 110, 2000 blocks at 1.10 against 120 m³ at 110
    expect(compareAllIn(ribbed, solid)).toEqual({
      between: ['R1', 'S1'],
      ledger: [
        { item: 'concrete.slab', first: '9900.00', second: '13200.00', difference: '-3300.00', running: '-3300.00' },
        { item: 'blocks.whole', first: '2200.00', second: '0.00', difference: '2200.00', running: '-1100.00' },
      ],
      tippingPoints: [
        { item: 'concrete.slab', rate: '110.00', value: '73.33', cheaperBelow: 'S1' },
        { item: 'blocks.whole', rate: '1.100', value: '1.650', cheaperBelow: 'R1' },
      ],
    })
  })

  it('always ends at the difference of the totals', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryQuantities, arbitraryRates, (ofFirst, ofSecond, rates) => {
        const [first, second] = [schemeOf('R1', 'ribbed', ofFirst, rates), schemeOf('S1', 'solid', ofSecond, rates)]
        const { ledger } = comparisonContract.parse(compareAllIn(first, second))
        expect(ledger.some(({ item }) => ['preliminaries', 'contingency', 'tax'].includes(item))).toBe(false)
        const end = new Big(ledger.at(-1)?.running ?? 0)
        expect(end.eq(new Big(first.cost!.total).minus(second.cost!.total))).toBe(true)
      }),
      { numRuns: 500 },
    )
  })
})
