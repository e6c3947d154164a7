import { interpolate } from './interpolate'
import { ASPECT_RATIOS, type TwoWayCase } from './twoWayCase'

type Row = readonly [number, number, number, number, number, number, number, number]

/** Coefficients of one panel type by kind of edge; null where the type has no such edge. `long` is the shear over long edges. */
interface ShearRows {
  readonly longContinuous: Row | null
  readonly longDiscontinuous: Row | null
  readonly shortContinuous: number | null
  readonly shortDiscontinuous: number | null
}

/**
 * Shear coefficients of rectangular panels on four sides with corners held down: v = β·n·lx per unit of edge.
 *
 * Source: BS 8110-1:1997, Table 3.15 (from memory; digits cross-checked against two public encodings with slips)
 */
export const RESTRAINED_SHEARS = {
  1: {
    longContinuous: [0.33, 0.36, 0.39, 0.41, 0.43, 0.45, 0.48, 0.5],
    longDiscontinuous: null,
    shortContinuous: 0.33,
    shortDiscontinuous: null,
  },
  2: {
    longContinuous: [0.36, 0.39, 0.42, 0.44, 0.45, 0.47, 0.5, 0.52],
    longDiscontinuous: null,
    shortContinuous: 0.36,
    shortDiscontinuous: 0.24,
  },
  3: {
    longContinuous: [0.36, 0.4, 0.44, 0.47, 0.49, 0.51, 0.55, 0.59],
    longDiscontinuous: [0.24, 0.27, 0.29, 0.31, 0.32, 0.34, 0.36, 0.38],
    shortContinuous: 0.36,
    shortDiscontinuous: null,
  },
  4: {
    longContinuous: [0.4, 0.44, 0.47, 0.5, 0.52, 0.54, 0.57, 0.6],
    longDiscontinuous: [0.26, 0.29, 0.31, 0.33, 0.34, 0.35, 0.38, 0.4],
    shortContinuous: 0.4,
    shortDiscontinuous: 0.26,
  },
  5: {
    longContinuous: [0.4, 0.43, 0.45, 0.47, 0.48, 0.49, 0.52, 0.54],
    longDiscontinuous: null,
    shortContinuous: null,
    shortDiscontinuous: 0.26,
  },
  6: {
    longContinuous: null,
    longDiscontinuous: [0.26, 0.3, 0.33, 0.36, 0.38, 0.4, 0.44, 0.47],
    shortContinuous: 0.4,
    shortDiscontinuous: null,
  },
  7: {
    longContinuous: [0.45, 0.48, 0.51, 0.53, 0.55, 0.57, 0.6, 0.63],
    longDiscontinuous: [0.3, 0.32, 0.34, 0.35, 0.36, 0.37, 0.39, 0.41],
    shortContinuous: null,
    shortDiscontinuous: 0.29,
  },
  8: {
    longContinuous: null,
    longDiscontinuous: [0.29, 0.33, 0.36, 0.38, 0.4, 0.42, 0.45, 0.48],
    shortContinuous: 0.45,
    shortDiscontinuous: 0.3,
  },
  9: {
    longContinuous: null,
    longDiscontinuous: [0.33, 0.36, 0.39, 0.41, 0.43, 0.45, 0.48, 0.5],
    shortContinuous: null,
    shortDiscontinuous: 0.33,
  },
} as const satisfies Record<TwoWayCase, ShearRows>

/**
 * Coefficient of Table 3.15 for one edge of a panel.
 *
 * Source: BS 8110-1:1997, Table 3.15, equations 19 and 20 (see RESTRAINED_SHEARS)
 * @param aspect - ly/lx, 1 to 2
 * @returns null where the panel type has no such edge
 */
export function restrainedShear(
  panelCase: TwoWayCase,
  edge: 'long' | 'short',
  isContinuous: boolean,
  aspect: number,
): number | null {
  const rows: ShearRows = RESTRAINED_SHEARS[panelCase]
  if (edge === 'short') return isContinuous ? rows.shortContinuous : rows.shortDiscontinuous
  const row = isContinuous ? rows.longContinuous : rows.longDiscontinuous
  return row && interpolate(ASPECT_RATIOS, row, aspect)
}
