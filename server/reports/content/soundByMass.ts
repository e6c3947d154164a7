const GRAVITY = 9.81
/** Above it the formula holds, kg/m². */
const LEAST_MASS = 150

/**
 * Weighted sound reduction index of a bare homogeneous floor by its mass, dB: Rw = 37.5 lg m′ − 42. No credit for cavities, a
 * floor's own figure and not a building's: for screening only.
 *
 * Source: EN 12354-1:2000, Annex B, from memory
 * @returns null at 150 kg/m² and below
 */
export function soundByMassDb(deadLoadKnPerM2: number): number | null {
  const massKgPerM2 = (deadLoadKnPerM2 * 1000) / GRAVITY
  if (massKgPerM2 <= LEAST_MASS) return null
  return 37.5 * Math.log10(massKgPerM2) - 42
}
