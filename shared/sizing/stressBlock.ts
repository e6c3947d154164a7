import type { BendingSection, Flexure } from './codeBasis'
import { figure, scaled } from './figure'

/** What a code says of concrete in bending by a rectangular stress block, and of the steel that balances it. Stresses MPa. */
export interface StressBlock {
  /** Characteristic strength of the concrete, which K is over, and its symbol. */
  readonly strengthMpa: number
  readonly strengthSymbol: string
  /** Stress of the block as a share of that strength. */
  readonly stressShare: number
  /** Depth of the block as a share of the neutral axis depth. */
  readonly depthShare: number
  /** Design stress of the steel as a share of its characteristic strength, and that strength. */
  readonly steelShare: number
  readonly steelMpa: number
  readonly steelSymbol: string
  /** Greatest z/d, and K above which a singly reinforced section fails. */
  readonly greatestLeverArm: number
  readonly greatestK: number
  readonly clause: string
}

/** Lever arm of a rectangle over its depth; above the greatest K the arm at that K, so that the steel shown stays finite. */
function leverArmRatio(k: number, { greatestK, greatestLeverArm, stressShare }: StressBlock): number {
  return Math.min(greatestLeverArm, 0.5 + Math.sqrt(0.25 - Math.min(k, greatestK) / (2 * stressShare)))
}

/** Depth of the block, mm: twice what the lever arm leaves of the effective depth. */
const blockDepthMm = ({ leverArmMm }: Flexure, depthMm: number) => 2 * (depthMm - leverArmMm)

/**
 * K, lever arm and tension steel of a section in bending; a T-section whose stress block leaves the flange is split into flange and web.
 *
 * Source: statics of the rectangular stress block, with the values and the clause of the basis that asks
 * @param momentNmm - ultimate moment, ≥ 0
 */
export function flexureByBlock(section: BendingSection, momentNmm: number, block: StressBlock): Flexure {
  const { flange, widthMm, depthMm } = section
  const whole = rectangle(widthMm, depthMm, momentNmm, block)
  if (!flange || flange.webMm >= widthMm) return whole
  if (blockDepthMm(whole, depthMm) <= flange.thicknessMm) return inFlange(whole, flange.thicknessMm, depthMm, block)
  return tee(section, flange, momentNmm, block)
}

function rectangle(widthMm: number, depthMm: number, momentNmm: number, block: StressBlock): Flexure {
  const { strengthMpa, strengthSymbol, steelShare, steelMpa, steelSymbol, greatestK, clause } = block
  const k = momentNmm / (widthMm * depthMm ** 2 * strengthMpa)
  const leverArmMm = leverArmRatio(k, block) * depthMm
  const requiredMm2 = momentNmm / (steelShare * steelMpa * leverArmMm)
  return {
    k,
    greatestK,
    leverArmMm,
    requiredMm2,
    clause,
    kWorking: () =>
      `K = M/(b·d²·${strengthSymbol}) = ${scaled(momentNmm, 6)}/(${figure(widthMm)}·${figure(depthMm)}²·${figure(strengthMpa)}) = ${figure(k, 3)}`,
    steelWorking: () =>
      `z = ${figure(leverArmMm)} (${figure(leverArmMm / depthMm, 3)}d); As = M/(${figure(steelShare, 3)}·${steelSymbol}·z) = ` +
      `${scaled(momentNmm, 6)}/(${figure(steelShare, 3)}·${figure(steelMpa)}·${figure(leverArmMm)}) = ${figure(requiredMm2, 0)} mm²`,
  }
}

function inFlange(whole: Flexure, thicknessMm: number, depthMm: number, { depthShare }: StressBlock): Flexure {
  const note = () => `${depthShare}x = ${figure(blockDepthMm(whole, depthMm))} ≤ hf = ${figure(thicknessMm)}, in the flange; `
  return { ...whole, steelWorking: () => note() + whole.steelWorking() }
}

/** Flange overhangs carry what they can at full stress; the web carries the rest as a rectangle. */
function tee(
  { widthMm, depthMm }: BendingSection,
  { webMm, thicknessMm }: { readonly webMm: number; readonly thicknessMm: number },
  momentNmm: number,
  block: StressBlock,
): Flexure {
  const flangeArmMm = depthMm - thicknessMm / 2
  const flangeNmm = block.stressShare * block.strengthMpa * (widthMm - webMm) * thicknessMm * flangeArmMm
  const web = rectangle(webMm, depthMm, Math.max(0, momentNmm - flangeNmm), block)
  const steelMpa = block.steelShare * block.steelMpa
  const flangeMm2 = (momentNmm - Math.max(0, momentNmm - flangeNmm)) / (steelMpa * flangeArmMm)
  const requiredMm2 = flangeMm2 + web.requiredMm2
  return {
    ...web,
    requiredMm2,
    leverArmMm: momentNmm / (steelMpa * requiredMm2),
    kWorking: () =>
      `stress block below the flange: overhangs carry ${scaled(flangeNmm, 6)} of ${scaled(momentNmm, 6)} N·mm; web ${web.kWorking()}`,
    steelWorking: () =>
      `flange ${figure(flangeMm2, 0)} + web: ${web.steelWorking()}; together As = ${figure(requiredMm2, 0)} mm²`,
  }
}
