import type { BarDiameter } from '../../contracts/appraisal'

/**
 * Nominal mass of bars, kg/m.
 *
 * Source: BS 4449, nominal masses as printed (8 to 32 mm as the engine design gives them; 6 and 40 mm from BS 8666, seen)
 */
export const BAR_MASS_KG_PER_M = {
  6: 0.222,
  8: 0.395,
  10: 0.616,
  12: 0.888,
  16: 1.58,
  20: 2.47,
  25: 3.85,
  32: 6.31,
  40: 9.864,
} as const satisfies Record<BarDiameter, number>

/**
 * Nominal cross-section of one bar, mm².
 *
 * Source: EN 10080:2005, nominal area π·φ²/4
 */
export function barAreaMm2(diameterMm: BarDiameter): number {
  return (Math.PI * diameterMm ** 2) / 4
}

/**
 * Diameters the engine chooses from, mm; 6 is left to links, 32 and 40 to beams.
 *
 * Source: project rule, common practice for slabs and ribs, no source
 */
export const CHOSEN_DIAMETERS = [8, 10, 12, 16, 20, 25] as const satisfies readonly BarDiameter[]
