import type { Point } from './point'

/** Smallest upright rectangle around points, mm. */
export interface Bounds {
  readonly minX: number
  readonly minY: number
  readonly maxX: number
  readonly maxY: number
}

/** Area of a simple ring (open: first vertex not repeated), mm²: positive when anticlockwise, negative when clockwise. */
export function signedArea(ring: readonly Point[]): number {
  const [originX, originY] = ring[0]!
  let twice = 0
  for (let i = 1; i + 1 < ring.length; i += 1) {
    const [ax, ay] = ring[i]!
    const [bx, by] = ring[i + 1]!
    twice += (ax - originX) * (by - originY) - (bx - originX) * (ay - originY)
  }
  return twice / 2
}

/** Bounds of a ring, mm. */
export function boundsOf(ring: readonly Point[]): Bounds {
  let [minX, minY] = ring[0]!
  let [maxX, maxY] = ring[0]!
  for (const [x, y] of ring) {
    if (x < minX) minX = x
    if (x > maxX) maxX = x
    if (y < minY) minY = y
    if (y > maxY) maxY = y
  }
  return { minX, minY, maxX, maxY }
}

/** Whether two bounds have a common area deeper than `depthMm` both ways; a negative depth lets them stand that far apart. */
export function boundsOverlap(a: Bounds, b: Bounds, depthMm: number): boolean {
  return (
    Math.min(a.maxX, b.maxX) - Math.max(a.minX, b.minX) > depthMm && Math.min(a.maxY, b.maxY) - Math.max(a.minY, b.minY) > depthMm
  )
}

/** Edge `i` of a ring: from vertex i to vertex i + 1, the last back to the first. */
export function edgeOfRing(ring: readonly Point[], i: number): readonly [Point, Point] {
  return [ring[i]!, ring[(i + 1) % ring.length]!]
}

export function distance(a: Point, b: Point): number {
  return Math.hypot(b[0] - a[0], b[1] - a[1])
}
