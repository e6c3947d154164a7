import { z } from 'zod'
import { positiveDecimal, resourceCode } from './buildUp'
import { decimalString, id, line, optionalLine, version } from './primitives'

export const resourceKind = z.enum(['material', 'labour', 'plant'])
export type ResourceKind = z.infer<typeof resourceKind>

/** Low, likely and high price of one unit; low ≤ likely ≤ high. */
export const threePrices = z
  .strictObject({ low: decimalString, likely: decimalString, high: decimalString })
  .refine(({ low, likely }) => Number(low) <= Number(likely), { path: ['low'], error: 'expected at most the likely price' })
  .refine(({ likely, high }) => Number(likely) <= Number(high), { path: ['high'], error: 'expected at least the likely price' })
export type ThreePrices = z.infer<typeof threePrices>

/** What rates are made of: a material delivered, an hour of a person all in, an hour of plant. It belongs to an edition and is fixed with it. */
export const resourceInput = z.strictObject({
  code: resourceCode,
  kind: resourceKind,
  description: line(200),
  /** As kg, m², nr; `h` for labour and plant. */
  unit: line(10),
  price: threePrices,
  source: optionalLine(400),
  /** Day of the price, ISO date; null: not known. */
  sourceDate: z.iso.date().nullable(),
})
export type ResourceInput = z.infer<typeof resourceInput>
/** `hasChosenQuotation`: its likely price is that of the quotation chosen for it. */
export const resource = resourceInput.extend({ hasChosenQuotation: z.boolean(), version })
export type Resource = z.infer<typeof resource>

/** People who work together: so many of each labour resource, costed by the gang hour. */
export const gangInput = z.strictObject({
  code: resourceCode,
  description: line(200),
  members: z
    .array(z.strictObject({ resource: resourceCode, count: positiveDecimal }))
    .min(1)
    .max(20),
})
export type GangInput = z.infer<typeof gangInput>
export const gang = gangInput.extend({ version })
export type Gang = z.infer<typeof gang>

/** A supplier's price for a resource. Several may stand side by side; one at most is chosen. */
export const quotationInput = z.strictObject({
  resource: resourceCode,
  supplier: line(120),
  /** Price of what is quoted, delivered. */
  price: decimalString,
  /** Units of the resource in what is quoted: 120 for a pallet of 120 blocks. */
  contains: positiveDecimal,
  reference: optionalLine(120),
  day: z.iso.date(),
  validUntil: z.iso.date().nullable(),
})
export type QuotationInput = z.infer<typeof quotationInput>
export const quotation = quotationInput.extend({ id, isChosen: z.boolean(), version })
export type Quotation = z.infer<typeof quotation>

/** All that the rates of an edition are built up from. */
export const resourceList = z.strictObject({ resources: z.array(resource), gangs: z.array(gang), quotations: z.array(quotation) })
export type ResourceList = z.infer<typeof resourceList>

/** What a change of a resource does to a rate built up from it: shown before it is saved. */
export const rateMove = z.strictObject({
  item: z.string(),
  description: z.string(),
  unit: z.string(),
  before: threePrices,
  after: threePrices,
})
export type RateMove = z.infer<typeof rateMove>
