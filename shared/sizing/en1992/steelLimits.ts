import type { Answer, SpacedBars, TensionZone } from '../codeBasis'
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
 * Least steel across the principal bars of a one-way slab, mm².
 *
 * Source: EN 1992-1-1:2004, 9.3.1.1(2) (20 % seen)
 */
export function secondarySteelMm2(principalMm2: number, { values }: Strengths): Answer {
  const value = values.secondaryShare * principalMm2
  return {
    value,
    clause: 'EN 1992-1-1 9.3.1.1(2)',
    working: () =>
      `${values.secondaryShare} of the main bars = ${values.secondaryShare}·${figure(principalMm2, 0)} = ${figure(value, 0)} mm²`,
  }
}

/**
 * Mesh in the topping of a ribbed floor, mm² per metre each way: least steel of the flange as a slab of its own.
 *
 * Source: EN 1992-1-1:2004, 9.2.1.1(1) over the whole thickness (166 mm²/m for 100 of C35/45 seen in R-EC-1)
 */
export function toppingMeshMm2(toppingMm: number, strengths: Strengths): Answer {
  const zone = { widthMm: 1000, webMm: 1000, flangeMm: 1000, heightMm: toppingMm, depthMm: toppingMm }
  return leastSteelMm2({ tension: 'rectangle', ...zone }, strengths)
}

/**
 * Greatest spacing of slab bars, mm.
 *
 * Source: EN 1992-1-1:2004, 9.3.1.1(3) (principal 3h ≤ 400 seen, the rest from memory)
 */
export function greatestSpacingMm({ place, heightMm }: SpacedBars, { values }: Strengths): Answer {
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
