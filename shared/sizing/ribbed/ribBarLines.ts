import type { BarDiameter } from '../../contracts/appraisal'
import type { EndOfSpan } from '../analysis/spanForces'
import { type BarLines, pastFaceMm } from '../bars/barRuns'
import type { CodeBasis } from '../codeBasis'
import type { LineEndOnEdge } from '../bars/lineEndAt'
import { TOP_REACH } from './ribContext'
import type { RibbedPanel } from './ribbedPanel'

/** What lengths of rib bars depend on beside the panel. */
export interface RibBarRules {
  readonly basis: CodeBasis
  readonly coverMm: number
  readonly trimmerMm: number
  readonly heightMm: number
}

/** A section deeper than this has poor bond at its top, mm. Source: EN 1992-1-1:2004, 8.4.2, Figure 8.2 */
const GOOD_BOND_MM = 250

/**
 * Bottom bars of every rib of a panel: clear length, and past each face into the support or the trimmer.
 *
 * Source: by the basis, `lapMm`; lengths by engine design section 4
 */
export function bottomLines({ ribs }: RibbedPanel, diameter: BarDiameter, each: number, rules: RibBarRules): BarLines {
  const past = ({ edge, supportMm }: LineEndOnEdge) =>
    edge === null ? rules.trimmerMm - rules.coverMm : pastFaceMm(diameter, supportMm, rules.coverMm)
  return {
    position: 'bottom, along ribs',
    diameter,
    each,
    lines: 'ribs',
    pieces: ribs.map(({ clearMm, start, end }) => [clearMm, past(start), past(end)]),
    lapMm: () => rules.basis.lapMm(diameter, false).value,
    clause: 'EN 1992-1-1 9.3.1.2(1)',
  }
}

/**
 * Top bars at one end of a panel's ribs, edge by edge: from the middle of a continuous support to 0.3 of the rib past its face; at an
 * edge designed as simple, an anchorage and the basis' share of the span.
 *
 * Source: by the basis, `simpleEdge`, `anchorageMm`; lengths by engine design section 4 (each panel counts its half)
 * @param spanAddedMm - what the effective span has over the clear one
 */
export function topLines(
  { ribs, ends }: RibbedPanel,
  end: EndOfSpan,
  diameter: BarDiameter,
  each: number,
  spanAddedMm: number,
  rules: RibBarRules,
): BarLines[] {
  const { basis, heightMm } = rules
  const isPoor = heightMm > GOOD_BOND_MM
  const anchorage = basis.anchorageMm(diameter, isPoor, 1)
  const { reach, clause } = basis.simpleEdge
  const isContinuous = ends[end].isContinuous
  return ends[end].edges.map((edge) => ({
    position: `top, edge ${edge + 1}`,
    diameter,
    each,
    lines: 'ribs',
    pieces: ribs
      .filter((rib) => rib[end].edge === edge)
      .map((rib) =>
        isContinuous ? [rib[end].supportMm / 2, TOP_REACH * rib.clearMm] : [anchorage.value, reach * (rib.clearMm + spanAddedMm)],
      ),
    lapMm: () => basis.lapMm(diameter, isPoor).value,
    clause: isContinuous ? 'common practice' : clause,
  }))
}
