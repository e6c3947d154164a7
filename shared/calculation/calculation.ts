import type { Check } from '../contracts/appraisalResult'

/** One line of a calculation as an engineer writes it: symbol = formula = numbers = result. What a line has not is null. */
export interface CalculationLine {
  readonly symbol: string | null
  readonly formula: string | null
  /** The formula with its numbers put in. */
  readonly numbers: string | null
  /** With its unit; or a sentence where nothing is reckoned. */
  readonly result: string
  /** Values that stand in the formula and were not worked out here: 'k 1.94, ρ 0.0099'. */
  readonly note: string | null
}

/** Lines about one thing at one place, and the check they end in. */
export interface CalculationEntry {
  /** What and where: 'Self-weight', 'midspan, 2φ12 a rib'. */
  readonly heading: string
  readonly clause: string
  readonly lines: readonly CalculationLine[]
  readonly check: Check | null
}

/** One step of a calculation. */
export interface CalculationSection {
  readonly title: CalculationTitle
  readonly entries: readonly CalculationEntry[]
}

/** Steps in the order in which they are worked. */
export const CALCULATION_TITLES = [
  'Loads',
  'Spans and depths',
  'Moments and shears',
  'Bending',
  'Shear',
  'Deflection',
  'Limits of steel',
  'Proportions and detailing',
  'Fire and cover',
] as const
export type CalculationTitle = (typeof CALCULATION_TITLES)[number]

/** The calculation of one panel of one scheme. Plain data. */
export interface PanelCalculation {
  readonly scheme: string
  readonly kind: 'ribbed' | 'solid'
  readonly level: string
  readonly panel: string
  /** Title of the code of practice. */
  readonly basis: string
  readonly depthMm: number
  readonly inputs: readonly { readonly name: string; readonly value: string }[]
  /** What was assumed or approximated. */
  readonly assumptions: readonly string[]
  readonly sections: readonly CalculationSection[]
}
