import { isMet } from '../finding'

/**
 * Step in which a solid zone left to the engine is widened, mm.
 *
 * Source: project rule, engine design section 4 (common practice, no source)
 */
export const ZONE_STEP_MM = 25

/** Something with demand and capacity. */
export interface Compared {
  readonly demand: number
  readonly capacity: number
}

/**
 * Widest solid zone that leaves blocks between two of them, mm, in steps.
 *
 * Source: project rule
 * @param clearMm - clear length of the longest rib
 */
export function widestZoneMm(clearMm: number): number {
  return Math.floor((clearMm / 2 - 1) / ZONE_STEP_MM) * ZONE_STEP_MM
}

/**
 * Least width of solid zone, in steps from a given one, at which everything is met; the widest that leaves blocks between two zones
 * where nothing is.
 *
 * Source: project rule, engine design section 4 (`"least"` lets shear widen the zone)
 * @param findingsAt - what the zone's width decides
 * @param clearMm - clear length of the longest rib
 */
export function leastZoneMm(fromMm: number, clearMm: number, findingsAt: (zoneMm: number) => readonly Compared[]): number {
  const widest = widestZoneMm(clearMm)
  for (let zone = fromMm; zone <= widest; zone += ZONE_STEP_MM)
    if (findingsAt(zone).every(({ demand, capacity }) => isMet(demand, capacity))) return zone
  return Math.max(fromMm, widest)
}
