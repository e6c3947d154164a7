import type { Answer, SpacedBars } from '../codeBasis'
import { figure } from '../figure'
import { barAreaMm2 } from '../tables/bars'
import { HIGH_YIELD_MPA } from './steelLimits'
import type { Strengths } from './strengths'

/** Clear distance that no bars exceed: multiples of d, and mm. Source: BS 8110-1:1997, 3.12.11.2.7 (3d seen in S-BS-1, 750 from memory) */
const [GREATEST_DEPTHS, GREATEST_CLEAR_MM] = [3, 750]

/** Thickness up to which cracks need no check, mm, by steel. Source: BS 8110-1:1997, 3.12.11.2.7 a) (from memory) */
const THIN_SLAB_MM = { mild: 250, highYield: 200 } as const

/** Steel, %, from which the clear distance is not raised for little of it. Source: BS 8110-1:1997, 3.12.11.2.7 b) (from memory) */
const FULL_PERCENT = 1

/**
 * Clear distance between bars that controls cracking, mm: 155 for fy 460 without redistribution.
 *
 * Source: BS 8110-1:1997, 3.12.11.2.3, 3.12.11.2.4, Table 3.28 (155 from memory), by 47 000/fs ≤ 300 with fs = 2·fy/(3·βb), to the nearest 5
 *   as the table prints
 */
export function crackDistanceMm(fyMpa: number, redistributedShare: number): number {
  const serviceMpa = (2 * fyMpa) / (3 * (1 - redistributedShare))
  return Math.min(300, 5 * Math.round(47_000 / serviceMpa / 5))
}

/**
 * Greatest spacing of slab bars between their middles, mm. Slabs too thick to go unchecked keep the clear distance of Table 3.28, divided by
 * the percentage of steel below 1 %: as that percentage follows from diameter and spacing, thin bars keep it at every spacing, and thick ones
 * up to the table's own distance.
 *
 * Source: BS 8110-1:1997, 3.12.11.2.7 (3d seen; the rest from memory)
 */
export function greatestSpacingMm(bars: SpacedBars, { fyMpa }: Strengths): Answer {
  const { heightMm, depthMm, diameterMm, redistributedShare } = bars
  const clearMm = Math.min(GREATEST_DEPTHS * depthMm, GREATEST_CLEAR_MM)
  const thinMm = fyMpa >= HIGH_YIELD_MPA ? THIN_SLAB_MM.highYield : fyMpa > 250 ? THIN_SLAB_MM.highYield : THIN_SLAB_MM.mild
  const crackMm = crackDistanceMm(fyMpa, redistributedShare)
  /** Spacing at which bars of this diameter are 1 % of the section. */
  const fullMm = (100 * barAreaMm2(diameterMm)) / (FULL_PERCENT * depthMm)
  const isThin = heightMm <= thinMm
  const isKept = fullMm - diameterMm <= crackMm
  const limitMm = isThin || isKept ? clearMm : Math.min(clearMm, crackMm)
  const value = limitMm + diameterMm
  const cracks = isThin
    ? `h ${figure(heightMm)} ≤ ${thinMm}, cracks need no check`
    : isKept
      ? `h ${figure(heightMm)} > ${thinMm}: clear ≤ ${crackMm}/ρ (ρ in %, ≤ 1), kept by φ${diameterMm} at every spacing`
      : `h ${figure(heightMm)} > ${thinMm}: clear ≤ ${crackMm}`
  return {
    value,
    clause: 'BS 8110-1 3.12.11.2.7',
    working: () =>
      `clear ≤ min(3d; ${GREATEST_CLEAR_MM}) = min(3·${figure(depthMm)}; ${GREATEST_CLEAR_MM}) = ${figure(clearMm)}; ${cracks}; ` +
      `smax = ${figure(limitMm)} + φ = ${figure(value)} mm`,
  }
}
