/**
 * Moments (× F·l) and shears (× F) of one-way slabs of three or more about equal spans, with a simple outer support.
 * 20 % redistribution of support moments is already in the values.
 *
 * Source: BS 8110-1:1997, Table 3.12 (moments seen in a published copy; shears seen in two worked examples)
 */
export const ONE_WAY_COEFFICIENTS = {
  moment: { outerSupport: 0, endSpan: 0.086, firstInteriorSupport: 0.086, interiorSpan: 0.063, interiorSupport: 0.063 },
  shear: { outerSupport: 0.4, firstInteriorSupport: 0.6, interiorSupport: 0.5 },
  /** Outer support continuous with what carries it; shown for comparison, the engine takes outer supports as simple. */
  continuousOuter: { outerSupportMoment: 0.04, endSpanMoment: 0.075, outerSupportShear: 0.46 },
} as const

/**
 * Share of the support moments that was taken off in the coefficients of slabs, one-way and two-way.
 *
 * Source: BS 8110-1:1997, 3.5.2.4 and Table 3.12 (20 %, as a worked example states it); two-way panels alike, on the safe side
 */
export const COEFFICIENT_REDISTRIBUTION = 0.2

/**
 * When Table 3.12 may be used: area of each bay, imposed to dead load, imposed load without partitions, spans.
 *
 * Source: BS 8110-1:1997, 3.5.2.3 (seen in a worked example); about equal within 15 % of the longest: common practice, no source
 */
export const ONE_WAY_CONDITIONS = {
  leastBayM2: 30,
  greatestImposedToDead: 1.25,
  greatestImposedKnPerM2: 5,
  leastSpans: 3,
  shortestToLongest: 0.85,
} as const
