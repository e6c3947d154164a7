import type { EditionWithRates } from '../../shared/contracts/rateBook'
import type { Gang, Quotation, RateMove, Resource } from '../../shared/contracts/resource'
import type { ResourceSheet } from '../../shared/contracts/resourceSheet'
import { aPricedSheet } from './openSheet'

/** A draft of the invented region, with the rates of a priced sheet. */
export function aDraft(change: Partial<EditionWithRates> = {}): EditionWithRates {
  return { ...aPricedSheet().edition!, state: 'draft', ...change }
}

/** Hollow blocks at 0.8, dated. */
export const aResource = (change: Partial<Resource> = {}): Resource => ({
  ...{ code: 'HC 200', kind: 'material', description: 'Hollow block 400 × 200', unit: 'nr' },
  ...{ price: { low: '0.7', likely: '0.8', high: '0.9' }, source: 'Price list', sourceDate: '2026-08-01' },
  ...{ hasChosenQuotation: false, version: 3 },
  ...change,
})

/** 96 for a pallet of 120. */
export const aQuotation = (change: Partial<Quotation> = {}): Quotation => ({
  ...{ id: '00000000-0000-4000-8000-000000000071', resource: 'HC 200', supplier: 'First kiln', price: '96', contains: '120' },
  ...{ reference: 'Q1', day: '2026-08-10', validUntil: null, isChosen: false, version: 1 },
  ...change,
})

export const aGang = (change: Partial<Gang> = {}): Gang => ({
  ...{ code: 'gang.blocks', description: 'One helper', members: [{ resource: 'HELPER', count: '1' }], version: 1 },
  ...change,
})

export const aSheetOf = (resource: Resource, quotations: Quotation[] = []): ResourceSheet => ({
  resource,
  quotations,
  restingOn: { rates: ['blocks.whole'], gangs: [] },
})

/** Blocks from 0.98 to 1.1. */
export const aMove = (): RateMove => ({
  ...{ item: 'blocks.whole', description: 'Hollow blocks laid', unit: 'nr' },
  before: { low: '0.86', likely: '0.98', high: '1.18' },
  after: { low: '0.96', likely: '1.1', high: '1.3' },
})
