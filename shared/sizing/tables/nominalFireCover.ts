import type { FirePeriod } from './slabFireSizes'

/** Members that Table 3.4 tells apart and a floor has. */
export type FireCover = 'floorSimple' | 'floorContinuous' | 'ribSimple' | 'ribContinuous'

/**
 * Nominal cover to all reinforcement for fire, mm, by minutes.
 *
 * Source: BS 8110-1:1997, Table 3.4, columns of floors and ribs (from memory)
 */
export const FIRE_COVER_MM = {
  30: { floorSimple: 20, floorContinuous: 20, ribSimple: 20, ribContinuous: 20 },
  60: { floorSimple: 20, floorContinuous: 20, ribSimple: 20, ribContinuous: 20 },
  90: { floorSimple: 25, floorContinuous: 20, ribSimple: 35, ribContinuous: 20 },
  120: { floorSimple: 35, floorContinuous: 25, ribSimple: 45, ribContinuous: 35 },
  180: { floorSimple: 45, floorContinuous: 35, ribSimple: 55, ribContinuous: 45 },
  240: { floorSimple: 55, floorContinuous: 45, ribSimple: 65, ribContinuous: 55 },
} as const satisfies Record<FirePeriod, Record<FireCover, number>>

/**
 * Least thickness of floors, the solid part of ribbed ones, and least width of ribs in fire, mm, by minutes.
 *
 * Source: BS 8110-1:1997, Figure 3.2 (from memory)
 */
export const FIRE_SIZES_MM = {
  30: { floor: 75, rib: 125 },
  60: { floor: 95, rib: 125 },
  90: { floor: 110, rib: 125 },
  120: { floor: 125, rib: 125 },
  180: { floor: 150, rib: 150 },
  240: { floor: 170, rib: 175 },
} as const satisfies Record<FirePeriod, { readonly floor: number; readonly rib: number }>
