/** Labour outputs and carbon factors, typed by the firm: what is compared beside the cost is worked out from them. */
import { z } from 'zod'
import { line } from './primitives'
import { PROPOSED_LABOUR } from './proposedLabour'

/** A labour output: how much is done, or how long it takes, with where the figure comes from. */
export const labourOutput = z.strictObject({ value: z.number().min(0.0001).max(10_000), source: line(240) })

export const labourFactors = z.strictObject({
  concrete: labourOutput.default(PROPOSED_LABOUR.concrete), // man-hours per m³
  barsTo8: labourOutput.default(PROPOSED_LABOUR.barsTo8), // kg per man-hour, as all bars
  barsTo12: labourOutput.default(PROPOSED_LABOUR.barsTo12),
  barsTo20: labourOutput.default(PROPOSED_LABOUR.barsTo20),
  barsOver20: labourOutput.default(PROPOSED_LABOUR.barsOver20),
  mesh: labourOutput.default(PROPOSED_LABOUR.mesh), // man-hours per m²
  blocks: labourOutput.default(PROPOSED_LABOUR.blocks), // nr per man-hour
  soffit: labourOutput.default(PROPOSED_LABOUR.soffit), // man-hours per m², fix and strike
  edge: labourOutput.default(PROPOSED_LABOUR.edge), // man-hours per m, fix and strike
  leastGang: z.int().min(1).max(500).default(PROPOSED_LABOUR.leastGang), // people at work together
  hoursPerDay: z.number().min(1).max(24).default(PROPOSED_LABOUR.hoursPerDay),
  daysPerWeek: z.int().min(1).max(7).default(PROPOSED_LABOUR.daysPerWeek),
  airTemperature: z.number().min(1).max(50).default(PROPOSED_LABOUR.airTemperature), // °C, mean while the concrete hardens
})

export const carbonMaterial = z.enum(['concrete', 'bars', 'mesh', 'blocks', 'formwork'])
export const carbonUnit = z.enum(['m³', 't', 'kg', 'm²', 'nr'])
export const carbonModules = z.enum(['A1-A3', 'A4'])

const UNITS: Readonly<Record<z.infer<typeof carbonMaterial>, readonly z.infer<typeof carbonUnit>[]>> = {
  concrete: ['m³'],
  bars: ['t', 'kg'],
  mesh: ['t', 'kg', 'm²'],
  blocks: ['nr', 't', 'kg'],
  formwork: ['m²'],
}

/** A carbon factor, kg CO2e per declared unit, of the modules of EN 15978 that it covers. */
export const carbonFactor = z
  .strictObject({
    material: carbonMaterial,
    modules: carbonModules,
    value: z.number().min(0).max(1_000_000),
    unit: carbonUnit,
    wastePercent: z.number().min(0).max(100).optional(), // with A1-A3: made, carried and thrown away (A5); absent: not stated
    uses: z.int().min(1).max(200).default(1), // of formwork
    source: line(240),
    date: z.iso.date(),
  })
  .superRefine(({ material, modules, unit, wastePercent, uses }, context) => {
    const refuse = (field: string, message: string) => context.addIssue({ code: 'custom', path: [field], message })
    if (!UNITS[material].includes(unit)) refuse('unit', `expected ${UNITS[material].join(' or ')} for ${material}`)
    if (modules !== 'A1-A3' && wastePercent !== undefined) refuse('wastePercent', 'expected none: waste is stated with A1-A3')
    if (material !== 'formwork' && uses !== 1) refuse('uses', 'expected 1: only formwork is used again')
  })

export const factors = z.strictObject({
  labour: labourFactors.prefault({}),
  carbon: z
    .array(carbonFactor)
    .max(10)
    .default([])
    .superRefine((list, context) => {
      list.forEach(({ material, modules }, index) => {
        if (list.findIndex((other) => other.material === material && other.modules === modules) < index)
          context.addIssue({
            code: 'custom',
            path: [index, 'material'],
            message: `expected one factor for ${material} ${modules}`,
          })
      })
    }),
})

/** Declared units that a material's factor may have, the usual one first. */
export const carbonUnitsOf = (material: CarbonMaterial): readonly CarbonUnit[] => UNITS[material]

export type LabourOutput = z.infer<typeof labourOutput>
export type LabourFactors = z.infer<typeof labourFactors>
export type CarbonMaterial = z.infer<typeof carbonMaterial>
export type CarbonUnit = z.infer<typeof carbonUnit>
export type CarbonModules = z.infer<typeof carbonModules>
export type CarbonFactor = z.infer<typeof carbonFactor>
export type Factors = z.infer<typeof factors>
