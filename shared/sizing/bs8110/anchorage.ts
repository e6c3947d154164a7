import type { BarDiameter } from '../../contracts/appraisal'
import type { Answer, BarBond, BottomEnd, SpanEnd } from '../codeBasis'
import { figure } from '../figure'
import type { Strengths } from './strengths'

/**
 * Bond coefficient β of deformed bars, type 2, in tension.
 *
 * Source: BS 8110-1:1997, 3.12.8.4, Table 3.26 (from memory, confirmed by evaluating Table 3.27)
 */
const BOND_COEFFICIENT = 0.5

/** Length that anchors a bar at a stress, mm: l = fs·φ/(4·fbu), fbu = β√fcu. */
function lengthMm(diameterMm: number, stressMpa: number, fcuMpa: number): number {
  return (stressMpa * diameterMm) / (4 * BOND_COEFFICIENT * Math.sqrt(fcuMpa))
}

/**
 * Anchorage length of a straight deformed bar in tension, mm.
 *
 * Source: BS 8110-1:1997, 3.12.8.3, 3.12.8.4, Tables 3.26 and 3.27 (from memory, confirmed by evaluation)
 * @param stressShare - stress of the bar over its design strength, 0 to 1
 */
export function anchorageMm(diameterMm: BarDiameter, stressShare: number, { fcuMpa, fyMpa, steelShare }: Strengths): Answer {
  const stressMpa = stressShare * steelShare * fyMpa
  const value = lengthMm(diameterMm, stressMpa, fcuMpa)
  return {
    value,
    clause: 'BS 8110-1 3.12.8.3, Table 3.27',
    working: () =>
      `l = fs·φ/(4·β·√fcu) = ${figure(stressMpa)}·${diameterMm}/(4·${BOND_COEFFICIENT}·√${figure(fcuMpa)}) = ${figure(value, 0)} mm`,
  }
}

/** Cover, in diameters, under which laps at the top or in a corner are longer. Source: BS 8110-1:1997, 3.12.8.13 (from memory) */
const SMALL_COVER_DIAMETERS = 2

function lapFactor(diameterMm: number, { isTop, isCorner }: BarBond, coverMm: number): number {
  if (coverMm >= SMALL_COVER_DIAMETERS * diameterMm) return 1
  return isTop && isCorner ? 2 : isTop || isCorner ? 1.4 : 1
}

/**
 * Lap length of deformed bars in tension, mm: the anchorage length, 1.4 times where it lies at the top of a section or in its corner with
 * little cover, twice where both; at least 15 diameters or 300.
 *
 * Source: BS 8110-1:1997, 3.12.8.11, 3.12.8.13 (from memory)
 */
export function lapMm(diameterMm: BarDiameter, bond: BarBond, strengths: Strengths): Answer {
  const { fcuMpa, fyMpa, steelShare, coverMm } = strengths
  const factor = lapFactor(diameterMm, bond, coverMm)
  const anchorage = lengthMm(diameterMm, steelShare * fyMpa, fcuMpa)
  const value = Math.max(factor * anchorage, 15 * diameterMm, 300)
  return {
    value,
    clause: 'BS 8110-1 3.12.8.13',
    working: () =>
      `lap = max(${factor}·l; 15φ; 300) = max(${factor}·${figure(anchorage, 0)}; ${15 * diameterMm}; 300) = ${figure(value, 0)} mm`,
  }
}

/**
 * How far a bottom bar passes the face of its support, mm: where the floor ends, twelve diameters past the centre of the support or half a
 * depth past its face, whichever is less; else to the centre, at least twelve diameters.
 *
 * Source: BS 8110-1:1997, 3.12.9.4 a), b) (from memory); the middle of inner supports: common practice, no source
 */
export function bottomEnd(diameterMm: BarDiameter, { supportMm, isContinuous }: SpanEnd, depthMm: number): BottomEnd {
  const twelve = 12 * diameterMm
  const clause = 'BS 8110-1 3.12.9.4'
  if (isContinuous) return { leastMm: twelve, usualMm: Math.max(twelve, supportMm / 2), clause }
  const leastMm = twelve + Math.min(supportMm, depthMm) / 2
  return { leastMm, usualMm: Math.max(leastMm, supportMm / 2), clause }
}
