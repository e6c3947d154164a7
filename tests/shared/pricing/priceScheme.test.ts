import { expect, it } from 'vitest'
import { markups, type Rates } from '#shared/contracts/appraisal'
import { type Quantity } from '#shared/contracts/appraisalResult'
import { priceScheme } from '#shared/pricing/priceScheme'

const concrete: Quantity = { item: 'concrete.slab', unit: 'm³', net: 33.9, parts: [] }
const bars: Quantity = { item: 'steel.bar.12', unit: 't', net: 1.205, parts: [] }
const rates: Rates = {
  currency: 'USD',
  items: { 'concrete.slab': '149.63', 'steel.bar.12': '1310' },
  byScheme: {},
  markups: markups.parse({ preliminariesPercent: '10', contingencyPercent: '5', taxPercent: '7.5' }),
}

it('multiplies printed quantities, rounds each line and takes markups in turn', () => {
  const cost = priceScheme([concrete, bars], rates, 200)
  expect(cost.lines).toEqual([
    { item: 'concrete.slab', quantity: '33.90', unit: 'm³', rate: '149.63', amount: '5072.46' }, // 5072.457
    { item: 'steel.bar.12', quantity: '1.205', unit: 't', rate: '1310', amount: '1578.55' },
  ])
  expect(cost.markups).toEqual([
    { name: 'preliminaries', percent: '10', amount: '665.10' }, // of 6651.01
    { name: 'contingency', percent: '5', amount: '365.81' }, // of 7316.11: 365.8055
    { name: 'tax', percent: '7.5', amount: '576.14' }, // of 7681.92: 576.144
  ])
  expect(cost).toMatchObject({ currency: 'USD', unpriced: [], total: '8258.06', perArea: '41.29' }) // 41.2903
})

it('names items without a rate and leaves them out of the total', () => {
  const cost = priceScheme([concrete, bars], { ...rates, items: { 'concrete.slab': '149.63' } }, 200)
  expect(cost.unpriced).toEqual(['steel.bar.12'])
  expect(cost.lines.map(({ item }) => item)).toEqual(['concrete.slab'])
  expect(cost.total).toBe('6298.10') // 5072.46 + 507.25 + 278.99 + 439.40
})

it('prices to whole yen and to thousandths of a dinar', () => {
  expect(priceScheme([concrete], { ...rates, currency: 'JPY' }, 200).lines[0]!.amount).toBe('5072')
  expect(priceScheme([concrete], { ...rates, currency: 'KWD' }, 200).lines[0]!.amount).toBe('5072.457')
})
