import type { ItemCode } from '../contracts/appraisal'
import type { ItemQuantity, Part } from '../contracts/appraisalResult'
import type { CompositeItem } from '../contracts/measurement'
import type { Expression } from './expression'
import { withRepeats, type MeasuredPanel } from './measuredPanel'
import { billedUnitOf, type MeasurementRules } from './measurementRules'
import { roundAsPrinted } from './roundAsPrinted'

/** Expressions of one panel without repeats, none where it contributes nothing. */
export type Measure = (measured: MeasuredPanel) => readonly Expression[]

/**
 * A quantity from what each panel contributes: parts unrounded, the net rounded as printed, both repeats in.
 * Null where nothing is measured, so that no empty line reaches a bill.
 */
export function quantityOf<Item extends ItemCode | CompositeItem>(
  item: Item,
  panels: readonly MeasuredPanel[],
  rules: MeasurementRules,
  measure: Measure,
): (Pick<ItemQuantity, 'unit' | 'net' | 'parts'> & { readonly item: Item }) | null {
  const parts = panels.flatMap((measured) => measure(measured).map((once) => partOf(once, measured)))
  if (parts.length === 0) return null
  const unit = billedUnitOf(item, rules)
  const sum = parts.reduce((total, { value }) => total + value, 0)
  const rounded = roundAsPrinted(sum, rules.decimals[unit])
  return { item, unit, net: rounded === 0 && sum > 0 && rules.isOneAtLeast ? leastOf(rules.decimals[unit]) : rounded, parts }
}

/** The least quantity that prints as something: one unit, or one hundredth where hundredths are printed. */
function leastOf(decimals: number): number {
  return 10 ** -decimals
}

function partOf(once: Expression, measured: MeasuredPanel): Part {
  const { text, value } = withRepeats(once, measured)
  return { level: measured.level.mark, panel: measured.panel.mark, expression: text, value }
}
