import type { BarDiameter } from '../../contracts/appraisal'

/** One line of bars: the plan length as the parts it adds up from and the legs that turn its ends (0: straight), mm. */
export interface BarPiece {
  readonly parts: readonly number[]
  readonly legs: readonly [number, number]
  /** Edge of the outline that a top bar runs over, into the floor behind; its first two parts are half the support and its reach. */
  readonly over?: number
}

/** Bars of one position to be scheduled. */
export interface BarLines {
  readonly position: string
  /** The strip of the panel they lie in, as `, middle strip`; absent across the whole width. */
  readonly strip?: string
  readonly diameter: BarDiameter
  /** Bars side by side in each line. */
  readonly each: number
  /** What is counted, as `ribs`. */
  readonly lines: string
  /** Of the layer that they are, mm; null for bars that are counted in ribs. */
  readonly spacingMm: number | null
  readonly pieces: readonly BarPiece[]
  /** Longest bar that can be had, mm. */
  readonly stockMm: number
  readonly lapMm: () => number
  readonly clause: string
}
