import type { Answer, ShearSection } from '../codeBasis'
import { figure } from '../figure'
import type { Strengths } from './strengths'

/** fcu beyond which vc does not grow, and the one Table 3.8 is printed for, MPa. Source: BS 8110-1:1997, Table 3.8, note 2 */
const [GREATEST_FCU_MPA, PRINTED_FCU_MPA] = [40, 25]

/** Bounds of 100As/(bv·d) and of (400/d)^¼ without links; γm of concrete in shear. Source: BS 8110-1:1997, Table 3.8, notes (from memory) */
const [GREATEST_PERCENT, LEAST_DEPTH_FACTOR, GAMMA] = [3, 0.67, 1.25]

/**
 * Design concrete shear stress vc, MPa.
 *
 * Source: BS 8110-1:1997, 3.4.5.4, Table 3.8, by the formula in its notes (from memory, confirmed by evaluating the printed table)
 */
export function concreteShearMpa({ widthMm, depthMm, steelMm2 }: ShearSection, fcuMpa: number): number {
  const percent = Math.min(GREATEST_PERCENT, (100 * steelMm2) / (widthMm * depthMm))
  const depthFactor = Math.max(LEAST_DEPTH_FACTOR, Math.sqrt(Math.sqrt(400 / depthMm)))
  const strengthFactor = Math.cbrt(Math.min(fcuMpa, GREATEST_FCU_MPA) / PRINTED_FCU_MPA)
  return (0.79 * Math.cbrt(percent) * depthFactor * strengthFactor) / GAMMA
}

/**
 * Shear resistance of a section without links, N: vc, never more than 0.8√fcu or 5 MPa, on the rib or a metre of slab. Block walls
 * beside a rib are not counted.
 *
 * Source: BS 8110-1:1997, 3.5.5.2, 3.5.5.3, 3.6.4.2, 3.6.4.3 (average rib width), 3.4.5.2 (greatest stress); from memory
 */
export function shearResistanceN(section: ShearSection, { fcuMpa }: Strengths): Answer {
  const { widthMm, depthMm, steelMm2 } = section
  const concrete = concreteShearMpa(section, fcuMpa)
  const most = Math.min(0.8 * Math.sqrt(fcuMpa), 5)
  const stress = Math.min(concrete, most)
  return {
    value: stress * widthMm * depthMm,
    clause: 'BS 8110-1 3.4.5.4, Table 3.8',
    working: () =>
      `vc = 0.79·(100As/(bv·d))^⅓·(400/d)^¼·(fcu/25)^⅓/1.25 = ${figure(concrete, 3)} MPa (100As/(bv·d) ` +
      `${figure(Math.min(GREATEST_PERCENT, (100 * steelMm2) / (widthMm * depthMm)), 2)} %, fcu ${figure(fcuMpa)} ≤ ${GREATEST_FCU_MPA}); ` +
      `min(vc; 0.8√fcu; 5)·bv·d = ${figure(stress, 3)}·${figure(widthMm)}·${figure(depthMm)} = ${figure((stress * widthMm * depthMm) / 1000)} kN`,
  }
}
