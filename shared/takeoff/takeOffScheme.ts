import type { BarDiameter, ItemCode, Level, Quantity, Scheme } from '../contracts/appraisal'
import type { SizedScheme } from '../sizing/sizedPanel'
import { blockCount } from './blocks'
import { concreteOf, concreteSplit } from './concrete'
import type { Expression } from './expression'
import { edgesOf, soffitOf } from './formwork'
import { type MeasuredPanel, measuredPanels } from './measuredPanel'
import type { MeasurementRules } from './measurementRules'
import { floorAreaOf } from './planAreas'
import { quantityOf } from './quantityOf'
import { barsOf, meshOf } from './reinforcement'

const BARS: readonly BarDiameter[] = [6, 8, 10, 12, 16, 20, 25, 32, 40]

/**
 * Everything a scheme takes, item by item in the order of a bill, all levels and repeats together. Items of which it takes
 * nothing are left out. Every part is one panel (for bars one run of bars), with the arithmetic that yields it.
 *
 * Source: measurement rules in `rules`
 * @param sized - the same scheme, sized over the same levels
 * @throws RangeError when `sized` belongs to other levels
 */
export function takeOffScheme(scheme: Scheme, sized: SizedScheme, levels: readonly Level[], rules: MeasurementRules): Quantity[] {
  const panels = measuredPanels(sized, levels)
  const take = (item: ItemCode, measure: (measured: MeasuredPanel) => Expression | readonly Expression[] | null) =>
    quantityOf(item, panels, rules, (measured) => [measure(measured) ?? []].flat())
  const concrete = take('concrete.slab', (measured) => concreteOf(measured, scheme, rules))
  const quantities = [
    concrete && { ...concrete, split: concreteSplit(panels, scheme, rules) },
    take('blocks.whole', (measured) => blockCount(measured, 'blocksWhole')),
    take('blocks.cut', (measured) => blockCount(measured, 'blocksCut')),
    take('blocks.closedEnds', (measured) => blockCount(measured, 'closedEnds')),
    ...BARS.map((diameter) => take(`steel.bar.${diameter}`, (measured) => barsOf(measured, diameter))),
    ...meshItem(scheme).map((item) => take(item, (measured) => meshOf(measured, rules))),
    take('formwork.soffit', (measured) => soffitOf(measured, rules)),
    take('formwork.edge', edgesOf),
    take('curing.area', (measured) => floorAreaOf(measured, rules.deductVoidsOver.curingM2)),
    take('propping.area', (measured) => soffitOf(measured, rules)),
  ]
  return quantities.filter((quantity) => quantity !== null)
}

function meshItem(scheme: Scheme): ItemCode[] {
  return scheme.kind === 'ribbed' && scheme.mesh !== 'none' ? [`steel.mesh.${scheme.mesh}`] : []
}
