import type { BarDiameter } from '../../contracts/appraisal'
import type { Answer } from '../codeBasis'
import { figure } from '../figure'
import { meanTensileStrength } from './meanTensileStrength'
import type { Strengths } from './strengths'

/** Bond strength fbd, MPa: fctk,0.05 is 0.7·fctm; poor bond in the top of deep sections. */
function bondMpa(diameterMm: BarDiameter, isPoor: boolean, { fckMpa, values }: Strengths): number {
  const eta1 = isPoor ? 0.7 : 1
  const eta2 = diameterMm <= 32 ? 1 : (132 - diameterMm) / 100
  return (2.25 * eta1 * eta2 * values.alphaCt * 0.7 * meanTensileStrength(fckMpa)) / values.gammaConcrete
}

/** Basic required anchorage of a fully stressed bar, mm. */
function requiredMm(diameterMm: BarDiameter, isPoor: boolean, strengths: Strengths): number {
  return ((diameterMm / 4) * strengths.values.steelShare * strengths.fykMpa) / bondMpa(diameterMm, isPoor, strengths)
}

/**
 * Design anchorage length lbd of a straight bar in tension, mm, every α taken as 1.
 *
 * Source: EN 1992-1-1:2004, 8.4.2, 8.4.3, 8.4.4, Expressions (8.2), (8.3), (8.6) (from memory, confirmed by evaluation)
 * @param isPoor - top bars of sections over 250 mm deep
 * @param stressShare - stress of the bar over its design strength, 0 to 1
 */
export function anchorageMm(diameterMm: BarDiameter, isPoor: boolean, stressShare: number, strengths: Strengths): Answer {
  const basic = requiredMm(diameterMm, isPoor, strengths)
  const value = Math.max(stressShare * basic, 0.3 * basic, 10 * diameterMm, 100)
  return {
    value,
    clause: 'EN 1992-1-1 8.4.4',
    working: () =>
      `lbd = φ/4·σsd/fbd = ${diameterMm}/4·${figure(stressShare * strengths.values.steelShare * strengths.fykMpa)}/` +
      `${figure(bondMpa(diameterMm, isPoor, strengths), 2)} = ${figure(value, 0)} mm`,
  }
}

/**
 * α6 where more than half the bars are lapped at one section.
 *
 * Source: EN 1992-1-1:2004, 8.7.3, Table 8.3 (from memory)
 */
const ALL_LAPPED = 1.5

/**
 * Lap length l0 of fully stressed bars all lapped at one section, mm.
 *
 * Source: EN 1992-1-1:2004, 8.7.3, Expressions (8.10), (8.11) (from memory, confirmed by evaluation)
 */
export function lapMm(diameterMm: BarDiameter, isPoor: boolean, strengths: Strengths): Answer {
  const basic = requiredMm(diameterMm, isPoor, strengths)
  const value = Math.max(ALL_LAPPED * basic, 15 * diameterMm, 200)
  return {
    value,
    clause: 'EN 1992-1-1 8.7.3',
    working: () => `l0 = α6·lb,rqd = ${ALL_LAPPED}·${figure(basic, 0)} = ${figure(value, 0)} mm`,
  }
}
