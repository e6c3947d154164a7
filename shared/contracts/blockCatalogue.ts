import { z } from 'zod'
import { id } from './primitives'

/** A block that the firm can buy. Millimetres and kilograms; length runs along the rib. */
export const catalogueBlock = z.strictObject({
  id,
  code: z.string(),
  name: z.string(),
  material: z.enum(['fired clay', 'concrete', 'lightweight concrete']),
  length: z.number(),
  width: z.number(),
  height: z.number(),
  mass: z.number(),
  supplier: z.string(),
  /** Blocks on one pallet; null: sold loose. */
  palletCount: z.int().nullable(),
  /** Share ordered on top of the net count, per cent. */
  breakagePercent: z.string(),
})
export type CatalogueBlock = z.infer<typeof catalogueBlock>
