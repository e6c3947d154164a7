/** By which rules quantities are measured and billed, and what such rules add to an item: composite items and bands. */
import { z } from 'zod'

/** Set of measurement rules, by its code; `comparing` is the project's own, for setting schemes against each other. */
export const measurement = z.enum(['comparing', 'nrm2', 'kilograms', 'composite'])
export type Measurement = z.infer<typeof measurement>

/** Items of one square metre of floor, made up of other items and priced by their rates. */
export const compositeItem = z.enum(['floor.ribbed', 'floor.solid'])
export type CompositeItem = z.infer<typeof compositeItem>

/** A stage that an item is described by, mm: above `over`, up to and including `upTo`; null: no upper end. */
export const stage = z.strictObject({
  of: z.enum(['thickness', 'edgeDepth', 'proppingHeight']),
  over: z.number(),
  upTo: z.number().nullable(),
})
/** What an item of the bill is described by beside its name: stages, or the overall depth of the floor, mm. */
export const band = z.discriminatedUnion('of', [stage, z.strictObject({ of: z.literal('overallDepth'), mm: z.number() })])
export type Stage = z.infer<typeof stage>
export type Band = z.infer<typeof band>
