import { z } from 'zod'
import { decimalString, optionalLine, percentString } from './primitives'

/** Code of a resource or a gang within an edition, as `CEM-42` or `gang.slab`. */
export const resourceCode = z
  .string()
  .trim()
  .min(1)
  .max(40)
  .regex(/^[\p{L}\p{N}][\p{L}\p{N} ._/-]*$/u, 'expected a code of letters, digits, spaces and . _ / -, as CEM-42')

/** A decimal above zero: an output, an amount of material in a unit of the work. */
export const positiveDecimal = decimalString.refine((text) => Number(text) > 0, 'expected a number above zero')

/** Material in one unit of the work: delivered price × quantity × (1 + waste) ÷ uses. */
export const materialLine = z.strictObject({
  resource: resourceCode,
  /** Units of the resource in one unit of the work, waste apart: the conversion between the two units. */
  quantity: positiveDecimal,
  wastePercent: percentString.default('0'),
  /** Times it is used before it is spent, as sheets of formwork. */
  uses: z.int().min(1).max(200).default(1),
  /** Takes the price of a scheme's own block, where the catalogue gives that block a price code. */
  isBlock: z.boolean().default(false),
  source: optionalLine(200).default(''),
})
export type MaterialLine = z.infer<typeof materialLine>

/** Labour: hourly cost of the gang × hours a unit, or ÷ units an hour. */
export const labourLine = z.strictObject({
  gang: resourceCode,
  basis: z.enum(['hours', 'output']),
  /** Gang hours for one unit of the work (`hours`), or units of the work in one gang hour (`output`). */
  value: positiveDecimal,
  source: optionalLine(200).default(''),
})
export type LabourLine = z.infer<typeof labourLine>

/** Plant: (hire an hour + fuel an hour) ÷ units of the work an hour. */
export const plantLine = z.strictObject({
  resource: resourceCode,
  fuel: z.strictObject({ resource: resourceCode, perHour: positiveDecimal }).nullable().default(null),
  outputPerHour: positiveDecimal,
  source: optionalLine(200).default(''),
})
export type PlantLine = z.infer<typeof plantLine>

/** How a rate is made up of resources of its edition, for one unit of the work. */
export const buildUp = z
  .strictObject({
    materials: z.array(materialLine).max(40),
    labour: z.array(labourLine).max(20),
    plant: z.array(plantLine).max(20),
    overheadsPercent: percentString.default('0'),
    profitPercent: percentString.default('0'),
  })
  .refine(({ materials, labour, plant }) => materials.length + labour.length + plant.length > 0, {
    path: ['materials'],
    error: 'expected at least one line of materials, labour or plant',
  })
export type BuildUp = z.infer<typeof buildUp>
