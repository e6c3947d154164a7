import type { Point } from './point'
import { distance, edgeOfRing } from './ring'
import { FIT_TOLERANCE_MM } from './tolerance'

/** Edge of a ring moved sideways: where it now starts and ends. */
export interface MovedEdge {
  readonly start: Point
  readonly end: Point
}

/** A ring whose edges were moved each by its own distance, corners mitred. */
export interface OffsetRing {
  /** Open ring, same direction as the given one; a step is kept where two edges in one line were moved by different amounts. */
  readonly ring: readonly Point[]
  /** For each edge of `ring`, the edge of the given ring that it came from. */
  readonly sources: readonly number[]
  /** For each edge of the given ring, where it went. */
  readonly moved: readonly MovedEdge[]
}

/**
 * Two edges that turn by less than this are taken as one straight line: a difference of support widths between them is a
 * square step at the vertex, not a mitre that runs on for metres. 5 degrees.
 *
 * Source: project rule, the face of a support ends where the support ends
 */
const STRAIGHT_SINE = Math.sin((5 * Math.PI) / 180)

/**
 * Ring with each edge moved to its left by its own distance (inwards when the ring is anticlockwise), corners mitred without limit.
 * The result may cross itself or have edges turned back: `vanishedEdge` tells.
 *
 * @param ring - open, simple, no repeated points, mm
 * @param distancesMm - one for each edge, negative: to the right
 */
export function offsetRing(ring: readonly Point[], distancesMm: readonly number[]): OffsetRing {
  const normals = ring.map((_, i) => leftNormal(...edgeOfRing(ring, i)))
  const corners = ring.map((vertex, i) => {
    const before = (i + ring.length - 1) % ring.length
    return cornersAt(vertex, normals[before]!, normals[i]!, distancesMm[before]!, distancesMm[i]!)
  })
  const points: Point[] = []
  const sources: number[] = []
  corners.forEach(([end, start], i) => {
    const before = (i + ring.length - 1) % ring.length
    if (end !== start) {
      points.push(end)
      sources.push(distancesMm[before]! > distancesMm[i]! ? before : i)
    }
    points.push(start)
    sources.push(i)
  })
  const moved = ring.map((_, i) => ({ start: corners[i]![1], end: corners[(i + 1) % ring.length]![0] }))
  return { ring: points, sources, moved }
}

/** First edge of `ring` that is left without length, or turned back, once it is moved; null when all keep their direction. */
export function vanishedEdge(ring: readonly Point[], { moved }: OffsetRing): number | null {
  const index = moved.findIndex(({ start, end }, i) => {
    const [a, b] = edgeOfRing(ring, i)
    return (end[0] - start[0]) * (b[0] - a[0]) + (end[1] - start[1]) * (b[1] - a[1]) <= FIT_TOLERANCE_MM * distance(a, b)
  })
  return index < 0 ? null : index
}

function leftNormal(a: Point, b: Point): Point {
  const length = distance(a, b)
  return [(a[1] - b[1]) / length, (b[0] - a[0]) / length]
}

/** Where the edge before a vertex ends and the edge after it starts; one and the same point where they are mitred. */
function cornersAt(vertex: Point, n1: Point, n2: Point, d1: number, d2: number): readonly [Point, Point] {
  const sine = n1[0] * n2[1] - n1[1] * n2[0]
  const cosine = n1[0] * n2[0] + n1[1] * n2[1]
  const along = (normal: Point, by: number): Point => [vertex[0] + normal[0] * by, vertex[1] + normal[1] * by]
  if (Math.abs(sine) < STRAIGHT_SINE && cosine > 0) {
    if (d1 !== d2) return [along(n1, d1), along(n2, d2)]
    const mitre: Point = [n1[0] + n2[0], n1[1] + n2[1]]
    const corner = along(mitre, d1 / (1 + cosine))
    return [corner, corner]
  }
  const corner: Point = [vertex[0] + (d1 * n2[1] - d2 * n1[1]) / sine, vertex[1] + (d2 * n1[0] - d1 * n2[0]) / sine]
  return [corner, corner]
}
