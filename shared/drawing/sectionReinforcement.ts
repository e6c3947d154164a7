import type { Bar, BarLayer } from '../contracts/appraisal'

/** Bars as a cross-section at midspan shows them; what is not known yet is empty and is not drawn. */
export interface SectionReinforcement {
  /** To the outermost bar or link, mm. */
  readonly coverMm: number
  /** Bottom bars of one rib, cut by the section. */
  readonly ribBars: readonly Bar[]
  /** Lowest layer of a solid floor, cut by the section. */
  readonly cutLayer: BarLayer | null
  /** Layer above it, lying in the section. */
  readonly lyingLayer: BarLayer | null
}

/** Nothing known but the cover. */
export function unknownReinforcement(coverMm: number): SectionReinforcement {
  return { coverMm, ribBars: [], cutLayer: null, lyingLayer: null }
}
