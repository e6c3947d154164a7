import type { Answer, Comparison, RibShape } from '../codeBasis'
import { figure } from '../figure'

const GREATEST_SPACING_MM = 1500
const GREATEST_DEPTH_IN_WIDTHS = 4

/**
 * Spacing and slenderness of ribs.
 *
 * Source: BS 8110-1:1997, 3.6.1.3 (from memory; the same figures seen in SANS 10100-1 4.5.1.3)
 */
export function ribProportions({ clearMm, ribMm, blockHeightMm }: RibShape): readonly Comparison[] {
  const depths = GREATEST_DEPTH_IN_WIDTHS * ribMm
  const clause = 'BS 8110-1 3.6.1.3'
  return [
    {
      demand: clearMm + ribMm,
      capacity: GREATEST_SPACING_MM,
      unit: 'mm',
      clause,
      working: () =>
        `centres of ribs = ${figure(clearMm)} + ${figure(ribMm)} = ${figure(clearMm + ribMm)} ≤ ${GREATEST_SPACING_MM} mm`,
    },
    {
      demand: blockHeightMm,
      capacity: depths,
      unit: 'mm',
      clause,
      working: () => `rib below the topping = ${figure(blockHeightMm)} ≤ 4·b = 4·${figure(ribMm)} = ${figure(depths)} mm`,
    },
  ]
}

/**
 * Topping over permanent blocks, mm: up to a clear distance between ribs one value, beyond it another or a tenth of the distance.
 *
 * Source: BS 8110-1:1997, Table 3.17 (same figures seen in SANS 10100-1 4.5.1.2); blocks jointed in mortar, 25 mm, are not assumed
 */
export const LEAST_TOPPING = { closeMm: 500, overClose: 30, overWide: 40, clearShare: 1 / 10 } as const

/**
 * Least thickness of the topping over permanent blocks, mm.
 *
 * Source: BS 8110-1:1997, 3.6.1.5 and Table 3.17 (see LEAST_TOPPING)
 */
export function leastToppingMm({ clearMm }: RibShape): Answer {
  const { closeMm, overClose, overWide, clearShare } = LEAST_TOPPING
  const isClose = clearMm <= closeMm
  const value = isClose ? overClose : Math.max(overWide, clearShare * clearMm)
  return {
    value,
    clause: 'BS 8110-1 Table 3.17',
    working: () =>
      isClose
        ? `permanent blocks, clear ${figure(clearMm)} ≤ ${closeMm}: topping ≥ ${value} mm`
        : `permanent blocks, clear ${figure(clearMm)} > ${closeMm}: topping ≥ max(${overWide}; clear/10) = ${figure(value)} mm`,
  }
}
