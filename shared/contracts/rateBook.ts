import { z } from 'zod'
import { itemCode } from './appraisal'
import { buildUp, resourceCode } from './buildUp'
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
  /** Why it was last returned to its compilers, or withdrawn; else empty. */
  stateReason: z.string(),
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

/** A new draft: empty, or a copy of an edition whose money is the same; `isCorrection`: it puts that edition right, and `reason` says how. */
export const draftInput = z
  .strictObject({ from: id.nullable(), isCorrection: z.boolean(), reason: optionalLine(400), particulars: editionInput })
  .refine(({ from, isCorrection }) => from !== null || !isCorrection, {
    path: ['from'],
    error: 'expected the edition that is put right',
  })
  .refine(({ reason, isCorrection }) => reason !== '' || !isCorrection, { path: ['reason'], error: 'expected what is put right' })
export type DraftInput = z.infer<typeof draftInput>

/** A step in the life of an edition. Returning and withdrawing need a reason. */
export const editionStep = z
  .strictObject({ step: z.enum(['check', 'return', 'publish', 'withdraw']), reason: optionalLine(400) })
  .refine(({ step, reason }) => reason !== '' || step === 'check' || step === 'publish', {
    path: ['reason'],
    error: 'expected a reason',
  })
export type EditionStep = z.infer<typeof editionStep>

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

/** What an item costs built up with a block of the catalogue, by that block's price code (`code`). */
export const blockRate = z.strictObject({ blockId: id, code: resourceCode, item: itemCode, rate: decimalString })
export type BlockRate = z.infer<typeof blockRate>

export const editionWithRates = edition.extend({ rates: z.array(rate), blockRates: z.array(blockRate).default([]) })
export type EditionWithRates = z.infer<typeof editionWithRates>

/** A region's book with its editions, newest first, without their rates. */
export const rateBook = z.strictObject({ id, region: z.string(), currency: currencyCode, editions: z.array(edition) })
export type RateBook = z.infer<typeof rateBook>

export const rateBookInput = z.strictObject({ region: line(80), currency: currencyCode })
export type RateBookInput = z.infer<typeof rateBookInput>
