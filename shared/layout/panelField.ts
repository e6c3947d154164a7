import type { Panel } from '../contracts/appraisal'
import type { Frame } from '../geometry/frame'
import { frameAt } from '../geometry/frame'
import { offsetRing } from '../geometry/offsetRing'
import type { Point } from '../geometry/point'
import type { Region } from '../geometry/region'
import { areaOf, regionWhere } from '../geometry/region'
import { boundsOf, signedArea } from '../geometry/ring'
import type { SlabEdge } from '../geometry/slabs'
import { cutIntoSlabs } from '../geometry/slabs'
import type { ClearOutline } from './clearOutline'
import { panelEdges } from './panelEdges'
import type { RunEnd } from './panelLayout'

/** A panel turned so that its ribs run along x, with what its supports, voids and trimmers leave. Lengths mm, areas mm². */
export interface PanelField {
  readonly frame: Frame
  /** Extent of the clear outline across the ribs. */
  readonly bottom: number
  readonly top: number
  /** Inside the clear outline, voids and trimmers not taken out. */
  readonly clear: Region
  /** Inside the clear outline, clear of voids and trimmers. */
  readonly free: Region
  /** Rings in the local frame: clear outline, voids, voids grown by the trimmer width. */
  readonly outlineRing: readonly Point[]
  readonly voidRings: readonly (readonly Point[])[]
  readonly grownRings: readonly (readonly Point[])[]
  readonly clearArea: number
  readonly voidsArea: number
  readonly trimmersArea: number
  readonly endAt: (edges: readonly SlabEdge[]) => RunEnd
}

/**
 * What the ribs of a panel have to find room in.
 *
 * @param trimmerWidthMm - solid strip around every void, corners mitred
 */
export function panelField(panel: Panel, clear: ClearOutline, trimmerWidthMm: number): PanelField {
  const frame = frameAt(panel.outline[0]!, panel.ribDirection)
  const outlineRing = clear.ring.map(frame.toLocal)
  const voidRings = panel.voids.map((ring) => ring.map(frame.toLocal))
  const grownRings = voidRings.map((ring) => offsetRing(ring, new Array<number>(ring.length).fill(-trimmerWidthMm)).ring)
  const rings = [outlineRing, ...voidRings, ...grownRings]
  const slabs = cutIntoSlabs(rings)
  const holes = voidRings.length
  const inOutline = (windings: readonly number[]) => windings[0]! > 0
  const inVoid = (windings: readonly number[]) => windings.slice(1, 1 + holes).some((winding) => winding > 0)
  const inHole = (windings: readonly number[]) => windings.slice(1).some((winding) => winding > 0)
  const where = (isInside: (windings: readonly number[]) => boolean) => regionWhere(slabs, rings.length, isInside)
  const free = where((windings) => inOutline(windings) && !inHole(windings))
  const { minY: bottom, maxY: top } = boundsOf(outlineRing)
  const clearArea = signedArea(outlineRing)
  const voidsArea = holes === 0 ? 0 : areaOf(where((windings) => inOutline(windings) && inVoid(windings)))
  const trimmersArea = holes === 0 ? 0 : areaOf(where((windings) => inOutline(windings) && inHole(windings) && !inVoid(windings)))
  const continuity = panelEdges(panel).map((edge) => edge.continuity)
  const endAt = (edges: readonly SlabEdge[]): RunEnd => {
    const ofOutline = edges.filter(({ ring }) => ring === 0)
    if (ofOutline.some(({ edge }) => continuity[clear.sources[edge]!] !== 'free')) return 'support'
    return ofOutline.length < edges.length ? 'trimmer' : 'free'
  }
  return {
    frame,
    bottom,
    top,
    clear: where(inOutline),
    free,
    outlineRing,
    voidRings,
    grownRings,
    clearArea,
    voidsArea,
    trimmersArea,
    endAt,
  }
}
