/**
 * Weighted sound reduction index of a bare homogeneous floor by its mass, dB: Rw = 37.5 lg m′ − 42. No credit for cavities; a floor's
 * own figure and not a building's: for screening only.
 *
 * Source: EN 12354-1:2000, Annex B (from memory)
 * @param massKgPerM2 - m′
 * @returns null at 150 kg/m² and below, where the formula does not hold
 */
export function airborneIndexDb(massKgPerM2: number): number | null {
  return massKgPerM2 > LEAST_AIRBORNE ? 37.5 * Math.log10(massKgPerM2) - 42 : null
}

/**
 * Equivalent weighted impact sound level of a bare homogeneous floor by its mass, dB: Ln,w,eq = 164 − 35 lg m′. For screening only.
 *
 * Source: EN 12354-2:2000, Annex B (as reported)
 * @param massKgPerM2 - m′
 * @returns null outside 100 to 600 kg/m², where the formula does not hold
 */
export function impactLevelDb(massKgPerM2: number): number | null {
  const isInside = massKgPerM2 >= LEAST_IMPACT && massKgPerM2 <= GREATEST_IMPACT
  return isInside ? 164 - 35 * Math.log10(massKgPerM2) : null
}

/** Masses that the formulas hold for, kg/m². */
export const LEAST_AIRBORNE = 150
export const LEAST_IMPACT = 100
export const GREATEST_IMPACT = 600
