import { simplySupportedCoefficients } from '../tables/simplySupportedCoefficients'
import type { TwoWayDirection, TwoWayForces, TwoWayPanel } from './twoWayForces'

/**
 * Shear at an edge as a share of n·lx: the table gives none for free corners, from which the load goes to the middle of the edges.
 *
 * Source: project rule, half the short span's load at every edge, as of a one-way strip, on the safe side
 */
const EDGE_SHEAR = 0.5

/**
 * Moments and shears of a two-way panel on four simple sides whose corners may lift.
 *
 * Source: BS 8110-1:1997, 3.5.3.3, equations 10 and 11, Table 3.13 (see simplySupportedCoefficients); shears see EDGE_SHEAR
 */
export function liftedTwoWayForces({ load, shortMm, longMm }: Omit<TwoWayPanel, 'shortEnds' | 'longEnds'>): TwoWayForces {
  const aspect = Math.max(1, longMm / shortMm)
  const alpha = simplySupportedCoefficients(aspect)
  const shearN = EDGE_SHEAR * load * shortMm
  const direction = (coefficient: number): TwoWayDirection => ({
    saggingNmm: coefficient * load * shortMm ** 2,
    hoggingNmm: [0, 0],
    shearN: [shearN, shearN],
  })
  return { panelCase: null, aspect, short: direction(alpha.short), long: direction(alpha.long) }
}
