/** What the engine answers: sized panels, checks, quantities, costs and their comparison. Units as in the appraisal file; areas m², forces kN. */
import { z } from 'zod'
import { decimal, itemCode, percent } from './appraisal'
import { band, compositeItem } from './measurement'
import { mark } from './primitives'
import { scopeItem } from './sameScope'

export const money = z.string().regex(/^-?\d+(\.\d+)?$/)
export const check = z.strictObject({
  level: mark,
  panel: mark,
  name: z.enum([
    'flexure.midspan',
    'flexure.support',
    'shear',
    'deflection',
    'steel.least',
    'steel.most',
    'bars.spacing',
    'bars.fit',
    'ribs.proportions',
    'topping',
    'fire.size',
    'fire.cover',
    'cover.exposure', // only where the brief names an exposure
  ]),
  clause: z.string(),
  demand: z.number(),
  capacity: z.number(),
  unit: z.string(),
  utilisation: z.number(),
  pass: z.boolean(),
  working: z.string(),
})
export const panelResult = z.strictObject({
  level: mark,
  mark,
  depth: z.number(),
  grossArea: z.number(),
  clearArea: z.number(), // one panel, m²
  rows: z.int(),
  blocksWhole: z.int(),
  blocksCut: z.int(), // 0 for solid
  moments: z.strictObject({
    midspan: z.number(),
    support: z.number(),
    midspanLong: z.number().optional(),
    supportLong: z.number().optional(),
  }), // kNm per rib (ribbed) or per m (solid), all ≥ 0; long: second direction of two-way panels
  steel: z.strictObject({
    midspanRequired: z.number(),
    midspanProvided: z.number(),
    supportRequired: z.number(),
    supportProvided: z.number(),
  }),
}) // mm² per rib or m; short direction
export const unit = z.enum(['m³', 'm²', 'm', 't', 'kg', 'nr'])
export const part = z.strictObject({ level: mark, panel: mark, expression: z.string(), value: z.number() })
export const split = z.strictObject({
  topping: z.number(),
  ribs: z.number(),
  edgeStrips: z.number(),
  solidZones: z.number(),
  crossRibs: z.number(),
  trimmers: z.number(),
  fillers: z.number(),
  slab: z.number(),
  wallStrips: z.number(),
})
export const itemQuantity = z.strictObject({
  item: itemCode,
  unit,
  net: z.number(),
  parts: z.array(part),
  split: split.optional(),
  bands: z.array(band).optional(), // where the rules bill the item by stages, or by overall depth
})
export const quantity = itemQuantity.extend({
  item: z.enum([...itemCode.options, ...compositeItem.options]),
  analysis: z.array(itemQuantity).optional(), // of a composite item: what it is made up of
})
export const deadLoad = z.strictObject({ perArea: z.number(), total: z.number() }) // concrete + blocks only; kN/m² of gross area; kN
/** What a bill line prices: a measured item, or an entry of the same-scope list where a file prices one. */
export const billItem = z.enum([...itemCode.options, ...compositeItem.options, ...scopeItem.options])
/** As `decimal`, with three digits more: a rate per tonne billed by the kilogram keeps all of its own. */
export const billRate = z.string().regex(/^\d{1,9}(\.\d{1,9})?$/)
export const itemLine = z.strictObject({
  item: billItem,
  quantity: z.string(),
  unit: z.string(),
  rate: billRate,
  amount: money,
  bands: z.array(band).optional(),
})
export const billLine = itemLine.extend({ analysis: z.array(itemLine).optional() }) // the lines that a composite adds up
export const markupName = z.enum([
  'preliminaries',
  'preliminariesFixed', // only where there is such a sum, as the two after it
  'preliminariesPerWeek',
  'overheadsAndProfit',
  'contingency',
  'tax',
])
/** A percentage of all that stands before it, or a sum (`percent` 0): fixed, or so much a week. */
export const markupLine = z.strictObject({
  name: markupName,
  percent,
  amount: money,
  perWeek: decimal.optional(),
  weeks: z.string().optional(),
})
export const cost = z.strictObject({
  currency: z.string(),
  lines: z.array(billLine),
  markups: z.array(markupLine),
  unpriced: z.array(itemCode),
  total: money,
  perArea: money,
})
export const schemeResult = z.strictObject({
  mark,
  kind: z.enum(['ribbed', 'solid']),
  depth: z.number(),
  passes: z.boolean(),
  checks: z.array(check),
  panels: z.array(panelResult),
  quantities: z.array(quantity),
  deadLoad,
  cost: cost.nullable(),
})
export const ledgerLine = z.strictObject({ item: z.string(), first: money, second: money, difference: money, running: money })
export const tippingPoint = z.strictObject({
  item: itemCode,
  rate: decimal,
  value: decimal.nullable(),
  cheaperBelow: mark.nullable(),
})
export const comparison = z.strictObject({
  between: z.tuple([mark, mark]),
  ledger: z.array(ledgerLine),
  tippingPoints: z.array(tippingPoint),
})
export const appraisal = z.strictObject({
  format: z.literal('bothways.appraisal-result/1'),
  schemes: z.array(schemeResult),
  comparison: comparison.nullable(),
})

export type BillItem = z.infer<typeof billItem>
export type Check = z.infer<typeof check>
export type PanelResult = z.infer<typeof panelResult>
export type Part = z.infer<typeof part>
export type ConcreteSplit = z.infer<typeof split>
export type Quantity = z.infer<typeof quantity>
export type ItemQuantity = z.infer<typeof itemQuantity>
export type Unit = z.infer<typeof unit>
export type DeadLoad = z.infer<typeof deadLoad>
export type BillLine = z.infer<typeof billLine>
export type ItemLine = z.infer<typeof itemLine>
export type MarkupLine = z.infer<typeof markupLine>
export type MarkupName = z.infer<typeof markupName>
export type Cost = z.infer<typeof cost>
export type SchemeResult = z.infer<typeof schemeResult>
export type LedgerLine = z.infer<typeof ledgerLine>
export type TippingPoint = z.infer<typeof tippingPoint>
export type Comparison = z.infer<typeof comparison>
export type Appraisal = z.infer<typeof appraisal>
