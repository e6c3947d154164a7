/** The appraisal file: the engine's one public input; what it answers stands in `appraisalResult.ts`. Lengths mm, loads kN/m², strengths MPa, masses kg, moments kNm. */
import { z } from 'zod'
import { britishExposure, europeanExposure } from './exposure'
import { factors } from './factors'
import { measurement } from './measurement'
import { britishValues, europeanValues } from './nationalValues'
import { line, mark } from './primitives'
import { scope, scopeFaults } from './sameScope'

export { mark }
const coordinate = z.number().min(-1_000_000).max(1_000_000)
export const ring = z
  .array(z.tuple([coordinate, coordinate]))
  .min(3)
  .max(200) // open, anticlockwise, simple, area > 0
export const load = z.number().min(0).max(100)
export const repeat = z.int().min(1).max(1000).default(1)
export const decimal = z.string().regex(/^\d{1,9}(\.\d{1,6})?$/)
export const percent = z.string().regex(/^\d{1,3}(\.\d{1,4})?$/)
export const mesh = z.enum(['none', 'A98', 'A142', 'A193', 'A252', 'A393'])
export const bar = z.strictObject({ diameter: z.literal([6, 8, 10, 12, 16, 20, 25, 32, 40]), count: z.int().min(1).max(10) })
export const layer = z.strictObject({ diameter: bar.shape.diameter, spacing: z.number().min(50).max(500) })

export const itemCode = z.enum([
  'concrete.slab',
  'blocks.whole',
  'blocks.cut',
  'blocks.closedEnds',
  'steel.bar.6',
  'steel.bar.8',
  'steel.bar.10',
  'steel.bar.12',
  'steel.bar.16',
  'steel.bar.20',
  'steel.bar.25',
  'steel.bar.32',
  'steel.bar.40',
  'steel.mesh.A98',
  'steel.mesh.A142',
  'steel.mesh.A193',
  'steel.mesh.A252',
  'steel.mesh.A393',
  'formwork.soffit',
  'formwork.edge',
  'formwork.edgeDeep', // by area, where the rules measure deep edges so
  'curing.area',
  'propping.area',
])
const loads = {
  imposedLoad: load,
  finishesLoad: load.default(0),
  servicesLoad: load.default(0), // permanent: finishes, services
  partitionsLoad: load.default(0), // variable, both bases
  cover: z.number().min(10).max(100), // nominal, to the outermost bar; no link unless `link` is given
  fireMinutes: z.literal([0, 30, 60, 90, 120, 180, 240]),
  redistribution: z.number().min(0).max(30).default(0), // percent of elastic support moments, moved to the spans
  stockLength: z.int().min(6000).max(18_000).multipleOf(25, 'expected a multiple of 25').default(12_000), // bars come in it; longer ones are lapped
}
export const brief = z.discriminatedUnion('basis', [
  z.strictObject({
    basis: z.literal('EN1992'),
    ...loads,
    fck: z.number().min(12).max(50),
    fyk: z.number().min(250).max(600),
    nationalValues: europeanValues.default({}),
    exposure: europeanExposure.optional(), // no check of cover for durability without it
  }),
  z.strictObject({
    basis: z.literal('BS8110'),
    ...loads,
    fcu: z.number().min(20).max(60),
    fy: z.number().min(250).max(500),
    nationalValues: britishValues.default({}),
    exposure: britishExposure.optional(),
  }),
])
/** What goes on behind a continuous edge, where the level's own strips are not meant: a span that is not drawn, mm, or a panel of the level. */
export const beyond = z.union([z.strictObject({ span: z.number().min(500).max(30_000) }), z.strictObject({ panel: mark })])
export const edge = z.strictObject({
  supportWidth: z.number().min(0).max(3000),
  kind: z.enum(['beam', 'wall']).default('beam'), // over a wall the floor bears, over a beam it does not
  continuity: z.enum(['continuous', 'discontinuous', 'free']),
  beyond: beyond.optional(), // of a continuous edge
})
export const panel = z.strictObject({
  mark,
  repeat,
  outline: ring,
  edges: z.array(edge).min(1), // 1, or as many as vertices; edge i runs from vertex i to i + 1; free ⇒ supportWidth 0
  ribDirection: z.number().min(0).lt(180),
  voids: z.array(ring).max(50).default([]),
  corners: z.enum(['held', 'mayLift']).default('held'), // of a solid panel with four discontinuous edges
})
const bottomBarsOfRib = z.array(bar).min(1).max(3)
const topBarsOfRib = z.array(bar).max(3)
/** Bars that an engineer gave one panel's ribs; they take the place of the scheme's own there. */
export const givenRibbedPanel = z
  .strictObject({ level: mark, panel: mark, ribBars: bottomBarsOfRib.optional(), topBars: topBarsOfRib.optional() })
  .refine(({ ribBars, topBars }) => ribBars !== undefined || topBars !== undefined, 'expected ribBars, topBars or both')
