import { interpolate } from './interpolate'
import { ASPECT_RATIOS, type TwoWayCase } from './twoWayCase'

type Row = readonly [number, number, number, number, number, number, number, number]

/** Coefficients of one panel type; null where no edge of that direction is continuous. */
interface MomentRows {
  readonly shortSupport: Row | null
  readonly shortSpan: Row
  readonly longSupport: number | null
  readonly longSpan: number
}

/**
 * Bending moment coefficients of rectangular panels on four sides with corners held down.
 *
 * Source: BS 8110-1:1997, Table 3.14 (seen in two public encodings that agree but for one entry, panels 1 to 4 in a third; same as memory)
 */
export const RESTRAINED_MOMENTS = {
  1: {
    shortSupport: [0.031, 0.037, 0.042, 0.046, 0.05, 0.053, 0.059, 0.063],
    shortSpan: [0.024, 0.028, 0.032, 0.035, 0.037, 0.04, 0.044, 0.048],
    longSupport: 0.032,
    longSpan: 0.024,
  },
  2: {
    shortSupport: [0.039, 0.044, 0.048, 0.052, 0.055, 0.058, 0.063, 0.067],
    shortSpan: [0.029, 0.033, 0.036, 0.039, 0.041, 0.043, 0.047, 0.05],
    longSupport: 0.037,
    longSpan: 0.028,
  },
  3: {
    shortSupport: [0.039, 0.049, 0.056, 0.062, 0.068, 0.073, 0.082, 0.089],
    shortSpan: [0.03, 0.036, 0.042, 0.047, 0.051, 0.055, 0.062, 0.067],
    longSupport: 0.037,
    longSpan: 0.028,
  },
  4: {
    shortSupport: [0.047, 0.056, 0.063, 0.069, 0.074, 0.078, 0.087, 0.093],
    shortSpan: [0.036, 0.042, 0.047, 0.051, 0.055, 0.059, 0.065, 0.07],
    longSupport: 0.045,
    longSpan: 0.034,
  },
  5: {
    shortSupport: [0.046, 0.05, 0.054, 0.057, 0.06, 0.062, 0.067, 0.07],
    shortSpan: [0.034, 0.038, 0.04, 0.043, 0.045, 0.047, 0.05, 0.053],
    longSupport: null,
    longSpan: 0.034,
  },
  6: {
    shortSupport: null,
    shortSpan: [0.034, 0.046, 0.056, 0.065, 0.072, 0.078, 0.091, 0.1],
    longSupport: 0.045,
    longSpan: 0.034,
  },
  7: {
    shortSupport: [0.057, 0.065, 0.071, 0.076, 0.081, 0.084, 0.092, 0.098],
    shortSpan: [0.043, 0.048, 0.053, 0.057, 0.06, 0.063, 0.069, 0.074],
    longSupport: null,
    longSpan: 0.044,
  },
  8: {
    shortSupport: null,
    shortSpan: [0.042, 0.054, 0.063, 0.071, 0.078, 0.084, 0.096, 0.105],
    longSupport: 0.058,
    longSpan: 0.044,
  },
  9: {
    shortSupport: null,
    shortSpan: [0.055, 0.065, 0.074, 0.081, 0.087, 0.092, 0.103, 0.111],
    longSupport: null,
    longSpan: 0.056,
  },
} as const satisfies Record<TwoWayCase, MomentRows>

/** Coefficients at one aspect ratio, all ≥ 0: hogging over continuous edges (0 where there is none) and sagging at midspan. */
export interface RestrainedMoments {
  readonly shortSupport: number
  readonly shortSpan: number
  readonly longSupport: number
  readonly longSpan: number
}

/**
 * Coefficients of Table 3.14 between its columns: m = β·n·lx² in both directions.
 *
 * Source: BS 8110-1:1997, Table 3.14, equations 14 and 15 (see RESTRAINED_MOMENTS)
 * @param aspect - ly/lx, 1 to 2
 */
export function restrainedMoments(panelCase: TwoWayCase, aspect: number): RestrainedMoments {
  const rows: MomentRows = RESTRAINED_MOMENTS[panelCase]
  return {
    shortSupport: rows.shortSupport ? interpolate(ASPECT_RATIOS, rows.shortSupport, aspect) : 0,
    shortSpan: interpolate(ASPECT_RATIOS, rows.shortSpan, aspect),
    longSupport: rows.longSupport ?? 0,
    longSpan: rows.longSpan,
  }
}
