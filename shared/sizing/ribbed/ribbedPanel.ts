import type { Brief, GivenRibbedPanel, RibbedScheme } from '../../contracts/appraisal'
import type { Point } from '../../geometry/point'
import { signedArea } from '../../geometry/ring'
import { layOutPanel } from '../../layout/layOutPanel'
import type { AlignedRows } from '../../layout/alignedRows'
import type { LayoutGround } from '../../layout/layoutGround'
import type { PanelLayout } from '../../layout/panelLayout'
import { type FloorLoads, floorLoads, selfWeightKnPerM2 } from '../actions'
import type { LineEnd } from '../analysis/levelStrips'
import type { EndOfSpan } from '../analysis/spanForces'
import type { CodeBasis } from '../codeBasis'
import { figure } from '../figure'
import type { PanelSite } from '../panelSite'
import type { RibLineEnds } from './ribEnds'
import type { RibbedGround } from './ribbedGround'

/** Where the bars of a panel's ribs come from. */
export type RibBarChoice = Pick<RibbedScheme, 'ribBars' | 'topBars'>

/** A ribbed panel laid out with one width of solid zone, before it is analysed: what does not depend on where it stands. */
export interface RibbedPanel {
  /** As `shapeKey`, with the zone. */
  readonly key: string
  /** Without the zone. */
  readonly shapeKey: string
  readonly ribs: readonly RibLineEnds[]
  readonly direction: Point
  readonly clearMm: number
  readonly ends: Readonly<Record<EndOfSpan, LineEnd>>
  readonly isCantilever: boolean
  readonly loads: FloorLoads
  readonly grossMm2: number
  readonly solidZoneMm: number
  /** Bars given to this panel, else to every panel of the scheme; or computed. */
  readonly bars: RibBarChoice
  readonly rows: AlignedRows | null
  /** The panel it was laid out for, and how. */
  readonly site: PanelSite
  readonly layout: PanelLayout
}

/**
 * A panel laid out with a solid zone of a given width.
 *
 * Source: project rule, engine design section 2
 * @param ground - of this very panel, where it is known
 */
export function laidOut(
  site: PanelSite,
  scheme: RibbedScheme,
  basis: CodeBasis,
  solidZoneMm: number,
  ground?: LayoutGround,
): PanelLayout {
  const crossRibs = basis.crossRibSpacingMm(scheme.block.height + scheme.topping)?.value ?? null
  return layOutPanel(site.panel, scheme, solidZoneMm, crossRibs, site.sharedEdges, ground)
}

/** A panel of a level as it asks to be laid out: `key` as `shapeKey`; `given` bars of this panel alone. */
export interface RibbedShape {
  readonly site: PanelSite
  readonly given: GivenRibbedPanel | undefined
  /** On a grid in common with neighbours; null: its own. */
  readonly rows: AlignedRows | null
  readonly key: string
}

/**
 * A panel laid out, with its rib ends and loads.
 *
 * Source: project rule, engine design sections 2 and 4 (self-weight of all concrete and blocks inside the clear outline)
 */
export function ribbedPanel(
  { given, key, rows }: RibbedShape,
  { site, ribs, direction, ends, isCantilever, layout: ground }: RibbedGround,
  scheme: RibbedScheme,
  brief: Brief,
  basis: CodeBasis,
  solidZoneMm: number,
): RibbedPanel {
  const layout = laidOut(site, scheme, basis, solidZoneMm, ground)
  const { length, width, height, mass } = scheme.block
  const blocksLongMm = layout.blocksWhole * length + layout.cutLength
  const selfWeight = selfWeightKnPerM2(
    layout.netArea,
    height + scheme.topping,
    blocksLongMm * width * height,
    (blocksLongMm / length) * mass,
  )
  return {
    key: `${solidZoneMm} ${key}`,
    shapeKey: key,
    ribs,
    direction,
    clearMm: layout.longestRib,
    ends,
    isCantilever,
    loads: floorLoads(selfWeight, brief),
    grossMm2: signedArea(site.panel.outline),
    solidZoneMm,
    bars: { ribBars: given?.ribBars ?? scheme.ribBars, topBars: given?.topBars ?? scheme.topBars },
    rows,
    site,
    layout,
  }
}

/**
 * The same for panels that differ only in mark, repeat and place.
 *
 * Source: project rule, identical panels are laid out once for sizing
 */
export function shapeKey(
  { panel, edges, sharedEdges }: PanelSite,
  rows: AlignedRows | null,
  given?: Partial<RibBarChoice>,
): string {
  const [originX, originY] = panel.outline[0]!
  const ring = (points: readonly Point[]) => points.map(([x, y]) => `${figure(x - originX, 4)},${figure(y - originY, 4)}`)
  const own = given ? [given.ribBars, given.topBars] : null
  return JSON.stringify([
    panel.ribDirection,
    ring(panel.outline),
    panel.voids.map(ring),
    edges,
    sharedEdges,
    ...(own ? [own] : []),
    ...(rows ? [`rows ${figure(rows.starts[0]!, 4)} ${rows.starts.length} ${rows.fewer}`] : []),
  ])
}

/**
 * Whether some, but not all, edges at one end of the ribs are continuous.
 *
 * Source: project rule, such an end is taken as discontinuous and flagged
 */
export function isMixedEnd({ site, ends }: RibbedPanel, end: EndOfSpan): boolean {
  return !ends[end].isContinuous && ends[end].edges.some((edge) => site.edges[edge]!.continuity === 'continuous')
}