export const ribbed = z.strictObject({
  mark,
  kind: z.literal('ribbed'),
  block: z.strictObject({
    length: z.number().min(50).max(2000),
    width: z.number().min(50).max(2000),
    height: z.number().min(50).max(1000),
    mass: z.number().min(0).max(500),
  }),
  ribWidth: z.number().min(50).max(1000),
  topping: z.number().min(0).max(500),
  mesh: mesh.default('none'),
  edgeStrip: z.number().min(0).max(5000).default(0),
  solidZone: z.union([z.number().min(0).max(5000), z.literal('least')]), // 'least': widened until shear passes; a number is never changed
  crossRibs: z
    .union([z.literal('none'), z.literal('rule'), z.strictObject({ every: z.number().min(500), width: z.number().min(50) })])
    .default('none'),
  trimmerWidth: z.number().min(0).max(1000).default(100), // solid strip around every void
  cutBlocks: z.boolean().default(false),
  leastPiece: z.number().min(10).default(50),
  alignRows: z.boolean().default(false), // panels whose ribs run on across a common support take their rows from one grid
  ribBars: z.union([z.literal('computed'), bottomBarsOfRib]).default('computed'), // bottom of every rib
  topBars: z.union([z.literal('computed'), topBarsOfRib]).default('computed'), // per rib over continuous edges
  givenPanels: z.array(givenRibbedPanel).max(5000).default([]),
  link: z.literal([0, 6, 8, 10]).default(0),
}) // link diameter; 0: none
export const slabLayers = z.strictObject({ bottomX: layer, bottomY: layer, topX: layer.optional(), topY: layer.optional() })
/** Bars that an engineer gave one panel; they take the place of the scheme's own there. */
export const givenSolidPanel = z.strictObject({ level: mark, panel: mark, bars: slabLayers })
export const solid = z
  .strictObject({
    mark,
    kind: z.literal('solid'),
    thickness: z.union([z.literal('least'), z.number().min(50).max(1500)]),
    thicknessPer: z.enum(['scheme', 'panel']).default('scheme'), // 'panel': each panel the least at which it passes
    bars: z.union([z.literal('computed'), slabLayers]).default('computed'),
    thicknessNote: line(400).optional(), // how a given thickness was found
    givenPanels: z.array(givenSolidPanel).max(5000).default([]),
  })
  .refine(({ thickness, thicknessPer }) => thicknessPer === 'scheme' || thickness === 'least', {
    path: ['thicknessPer'],
    error: "expected scheme where the thickness is a number: 'panel' is for the least thickness of each panel",
  })
  .refine(({ thickness, thicknessNote }) => thickness !== 'least' || thicknessNote === undefined, {
    path: ['thicknessNote'],
    error: 'expected no note on a thickness that the engine finds',
  })
export const level = z.strictObject({
  mark,
  repeat,
  proppingHeight: z.int().min(1000).max(30_000).default(2800), // clear, from what the props stand on to the soffit
  panels: z.array(panel).min(1).max(500),
})
export const scheme = z.discriminatedUnion('kind', [ribbed, solid])
export const markups = z.strictObject({
  preliminariesPercent: percent.default('0'),
  preliminariesFixed: decimal.default('0'), // of each scheme, whatever it measures
  preliminariesPerWeek: decimal.default('0'), // × weeks of the scheme's least gang, as compared beside the cost
  overheadsAndProfitPercent: percent.default('0'), // on measured work with preliminaries, where the rates do not hold them
  contingencyPercent: percent.default('0'),
  taxPercent: percent.default('0'),
})
export const rates = z.strictObject({
  currency: z.string().regex(/^[A-Z]{3}$/),
  items: z.partialRecord(itemCode, decimal),
  byScheme: z.record(mark, z.partialRecord(itemCode, decimal)).default({}), // by mark; go before `items` there
  markups: markups.prefault({}),
})
export const appraisalFile = z
  .strictObject({
    format: z.literal('bothways.appraisal/1'),
    brief,
    levels: z.array(level).min(1).max(100),
    schemes: z.array(scheme).min(1).max(20),
    rates: rates.optional(),
    measurement: measurement.default('comparing'), // rules that the quantities are measured and billed by
    scope: scope.default([]),
    factors: factors.prefault({}),
  })
  .superRefine(({ schemes, scope: declarations, rates: priced }, context) => {
    for (const of of Object.keys(priced?.byScheme ?? {}))
      if (!schemes.some((each) => each.mark === of))
        context.addIssue({
          code: 'custom',
          path: ['rates', 'byScheme', of],
          message: 'expected the mark of a scheme of the file',
        })
    for (const { index, field, message } of scopeFaults(declarations, schemes))
      context.addIssue({ code: 'custom', path: ['scope', index, field], message })
  })

export type ItemCode = z.infer<typeof itemCode>
export type Brief = z.infer<typeof brief>
export type Edge = z.infer<typeof edge>
export type Beyond = z.infer<typeof beyond>
export type Ring = z.infer<typeof ring>
export type Panel = z.infer<typeof panel>
export type Level = z.infer<typeof level>
export type RibbedScheme = z.infer<typeof ribbed>
export type SolidScheme = z.infer<typeof solid>
export type SlabLayers = z.infer<typeof slabLayers>
export type GivenRibbedPanel = z.infer<typeof givenRibbedPanel>
export type GivenSolidPanel = z.infer<typeof givenSolidPanel>
export type Scheme = z.infer<typeof scheme>
export type Mesh = z.infer<typeof mesh>
export type Bar = z.infer<typeof bar>
export type BarLayer = z.infer<typeof layer>
export type Markups = z.infer<typeof markups>
export type Rates = z.infer<typeof rates>
export type AppraisalFile = z.infer<typeof appraisalFile>
/** Input as it may be written, with defaults left out. */
export type AppraisalFileInput = z.input<typeof appraisalFile>
export type BarDiameter = Bar['diameter']
