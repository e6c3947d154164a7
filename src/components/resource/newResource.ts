import type { GangInput, QuotationInput, ResourceInput, ResourceKind } from '#shared/contracts/resource'

/** Kinds of resources in words. */
export const KINDS: readonly { readonly value: ResourceKind; readonly label: string; readonly note: string }[] = [
  { value: 'material', label: 'Material', note: 'delivered' },
  { value: 'labour', label: 'Labour', note: 'an hour, all in' },
  { value: 'plant', label: 'Plant', note: 'an hour on hire' },
]

/** An empty resource to type into. */
export const newResource = (): ResourceInput => ({
  code: '',
  kind: 'material',
  description: '',
  unit: '',
  price: { low: '', likely: '', high: '' },
  source: '',
  sourceDate: null,
})

/** An empty gang of one. */
export const newGang = (): GangInput => ({ code: '', description: '', members: [{ resource: '', count: '1' }] })

/** A quotation of today to type into. @param today - ISO date */
export const newQuotation = (resource: string, today: string): QuotationInput => ({
  resource,
  supplier: '',
  price: '',
  contains: '1',
  reference: '',
  day: today,
  validUntil: null,
})
