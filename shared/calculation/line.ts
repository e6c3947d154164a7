import { figure } from '../sizing/figure'
import type { CalculationEntry, CalculationLine } from './calculation'

/** A line that reckons: symbol = formula = numbers = value unit. */
export function reckoned(
  symbol: string,
  formula: string,
  numbers: string,
  value: number,
  unit: string,
  decimals = 2,
): CalculationLine {
  return { symbol, formula, numbers, result: `${figure(value, decimals)} ${unit}`, note: null }
}

/** A line that says something. */
export function said(result: string): CalculationLine {
  return { symbol: null, formula: null, numbers: null, result, note: null }
}

/** Lines that end in no check. */
export function worked(heading: string, clause: string, ...lines: CalculationLine[]): CalculationEntry {
  return { heading, clause, lines, check: null }
}
