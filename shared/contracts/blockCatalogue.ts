import { z } from 'zod'
import { resourceCode } from './buildUp'
import { id, line, optionalLine, percentString, version } from './primitives'

const sizeMm = (most: number) => z.number().min(50).max(most)

/** A block that the firm can buy, as an estimator states it. Millimetres and kilograms; length runs along the rib. Sizes as the engine takes them. */
export const blockInput = z.strictObject({
  code: line(40),
  name: line(120),
  material: z.enum(['fired clay', 'concrete', 'lightweight concrete']),
  length: sizeMm(2000),
  width: sizeMm(2000),
  height: sizeMm(1000),
  mass: z.number().min(0).max(500),
  supplier: optionalLine(120),
  /** Blocks on one pallet; null: sold loose. */
  palletCount: z.int().min(1).max(10_000).nullable(),
  /** Share ordered on top of the net count, per cent. */
  breakagePercent: percentString,
  /** Code of the resource that it is priced by, in whatever edition; null: as the edition builds its block rates up. */
  priceCode: resourceCode.nullable(),
})
export type BlockInput = z.infer<typeof blockInput>

export const catalogueBlock = blockInput.extend({ id, version })
export type CatalogueBlock = z.infer<typeof catalogueBlock>
