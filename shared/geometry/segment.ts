import type { Point } from './point'

/** Shortest distance from a point to a segment, mm. */
export function distanceToSegment([px, py]: Point, [ax, ay]: Point, [bx, by]: Point): number {
  const [dx, dy] = [bx - ax, by - ay]
  const squared = dx * dx + dy * dy
  const along = squared === 0 ? 0 : Math.min(1, Math.max(0, ((px - ax) * dx + (py - ay) * dy) / squared))
  const [offX, offY] = [px - ax - along * dx, py - ay - along * dy]
  return Math.sqrt(offX * offX + offY * offY)
}

/** Twice the area of triangle abc: positive when c lies left of a → b. */
export function turn([ax, ay]: Point, [bx, by]: Point, [cx, cy]: Point): number {
  return (bx - ax) * (cy - ay) - (by - ay) * (cx - ax)
}

/** Whether two segments cross, touch or come within `toleranceMm` of each other. */
export function segmentsMeet(a: Point, b: Point, c: Point, d: Point, toleranceMm: number): boolean {
  if (Math.max(a[0], b[0]) + toleranceMm < Math.min(c[0], d[0]) || Math.max(c[0], d[0]) + toleranceMm < Math.min(a[0], b[0]))
    return false
  if (Math.max(a[1], b[1]) + toleranceMm < Math.min(c[1], d[1]) || Math.max(c[1], d[1]) + toleranceMm < Math.min(a[1], b[1]))
    return false
  if (turn(a, b, c) * turn(a, b, d) < 0 && turn(c, d, a) * turn(c, d, b) < 0) return true
  return (
    distanceToSegment(a, c, d) <= toleranceMm ||
    distanceToSegment(b, c, d) <= toleranceMm ||
    distanceToSegment(c, a, b) <= toleranceMm ||
    distanceToSegment(d, a, b) <= toleranceMm
  )
}
