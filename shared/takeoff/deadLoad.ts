import type { Scheme } from '../contracts/appraisal'
import type { DeadLoad } from '../contracts/appraisalResult'
import { toKn, toM2 } from '../units'
import { concreteSplit } from './concrete'
import { type MeasuredPanel, repeatsOf } from './measuredPanel'
import type { MeasurementRules } from './measurementRules'

/** Source: EN 1991-1-1:2002, Table A.1: normal weight concrete 24 kN/m³, reinforced + 1 */
export const REINFORCED_CONCRETE_KN_PER_M3 = 25

/**
 * Weight of a scheme's concrete and blocks: in all, kN, repeats in, and over the gross area, kN/m². Cut blocks weigh by length.
 *
 * Source: EN 1991-1-1:2002, Table A.1 for concrete; blocks by their mass
 */
export function deadLoadOf(panels: readonly MeasuredPanel[], scheme: Scheme, rules: MeasurementRules): DeadLoad {
  const concreteM3 = Object.values(concreteSplit(panels, scheme, rules)).reduce((sum, volume) => sum + volume, 0)
  const blocksKg = panels.reduce((sum, measured) => sum + blockMassKg(measured, scheme) * repeatsOf(measured), 0)
  const total = concreteM3 * REINFORCED_CONCRETE_KN_PER_M3 + toKn(blocksKg)
  return { total, perArea: total / grossAreaM2(panels) }
}

/** Area of the floor to support centre-lines, m², repeats in. */
export function grossAreaM2(panels: readonly MeasuredPanel[]): number {
  return panels.reduce((sum, measured) => sum + toM2(measured.sized.areas.gross) * repeatsOf(measured), 0)
}

/** Mass of the blocks of one panel without repeats, kg; cut blocks weigh by length. */
export function blockMassKg({ sized: { layout } }: MeasuredPanel, scheme: Scheme): number {
  if (scheme.kind === 'solid' || !layout) return 0
  return (layout.blocksWhole + layout.cutLength / scheme.block.length) * scheme.block.mass
}
