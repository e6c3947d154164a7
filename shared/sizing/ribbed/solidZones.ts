/**
 * Step in which a solid zone left to the engine is widened, mm.
 *
 * Source: project rule, engine design section 4 (common practice, no source)
 */
export const ZONE_STEP_MM = 25

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
 * @param isMetAt - whether what the zone's width decides is met
 * @param clearMm - clear length of the longest rib
 */
export function leastZoneMm(fromMm: number, clearMm: number, isMetAt: (zoneMm: number) => boolean): number {
  const widest = widestZoneMm(clearMm)
  for (let zone = fromMm; zone <= widest; zone += ZONE_STEP_MM) if (isMetAt(zone)) return zone
  return Math.max(fromMm, widest)
}
