import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { ItemCode } from '../../../shared/contracts/appraisal'
import type { Cost } from '../../../shared/contracts/appraisalResult'
import { itemCode } from '../../../shared/contracts/appraisal'
import { Decimal, sumOf } from '../../../shared/pricing/decimal'
import { differenceGroups } from '../../../server/reports/content/differenceGroups'
import { wholeParts } from '../../../server/reports/content/wholeParts'

/** A bill of these amounts, with markups that add up as the engine's do. */
function costOf(amounts: Partial<Record<ItemCode, string>>, markups: Partial<Record<string, string>> = {}): Cost {
  const lines = Object.entries(amounts).map(([item, amount]) => ({
    item: item as ItemCode,
    quantity: '1',
    unit: 'm³',
    rate: amount,
    amount,
  }))
  let running = sumOf(lines.map(({ amount }) => new Decimal(amount)))
  const charged = (['preliminaries', 'contingency', 'tax'] as const).map((name) => {
    const percent = markups[name] ?? '0'
    const amount = running.times(percent).div(100).toDecimalPlaces(2)
    running = running.plus(amount)
    return { name, percent, amount: amount.toFixed(2) }
  })
  return { currency: 'USD', lines, markups: charged, unpriced: [], total: running.toFixed(2), perArea: '1' }
}

const RIBBED = {
  'concrete.slab': '200',
  'steel.bar.12': '90',
  'blocks.whole': '70',
  'blocks.closedEnds': '5',
  'formwork.soffit': '80',
} as const
const SOLID = { 'concrete.slab': '300', 'steel.bar.10': '140', 'formwork.soffit': '80' } as const

describe('the groups of the difference', () => {
  it('gather items and markups, the largest first and markups last', () => {
    const markups = { preliminaries: '10', contingency: '5' }
    expect(differenceGroups(costOf(RIBBED, markups), costOf(SOLID, markups))).toEqual([
      { label: 'Concrete and bars', difference: '-150.00', sway: '-173.25' },
      { label: 'Blocks and closing of their ends', difference: '75.00', sway: '86.625' },
      { label: 'Formwork', difference: '0.00', sway: '0' },
      { label: 'Preliminaries and contingency', difference: '-11.62', sway: null },
    ])
  })

  it('never rest on one price alone: such a group joins its neighbours until it does not', () => {
    const withoutEnds = { ...RIBBED, 'blocks.closedEnds': '0' }
    const groups = differenceGroups(costOf(withoutEnds), costOf(SOLID))
    expect(groups.map(({ label, difference }) => [label, difference])).toEqual([
      ['Concrete, bars, blocks and formwork', '-80.00'],
    ])
  })

  it('hide a single markup among the items, and then tell no sway from which it could be worked out', () => {
    const groups = differenceGroups(costOf(RIBBED, { contingency: '5' }), costOf(SOLID, { contingency: '5' }))
    expect(groups.map(({ label }) => label)).toEqual([
      'Concrete and bars',
      'Blocks, closing of their ends, formwork and contingency',
    ])
    expect(groups.every(({ sway }) => sway === null)).toBe(true)
  })

  const amount = fc.integer({ min: 0, max: 10_000_000 }).map((cents) => (cents / 100).toFixed(2))
  const bill = fc.dictionary(fc.constantFrom(...itemCode.options), amount, { minKeys: 1 })
  const percent = fc.constantFrom('0', '5', '7.5', '10')
  const markups = fc.record({ preliminaries: percent, contingency: percent, tax: percent })

  it('add up to the difference of the totals, whatever the bills are', () => {
    fc.assert(
      fc.property(bill, bill, markups, (first, second, charged) => {
        const [ribbed, solid] = [costOf(first, charged), costOf(second, charged)]
        const groups = differenceGroups(ribbed, solid)
        const sum = sumOf(groups.map(({ difference }) => new Decimal(difference)))
        expect(sum.toFixed(2)).toBe(new Decimal(ribbed.total).minus(solid.total).toFixed(2))
      }),
    )
  })
})

describe('whole parts', () => {
  it('add up to the whole as printed, each within one and a bit of its own value', () => {
    const part = fc.integer({ min: -1_000_000, max: 1_000_000 }).map((cents) => new Decimal(cents).div(100))
    fc.assert(
      fc.property(fc.array(part, { minLength: 1, maxLength: 6 }), fc.constantFrom(-1, 0, 1), (parts, shift) => {
        const exact = sumOf(parts)
        const whole = exact.toDecimalPlaces(0).plus(shift)
        if (whole.minus(exact).abs().greaterThan(1)) return
        const rounded = wholeParts(parts, whole)
        expect(sumOf(rounded).toFixed()).toBe(whole.toFixed())
        rounded.forEach((value, index) => {
          expect(value.isInteger()).toBe(true)
          expect(value.minus(parts[index]!).abs().toNumber()).toBeLessThan(2)
        })
      }),
    )
  })
})
