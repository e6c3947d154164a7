import type { BendingSection, Flexure } from '../codeBasis'
import { flexureByBlock } from '../stressBlock'
import type { Strengths } from './strengths'

/** Depth of the stress block over the neutral axis depth, up to C50/60. Source: EN 1992-1-1:2004, 3.1.7(3), Expression (3.19) */
const BLOCK_DEPTH = 0.8

/** Neutral axis of a singly reinforced section that is not redistributed, x/d. Source: common practice of design aids, K′ = 0.167 */
const GREATEST_DEPTH_OF_AXIS = 0.45

/**
 * Greatest K of a singly reinforced section from which a share of the moment was redistributed, to three decimals as design aids print it.
 *
 * Source: EN 1992-1-1:2004, 5.5(4), Expression (5.10a), x/d ≤ (δ − k1)/k2 (0.167 and 0.116 by the engine design, 0.153 with the
 *   values of the United Kingdom seen in a published example); at most x/d = 0.45, common practice
 */
export function greatestK(redistributedShare: number, { concreteShare, redistribution }: Strengths['values']): number {
  const axis = Math.min(GREATEST_DEPTH_OF_AXIS, (1 - redistributedShare - redistribution.k1) / redistribution.k2)
  const block = BLOCK_DEPTH * Math.max(0, axis)
  return Math.round(concreteShare * block * (1 - block / 2) * 1000) / 1000
}

/**
 * K, lever arm and tension steel of a section in bending, T-sections with their neutral axis checked.
 *
 * Source: EN 1992-1-1:2004, 3.1.7 and 6.1, rectangular stress block (lever arm seen in R-EC-1; cap 0.95d common practice)
 * @param momentNmm - ultimate moment, ≥ 0
 * @param redistributedShare - share of the moment taken off at this section, which lowers the greatest K
 */
export function flexure(section: BendingSection, momentNmm: number, redistributedShare: number, strengths: Strengths): Flexure {
  const { fckMpa, fykMpa, values } = strengths
  return flexureByBlock(section, momentNmm, {
    strengthMpa: fckMpa,
    strengthSymbol: 'fck',
    stressShare: values.concreteShare,
    depthShare: BLOCK_DEPTH,
    steelShare: values.steelShare,
    steelMpa: fykMpa,
    steelSymbol: 'fyk',
    greatestLeverArm: values.greatestLeverArm,
    greatestK: greatestK(redistributedShare, values),
    clause: 'EN 1992-1-1 3.1.7, 6.1',
  })
}
