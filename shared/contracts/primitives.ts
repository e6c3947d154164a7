import { z } from 'zod'

/** Text as typed by a person: trimmed, one line, no control characters, no half of a surrogate pair (JSON columns refuse it). */
export const line = (most: number) =>
  z
    .string()
    .trim()
    .min(1)
    .max(most)
    .regex(/^[^\p{Cc}\p{Cs}]*$/u, 'expected one line of text without control or broken characters')

/** Like `line`, but may be left empty. */
export const optionalLine = (most: number) =>
  z
    .string()
    .trim()
    .max(most)
    .regex(/^[^\p{Cc}\p{Cs}]*$/u, 'expected one line of text without control or broken characters')

/** Mark of a level, panel or scheme. */
export const mark = z
  .string()
  .trim()
  .min(1)
  .max(20)
  .regex(/^[\w.-]+$/)

/** One plain e-mail address: no display name, list, group or quoted part. */
export const emailAddress = z
  .string()
  .trim()
  .toLowerCase()
  .max(254)
  .regex(/^[a-z0-9][a-z0-9._+-]{0,63}@[a-z0-9-]+(\.[a-z0-9-]+)+$/, 'expected one e-mail address, as name@example.com')

/** Money or a rate as a decimal string, not negative, at most six decimals. */
export const decimalString = z.string().regex(/^\d{1,9}(\.\d{1,6})?$/, 'expected a decimal number, as 149.63')

/** Percentage as a decimal string, as `7.5`. */
export const percentString = z.string().regex(/^\d{1,3}(\.\d{1,4})?$/, 'expected a percentage, as 7.5')

export const currencyCode = z.string().regex(/^[A-Z]{3}$/, 'expected a three-letter currency code, as USD')

/** Version of a stored row: what `ETag` and `If-Match` carry. */
export const version = z.int().min(1)

/** Moment in ISO 8601, UTC. */
export const moment = z.iso.datetime()

export const id = z.uuid()
