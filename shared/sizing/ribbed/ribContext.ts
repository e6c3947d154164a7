import type { BarDiameter } from '../../contracts/appraisal'
import type { EndOfSpan } from '../analysis/spanForces'
import { topBarReachMm, type TopReach } from '../bars/topReach'
import type { CodeBasis } from '../codeBasis'
import type { LineEnd } from '../analysis/levelStrips'
import type { RibAnalysis } from './ribAnalysis'
import type { RibSection } from './ribSection'

/** Everything the checks of one ribbed panel look at. Forces per metre of width become those of a rib by `perRib`. */
export interface RibContext {
  readonly basis: CodeBasis
  readonly section: RibSection
  readonly analysis: RibAnalysis
  readonly ends: Readonly<Record<EndOfSpan, LineEnd>>
  readonly clearMm: number
  readonly solidZoneMm: number
  readonly fireMinutes: number
  readonly carriesPartitions: boolean
}

/** Largest aggregate that is placed between blocks, mm. Source: project rule, small aggregate in ribs, common practice, no source */
export const RIB_AGGREGATE_MM = 10

/**
 * How far top bars run past the face of an end into ribs of a clear length, mm: over the whole of a cantilever, else as `topBarReachMm`.
 *
 * Source: see `topBarReachMm`
 */
export function topReachMm(
  { analysis, section, basis }: Pick<RibContext, 'analysis' | 'section' | 'basis'>,
  end: EndOfSpan,
  clearMm: number,
  diameter: BarDiameter,
): number {
  if (analysis.position === 'cantilever') return clearMm - section.coverMm
  return topBarReachMm(topReachOf({ analysis, section, basis }, end, clearMm, diameter))
}

/**
 * What the reach of top bars over an end depends on.
 *
 * Source: see `topBarReachMm`
 */
export function topReachOf(
  { analysis, section, basis }: Pick<RibContext, 'analysis' | 'section' | 'basis'>,
  end: EndOfSpan,
  clearMm: number,
  diameter: BarDiameter,
): TopReach {
  return {
    basis,
    diameter,
    depthMm: section.heightMm - section.coverMm - section.linkMm,
    bond: { isTop: true, sectionMm: section.heightMm, isCorner: false },
    clearMm,
    hoggingShare: analysis.hoggingShares[end],
    overhangMm: analysis.overhangMm[end],
  }
}

/**
 * A force or moment per metre of width as that of one rib.
 *
 * Source: statics, a rib carries the width of its spacing
 */
export function perRib({ section }: RibContext, perMetre: number): number {
  return (perMetre * section.spacingMm) / 1000
}

/**
 * Distance from the line of support to the inner face of the solid zone, mm.
 *
 * Source: project rule, engine design section 4 (shear at the solid zone's inner face)
 */
export function zoneFaceMm({ analysis, solidZoneMm }: RibContext, end: EndOfSpan): number {
  return analysis.faceMm[end] + solidZoneMm
}

/**
 * How an end is named in workings: by the edges it bears on, numbered from 1.
 *
 * Source: project rule
 */
export function endName({ ends }: Pick<RibContext, 'ends'>, end: EndOfSpan): string {
  const { edges } = ends[end]
  return `edge${edges.length > 1 ? 's' : ''} ${edges.map((edge) => edge + 1).join(', ')}`
}
