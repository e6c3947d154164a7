import type { Answer, ShearSection } from '../codeBasis'
import { figure } from '../figure'
import type { Strengths } from './strengths'

/**
 * Shear resistance VRd,c of a section without links and without axial force, N.
 *
 * Source: EN 1992-1-1:2004, 6.2.2(1), Expressions (6.2.a), (6.2.b), (6.3N) (seen in a public encoding and in R-EC-1)
 */
export function shearResistanceN(section: ShearSection, { fckMpa, values }: Strengths): Answer {
  const { widthMm, depthMm, steelMm2 } = section
  const k = Math.min(2, 1 + Math.sqrt(200 / depthMm))
  const rho = Math.min(0.02, steelMm2 / (widthMm * depthMm))
  const stress = (values.shear.coefficient / values.gammaConcrete) * k * Math.cbrt(100 * rho * fckMpa)
  const leastStress = values.shear.vMinCoefficient * k ** 1.5 * Math.sqrt(fckMpa)
  const governing = Math.max(stress, leastStress)
  return {
    value: governing * widthMm * depthMm,
    clause: 'EN 1992-1-1 6.2.2(1)',
    working: () =>
      `VRd,c = max(0.18/γc·k·(100ρ·fck)^⅓; vmin)·bw·d = max(${figure(stress, 3)}; ${figure(leastStress, 3)})·${figure(widthMm)}·` +
      `${figure(depthMm)} = ${figure((governing * widthMm * depthMm) / 1000)} kN (k ${figure(k, 2)}, ρ ${figure(rho, 4)})`,
  }
}
