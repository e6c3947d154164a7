import type { BarDiameter, Brief, ItemCode, Mesh, Scheme } from '../contracts/appraisal'
import type { ItemQuantity } from '../contracts/appraisalResult'
import { blockCount } from './blocks'
import { concreteOf, concreteSplit } from './concrete'
import type { Expression } from './expression'
import { deepEdgesOf, edgesOf, soffitOf } from './formwork'
import type { MeasuredPanel } from './measuredPanel'
import type { MeasurementRules } from './measurementRules'
import { floorAreaOf } from './planAreas'
import { quantityOf } from './quantityOf'
import { barsOf, meshOf } from './reinforcement'
import { stagesOf } from './stagesOf'

const BARS: readonly BarDiameter[] = [6, 8, 10, 12, 16, 20, 25, 32, 40]

/** A scheme and the rules it is measured by. */
export interface TakeOff {
  readonly scheme: Scheme
  readonly rules: MeasurementRules
  /** Laps of mesh go by it. */
  readonly basis: Brief['basis']
}

type MeasureOne = (measured: MeasuredPanel) => Expression | readonly Expression[] | null

/** What some panels of a scheme take, item by item in the order of a bill, one quantity for each stage that the rules bill apart. */
export function takeOffItems(job: TakeOff, panels: readonly MeasuredPanel[]): ItemQuantity[] {
  return itemMeasures(job).flatMap(([item, measure]) =>
    byStage(item, panels, job.rules).flatMap(({ bands, members }) => {
      const quantity = quantityOf(item, members, job.rules, (measured) => [measure(measured) ?? []].flat())
      if (quantity === null) return []
      const split = item === 'concrete.slab' ? { split: concreteSplit(members, job.scheme, job.rules) } : {}
      return [{ ...quantity, ...split, ...(bands.length === 0 ? {} : { bands }) }]
    }),
  )
}

/** Panels by the stages of one item, stages ascending; all of them together where the rules have none. */
function byStage(item: ItemCode, panels: readonly MeasuredPanel[], rules: MeasurementRules) {
  const groups = new Map<string, { bands: ReturnType<typeof stagesOf>; members: MeasuredPanel[] }>()
  for (const measured of panels) {
    const bands = stagesOf(item, measured, rules)
    const key = bands.map(({ over }) => over).join(' ')
    const group = groups.get(key) ?? { bands, members: [] }
    group.members.push(measured)
    groups.set(key, group)
  }
  const order = ({ bands }: { bands: ReturnType<typeof stagesOf> }) => bands.map(({ over }) => over)
  return [...groups.values()].sort((a, b) => {
    const [first, second] = [order(a), order(b)]
    const at = first.findIndex((over, index) => over !== second[index])
    return at < 0 ? 0 : first[at]! - second[at]!
  })
}

function itemMeasures({ scheme, rules, basis }: TakeOff): [ItemCode, MeasureOne][] {
  const { edgesByLengthUpToMm, deductVoidsOver } = rules
  const isDeep = ({ sized }: MeasuredPanel) => edgesByLengthUpToMm !== null && sized.depth > edgesByLengthUpToMm
  return [
    ['concrete.slab', (measured) => concreteOf(measured, scheme, rules)],
    ['blocks.whole', (measured) => blockCount(measured, 'blocksWhole')],
    ['blocks.cut', (measured) => blockCount(measured, 'blocksCut')],
    ['blocks.closedEnds', (measured) => blockCount(measured, 'closedEnds')],
    ...BARS.map((diameter): [ItemCode, MeasureOne] => [`steel.bar.${diameter}`, (measured) => barsOf(measured, diameter, rules)]),
    ...meshes(scheme).map((mesh): [ItemCode, MeasureOne] => [
      `steel.mesh.${mesh}`,
      (measured) => meshOf(measured, mesh, rules, basis),
    ]),
    ['formwork.soffit', (measured) => soffitOf(measured, rules)],
    ['formwork.edge', (measured) => (isDeep(measured) ? null : edgesOf(measured))],
    ['formwork.edgeDeep', (measured) => (isDeep(measured) ? deepEdgesOf(measured) : null)],
    ['curing.area', (measured) => floorAreaOf(measured, deductVoidsOver.curingM2)],
    ['propping.area', (measured) => soffitOf(measured, rules)],
  ]
}

function meshes(scheme: Scheme): Exclude<Mesh, 'none'>[] {
  return scheme.kind === 'ribbed' && scheme.mesh !== 'none' ? [scheme.mesh] : []
}
