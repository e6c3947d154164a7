import type { BarDiameter } from '../../contracts/appraisal'
import type { Answer, BarBond, BottomEnd, SpanEnd } from '../codeBasis'
import { figure } from '../figure'
import { meanTensileStrength } from './meanTensileStrength'
import type { Strengths } from './strengths'

/**
 * Depth of a section above which bars at its top have poor bond, mm.
 *
 * Source: EN 1992-1-1:2004, 8.4.2, Figure 8.2 (from memory)
 */
const GOOD_BOND_MM = 250

const isPoorBond = ({ isTop, sectionMm }: BarBond) => isTop && sectionMm > GOOD_BOND_MM

/** Bond strength fbd, MPa: fctk,0.05 is 0.7·fctm; poor bond in the top of deep sections. */
function bondMpa(diameterMm: BarDiameter, bond: BarBond, { fckMpa, values }: Strengths): number {
  const eta1 = isPoorBond(bond) ? 0.7 : 1
  const eta2 = diameterMm <= 32 ? 1 : (132 - diameterMm) / 100
  return (2.25 * eta1 * eta2 * values.alphaCt * 0.7 * meanTensileStrength(fckMpa)) / values.gammaConcrete
}

/** Basic required anchorage of a fully stressed bar, mm. */
function requiredMm(diameterMm: BarDiameter, bond: BarBond, strengths: Strengths): number {
  return ((diameterMm / 4) * strengths.values.steelShare * strengths.fykMpa) / bondMpa(diameterMm, bond, strengths)
}

/**
 * Design anchorage length lbd of a straight bar in tension, mm, every α taken as 1.
 *
 * Source: EN 1992-1-1:2004, 8.4.2, 8.4.3, 8.4.4, Expressions (8.2), (8.3), (8.6) (from memory, confirmed by evaluation)
 * @param stressShare - stress of the bar over its design strength, 0 to 1
 */
export function anchorageMm(diameterMm: BarDiameter, bond: BarBond, stressShare: number, strengths: Strengths): Answer {
  const basic = requiredMm(diameterMm, bond, strengths)
  const value = Math.max(stressShare * basic, 0.3 * basic, 10 * diameterMm, 100)
  return {
    value,
    clause: 'EN 1992-1-1 8.4.4',
    working: () =>
      `lbd = φ/4·σsd/fbd = ${diameterMm}/4·${figure(stressShare * strengths.values.steelShare * strengths.fykMpa)}/` +
      `${figure(bondMpa(diameterMm, bond, strengths), 2)} = ${figure(value, 0)} mm`,
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
export function lapMm(diameterMm: BarDiameter, bond: BarBond, strengths: Strengths): Answer {
  const basic = requiredMm(diameterMm, bond, strengths)
  const value = Math.max(ALL_LAPPED * basic, 15 * diameterMm, 200)
  return {
    value,
    clause: 'EN 1992-1-1 8.7.3',
    working: () => `l0 = α6·lb,rqd = ${ALL_LAPPED}·${figure(basic, 0)} = ${figure(value, 0)} mm`,
  }
}

/**
 * How far a bottom bar passes the face of its support, mm: ten diameters, or to the middle of the support.
 *
 * Source: EN 1992-1-1:2004, 9.3.1.2(1) with 8.4.4 (10φ); the middle of the support: common practice, no source (engine design section 4)
 */
export function bottomEnd(diameterMm: BarDiameter, { supportMm }: SpanEnd): BottomEnd {
  const leastMm = 10 * diameterMm
  return { leastMm, usualMm: Math.max(leastMm, supportMm / 2), clause: 'EN 1992-1-1 9.3.1.2(1)' }
}
