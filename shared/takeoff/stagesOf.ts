import type { ItemCode } from '../contracts/appraisal'
import type { Stage } from '../contracts/measurement'
import type { MeasuredPanel } from './measuredPanel'
import type { MeasurementRules, Stages } from './measurementRules'

/** What a panel has of each dimension that stages go by, mm. */
const DIMENSION_MM: Readonly<Record<Stage['of'], (measured: MeasuredPanel) => number>> = {
  thickness: ({ sized }) => sized.depth,
  edgeDepth: ({ sized }) => sized.depth,
  proppingHeight: ({ level }) => level.proppingHeight,
}
const ORDER: readonly Stage['of'][] = ['thickness', 'edgeDepth', 'proppingHeight']

/** The stages that an item of one panel is billed under; none where the rules do not bill the item by stages. */
export function stagesOf(item: ItemCode, measured: MeasuredPanel, { stages }: MeasurementRules): Stage[] {
  const asked = stages[item] ?? {}
  return ORDER.flatMap((of) => {
    const bounds = asked[of]
    return bounds === undefined ? [] : [{ of, ...stageAt(DIMENSION_MM[of](measured), bounds) }]
  })
}

/**
 * The stage that a dimension falls in, mm; a bound belongs to the stage below it.
 *
 * @param dimensionMm - ≥ 0
 */
export function stageAt(dimensionMm: number, { boundsMm, thenEveryMm }: Stages): Pick<Stage, 'over' | 'upTo'> {
  const at = boundsMm.findIndex((bound) => dimensionMm <= bound)
  if (at >= 0) return { over: boundsMm[at - 1] ?? 0, upTo: boundsMm[at]! }
  const last = boundsMm.at(-1) ?? 0
  if (thenEveryMm === undefined) return { over: last, upTo: null }
  const over = last + (Math.ceil((dimensionMm - last) / thenEveryMm) - 1) * thenEveryMm
  return { over, upTo: over + thenEveryMm }
}
