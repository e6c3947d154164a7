import type { Ring } from '../contracts/appraisal'
import type { Point } from '../geometry/point'
import { boundsOf, edgeOfRing } from '../geometry/ring'
import { distanceToSegment } from '../geometry/segment'

/** Sampling steps across the outline's box: fine enough for a label, cheap enough for every stroke of a key. */
const STEPS = 20

/** Distance beyond which more room makes a place no better, mm: then the nearer one to the middle wins. */
const ENOUGH_ROOM_MM = 1400

/**
 * Where a panel's mark stands: inside the outline, outside its voids, with room around, as near to the middle as may be.
 *
 * @returns the place and the room around it, mm
 */
export function labelPlace(outline: Ring, voids: readonly Ring[]): { readonly place: Point; readonly roomMm: number } {
  const { minX, minY, maxX, maxY } = boundsOf(outline)
  const middle: Point = [(minX + maxX) / 2, (minY + maxY) / 2]
  let best = { place: middle, roomMm: roomAt(middle, outline, voids) }
  let bestScore = score(best.roomMm, 0)
  for (let i = 1; i < STEPS; i += 1) {
    for (let j = 1; j < STEPS; j += 1) {
      const place: Point = [minX + ((maxX - minX) * i) / STEPS, minY + ((maxY - minY) * j) / STEPS]
      const roomMm = roomAt(place, outline, voids)
      const placeScore = score(roomMm, Math.hypot(place[0] - middle[0], place[1] - middle[1]))
      if (placeScore > bestScore) {
        best = { place, roomMm }
        bestScore = placeScore
      }
    }
  }
  return best
}

function score(roomMm: number, offMiddleMm: number): number {
  return Math.min(roomMm, ENOUGH_ROOM_MM) - offMiddleMm / 20
}

/** Least distance to an edge; negative outside the outline or inside a void. */
function roomAt(place: Point, outline: Ring, voids: readonly Ring[]): number {
  const room = Math.min(...[outline, ...voids].map((ring) => distanceToRing(place, ring)))
  const isOpen = isInside(place, outline) && !voids.some((ring) => isInside(place, ring))
  return isOpen ? room : -room
}

function distanceToRing(place: Point, ring: Ring): number {
  return Math.min(...ring.map((_, i) => distanceToSegment(place, ...edgeOfRing(ring, i))))
}

/** True inside the ring, by counting the edges a ray crosses. */
function isInside([x, y]: Point, ring: Ring): boolean {
  return ring.reduce((inside, [ax, ay], i) => {
    const [bx, by] = ring[(i + 1) % ring.length]!
    const crosses = ay > y !== by > y && x < ax + ((y - ay) / (by - ay)) * (bx - ax)
    return crosses ? !inside : inside
  }, false)
}
