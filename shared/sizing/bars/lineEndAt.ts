import type { Point } from '../../geometry/point'
import { distance, edgeOfRing } from '../../geometry/ring'
import { distanceToSegment } from '../../geometry/segment'
import { DRAWN_TOLERANCE_MM } from '../../geometry/tolerance'
import type { PanelSite } from '../panelSite'

/** Where a line of bars ends: on an edge of the outline, or at a void. */
export interface LineEndOnEdge {
  /** Number of the outline's edge from 0; null at a void or its trimmer. */
  readonly edge: number | null
  /** Width of that support measured along the line, mm. */
  readonly supportMm: number
}

/** A support met at less than this sine is taken ten times its width at most. */
const LEAST_CROSSING = 0.1

/** Whether a point lies off the box round a segment, and so off the segment. */
const isBeside = ([x, y]: Point, [ax, ay]: Point, [bx, by]: Point) =>
  x < Math.min(ax, bx) - DRAWN_TOLERANCE_MM ||
  x > Math.max(ax, bx) + DRAWN_TOLERANCE_MM ||
  y < Math.min(ay, by) - DRAWN_TOLERANCE_MM ||
  y > Math.max(ay, by) + DRAWN_TOLERANCE_MM

/**
 * The support that a line ends on; of two at a corner the one it crosses more squarely.
 *
 * Source: geometry
 * @param at - a point of the clear outline, or of a void's edge, level coordinates, mm
 * @param direction - unit vector of the line
 */
export function lineEndAt({ clear, edges }: PanelSite, at: Point, direction: Point): LineEndOnEdge {
  let [best, squarest] = [-1, -1]
  for (let i = 0; i < clear.ring.length; i += 1) {
    const [a, b] = edgeOfRing(clear.ring, i)
    if (isBeside(at, a, b) || distanceToSegment(at, a, b) > DRAWN_TOLERANCE_MM) continue
    const crossing = Math.abs(direction[0] * (b[1] - a[1]) - direction[1] * (b[0] - a[0])) / distance(a, b)
    if (crossing > squarest) [best, squarest] = [i, crossing]
  }
  if (best < 0) return { edge: null, supportMm: 0 }
  const edge = clear.sources[best]!
  return { edge, supportMm: edges[edge]!.supportWidth / Math.max(squarest, LEAST_CROSSING) }
}
