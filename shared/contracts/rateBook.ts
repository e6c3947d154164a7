import { z } from 'zod'
import { itemCode } from './appraisal'
import { currencyCode, decimalString, id, version } from './primitives'

export const editionState = z.enum(['draft', 'checked', 'published', 'superseded', 'withdrawn'])
export type EditionState = z.infer<typeof editionState>

/** A dated state of a region's prices. Published ones are never edited, only superseded. */
export const edition = z.strictObject({
  id,
  bookId: id,
  region: z.string(),
  currency: currencyCode,
  number: z.int().min(1),
  state: editionState,
  /** Day the prices hold for, ISO date. */
  baseDate: z.iso.date(),
  validUntil: z.iso.date().nullable(),
  compiledBy: z.string(),
  checkedBy: z.string().nullable(),
  taxBasis: z.string(),
  note: z.string(),
  version,
})
export type Edition = z.infer<typeof edition>

/** One price of an edition: all-in before preliminaries, contingency and tax. */
export const rate = z.strictObject({
  item: itemCode,
  description: z.string(),
  unit: z.string(),
  low: decimalString,
  likely: decimalString,
  high: decimalString,
  source: z.string(),
})
export type Rate = z.infer<typeof rate>

export const editionWithRates = edition.extend({ rates: z.array(rate) })
export type EditionWithRates = z.infer<typeof editionWithRates>

/** A region's book with its editions, newest first, without their rates. */
export const rateBook = z.strictObject({ id, region: z.string(), currency: currencyCode, editions: z.array(edition) })
export type RateBook = z.infer<typeof rateBook>
