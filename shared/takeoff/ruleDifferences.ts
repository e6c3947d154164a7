import type { Brief, ItemCode, Level, Scheme } from '../contracts/appraisal'
import type { ItemQuantity, Unit } from '../contracts/appraisalResult'
import type { SizedScheme } from '../sizing/sizedPanel'
import { itemisedQuantities } from './itemisedQuantities'
import type { MeasurementRules } from './measurementRules'
import { comparingRules } from './rules/comparingRules'
import { takeOffScheme } from './takeOffScheme'

/** Why a quantity under other rules is not that for comparing: small voids, laps of mesh, deep edges by area, rounding. */
export type DifferenceReason = 'voids' | 'laps' | 'deepEdges' | 'rounding'

/** What one reason adds to an item, in the unit of its rate; below zero where it takes off. */
export interface RuleDifference {
  readonly item: ItemCode
  readonly unit: Unit
  readonly reason: DifferenceReason
  readonly difference: number
}

/** Differences this small, relative to their quantity, are noise of binary arithmetic. */
const NOISE = 1e-9

/**
 * Everything by which the quantities of a scheme under some rules differ from those for comparing: for each item the net by the rules
 * is the net for comparing and the sum of its differences. What is billed together or in another unit makes no difference.
 *
 * Source: project rule, the total is the same whatever the rules bill, but for stated differences
 * @param sized - the same scheme, sized over the same levels by `basis`
 */
export function ruleDifferences(
  scheme: Scheme,
  sized: SizedScheme,
  levels: readonly Level[],
  rules: MeasurementRules,
  basis: Brief['basis'],
): RuleDifference[] {
  const measured = (by: MeasurementRules) => itemisedQuantities(takeOffScheme(scheme, sized, levels, by, basis))
  const { deductVoidsOver, meshLaps } = rules
  const voidsLeftIn: MeasurementRules = { ...comparingRules, deductVoidsOver }
  const steps: readonly [DifferenceReason, ItemQuantity[], ItemQuantity[]][] = [
    ['voids', measured(comparingRules), measured(voidsLeftIn)],
    ['laps', measured(voidsLeftIn), measured({ ...voidsLeftIn, meshLaps })],
    ['deepEdges', measured({ ...voidsLeftIn, meshLaps }), measured(rules)],
  ]
  const items = [...new Map(steps.flatMap(([, ...both]) => both.flat()).map((each) => [each.item, each])).values()]
  return items.flatMap(({ item, unit }) => {
    const [plain, last] = [steps[0]![1], steps.at(-1)![2]]
    const byReason = steps.map(([reason, before, after]) => ({ reason, difference: sumOf(after, item) - sumOf(before, item) }))
    const unrounded = sumOf(last, item) - sumOf(plain, item)
    const rounding = netOf(last, item) - netOf(plain, item) - unrounded
    const noise = NOISE * Math.max(sumOf(plain, item), sumOf(last, item))
    return [...byReason, { reason: 'rounding' as const, difference: rounding }]
      .filter(({ difference }) => Math.abs(difference) > noise)
      .map(({ reason, difference }) => ({ item, unit, reason, difference }))
  })
}

function sumOf(quantities: readonly ItemQuantity[], item: ItemCode): number {
  return quantities.find((each) => each.item === item)?.parts.reduce((sum, { value }) => sum + value, 0) ?? 0
}

function netOf(quantities: readonly ItemQuantity[], item: ItemCode): number {
  return quantities.find((each) => each.item === item)?.net ?? 0
}
