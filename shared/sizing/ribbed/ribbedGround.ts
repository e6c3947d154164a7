import type { RibbedScheme } from '../../contracts/appraisal'
import { frameAt } from '../../geometry/frame'
import type { Point } from '../../geometry/point'
import type { AlignedRows } from '../../layout/alignedRows'
import { type LayoutGround, layoutGround } from '../../layout/layoutGround'
import { OutOfScopeError } from '../../outOfScope'
import { edgesLengthMm, endBeyond } from '../analysis/endBeyond'
import type { LineEnd } from '../analysis/levelStrips'
import type { EndOfSpan } from '../analysis/spanForces'
import type { PanelSite } from '../panelSite'
import { type RibLineEnds, ribLineEnds } from './ribEnds'

/** What of a ribbed panel does not depend on its solid zones: rows and ribs, and what they bear on. */
export interface RibbedGround {
  /** The panel it was made for, in whose place `layout` lies. */
  readonly site: PanelSite
  readonly layout: LayoutGround
  readonly ribs: readonly RibLineEnds[]
  readonly direction: Point
  readonly ends: Readonly<Record<EndOfSpan, LineEnd>>
  /** Free at one end. */
  readonly isCantilever: boolean
}

/**
 * Ribs of a panel with their ends.
 *
 * Source: project rule, engine design section 2
 * @param rows - where they stand on a grid in common with neighbours
 * @throws OutOfScopeError `outline` where no row of blocks fits
 */
export function ribbedGround(site: PanelSite, scheme: RibbedScheme, rows: AlignedRows | null): RibbedGround {
  const layout = layoutGround(site.panel, scheme, rows?.starts)
  const ribs = ribLineEnds(site, layout)
  if (layout.longestRib === 0 || ribs.length === 0)
    throw new OutOfScopeError('outline', 'no row of blocks fits: expected a wider panel, smaller blocks or another rib direction')
  const ends = { start: lineEnd(site, ribs, 'start'), end: lineEnd(site, ribs, 'end') }
  return {
    site,
    layout,
    ribs,
    direction: frameAt([0, 0], site.panel.ribDirection).toLevel([1, 0]),
    ends,
    isCantilever: ends.start.isFree || ends.end.isFree,
  }
}

/** One end of the panel's ribs as a whole: continuous only where every edge they end on is; the widest support counts. */
function lineEnd(site: PanelSite, ribs: readonly RibLineEnds[], end: EndOfSpan): LineEnd {
  const { edges } = site
  const borne = ribs.map((rib) => rib[end]).filter(({ edge }) => edge !== null)
  const numbers = [...new Set(borne.map(({ edge }) => edge!))].sort((a, b) => a - b)
  return {
    edges: numbers,
    supportMm: Math.max(0, ...borne.map(({ supportMm }) => supportMm)),
    isContinuous: numbers.length > 0 && numbers.every((edge) => edges[edge]!.continuity === 'continuous'),
    isFree: numbers.some((edge) => edges[edge]!.continuity === 'free'),
    supportLengthMm: edgesLengthMm(site, numbers),
    beyond: endBeyond(site, numbers),
  }
}
