import type { Point } from '../../geometry/point'
import { distance } from '../../geometry/ring'

/** What a point being drawn is drawn to. */
export interface SnapTargets {
  /** Corners that stand already, mm: outlines, voids, points drawn so far. */
  readonly corners: readonly Point[]
  /** How near counts, mm. */
  readonly reachMm: number
  /** Grid that a free point falls on, mm. */
  readonly stepMm: number
}

/**
 * Where a point drawn by hand falls: on a corner within reach; else, each way by itself, on the line of a corner within reach,
 * or on the grid.
 */
export function snapPoint(point: Point, { corners, reachMm, stepMm }: SnapTargets): Point {
  const corner = nearest(corners, (each) => distance(each, point))
  if (corner !== undefined && distance(corner, point) <= reachMm) return corner
  return [0, 1].map((axis) => {
    const own = point[axis]!
    const line = nearest(
      corners.map((each) => each[axis]!),
      (each) => Math.abs(each - own),
    )
    return line !== undefined && Math.abs(line - own) <= reachMm ? line : Math.round(own / stepMm) * stepMm
  }) as [number, number]
}

/**
 * The end of a side of given length that starts at `from` and runs towards `toward`; along x or y where it is nearly so.
 *
 * @param lengthMm - > 0
 */
export function sideEnd(from: Point, toward: Point, lengthMm: number): Point {
  const [dx, dy] = [toward[0] - from[0], toward[1] - from[1]]
  const isNearly = (small: number, large: number) => Math.abs(small) <= Math.abs(large) * NEARLY_STRAIGHT
  if (isNearly(dy, dx)) return [from[0] + Math.sign(dx || 1) * lengthMm, from[1]]
  if (isNearly(dx, dy)) return [from[0], from[1] + Math.sign(dy) * lengthMm]
  const length = Math.hypot(dx, dy)
  const end = [from[0] + (dx / length) * lengthMm, from[1] + (dy / length) * lengthMm] as const
  return [Math.round(end[0]), Math.round(end[1])]
}

/** A side that leaves an axis by less than this slope runs along it: some three degrees, what a hand cannot tell. */
const NEARLY_STRAIGHT = 0.05

function nearest<T>(all: readonly T[], measure: (each: T) => number): T | undefined {
  let best: T | undefined
  let least = Infinity
  for (const each of all) {
    const measured = measure(each)
    if (measured < least) [best, least] = [each, measured]
  }
  return best
}
