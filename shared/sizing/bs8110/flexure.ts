import type { BendingSection, Flexure } from '../codeBasis'
import { flexureByBlock } from '../stressBlock'
import type { Strengths } from './strengths'

/** Simplified stress block: 0.67·fcu/1.5 over 0.9 of the neutral axis. Source: BS 8110-1:1997, 3.4.4.1 and Figure 3.3 (from memory) */
const BLOCK = { stressShare: 0.45, depthShare: 0.9 } as const

/** Greatest K up to 10 % of redistribution. Source: BS 8110-1:1997, 3.4.4.4 (seen in several worked examples) */
const GREATEST_K = 0.156

/** Redistribution up to which it holds. Source: BS 8110-1:1997, 3.4.4.4 */
const SMALL_REDISTRIBUTION = 0.1

/** z ≤ 0.95d. Source: BS 8110-1:1997, 3.4.4.1 e) (seen in several worked examples) */
const GREATEST_LEVER_ARM = 0.95

/**
 * Greatest K of a singly reinforced section from which a share of the moment was redistributed: 0.156, and 0.132 after 20 %.
 *
 * Source: BS 8110-1:1997, 3.4.4.4, K′ = 0.402(βb − 0.4) − 0.18(βb − 0.4)² (seen; 0.132 seen in R-BS-3)
 */
export function greatestK(redistributedShare: number): number {
  if (redistributedShare <= SMALL_REDISTRIBUTION) return GREATEST_K
  const axis = 1 - redistributedShare - 0.4
  return Math.round((0.402 * axis - 0.18 * axis ** 2) * 1000) / 1000
}

/**
 * K, lever arm and tension steel of a section in bending: z = d(0.5 + √(0.25 − K/0.9)), As = M/(0.95·fy·z); T-sections with their neutral
 * axis checked, the overhangs of the flange at 0.45·fcu where it lies below them.
 *
 * Source: BS 8110-1:1997, 3.4.4.1, 3.4.4.4, 3.4.4.5 (3.4.4.4 seen in several worked examples; the flange by the same block)
 * @param momentNmm - ultimate moment, ≥ 0
 * @param redistributedShare - share of the moment taken off at this section, which lowers the greatest K
 */
export function flexure(section: BendingSection, momentNmm: number, redistributedShare: number, strengths: Strengths): Flexure {
  const { fcuMpa, fyMpa, steelShare } = strengths
  return flexureByBlock(section, momentNmm, {
    ...BLOCK,
    strengthMpa: fcuMpa,
    strengthSymbol: 'fcu',
    steelShare,
    steelMpa: fyMpa,
    steelSymbol: 'fy',
    greatestLeverArm: GREATEST_LEVER_ARM,
    greatestK: greatestK(redistributedShare),
    clause: section.flange ? 'BS 8110-1 3.4.4.4, 3.4.4.5' : 'BS 8110-1 3.4.4.4',
  })
}
