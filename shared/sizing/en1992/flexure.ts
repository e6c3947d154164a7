import type { BendingSection, Flexure } from '../codeBasis'
import { figure, scaled } from '../figure'
import type { Strengths } from './strengths'

const CLAUSE = 'EN 1992-1-1 3.1.7, 6.1'

/** Lever arm of a rectangular section over its depth; above the greatest K the arm at that K, so that the steel shown stays finite. */
function leverArmRatio(k: number, greatestK: number, { concreteShare, greatestLeverArm }: Strengths['values']): number {
  return Math.min(greatestLeverArm, 0.5 + Math.sqrt(0.25 - Math.min(k, greatestK) / (2 * concreteShare)))
}

/**
 * K, lever arm and tension steel of a section in bending; a T-section whose stress block leaves the flange is split into flange and web.
 *
 * Source: EN 1992-1-1:2004, 3.1.7 and 6.1, rectangular stress block (lever arm seen in R-EC-1; cap 0.95d common practice)
 * @param momentNmm - ultimate moment, ≥ 0
 * @param isRedistributed - whether 20 % was taken off at this section, which lowers the greatest K
 */
export function flexure(section: BendingSection, momentNmm: number, isRedistributed: boolean, strengths: Strengths): Flexure {
  const { flange, widthMm, depthMm } = section
  const whole = rectangle(widthMm, depthMm, momentNmm, isRedistributed, strengths)
  if (!flange || flange.webMm >= widthMm) return whole
  if (neutralAxisMm(whole, depthMm) * 0.8 <= flange.thicknessMm) return inFlange(whole, flange.thicknessMm, depthMm)
  return tee(section, flange, momentNmm, isRedistributed, strengths)
}

const neutralAxisMm = ({ leverArmMm }: Flexure, depthMm: number) => 2.5 * (depthMm - leverArmMm)

function rectangle(widthMm: number, depthMm: number, momentNmm: number, isRedistributed: boolean, strengths: Strengths): Flexure {
  const { fckMpa, fykMpa, values } = strengths
  const greatestK = isRedistributed ? values.greatestK.redistributed : values.greatestK.elastic
  const k = momentNmm / (widthMm * depthMm ** 2 * fckMpa)
  const leverArmMm = leverArmRatio(k, greatestK, values) * depthMm
  const requiredMm2 = momentNmm / (values.steelShare * fykMpa * leverArmMm)
  return {
    k,
    greatestK,
    leverArmMm,
    requiredMm2,
    clause: CLAUSE,
    kWorking: () =>
      `K = M/(b·d²·fck) = ${scaled(momentNmm, 6)}/(${figure(widthMm)}·${figure(depthMm)}²·${figure(fckMpa)}) = ${figure(k, 3)}`,
    steelWorking: () =>
      `z = ${figure(leverArmMm)} (${figure(leverArmMm / depthMm, 3)}d); As = M/(${values.steelShare}·fyk·z) = ` +
      `${scaled(momentNmm, 6)}/(${values.steelShare}·${figure(fykMpa)}·${figure(leverArmMm)}) = ${figure(requiredMm2, 0)} mm²`,
  }
}

function inFlange(whole: Flexure, thicknessMm: number, depthMm: number): Flexure {
  const block = 0.8 * neutralAxisMm(whole, depthMm)
  const note = () => `0.8x = ${figure(block)} ≤ hf = ${figure(thicknessMm)}, in the flange; `
  return { ...whole, steelWorking: () => note() + whole.steelWorking() }
}

/** Flange overhangs carry what they can at full stress; the web carries the rest as a rectangle. */
function tee(
  { widthMm, depthMm }: BendingSection,
  { webMm, thicknessMm }: { webMm: number; thicknessMm: number },
  momentNmm: number,
  isRedistributed: boolean,
  strengths: Strengths,
): Flexure {
  const { fckMpa, fykMpa, values } = strengths
  const flangeArmMm = depthMm - thicknessMm / 2
  const flangeNmm = values.concreteShare * fckMpa * (widthMm - webMm) * thicknessMm * flangeArmMm
  const web = rectangle(webMm, depthMm, Math.max(0, momentNmm - flangeNmm), isRedistributed, strengths)
  const flangeMm2 = (momentNmm - Math.max(0, momentNmm - flangeNmm)) / (values.steelShare * fykMpa * flangeArmMm)
  const requiredMm2 = flangeMm2 + web.requiredMm2
  return {
    ...web,
    requiredMm2,
    leverArmMm: momentNmm / (values.steelShare * fykMpa * requiredMm2),
    kWorking: () =>
      `stress block below the flange: overhangs carry ${scaled(flangeNmm, 6)} of ${scaled(momentNmm, 6)} N·mm; web ${web.kWorking()}`,
    steelWorking: () =>
      `flange ${figure(flangeMm2, 0)} + web: ${web.steelWorking()}; together As = ${figure(requiredMm2, 0)} mm²`,
  }
}
