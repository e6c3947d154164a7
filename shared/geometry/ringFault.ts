import type { Point } from './point'
import { distance, edgeOfRing, signedArea } from './ring'
import { distanceToSegment, segmentsMeet, turn } from './segment'
import { FIT_TOLERANCE_MM } from './tolerance'

/** What keeps a ring from being a simple, anticlockwise polygon. Vertex and edge numbers from 0. */
export type RingFault =
  | { readonly kind: 'repeated'; readonly vertex: number }
  | { readonly kind: 'foldsBack'; readonly vertex: number }
  | { readonly kind: 'crosses'; readonly edge: number; readonly other: number }
  | { readonly kind: 'clockwise' }
  | { readonly kind: 'flat' }

/**
 * First fault of a ring as an anticlockwise simple polygon, or null. Looked for in this order: a vertex that repeats the one
 * before, no area, edges that meet where they should not, edges that run back on themselves, clockwise order.
 *
 * @param ring - open, at least 3 vertices, mm
 */
export function findRingFault(ring: readonly Point[]): RingFault | null {
  const repeated = ring.findIndex((point, i) => distance(point, ring[(i + ring.length - 1) % ring.length]!) <= FIT_TOLERANCE_MM)
  if (repeated >= 0) return { kind: 'repeated', vertex: repeated === 0 ? ring.length - 1 : repeated }
  if (isFlat(ring)) return { kind: 'flat' }
  return findMeeting(ring) ?? (signedArea(ring) < 0 ? { kind: 'clockwise' } : null)
}

/** Whether a ring is simple (neither crossing nor touching itself) whatever its direction. */
export function isSimple(ring: readonly Point[]): boolean {
  const fault = findRingFault(ring)
  return fault === null || fault.kind === 'clockwise'
}

/** Whether all vertices lie on the line through the first and the one farthest from it. */
function isFlat(ring: readonly Point[]): boolean {
  const first = ring[0]!
  const farthest = ring.reduce((best, each) => (distance(first, each) > distance(first, best) ? each : best), first)
  const length = distance(first, farthest)
  return ring.every((point) => Math.abs(turn(first, farthest, point)) <= FIT_TOLERANCE_MM * length)
}

function findMeeting(ring: readonly Point[]): RingFault | null {
  for (let i = 0; i < ring.length; i += 1) {
    const [a, b] = edgeOfRing(ring, i)
    const c = ring[(i + 2) % ring.length]!
    if (distanceToSegment(c, a, b) <= FIT_TOLERANCE_MM || distanceToSegment(a, b, c) <= FIT_TOLERANCE_MM)
      return { kind: 'foldsBack', vertex: (i + 1) % ring.length }
    for (let j = i + 2; j < ring.length; j += 1) {
      if (i === 0 && j === ring.length - 1) continue
      const [d, e] = edgeOfRing(ring, j)
      if (segmentsMeet(a, b, d, e, FIT_TOLERANCE_MM)) return { kind: 'crosses', edge: i, other: j }
    }
  }
  return null
}
