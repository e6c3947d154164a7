import type { BarDiameter, BarLayer } from '../../../contracts/appraisal'
import type { EndOfSpan } from '../../analysis/spanForces'
import { anchoredEnd, bottomBarEnd } from '../../bars/barEnds'
import type { BarPiece } from '../../bars/barLines'
import { totalLengthMm } from '../../bars/barRuns'
import type { BarBond } from '../../codeBasis'
import { BAR_MASS_KG_PER_M } from '../../tables/bars'
import { isHogging, type SlabContext, type TopPlace } from '../slabContext'
import type { StripLayers } from './slabLayer'
import type { SlabAxis } from '../slabPlan'

/**
 * Share of a two-way panel's width that one edge strip takes.
 *
 * Source: BS 8110-1:1997, 3.5.3.5 and Figure 3.9 (middle strips three quarters; from memory, engine design section 4)
 */
export const EDGE_STRIP = 1 / 8

/**
 * Reach of top bars past the face of a continuous support, as a share of the clear span.
 *
 * Source: project rule, common practice of detailing, no source (engine design section 4, lengths)
 */
export const SLAB_TOP_REACH = 0.3

/**
 * Bars that a width takes at a spacing, half a spacing in from either side.
 *
 * Source: project rule, engine design section 4; each bar serves one spacing
 */
export function lineCount(widthMm: number, spacingMm: number): number {
  return Math.max(1, Math.ceil(widthMm / spacingMm - 1e-6))
}

/**
 * A bottom bar along an axis: clear length and past each face; short of a free edge by the cover.
 *
 * Source: see `bottomBarEnd`
 */
export function bottomParts(
  { basis, brief, heightMm }: SlabContext,
  { clearMm, ends }: SlabAxis,
  { diameter }: BarLayer,
): BarPiece {
  const at = (end: EndOfSpan) => bottomBarEnd(basis, diameter, ends[end], { coverMm: brief.cover, heightMm })
  const [start, end] = [at('start'), at('end')]
  return { parts: [clearMm, start.pastMm, end.pastMm], legs: [start.legMm, end.legMm] }
}

/**
 * How far top bars run past the face of a continuous support into a clear length, mm: over the whole of a cantilever, and as far behind it;
 * else the usual share.
 *
 * Source: see SLAB_TOP_REACH; behind a cantilever as long as it: common practice, no source
 */
export function topReachMm({ brief }: SlabContext, { span, end }: TopPlace, clearMm: number): number {
  if (span?.position === 'cantilever') return clearMm - brief.cover
  return Math.max(SLAB_TOP_REACH * clearMm, Math.min(clearMm, span?.ends[end].overhangMm ?? 0))
}

/**
 * A top bar at one end: half the support and 0.3 of the clear span; at an edge taken as simple see `simpleTopPiece`.
 *
 * Source: engine design section 4; for the floor behind see `overSupports`
 */
export function topParts(context: SlabContext, place: TopPlace, { diameter }: BarLayer, clearMm: number): BarPiece {
  const { supportMm } = place.side
  if (isHogging(place)) return { parts: [supportMm / 2, topReachMm(context, place, clearMm)], legs: [0, 0] }
  return simpleTopPiece(context, place, diameter, supportMm)
}

/**
 * A top bar at an edge taken as simple: the basis' share of the span that carries and an anchorage, turned down where the support is too
 * narrow for it.
 *
 * Source: by the basis, `anchorageMm` and `simpleEdge`
 * @param supportMm - width of the support along the bar
 * @param roomMm - from its face to a void, less the cover
 */
export function simpleTopPiece(
  { basis, analysis, heightMm, brief }: SlabContext,
  { span }: TopPlace,
  diameter: BarDiameter,
  supportMm: number,
  roomMm = Infinity,
): BarPiece {
  const { spanMm } = span ?? analysis.short
  const anchorageMm = basis.anchorageMm(diameter, slabBond(heightMm, true), 1).value
  const { pastMm, legMm } = anchoredEnd(diameter, anchorageMm, supportMm - brief.cover)
  return { parts: [Math.min(basis.simpleEdge.slab.reach * spanMm, roomMm), pastMm], legs: [legMm, 0] }
}

/**
 * What the bond of a slab's bars depends on.
 *
 * Source: by the basis, `anchorageMm` and `lapMm`; bars of slabs do not lie in corners
 */
export function slabBond(heightMm: number, isTop: boolean): BarBond {
  return { isTop, sectionMm: heightMm, isCorner: false }
}

/**
 * Mass of a layer's bars on the panel's rectangle, kg.
 *
 * Source: BS 4449, nominal masses
 * @param widthMm - clear width that the layer covers
 */
export function layerMassKg(context: SlabContext, layer: BarLayer, piece: BarPiece, widthMm: number, isTop: boolean): number {
  const { diameter, spacing } = layer
  const lapMm = () => context.basis.lapMm(diameter, slabBond(context.heightMm, isTop)).value
  const made = { diameter, stockMm: context.brief.stockLength, lapMm }
  const lengthMm = totalLengthMm({ ...made, pieces: [piece], each: lineCount(widthMm, spacing) })
  return (lengthMm * BAR_MASS_KG_PER_M[diameter]) / 1000
}

/**
 * Mass of middle and edge strips together, kg.
 *
 * Source: as `layerMassKg`
 */
export function stripsMassKg(
  context: SlabContext,
  { middle, edge }: StripLayers,
  piece: BarPiece,
  widthMm: number,
  isTop: boolean,
): number {
  if (!edge) return layerMassKg(context, middle, piece, widthMm, isTop)
  return (
    layerMassKg(context, middle, piece, (1 - 2 * EDGE_STRIP) * widthMm, isTop) +
    2 * layerMassKg(context, edge, piece, EDGE_STRIP * widthMm, isTop)
  )
}
