import { z } from 'zod'
import { brief, itemCode, ribbed, solid } from '#shared/contracts/appraisal'
import { check, deadLoad, markupLine, money, unit } from '#shared/contracts/appraisalResult'
import { currencyCode, id, moment } from '#shared/contracts/primitives'
import { rateOverride } from '#shared/contracts/rateOverride'
import { useCategory } from '#shared/contracts/project'
import type { SvgNode } from '#shared/drawing/svgNode'
import { frozenAlsoRow, frozenScope } from './frozenBeside'
import { frozenCalculation } from './frozenCalculation'

const drawing: z.ZodType<SvgNode> = z.strictObject({
  tag: z.enum([
    'svg',
    'g',
    'path',
    'rect',
    'line',
    'circle',
    'polygon',
    'polyline',
    'text',
    'tspan',
    'title',
    'desc',
    'defs',
    'pattern',
    'clipPath',
    'use',
  ]),
  attributes: z.record(z.string(), z.union([z.string(), z.number()])),
  get children() {
    return z.array(z.union([drawing, z.string()]))
  },
})

const frozenScheme = z.strictObject({
  name: z.string(),
  depth: z.number(),
  passes: z.boolean(),
  /** Of all panels: how many checks were made and how many failed. */
  checkCount: z.int(),
  failedCount: z.int(),
  /** The tightest of each kind, then every failing one that is not among them. */
  checks: z.array(check),
  deadLoad,
  quantities: z.array(z.strictObject({ item: itemCode, unit, net: z.number() })),
  total: money,
  perArea: money,
})

/** A part of the difference in cost, grouped so widely that no rate can be worked back from it. */
const frozenGroup = z.strictObject({
  label: z.string(),
  /** Ribbed less solid; the groups add up to the difference of the totals. */
  difference: money,
  /** What the difference of the totals would move by if all prices of the group doubled; null: not told. */
  sway: money.nullable(),
})

/**
 * Two schemes of a project as they stood when the comparison was sent: all that the report, the e-mail and the PDF are made of.
 * It holds no rate and no amount of a single item. Units as in the appraisal file; areas m², loads kN/m² and kN.
 */
export const frozenComparison = z.strictObject({
  format: z.literal('bothways.comparison/1'),
  frozenAt: moment,
  firm: z.strictObject({ name: z.string(), isDemo: z.boolean() }),
  project: z.strictObject({ id, name: z.string(), reference: z.string(), place: z.string(), use: useCategory }),
  recipient: z.strictObject({ name: z.string(), email: z.string() }),
  preparedBy: z.string(),
  note: z.string(),
  brief,
  edition: z.strictObject({
    region: z.string(),
    number: z.int(),
    currency: currencyCode,
    baseDate: z.iso.date(),
    taxBasis: z.string(),
  }),
  floor: z.strictObject({ areaM2: z.number(), floorCount: z.int(), panelCount: z.int() }),
  ribbed: frozenScheme.extend({ specification: ribbed }),
  solid: frozenScheme.extend({ specification: solid }),
  groups: z.array(frozenGroup),
  /** Markups in both totals, by name. */
  markups: z.array(markupLine.shape.name),
  /** Both cross-sections at one scale, for a page and for a telephone. */
  sections: z.strictObject({ wide: drawing, narrow: drawing }),
  /** Beside the cost; absent in what was sent before it was compared. */
  alsoCompared: z.array(frozenAlsoRow).optional(),
  scope: frozenScope.optional(),
  /** Rules that the quantities are measured by, by name and source; absent in what was sent before they were kept. */
  measuredBy: z.strictObject({ name: z.string(), source: z.string() }).optional(),
  /** Items that the project prices otherwise than its edition, and why, without the rates; absent in what was sent before there were any. */
  overrides: z.array(rateOverride.pick({ item: true, reason: true, author: true, changedAt: true })).optional(),
  /** Of the tightest panel of each scheme; absent in what was sent before it was kept. */
  calculations: z.array(frozenCalculation).optional(),
})
export type FrozenComparison = z.infer<typeof frozenComparison>
export type FrozenScheme = FrozenComparison['ribbed'] | FrozenComparison['solid']
export type FrozenGroup = z.infer<typeof frozenGroup>
