import { z } from 'zod'
import { itemCode } from './appraisal'
import { buildUp } from './buildUp'
import { currencyCode, decimalString, id, line, optionalLine, version } from './primitives'
import { threePrices } from './resource'

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
  /** Its rates hold overheads and profit; else a project adds its own, once. */
  holdsOverheads: z.boolean(),
  /** Why it was made, where it puts an earlier edition right or was rebased; else empty. */
  reason: z.string(),
  /** Number of the edition that it puts right. */
  corrects: z.int().min(1).nullable(),
  /** The reader compiled it or changed a rate in it, so that somebody else must check it. */
  isOwnWork: z.boolean(),
  version,
})
export type Edition = z.infer<typeof edition>

/** What a compiler states of an edition. */
export const editionInput = z.strictObject({
  baseDate: z.iso.date(),
  validUntil: z.iso.date().nullable(),
  taxBasis: line(200),
  note: optionalLine(2000),
  holdsOverheads: z.boolean(),
})
export type EditionInput = z.infer<typeof editionInput>

/** One price of an edition: all-in before preliminaries, contingency and tax. */
export const rate = z.strictObject({
  item: itemCode,
  description: z.string(),
  unit: z.string(),
  low: decimalString,
  likely: decimalString,
  high: decimalString,
  source: z.string(),
  /** Day of the price, ISO date; null: not known, or built up. */
  sourceDate: z.iso.date().nullable(),
  /** Null: a plain price. */
  buildUp: buildUp.nullable(),
  version,
})

/** A rate as an estimator gives it: three plain prices, or a build-up that makes them; exactly one of the two. */
export const rateInput = z
  .strictObject({
    description: line(200),
    unit: line(10),
    price: threePrices.nullable(),
    buildUp: buildUp.nullable(),
    source: optionalLine(400),
    sourceDate: z.iso.date().nullable(),
  })
  .refine(({ price, buildUp }) => (price === null) !== (buildUp === null), {
    path: ['price'],
    error: 'expected either prices or a build-up',
  })
export type RateInput = z.infer<typeof rateInput>
export type Rate = z.infer<typeof rate>

export const editionWithRates = edition.extend({ rates: z.array(rate) })
export type EditionWithRates = z.infer<typeof editionWithRates>

/** A region's book with its editions, newest first, without their rates. */
export const rateBook = z.strictObject({ id, region: z.string(), currency: currencyCode, editions: z.array(edition) })
export type RateBook = z.infer<typeof rateBook>
