import type { BarDiameter } from '../../contracts/appraisal'
import type { EndOfSpan } from '../analysis/spanForces'
import { anchoredEnd, type BarEnd, bottomBarEnd } from '../bars/barEnds'
import type { BarLines, BarPiece } from '../bars/barLines'
import type { CodeBasis } from '../codeBasis'
import type { RibLineEnds } from './ribEnds'
import { type RibContext, topReachMm } from './ribContext'
import type { RibbedPanel } from './ribbedPanel'

/** What lengths of rib bars depend on beside the panel. */
export interface RibBarRules {
  readonly basis: CodeBasis
  readonly coverMm: number
  readonly trimmerMm: number
  readonly heightMm: number
  readonly stockMm: number
}

/**
 * Bottom bars of every rib of a panel: clear length, and past each face into the support or the trimmer.
 *
 * Source: by the basis, `bottomEnd` and `lapMm`; lengths by engine design section 4
 */
export function bottomLines(panel: RibbedPanel, diameter: BarDiameter, each: number, rules: RibBarRules): BarLines {
  const { basis, heightMm, stockMm } = rules
  return {
    position: 'bottom, along ribs',
    diameter,
    each,
    lines: 'ribs',
    spacingMm: null,
    pieces: panel.ribs.map((rib) => bottomPiece(panel, rib, diameter, rules)),
    stockMm,
    lapMm: () => basis.lapMm(diameter, { isTop: false, sectionMm: heightMm, isCorner: true }).value,
    clause: basis.bottomEnd(diameter, panel.ends.start, heightMm).clause,
  }
}

/**
 * A bottom bar of one rib.
 *
 * Source: see `bottomBarEnd`
 */
export function bottomPiece({ ends }: RibbedPanel, rib: RibLineEnds, diameter: BarDiameter, rules: RibBarRules): BarPiece {
  const { basis, coverMm, trimmerMm } = rules
  const at = (end: EndOfSpan): BarEnd => {
    const { edge, supportMm } = rib[end]
    if (edge === null) return { pastMm: trimmerMm - coverMm, legMm: 0 }
    return bottomBarEnd(basis, diameter, { supportMm, isContinuous: ends[end].isContinuous }, rules)
  }
  const [start, end] = [at('start'), at('end')]
  return { parts: [rib.clearMm, start.pastMm, end.pastMm], legs: [start.legMm, end.legMm] }
}

/**
 * Top bars at one end of a panel's ribs, edge by edge: from the middle of a continuous support to 0.3 of the rib past its face; at an
 * edge designed as simple, an anchorage and the basis' share of the span. A rib cut by a void counts as long as the longest, and its bar
 * stops at the void.
 *
 * Source: by the basis, `simpleEdge`, `anchorageMm`; lengths by engine design section 4; for the floor behind see `overSupports`
 * @param context - of the panel, for its span and how far the bars reach
 */
export function topLines(
  { ribs, ends, clearMm }: RibbedPanel,
  end: EndOfSpan,
  diameter: BarDiameter,
  each: number,
  context: RibContext,
  rules: RibBarRules,
): BarLines[] {
  const { basis, heightMm } = rules
  const bond = { isTop: true, sectionMm: heightMm, isCorner: false }
  const anchorageMm = basis.anchorageMm(diameter, bond, 1).value
  const { reach, clause } = basis.simpleEdge.rib
  const isContinuous = ends[end].isContinuous
  const spanAddedMm = context.analysis.spanMm - clearMm
  const pieceOf = (rib: RibLineEnds, edge: number): BarPiece => {
    const { supportMm } = rib[end]
    const isCut = rib[end === 'start' ? 'end' : 'start'].edge === null
    const fullMm = isCut ? clearMm : rib.clearMm
    const roomMm = isCut ? rib.clearMm + rules.trimmerMm - rules.coverMm : Infinity
    if (isContinuous)
      return { parts: [supportMm / 2, Math.min(topReachMm(context, end, fullMm), roomMm)], legs: [0, 0], over: edge }
    const { pastMm, legMm } = anchoredEnd(diameter, anchorageMm, supportMm - rules.coverMm)
    return { parts: [Math.min(reach * (fullMm + spanAddedMm), roomMm), pastMm], legs: [legMm, 0] }
  }
  return ends[end].edges.map((edge) => ({
    position: `top, edge ${edge + 1}`,
    diameter,
    each,
    lines: 'ribs',
    spacingMm: null,
    pieces: ribs.filter((rib) => rib[end].edge === edge).map((rib) => pieceOf(rib, edge)),
    stockMm: rules.stockMm,
    lapMm: () => basis.lapMm(diameter, bond).value,
    clause: isContinuous ? 'common practice' : clause,
  }))
}
