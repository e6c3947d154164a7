import type { Answer, Comparison, RibShape } from '../codeBasis'
import { figure } from '../figure'

const CLAUSE = 'EN 1992-1-1 5.3.1(6)'
const GREATEST_SPACING_MM = 1500
const GREATEST_DEPTH_IN_WIDTHS = 4
const LEAST_TOPPING_MM = 40
const CLEAR_SHARE = 1 / 10

/**
 * Spacing and slenderness of ribs.
 *
 * Source: EN 1992-1-1:2004, 5.3.1(6) (from memory)
 */
export function ribProportions({ clearMm, ribMm, blockHeightMm }: RibShape): readonly Comparison[] {
  const depths = GREATEST_DEPTH_IN_WIDTHS * ribMm
  return [
    {
      demand: clearMm + ribMm,
      capacity: GREATEST_SPACING_MM,
      unit: 'mm',
      clause: CLAUSE,
      working: () =>
        `spacing of ribs = ${figure(clearMm)} + ${figure(ribMm)} = ${figure(clearMm + ribMm)} ≤ ${GREATEST_SPACING_MM} mm`,
    },
    {
      demand: blockHeightMm,
      capacity: depths,
      unit: 'mm',
      clause: CLAUSE,
      working: () => `rib below the flange = ${figure(blockHeightMm)} ≤ 4·b = 4·${figure(ribMm)} = ${figure(depths)} mm`,
    },
  ]
}

/**
 * Least thickness of the topping over permanent blocks, mm.
 *
 * Source: EN 1992-1-1:2004, 5.3.1(6), note on permanent blocks (from memory)
 */
export function leastToppingMm({ clearMm }: RibShape): Answer {
  const value = Math.max(CLEAR_SHARE * clearMm, LEAST_TOPPING_MM)
  return {
    value,
    clause: CLAUSE,
    working: () =>
      `hf ≥ max(clear/10; ${LEAST_TOPPING_MM}) = max(${figure(clearMm)}/10; ${LEAST_TOPPING_MM}) = ${figure(value)} mm`,
  }
}

/**
 * Greatest clear length of ribs between transverse ribs or solid zones, mm.
 *
 * Source: EN 1992-1-1:2004, 5.3.1(6) (from memory)
 */
export function crossRibSpacingMm(heightMm: number): Answer {
  return { value: 10 * heightMm, clause: CLAUSE, working: () => `10·h = 10·${figure(heightMm)} = ${figure(10 * heightMm)} mm` }
}
