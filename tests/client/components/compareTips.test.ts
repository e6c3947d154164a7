import { describe, expect, it } from 'vitest'
import { compareSchemes } from '#shared/comparison/compareSchemes'
import { compareStandfirst, tipsOf } from '../../../src/components/compare/compareStandfirst'
import { tipInWords } from '../../../src/components/compare/tipInWords'
import { ledgerRows } from '../../../src/components/ledger/ledgerRows'
import { aSheet } from '../../support/projectSheetOf'
import { aCost, aResult } from '../../support/schemeResultOf'

const line = (
  item: 'concrete.slab' | 'blocks.whole' | 'curing.area',
  quantity: string,
  rate: string,
  amount: string,
  unit = 'm³',
) => ({
  item,
  quantity,
  unit,
  rate,
  amount,
})
/** Ribbed: 8 m³ at 150 and 100 blocks at 2; solid: 10 m³ at 150; curing the same: ribbed is 100 cheaper. */
const ribbed = aResult('ribbed', {
  cost: aCost('1450.00', {
    lines: [
      line('concrete.slab', '8', '150', '1200.00'),
      line('blocks.whole', '100', '2', '200.00', 'nr'),
      line('curing.area', '50', '1', '50.00', 'm²'),
    ],
  }),
})
const solid = aResult('solid', {
  cost: aCost('1550.00', {
    lines: [line('concrete.slab', '10', '150', '1500.00'), line('curing.area', '50', '1', '50.00', 'm²')],
  }),
})
const pair = { ribbed, solid }
const comparison = compareSchemes(ribbed, solid)!
const { rates } = aSheet().edition!

describe('tipping points', () => {
  it('stand nearest first, each with its change against now: 100 less over 2 m³ and over 100 blocks', () => {
    expect(tipsOf(comparison, []).map(({ point, change }) => [point.item, point.value, change])).toEqual([
      ['concrete.slab', '100', -1 / 3],
      ['blocks.whole', '3', 0.5],
    ])
  })

  it("know whether they lie inside the book's range of 124 to 178", () => {
    const [concrete] = tipsOf(comparison, rates)
    expect(concrete?.isInsideBook).toBe(false)
    const wide = rates.map((rate) => ({ ...rate, low: '90' }))
    expect(tipsOf(comparison, wide)[0]?.isInsideBook).toBe(true)
  })

  it('say who wins beyond them', () => {
    const [concrete, blocks] = tipsOf(comparison, [])
    expect(tipInWords(concrete!, 'R1')).toBe('below 100.00 solid is cheaper')
    expect(tipInWords(blocks!, 'R1')).toBe('above 3.00 solid is cheaper')
  })

  it('give the standfirst its doubt', () => {
    expect(compareStandfirst(pair, comparison, [])).toEqual([
      'Ribbed saves 6.5% of the dearer floors: 1,450 against 1,550 USD, at the likely rates of the book.',
      'The order turns if the rate of concrete in slabs falls by 33%, to 100.00 USD/m³, all else as it is.',
    ])
  })

  it('say how to get prices where there are none', () => {
    const unpriced = { ribbed: { ...ribbed, cost: null }, solid: { ...solid, cost: null } }
    expect(compareStandfirst(unpriced, null, [])[0]).toContain('Choose an edition')
  })
})

describe('the ledger as it is read', () => {
  const ledger = ledgerRows(comparison, pair)!

  it('orders the differences by size and ends at the difference of the totals', () => {
    expect(ledger.rows.map(({ name, difference, running }) => [name, difference, running])).toEqual([
      ['Concrete in slabs', '-300.00', '-300.00'],
      ['Hollow blocks, whole', '200.00', '-100.00'],
    ])
    expect(ledger.total).toEqual({ ribbed: '1450.00', solid: '1550.00', difference: '-100.00' })
  })

  it('shows how each amount came about', () => {
    expect(ledger.rows.map(({ working }) => working)).toEqual(['8 and 10 m³ at 150.00', '100 nr at 2.00'])
  })

  it('takes together what costs the same in both', () => {
    expect(ledger.same).toEqual({ names: 'curing', amount: '50.00', difference: '0.00' })
  })
})
