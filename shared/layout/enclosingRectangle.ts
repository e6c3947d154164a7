import { convexHull } from '../geometry/convexHull'
import type { Point } from '../geometry/point'
import { distance, edgeOfRing, signedArea } from '../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../geometry/tolerance'

/** The rectangle of least area around a ring. */
export interface EnclosingRectangle {
  /** Shorter and longer side, mm. */
  readonly short: number
  readonly long: number
  /** Direction of the longer side, degrees anticlockwise from +x, 0 ≤ angle < 180. */
  readonly longDirection: number
  /** Four corners, anticlockwise, mm. */
  readonly corners: readonly Point[]
  /** Whether the ring fills it, to a millimetre along its sides. */
  readonly isFilled: boolean
}

interface Candidate {
  readonly along: number
  readonly across: number
  readonly direction: Point
  readonly origin: Point
}

/** Rectangles whose areas differ by less than this share are equally small. */
const SAME_AREA_SHARE = 1e-6

/**
 * Least-area enclosing rectangle. One side runs along an edge of the convex hull. Of equally small ones (every triangle has three)
 * the one with the longest short side counts: the safe one to size a floor on.
 *
 * Source: H. Freeman and R. Shapira, "Determining the minimum-area encasing rectangle for an arbitrary closed curve",
 * Communications of the ACM 18 (1975)
 * @param ring - open, at least 3 vertices not in one line, mm
 */
export function enclosingRectangle(ring: readonly Point[]): EnclosingRectangle {
  const hull = convexHull(ring)
  const candidates = hull.map((_, i) => rectangleAlong(hull, ...edgeOfRing(hull, i)))
  const least = Math.min(...candidates.map(area))
  const smallest = candidates.filter((each) => area(each) <= least * (1 + SAME_AREA_SHARE))
  const best = smallest.reduce((a, b) => (shorter(b) > shorter(a) ? b : a))
  const { along, across, direction } = best
  const [ux, uy] = along >= across ? direction : ([-direction[1], direction[0]] as const)
  return {
    short: Math.min(along, across),
    long: Math.max(along, across),
    longDirection: ((Math.atan2(uy, ux) * 180) / Math.PI + 180) % 180,
    corners: cornersOf(best),
    isFilled: area(best) - Math.abs(signedArea(ring)) <= DRAWN_TOLERANCE_MM * Math.max(along, across),
  }
}

const area = ({ along, across }: Candidate) => along * across
const shorter = ({ along, across }: Candidate) => Math.min(along, across)

function rectangleAlong(hull: readonly Point[], a: Point, b: Point): Candidate {
  const length = distance(a, b)
  const [ux, uy] = [(b[0] - a[0]) / length, (b[1] - a[1]) / length]
  const [along, across] = [
    hull.map(([x, y]) => (x - a[0]) * ux + (y - a[1]) * uy),
    hull.map(([x, y]) => (y - a[1]) * ux - (x - a[0]) * uy),
  ]
  const first = Math.min(...along)
  return {
    along: Math.max(...along) - first,
    across: Math.max(...across),
    direction: [ux, uy],
    origin: [a[0] + ux * first, a[1] + uy * first],
  }
}

function cornersOf({ origin: [x, y], direction: [ux, uy], along, across }: Candidate): Point[] {
  const corner = (s: number, t: number): Point => [x + s * ux - t * uy, y + s * uy + t * ux]
  return [corner(0, 0), corner(along, 0), corner(along, across), corner(0, across)]
}
