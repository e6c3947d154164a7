import type { Point } from './point'

/** An edge of one of the rings, lower end first. */
export interface SlabEdge {
  readonly ring: number
  readonly edge: number
  readonly lowX: number
  readonly lowY: number
  readonly highX: number
  readonly highY: number
  /** Change of the ring's winding number on crossing the edge from left to right. */
  readonly winding: 1 | -1
}

/** A level band of the plane in which no two edges cross: its edges from left to right. */
export interface Slab {
  readonly bottom: number
  readonly top: number
  readonly edges: readonly SlabEdge[]
}

/** Heights nearer than this are one, mm: far above rounding, far below any fit. */
const SAME_HEIGHT_MM = 1e-7

/** x of an edge at height y, mm; beyond its ends, that of the end. */
export function xAt(edge: SlabEdge, y: number): number {
  if (y <= edge.lowY) return edge.lowX
  if (y >= edge.highY) return edge.highX
  return edge.lowX + ((edge.highX - edge.lowX) * (y - edge.lowY)) / (edge.highY - edge.lowY)
}

/**
 * The plane cut into level slabs at every vertex and every crossing of the rings, lowest first. Rings may cross each other and
 * themselves. Floating point all through, so that areas are exact to rounding.
 *
 * @param rings - open, mm
 */
export function cutIntoSlabs(rings: readonly (readonly Point[])[]): Slab[] {
  const edges = rings.flatMap((ring, index) => risingEdges(ring, index)).sort((a, b) => a.lowY - b.lowY)
  const heights = distinct([...edges.flatMap(({ lowY, highY }) => [lowY, highY]), ...crossingHeights(edges)])
  const slabs: Slab[] = []
  let open: SlabEdge[] = []
  let next = 0
  for (let i = 0; i + 1 < heights.length; i += 1) {
    const [bottom, top] = [heights[i]!, heights[i + 1]!]
    const middle = (bottom + top) / 2
    open = open.filter(({ highY }) => highY > middle)
    for (; next < edges.length && edges[next]!.lowY < middle; next += 1) if (edges[next]!.highY > middle) open.push(edges[next]!)
    if (open.length > 0) slabs.push({ bottom, top, edges: sortedAt(open, middle) })
  }
  return slabs
}

function risingEdges(ring: readonly Point[], index: number): SlabEdge[] {
  return ring.flatMap(([ax, ay], edge): SlabEdge[] => {
    const [bx, by] = ring[(edge + 1) % ring.length]!
    if (ay === by) return []
    return ay < by
      ? [{ ring: index, edge, lowX: ax, lowY: ay, highX: bx, highY: by, winding: -1 }]
      : [{ ring: index, edge, lowX: bx, lowY: by, highX: ax, highY: ay, winding: 1 }]
  })
}

/** Heights at which two edges cross between their ends. */
function crossingHeights(edges: readonly SlabEdge[]): number[] {
  const heights: number[] = []
  for (let i = 0; i < edges.length; i += 1) {
    const a = edges[i]!
    for (let j = i + 1; j < edges.length && edges[j]!.lowY < a.highY; j += 1) {
      const b = edges[j]!
      const [bottom, top] = [b.lowY, Math.min(a.highY, b.highY)]
      const [below, above] = [xAt(a, bottom) - xAt(b, bottom), xAt(a, top) - xAt(b, top)]
      if ((below < 0 && above > 0) || (below > 0 && above < 0)) heights.push(bottom + ((top - bottom) * below) / (below - above))
    }
  }
  return heights
}

function distinct(heights: number[]): number[] {
  heights.sort((a, b) => a - b)
  return heights.filter((height, i) => i === 0 || height - heights[i - 1]! > SAME_HEIGHT_MM)
}

function sortedAt(edges: readonly SlabEdge[], y: number): SlabEdge[] {
  return edges
    .map((edge) => ({ edge, x: xAt(edge, y) }))
    .sort((a, b) => a.x - b.x)
    .map(({ edge }) => edge)
}
