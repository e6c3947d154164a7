import type { BlockInput } from '../../shared/contracts/blockCatalogue'
import type { RateInput } from '../../shared/contracts/rateBook'
import type { GangInput, QuotationInput, ResourceInput } from '../../shared/contracts/resource'

/** A material sold by the number, 0.75 to 0.9. */
export const material = (code: string, change: Partial<ResourceInput> = {}): ResourceInput => ({
  code,
  kind: 'material',
  description: 'Hollow block 400 × 200 × 200',
  unit: 'nr',
  price: { low: '0.75', likely: '0.8', high: '0.9' },
  source: 'Price list',
  sourceDate: '2026-08-01',
  ...change,
})

/** Two steel fixers. */
export const fixers = (code: string, change: Partial<GangInput> = {}): GangInput => ({
  code,
  description: 'Two fixers',
  members: [{ resource: 'fixer', count: '2' }],
  ...change,
})

/** A pallet of 120 blocks for 99. */
export const blockQuotation = (change: Partial<QuotationInput> = {}): QuotationInput => ({
  resource: 'block',
  supplier: 'Third kiln',
  price: '99',
  contains: '120',
  reference: 'Q7',
  day: '2026-09-01',
  validUntil: null,
  ...change,
})

/** A plain price from 90 to 120. */
export const plainRate = (unit: string, change: Partial<RateInput> = {}): RateInput => ({
  description: 'A rate',
  unit,
  price: { low: '90', likely: '100', high: '120' },
  buildUp: null,
  source: 'Last job',
  sourceDate: '2026-07-01',
  ...change,
})

/** A hollow clay block, 400 wide and 200 high. */
export const sampleBlock = (change: Partial<BlockInput> = {}): BlockInput => ({
  code: 'HB 200',
  name: 'Hollow clay block',
  material: 'fired clay',
  length: 200,
  width: 400,
  height: 200,
  mass: 15,
  supplier: 'First kiln',
  palletCount: 120,
  breakagePercent: '3',
  priceCode: null,
  ...change,
})
