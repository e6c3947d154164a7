import type { Panel } from '#shared/contracts/appraisal'

/**
 * Whether single points lie where blocks may, decided from the panel as typed by crossing counts and distances only. It shares no code
 * with the layout: no offset rings, no slabs, no clipping.
 */
export type XY = readonly [number, number]

interface Side {
  readonly a: XY
  readonly b: XY
  readonly length: number
  /** Unit vector to the left. */
  readonly normal: XY
}

/** Even-odd crossing count. */
export function isInside([x, y]: XY, ring: readonly XY[]): boolean {
  let inside = false
  ring.forEach(([ax, ay], i) => {
    const [bx, by] = ring[(i + 1) % ring.length]!
    if (ay > y !== by > y && x < ax + ((bx - ax) * (y - ay)) / (by - ay)) inside = !inside
  })
  return inside
}

function sidesOf(ring: readonly XY[]): Side[] {
  return ring.map((a, i) => {
    const b = ring[(i + 1) % ring.length]!
    const length = Math.hypot(b[0] - a[0], b[1] - a[1])
    return { a, b, length, normal: [(a[1] - b[1]) / length, (b[0] - a[0]) / length] }
  })
}

const moved = ([x, y]: XY, [nx, ny]: XY, by: number): XY => [x + nx * by, y + ny * by]

function distanceTo({ a, b, length }: Side, [x, y]: XY): number {
  const share = ((x - a[0]) * (b[0] - a[0]) + (y - a[1]) * (b[1] - a[1])) / length ** 2
  const held = Math.min(1, Math.max(0, share))
  return Math.hypot(x - a[0] - held * (b[0] - a[0]), y - a[1] - held * (b[1] - a[1]))
}

/** Corner where two sides moved to the left by d1 and d2 meet. */
function mitre(before: Side, after: Side, d1: number, d2: number): XY {
  const [p, q] = [moved(after.a, before.normal, d1), moved(after.a, after.normal, d2)]
  const u: XY = [(before.b[0] - before.a[0]) / before.length, (before.b[1] - before.a[1]) / before.length]
  const along =
    ((q[0] - p[0]) * after.normal[0] + (q[1] - p[1]) * after.normal[1]) / (u[0] * after.normal[0] + u[1] * after.normal[1])
  return [p[0] + along * u[0], p[1] + along * u[1]]
}

/**
 * Polygons that together cover what lies between a ring and its sides moved to the left: one a side, cut off at its corners' mitres, or
 * square where two sides in one line are moved by different distances.
 */
export function coversOf(ring: readonly XY[], distances: readonly number[]): XY[][] {
  const sides = sidesOf(ring)
  const straight = Math.sin((5 * Math.PI) / 180)
  const cornerOf = (before: number, after: number, own: number): XY => {
    const [first, second] = [sides[before]!, sides[after]!]
    const sine = first.normal[0] * second.normal[1] - first.normal[1] * second.normal[0]
    const isStep = Math.abs(sine) < straight && distances[before] !== distances[after]
    if (isStep || Math.abs(sine) < 1e-12) return moved(second.a, sides[own]!.normal, distances[own]!)
    return mitre(first, second, distances[before]!, distances[after]!)
  }
  return sides.map((side, i) => {
    const [before, after] = [(i + sides.length - 1) % sides.length, (i + 1) % sides.length]
    return [side.a, side.b, cornerOf(i, after, i), cornerOf(before, i, i)]
  })
}

export interface Oracle {
  readonly isClear: (point: XY) => boolean
  readonly isInGrownVoid: (point: XY) => boolean
  readonly isInVoid: (point: XY) => boolean
  /** Number of the outline's edge whose support a point lies on, or beyond which it lies. */
  readonly edgeAt: (point: XY) => number
  /** Corners of everything the oracle looks at: where lengths of rows can change. */
  readonly corners: readonly XY[]
}

/** Oracle of a panel. Voids are grown on their outside: their rings are walked the other way round. */
export function oracleOf(panel: Panel, trimmerWidthMm: number): Oracle {
  const halves = panel.outline.map((_, i) => (panel.edges.length === 1 ? panel.edges[0]! : panel.edges[i]!).supportWidth / 2)
  const strips = coversOf(panel.outline, halves)
  const trimmers = panel.voids.flatMap((ring) =>
    coversOf(
      [...ring].reverse(),
      ring.map(() => trimmerWidthMm),
    ),
  )
  const isInVoid = (point: XY) => panel.voids.some((ring) => isInside(point, ring))
  const sides = sidesOf(panel.outline)
  const edgeAt = (point: XY) => {
    const on = isInside(point, panel.outline) ? strips.findIndex((ring) => isInside(point, ring)) : -1
    if (on >= 0) return on
    const away = sides.map((side) => distanceTo(side, point))
    return away.indexOf(Math.min(...away))
  }
  return {
    edgeAt,
    isClear: (point) => isInside(point, panel.outline) && !strips.some((ring) => isInside(point, ring)),
    isInVoid,
    isInGrownVoid: (point) => isInVoid(point) || trimmers.some((ring) => isInside(point, ring)),
    corners: [...panel.outline, ...panel.voids.flat(), ...strips.flat(), ...trimmers.flat()],
  }
}
