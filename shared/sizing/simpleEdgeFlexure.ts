import type { BendingSection, CodeBasis, Flexure, Member, TensionZone } from './codeBasis'
import { figure } from './figure'

/** Sections at the depth of the top bars: where they hog, and at midspan with its moment, N·mm ≥ 0; `zone` for least steel. */
interface SimpleEdgeSections {
  readonly hogging: BendingSection
  readonly sagging: BendingSection
  readonly midspanNmm: number
  readonly zone: TensionZone
}

/**
 * Top steel at an edge designed as simple: for a share of the midspan moment, or a share of the steel that the midspan moment needs at
 * the depth of the top bars, by the basis; no less than the least steel where the basis says so.
 *
 * Source: by the basis, `simpleEdge`, `flexure`, `leastSteelMm2`
 */
export function simpleEdgeFlexure(
  basis: CodeBasis,
  member: Member,
  { hogging, sagging, midspanNmm, zone }: SimpleEdgeSections,
): Flexure {
  const { share, of, isAtLeastLeast } = basis.simpleEdge[member]
  const byMoment = of === 'moment'
  const flexure = byMoment ? basis.flexure(hogging, share * midspanNmm, 0) : basis.flexure(sagging, midspanNmm, 0)
  const sharedMm2 = byMoment ? flexure.requiredMm2 : share * flexure.requiredMm2
  const least = isAtLeastLeast ? basis.leastSteelMm2(zone) : null
  const isLeast = least !== null && least.value > sharedMm2
  return {
    ...flexure,
    requiredMm2: isLeast ? least.value : sharedMm2,
    steelWorking: () =>
      byMoment
        ? `${share} of the midspan moment; ${flexure.steelWorking()}`
        : `${share} of the midspan steel, ${flexure.steelWorking()}: ${figure(sharedMm2, 0)} mm²${isLeast ? `, but ${least.working()}` : ''}`,
  }
}
