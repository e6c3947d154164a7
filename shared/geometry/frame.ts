import type { Point } from './point'

/** A right-handed frame of its own for one panel: x along the ribs. `toLocal` and `toLevel` undo each other. */
export interface Frame {
  readonly toLocal: (point: Point) => Point
  readonly toLevel: (point: Point) => Point
}

/** Cosine and sine, exact at right angles so that upright floors stay upright. */
function cosineAndSine(degrees: number): readonly [number, number] {
  const quarter = { 0: [1, 0], 90: [0, 1] } as const
  if (degrees === 0 || degrees === 90) return quarter[degrees]
  const radians = (degrees * Math.PI) / 180
  return [Math.cos(radians), Math.sin(radians)]
}

/**
 * Frame with its origin at `origin` and its x axis turned anticlockwise from the level's.
 *
 * @param degrees - 0 ≤ degrees < 180, anticlockwise from +x
 */
export function frameAt(origin: Point, degrees: number): Frame {
  const [cosine, sine] = cosineAndSine(degrees)
  const [originX, originY] = origin
  return {
    toLocal: ([x, y]) => [(x - originX) * cosine + (y - originY) * sine, (y - originY) * cosine - (x - originX) * sine],
    toLevel: ([x, y]) => [originX + x * cosine - y * sine, originY + x * sine + y * cosine],
  }
}
