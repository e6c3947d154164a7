import type { Answer, BarPlace, TensionZone } from '../codeBasis'
import type { BarDiameter } from '../../contracts/appraisal'
import { figure } from '../figure'
import { meanTensileStrength } from './meanTensileStrength'
import type { Strengths } from './strengths'

/**
 * Least tension steel of a section, mm².
 *
 * Source: EN 1992-1-1:2004, 9.2.1.1(1), Expression (9.1N); 9.3.1.1(1) for slabs (seen in R-EC-1)
 */
export function leastSteelMm2({ widthMm, depthMm }: TensionZone, { fckMpa, fykMpa, values }: Strengths): Answer {
  const { tensileShare, share } = values.leastSteel
  const fctm = meanTensileStrength(fckMpa)
  const value = Math.max((tensileShare * fctm) / fykMpa, share) * widthMm * depthMm
  return {
    value,
    clause: 'EN 1992-1-1 9.2.1.1(1)',
    working: () =>
      `As,min = max(${tensileShare}·fctm/fyk; ${share})·bt·d = max(${tensileShare}·${figure(fctm, 2)}/${figure(fykMpa)}; ${share})·` +
      `${figure(widthMm)}·${figure(depthMm)} = ${figure(value, 0)} mm²`,
  }
}

/**
 * Most steel of a section outside laps, mm².
 *
 * Source: EN 1992-1-1:2004, 9.2.1.1(3) (seen in R-EC-1)
 */
export function mostSteelMm2(concreteMm2: number, { values }: Strengths): Answer {
  const value = values.greatestSteelShare * concreteMm2
  return {
    value,
    clause: 'EN 1992-1-1 9.2.1.1(3)',
    working: () =>
      `As,max = ${values.greatestSteelShare}·Ac = ${values.greatestSteelShare}·${figure(concreteMm2, 0)} = ${figure(value, 0)} mm²`,
  }
}

/**
 * Greatest spacing of slab bars, mm.
 *
 * Source: EN 1992-1-1:2004, 9.3.1.1(3) (principal 3h ≤ 400 seen, the rest from memory)
 */
export function greatestSpacingMm(place: BarPlace, heightMm: number, { values }: Strengths): Answer {
  const { depths, mm } = values.spacing[place]
  const value = Math.min(depths * heightMm, mm)
  return {
    value,
    clause: 'EN 1992-1-1 9.3.1.1(3)',
    working: () => `smax = min(${depths}h; ${mm}) = min(${figure(depths * heightMm)}; ${mm}) = ${figure(value)} mm`,
  }
}

/**
 * Least clear gap between bars, mm.
 *
 * Source: EN 1992-1-1:2004, 8.2(2) (from memory)
 */
export function leastGapMm(diameterMm: BarDiameter, aggregateMm: number, { values }: Strengths): Answer {
  const { diameters, overAggregateMm, leastMm } = values.gap
  const value = Math.max(diameters * diameterMm, aggregateMm + overAggregateMm, leastMm)
  return {
    value,
    clause: 'EN 1992-1-1 8.2(2)',
    working: () =>
      `gap = max(φ; dg + ${overAggregateMm}; ${leastMm}) = max(${diameterMm}; ${aggregateMm + overAggregateMm}; ${leastMm}) = ${value} mm`,
  }
}
