import type { BarDiameter } from '../../../contracts/appraisal'
import type { EndOfSpan } from '../../analysis/spanForces'
import { type BarEnd, bottomBarEnd } from '../../bars/barEnds'
import type { SlabContext } from '../slabContext'
import type { SlabAxis } from '../slabPlan'
import type { SlabLine } from './slabLines'

/**
 * How a bottom bar ends at one end of its line: at a support, or short of a void by the cover.
 *
 * Source: see `bottomBarEnd`
 */
export function bottomLineEnd(
  { basis, brief, heightMm }: SlabContext,
  axis: SlabAxis,
  line: SlabLine,
  end: EndOfSpan,
  diameter: BarDiameter,
): BarEnd {
  const { edge, supportMm } = line[end]
  const support = { supportMm: edge === null ? 0 : supportMm, isContinuous: axis.ends[end].isContinuous }
  return bottomBarEnd(basis, diameter, support, { coverMm: brief.cover, heightMm })
}
