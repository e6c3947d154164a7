import { z } from 'zod'
import { itemCode } from './appraisal'
import { decimalString, line, moment, version } from './primitives'

/** A rate that a project prices an item by in place of its edition's, and why. */
export const rateOverrideInput = z.strictObject({ rate: decimalString, reason: line(400) })
export type RateOverrideInput = z.infer<typeof rateOverrideInput>

export const rateOverride = rateOverrideInput.extend({ item: itemCode, author: z.string(), changedAt: moment, version })
export type RateOverride = z.infer<typeof rateOverride>
