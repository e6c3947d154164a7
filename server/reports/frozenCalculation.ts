import { z } from 'zod'
import { CALCULATION_TITLES, type PanelCalculation } from '#shared/calculation/calculation'
import { check } from '#shared/contracts/appraisalResult'

const line = z.strictObject({
  symbol: z.string().nullable(),
  formula: z.string().nullable(),
  numbers: z.string().nullable(),
  result: z.string(),
  note: z.string().nullable(),
})
const entry = z.strictObject({ heading: z.string(), clause: z.string(), lines: z.array(line), check: check.nullable() })

/** The calculation of a panel as it stood when it was sent. */
export const frozenCalculation: z.ZodType<PanelCalculation> = z.strictObject({
  scheme: z.string(),
  kind: z.enum(['ribbed', 'solid']),
  level: z.string(),
  panel: z.string(),
  basis: z.string(),
  depthMm: z.number(),
  inputs: z.array(z.strictObject({ name: z.string(), value: z.string() })),
  assumptions: z.array(z.string()),
  sections: z.array(z.strictObject({ title: z.enum(CALCULATION_TITLES), entries: z.array(entry) })),
})
