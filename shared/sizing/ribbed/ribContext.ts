import type { EndOfSpan } from '../analysis/spanForces'
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
 * Reach of top bars over a continuous support past its face, as a share of the clear span.
 *
 * Source: project rule, common practice of detailing, no source (engine design section 4, lengths)
 */
export const TOP_REACH = 0.3

/**
 * How far top bars run past the face of an end into ribs of a clear length, mm: over the whole of a cantilever, and as far behind it; else
 * the usual share.
 *
 * Source: see TOP_REACH; behind a cantilever as long as it: common practice, no source
 */
export function topReachMm(
  { analysis, section }: Pick<RibContext, 'analysis' | 'section'>,
  end: EndOfSpan,
  clearMm: number,
): number {
  if (analysis.position === 'cantilever') return clearMm - section.coverMm
  return Math.max(TOP_REACH * clearMm, Math.min(clearMm, analysis.overhangMm[end]))
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
