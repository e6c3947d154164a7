import { z } from 'zod'
import { resourceCode } from './buildUp'
import { currencyCode, decimalString } from './primitives'
import { gang, quotation, resource, resourceKind } from './resource'
import { rate } from './rateBook'

const amounts = z.strictObject({ low: decimalString, likely: decimalString, high: decimalString })

/** A line of an opened build-up: what it adds to one unit of the work, and how. */
export const openedLine = z.strictObject({
  kind: resourceKind,
  /** Of the resource or the gang. */
  code: resourceCode,
  name: z.string(),
  /** With the likely prices in it, as `1 t × 900 × (1 + 2 %)`. */
  expression: z.string(),
  low: decimalString,
  likely: decimalString,
  high: decimalString,
  /** Where the amount or the output comes from. */
  source: z.string(),
  /** Codes of the resources whose prices are in it. */
  inputs: z.array(resourceCode),
})
export type OpenedLine = z.infer<typeof openedLine>

/** How a rate comes about: its lines, and the resources, gangs and chosen quotations that they rest on. */
export const openedBuildUp = z.strictObject({
  lines: z.array(openedLine),
  net: amounts,
  overheads: amounts,
  profit: amounts,
  price: amounts,
  resources: z.array(resource),
  gangs: z.array(gang),
  chosen: z.array(quotation),
})
export type OpenedBuildUp = z.infer<typeof openedBuildUp>

/** A rate of an edition, opened. `built` is null for a plain price. */
export const openedRate = z.strictObject({ currency: currencyCode, rate, built: openedBuildUp.nullable() })
export type OpenedRate = z.infer<typeof openedRate>
