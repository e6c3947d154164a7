import type { ItemCode, Part, Quantity } from '../contracts/appraisal'
import type { Expression } from './expression'
import { withRepeats, type MeasuredPanel } from './measuredPanel'
import { type MeasurementRules, unitOf } from './measurementRules'
import { roundAsPrinted } from './roundAsPrinted'

/**
 * A quantity from what each panel contributes: parts unrounded, the net rounded as printed, both repeats in.
 * Null where nothing is measured, so that no empty line reaches a bill.
 *
 * @param measure - expressions of one panel without repeats, none where it contributes nothing
 */
export function quantityOf(
  item: ItemCode,
  panels: readonly MeasuredPanel[],
  rules: MeasurementRules,
  measure: (measured: MeasuredPanel) => readonly Expression[],
): Quantity | null {
  const parts = panels.flatMap((measured) => measure(measured).map((once) => partOf(once, measured)))
  if (parts.length === 0) return null
  const unit = unitOf(item)
  const sum = parts.reduce((total, { value }) => total + value, 0)
  return { item, unit, net: roundAsPrinted(sum, rules.decimals[unit]), parts }
}

function partOf(once: Expression, measured: MeasuredPanel): Part {
  const { text, value } = withRepeats(once, measured)
  return { level: measured.level.mark, panel: measured.panel.mark, expression: text, value }
}
