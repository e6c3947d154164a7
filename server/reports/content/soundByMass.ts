import { airborneIndexDb } from '#shared/alsoCompared/soundByMass'
import { GRAVITY_M_PER_S2 } from '#shared/units'

/**
 * Weighted sound reduction index of a bare homogeneous floor by its mass, dB: Rw = 37.5 lg m′ − 42. No credit for cavities, a
 * floor's own figure and not a building's: for screening only.
 *
 * Source: EN 12354-1:2000, Annex B, from memory
 * @returns null at 150 kg/m² and below
 */
export function soundByMassDb(deadLoadKnPerM2: number): number | null {
  return airborneIndexDb((deadLoadKnPerM2 * 1000) / GRAVITY_M_PER_S2)
}
