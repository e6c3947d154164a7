import type { Brief, GivenRibbedPanel, RibbedScheme } from '../../contracts/appraisal'
import { frameAt } from '../../geometry/frame'
import type { Point } from '../../geometry/point'
import { layOutPanel } from '../../layout/layOutPanel'
import type { PanelLayout } from '../../layout/panelLayout'
import { OutOfScopeError } from '../../outOfScope'
import { type FloorLoads, floorLoads, selfWeightKnPerM2 } from '../actions'
import type { LineEnd } from '../analysis/levelStrips'
import type { EndOfSpan } from '../analysis/spanForces'
import type { CodeBasis } from '../codeBasis'
import { figure } from '../figure'
import type { PanelSite } from '../panelSite'
import { type RibLineEnds, ribLineEnds } from './ribEnds'

/** Where the bars of a panel's ribs come from. */
export type RibBarChoice = Pick<RibbedScheme, 'ribBars' | 'topBars'>

/** A ribbed panel laid out with one width of solid zone, before it is analysed: what does not depend on where it stands. */
export interface RibbedPanel {
  /** As `shapeKey`. */
  readonly key: string
  readonly ribs: readonly RibLineEnds[]
  readonly direction: Point
  readonly clearMm: number
  readonly ends: Readonly<Record<EndOfSpan, LineEnd>>
  readonly loads: FloorLoads
  readonly grossMm2: number
  readonly solidZoneMm: number
  /** Bars given to this panel, else to every panel of the scheme; or computed. */
  readonly bars: RibBarChoice
  /** The panel it was laid out for, and how. */
  readonly site: PanelSite
  readonly layout: PanelLayout
}

/**
 * A panel laid out with a solid zone of a given width.
 *
 * Source: project rule, engine design section 2
 */
export function laidOut(site: PanelSite, scheme: RibbedScheme, basis: CodeBasis, solidZoneMm: number): PanelLayout {
  const crossRibs = basis.crossRibSpacingMm(scheme.block.height + scheme.topping)?.value ?? null
  return layOutPanel(site.panel, scheme, solidZoneMm, crossRibs, site.sharedEdges)
}

/**
 * A panel laid out, with its rib ends and loads.
 *
 * Source: project rule, engine design sections 2 and 4 (self-weight of all concrete and blocks inside the clear outline)
 * @param given - bars of this panel alone
 * @throws OutOfScopeError `outline` where no row of blocks fits, `edges` where ribs end on a free edge
 */
export function ribbedPanel(
  site: PanelSite,
  scheme: RibbedScheme,
  brief: Brief,
  basis: CodeBasis,
  solidZoneMm: number,
  given?: GivenRibbedPanel,
): RibbedPanel {
  const layout = laidOut(site, scheme, basis, solidZoneMm)
  const ribs = ribLineEnds(site, layout)
  if (layout.longestRib === 0 || ribs.length === 0)
    throw new OutOfScopeError('outline', 'no row of blocks fits: expected a wider panel, smaller blocks or another rib direction')
  const { length, width, height, mass } = scheme.block
  const blocksLongMm = layout.blocksWhole * length + layout.cutLength
  const selfWeight = selfWeightKnPerM2(
    layout.areas.clear - layout.areas.voids,
    height + scheme.topping,
    blocksLongMm * width * height,
    (blocksLongMm / length) * mass,
  )
  return {
    key: shapeKey(site, solidZoneMm, given),
    ribs,
    direction: frameAt([0, 0], site.panel.ribDirection).toLevel([1, 0]),
    clearMm: layout.longestRib,
    ends: { start: lineEnd(site, ribs, 'start'), end: lineEnd(site, ribs, 'end') },
    loads: floorLoads(selfWeight, brief),
    grossMm2: layout.areas.gross,
    solidZoneMm,
    bars: { ribBars: given?.ribBars ?? scheme.ribBars, topBars: given?.topBars ?? scheme.topBars },
    site,
    layout,
  }
}

/**
 * The same for panels that differ only in mark, repeat and place.
 *
 * Source: project rule, identical panels are laid out once for sizing
 */
export function shapeKey({ panel, edges, sharedEdges }: PanelSite, solidZoneMm: number, given?: Partial<RibBarChoice>): string {
  const [originX, originY] = panel.outline[0]!
  const ring = (points: readonly Point[]) => points.map(([x, y]) => `${figure(x - originX, 4)},${figure(y - originY, 4)}`)
  const own = given ? [given.ribBars, given.topBars] : null
  return JSON.stringify([
    solidZoneMm,
    panel.ribDirection,
    ring(panel.outline),
    panel.voids.map(ring),
    edges,
    sharedEdges,
    ...(own ? [own] : []),
  ])
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
