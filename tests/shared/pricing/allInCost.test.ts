import Big from 'big.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { markups } from '#shared/contracts/appraisal'
import { cost as costContract } from '#shared/contracts/appraisalResult'
import { allInCost } from '#shared/pricing/allInCost'
import { allocate } from '#shared/pricing/allocate'
import { Decimal } from '#shared/pricing/decimal'
import { minorUnit } from '#shared/pricing/minorUnit'
import { priceScheme } from '#shared/pricing/priceScheme'
import { arbitraryQuantities, arbitraryRates } from '../support/arbitraryBill'

describe('allInCost', () => {
  it('folds markups into lines that add up to the same total', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryRates, (quantities, rates) => {
        const cost = priceScheme(quantities, rates, 100)
        const allIn = costContract.parse(allInCost(cost))
        expect(allIn.markups).toEqual([])
        expect({ ...allIn, lines: [], markups: [] }).toEqual({ ...cost, lines: [], markups: [] })
        const sum = allIn.lines.reduce((total, { amount }) => total.plus(amount), new Big(0))
        expect(sum.toFixed(minorUnit(cost.currency))).toBe(cost.total)
      }),
      { numRuns: 2000 },
    )
  })

  it('keeps every share within one minor unit of its exact part', () => {
    fc.assert(
      fc.property(arbitraryQuantities, arbitraryRates, (quantities, rates) => {
        const cost = priceScheme(quantities, rates, 100)
        const measured = cost.lines.reduce((sum, { amount }) => sum.plus(amount), new Decimal(0))
        fc.pre(!measured.isZero())
        const step = new Decimal(10).pow(-minorUnit(cost.currency))
        allInCost(cost).lines.forEach(({ amount }, index) => {
          const exact = new Decimal(cost.lines[index]!.amount).times(cost.total).div(measured)
          expect(exact.minus(amount).abs().lessThan(step)).toBe(true)
        })
      }),
      { numRuns: 500 },
    )
  })

  it('prints rates that explain the amounts and show no markup', () => {
    const cost = priceScheme(
      [
        { item: 'concrete.slab', unit: 'm³', net: 100, parts: [] },
        { item: 'blocks.whole', unit: 'nr', net: 4000, parts: [] },
      ],
      {
        currency: 'USD',
        items: { 'concrete.slab': '150', 'blocks.whole': '1.25' },
        markups: markups.parse({ preliminariesPercent: '10' }),
      },
      500,
    )
    expect(allInCost(cost).lines).toEqual([
      { item: 'concrete.slab', quantity: '100.00', unit: 'm³', rate: '165.00', amount: '16500.00' },
      { item: 'blocks.whole', quantity: '4000', unit: 'nr', rate: '1.375', amount: '5500.00' },
    ])
  })
})

describe('allocate', () => {
  it('gives what is left over to the largest remainders', () => {
    const shares = allocate(new Decimal('10.00'), [new Decimal(1), new Decimal(1), new Decimal(1)], 2)
    expect(shares.map((share) => share.toFixed(2))).toEqual(['3.34', '3.33', '3.33'])
  })

  it('refuses weights that are all zero and totals finer than its step', () => {
    expect(() => allocate(new Decimal(1), [new Decimal(0)], 2)).toThrow(RangeError)
    expect(() => allocate(new Decimal('0.001'), [new Decimal(1)], 2)).toThrow(RangeError)
  })
})
