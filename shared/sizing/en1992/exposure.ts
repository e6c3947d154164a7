import type { EuropeanExposure } from '../../contracts/exposure'
import type { Comparison, ExposedBars } from '../codeBasis'
import { figure } from '../figure'

const CLAUSE = 'EN 1992-1-1 4.4.1'

/**
 * Least cover for durability of reinforcement, mm, structural class S4 (50 years), no class taken off for slabs.
 *
 * Source: EN 1992-1-1:2004, 4.4.1.2(5), Table 4.4N, row S4 (from memory)
 */
export const DURABILITY_COVER_MM = {
  X0: 10,
  XC1: 15,
  XC2: 25,
  XC3: 25,
  XC4: 30,
  XD1: 35,
  XS1: 35,
  XD2: 40,
  XS2: 40,
  XD3: 45,
  XS3: 45,
} as const satisfies Record<EuropeanExposure, number>

/**
 * Least of any cover, and the allowance for deviation, mm.
 *
 * Source: EN 1992-1-1:2004, 4.4.1.2(2) Expression (4.2) and 4.4.1.3(1), recommended value of Δcdev (from memory)
 */
const LEAST_MM = 10
const DEVIATION_MM = 10

/**
 * Nominal cover that an exposure and the bond of the bars ask, against the cover there is.
 *
 * Source: EN 1992-1-1:2004, 4.4.1.1, Expressions (4.1), (4.2), Tables 4.2 and 4.4N (from memory)
 */
export function exposureCover(exposure: EuropeanExposure, { coverMm, linkMm, diameterMm }: ExposedBars): readonly Comparison[] {
  const durabilityMm = DURABILITY_COVER_MM[exposure]
  const bondMm = Math.max(linkMm, diameterMm - linkMm)
  const demand = Math.max(bondMm, durabilityMm, LEAST_MM) + DEVIATION_MM
  return [
    {
      demand,
      capacity: coverMm,
      unit: 'mm',
      clause: CLAUSE,
      working: () =>
        `${exposure}, S4: cnom = max(cmin,b; cmin,dur; ${LEAST_MM}) + Δcdev = max(${figure(bondMm)}; ${durabilityMm}; ${LEAST_MM}) + ` +
        `${DEVIATION_MM} = ${figure(demand)} mm; cover ${figure(coverMm)} mm`,
    },
  ]
}
