import type { Brief, RibbedScheme } from '../../contracts/appraisal'
import type { Point } from '../../geometry/point'
import { frameAt } from '../../geometry/frame'
import { layOutPanel } from '../../layout/layOutPanel'
import type { PanelLayout } from '../../layout/panelLayout'
import { OutOfScopeError } from '../../outOfScope'
import { type FloorLoads, floorLoads, selfWeightKnPerM2 } from '../actions'
import type { LineEnd } from '../analysis/levelStrips'
import type { EndOfSpan } from '../analysis/spanForces'
import type { CodeBasis } from '../codeBasis'
import type { PanelSite } from '../panelSite'
import { type RibLineEnds, ribLineEnds } from './ribEnds'

/** A ribbed panel laid out with one width of solid zone, before it is analysed. */
export interface RibbedPanel {
  readonly site: PanelSite
  readonly layout: PanelLayout
  readonly ribs: readonly RibLineEnds[]
  readonly direction: Point
  readonly clearMm: number
  readonly ends: Readonly<Record<EndOfSpan, LineEnd>>
  readonly loads: FloorLoads
}

/**
 * A panel laid out with a solid zone of a given width, with its rib ends and loads.
 *
 * Source: project rule, engine design sections 2 and 4 (self-weight of all concrete and blocks inside the clear outline)
 * @throws OutOfScopeError `ribDirection` where no row of blocks fits, `edges` where ribs end on a free edge
 */
export function ribbedPanel(site: PanelSite, scheme: RibbedScheme, brief: Brief, basis: CodeBasis, solidZoneMm: number): RibbedPanel {
  const depthMm = scheme.block.height + scheme.topping
  const crossRibs = basis.crossRibSpacingMm(depthMm)?.value ?? null
  const layout = layOutPanel(site.panel, scheme, solidZoneMm, crossRibs, site.sharedEdges)
  const ribs = ribLineEnds(site, layout)
  if (layout.longestRib === 0 || ribs.length === 0)
    throw new OutOfScopeError('outline', 'no row of blocks fits: expected a wider panel, smaller blocks or another rib direction')
  const { length, width, height, mass } = scheme.block
  const blocksLongMm = layout.blocksWhole * length + layout.cutLength
  const selfWeight = selfWeightKnPerM2(
    layout.areas.clear - layout.areas.voids,
    depthMm,
    blocksLongMm * width * height,
    (blocksLongMm / length) * mass,
  )
  return {
    site,
    layout,
    ribs,
    direction: frameAt([0, 0], site.panel.ribDirection).toLevel([1, 0]),
    clearMm: layout.longestRib,
    ends: { start: lineEnd(site, ribs, 'start'), end: lineEnd(site, ribs, 'end') },
    loads: floorLoads(selfWeight, brief),
  }
}

/** One end of the panel's ribs as a whole: continuous only where every edge they end on is; the widest support counts. */
function lineEnd({ edges }: PanelSite, ribs: readonly RibLineEnds[], end: EndOfSpan): LineEnd {
  const borne = ribs.map((rib) => rib[end]).filter(({ edge }) => edge !== null)
  const numbers = [...new Set(borne.map(({ edge }) => edge!))].sort((a, b) => a - b)
  return {
    edges: numbers,
    supportMm: Math.max(0, ...borne.map(({ supportMm }) => supportMm)),
    isContinuous: numbers.length > 0 && numbers.every((edge) => edges[edge]!.continuity === 'continuous'),
  }
}

/**
 * Whether some, but not all, edges at one end of the ribs are continuous.
 *
 * Source: project rule, such an end is taken as discontinuous and flagged
 */
export function isMixedEnd({ site, ends }: RibbedPanel, end: EndOfSpan): boolean {
  return !ends[end].isContinuous && ends[end].edges.some((edge) => site.edges[edge]!.continuity === 'continuous')
}
