import type { BarDiameter, BarLayer, Brief, SolidScheme } from '../../contracts/appraisal'
import type { EndOfSpan } from '../analysis/spanForces'
import type { CodeBasis } from '../codeBasis'
import { endName } from '../ribbed/ribContext'
import { depthLeft } from '../sectionDepth'
import type { EndForces, SlabAnalysis, SlabSpan } from './slabAnalysis'
import type { SlabAxis, SlabPlan, SlabSide } from './slabPlan'

/** Everything the checks of one solid panel look at, per metre of width. */
export interface SlabContext {
  readonly basis: CodeBasis
  readonly brief: Brief
  readonly given: Exclude<SolidScheme['bars'], 'computed'> | null
  readonly plan: SlabPlan
  readonly analysis: SlabAnalysis
  readonly heightMm: number
  /** As `topPlaces`. */
  readonly places: readonly TopPlace[]
}

/** Width that forces and steel are per, mm. */
export const METRE_MM = 1000

/**
 * Effective depth of a layer, mm: nearest the face, or inside bars of the other direction.
 *
 * Source: engine design section 3 (dy = dx − φ); cover is to the outermost bar
 * @param outer - diameter of the bars between the layer and the face; null for the outermost layer
 */
export function layerDepthMm({ heightMm, brief }: SlabContext, diameter: BarDiameter, outer: BarDiameter | null): number {
  return depthLeft(heightMm, brief.cover + (outer ?? 0) + diameter / 2)
}

/** A place on a slab's top: one end of one direction. */
export interface TopPlace {
  readonly direction: 'short' | 'long'
  readonly end: EndOfSpan
  readonly side: SlabSide
  /** Span that carries there; null across a one-way panel. */
  readonly span: SlabSpan | null
}

/**
 * The four ends at which a panel has top bars: supported ones only.
 *
 * Source: project rule, engine design section 4
 */
export function topPlaces({ short, long, other }: SlabAnalysis): TopPlace[] {
  const at = (direction: 'short' | 'long', end: EndOfSpan, side: SlabSide, span: SlabSpan | null): TopPlace[] =>
    side.isFree ? [] : [{ direction, end, side, span }]
  return (['start', 'end'] as const).flatMap((end) => [
    ...at('short', end, short.axis.ends[end], short),
    ...at('long', end, other.ends[end], long),
  ])
}

/**
 * Whether top bars at a place are designed for a hogging moment, not for the share that edges taken as simple get.
 *
 * Source: project rule, engine design section 4
 */
export function isHogging({ side, span }: TopPlace): boolean {
  return side.isContinuous && span !== null
}

/**
 * Whether a panel carries two ways with its corners held down, and so in strips and with torsion at its corners.
 *
 * Source: BS 8110-1:1997, 3.5.3.4, 3.5.3.5 (corners held) against 3.5.3.3 (corners may lift)
 */
export function hasHeldCorners({ analysis }: Pick<SlabContext, 'analysis'>): boolean {
  return analysis.long !== null && analysis.panelCase !== null
}

/**
 * How a place is named in workings.
 *
 * Source: project rule
 */
export function placeName({ direction, side, end }: TopPlace): string {
  return `${direction} span, ${endName({ ends: { start: side, end: side } }, end)}`
}

/**
 * Layer given for the top at a place, null where the engine chooses.
 *
 * Source: project rule, given X is the direction spanned first
 */
export function givenTop({ given }: SlabContext, { direction }: TopPlace): BarLayer | null {
  return (direction === 'short' ? given?.topX : given?.topY) ?? null
}

/**
 * The same for panels of one scheme that are reinforced alike.
 *
 * Source: project rule, identical panels are sized once
 */
export function slabKey({ heightMm, given, analysis }: SlabContext): string {
  const { short, long, other, aspect, method, panelCase } = analysis
  const endKey = ({ hoggingNmm, shearN, overhangMm }: EndForces) => [hoggingNmm, shearN, overhangMm]
  const spanKey = (span: SlabSpan | null) => {
    if (span === null) return null
    const { spanMm, position, redistributedShare, saggingNmm, ends } = span
    return [spanMm, position, redistributedShare, saggingNmm, endKey(ends.start), endKey(ends.end)]
  }
  const axisKey = ({ clearMm, ends }: SlabAxis) => [clearMm, ends]
  const round = (_: string, value: unknown) => (typeof value === 'number' ? Number(value.toPrecision(10)) : value)
  const forces = [spanKey(short), spanKey(long), axisKey(short.axis), axisKey(other), aspect, method, panelCase]
  return JSON.stringify([heightMm, given, forces], round)
}
