import type { NationalValues } from './recommendedValues'

/** What the formulas of EN 1992-1-1 need to know of one brief: characteristic strengths, MPa, and the national values. */
export interface Strengths {
  readonly fckMpa: number
  readonly fykMpa: number
  readonly values: NationalValues
}
