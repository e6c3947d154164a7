import { z } from 'zod'
import { itemCode } from './appraisal'
import { resourceCode } from './buildUp'
import { id, optionalLine } from './primitives'
import { quotation, resource, resourceKind } from './resource'

/** Resources on one page of the list. */
export const RESOURCES_A_PAGE = 100

/** Which resources of an edition are asked for, as the address says it. Every word of `search` must be in the code or the description. */
export const resourceQuery = z.strictObject({
  search: optionalLine(100).default(''),
  kind: resourceKind.optional(),
  page: z
    .string()
    .regex(/^[1-9]\d{0,5}$/, 'expected the number of a page, from 1')
    .default('1')
    .transform(Number),
})
export type ResourceQuery = z.infer<typeof resourceQuery>

/** A page of them in the order of their codes, and how many there are in all. */
export const resourcePage = z.strictObject({ resources: z.array(resource), page: z.int().min(1), total: z.int().min(0) })
export type ResourcePage = z.infer<typeof resourcePage>

/** What rests on a resource or a gang: it is not removed while something does. */
export const restingOn = z.strictObject({ rates: z.array(itemCode), gangs: z.array(resourceCode) })
export type RestingOn = z.infer<typeof restingOn>

/** A resource with the quotations for it, cheapest first, and what rests on it. */
export const resourceSheet = z.strictObject({ resource, quotations: z.array(quotation), restingOn })
export type ResourceSheet = z.infer<typeof resourceSheet>

/** The quotation that a resource takes its price from; null: none, the price is typed. */
export const quotationChoice = z.strictObject({ quotation: id.nullable() })
export type QuotationChoice = z.infer<typeof quotationChoice>
