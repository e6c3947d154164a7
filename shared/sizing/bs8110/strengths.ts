/** What the formulas of BS 8110-1 need to know of one brief: characteristic strengths, MPa, the steel's design share, nominal cover, mm. */
export interface Strengths {
  readonly fcuMpa: number
  readonly fyMpa: number
  /** Design stress of the steel as a share of fy. */
  readonly steelShare: number
  readonly coverMm: number
}

/**
 * Design stress of reinforcement as a share of fy, as the code prints it.
 *
 * Source: BS 8110-1:1997, 2.4.4.1, Table 2.2 and 3.4.4.4 (0.95 for γm 1.05); 0.87 for γm 1.15, 1985 edition and the amendment of 2005
 *   (both seen in worked examples)
 */
export const STEEL_SHARE = { 1.05: 0.95, 1.15: 0.87 } as const

/** γm of reinforcement where a brief chooses none. Source: BS 8110-1:1997, 2.4.4.1, Table 2.2 */
export const STEEL_FACTOR = 1.05
