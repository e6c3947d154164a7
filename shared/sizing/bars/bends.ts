import type { BarDiameter } from '../../contracts/appraisal'

/**
 * Least radius of a bend, inner side, mm.
 *
 * Source: BS 8666:2005, Table 2 (from memory)
 */
export const LEAST_RADIUS_MM = {
  6: 12,
  8: 16,
  10: 20,
  12: 24,
  16: 32,
  20: 70,
  25: 87,
  32: 112,
  40: 140,
} as const satisfies Record<BarDiameter, number>

/**
 * Least length of the end of a bar past a bend, outside dimension P, mm.
 *
 * Source: BS 8666:2005, Table 2 (from memory)
 */
export const LEAST_END_MM = {
  6: 110,
  8: 115,
  10: 120,
  12: 125,
  16: 130,
  20: 190,
  25: 240,
  32: 305,
  40: 380,
} as const satisfies Record<BarDiameter, number>
