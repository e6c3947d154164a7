import type { Ring } from '../contracts/appraisal'
import { distance, edgeOfRing, signedArea } from '../geometry/ring'
import { toM, toM2 } from '../units'
import { type Expression, figure, plus, times } from './expression'

/** Two figures this close, relative, are the same: what is left is noise of binary arithmetic. */
const SAME = 1e-9

/**
 * Area of a ring, m²: `6.35 * 5.15` where it is a rectangle of that area, in any position, otherwise one figure.
 *
 * @param areaMm2 - area reckoned elsewhere, which the expression has to yield
 */
export function areaOf(ring: Ring, areaMm2: number): Expression {
  const sides = rectangleSides(ring)
  if (sides && Math.abs(sides[0] * sides[1] - areaMm2) <= SAME * areaMm2) {
    return times(figure(toM(sides[0])), figure(toM(sides[1])))
  }
  return figure(toM2(areaMm2))
}

/** Length round a ring, m: `2 * (1.2 + 0.9)` for a rectangle, otherwise side by side. */
export function perimeterOf(ring: Ring): Expression {
  const sides = rectangleSides(ring)
  if (sides) return times(figure(2), plus(figure(toM(sides[0])), figure(toM(sides[1]))))
  return plus(...sideLengths(ring).map((length) => figure(toM(length))))
}

/** Both sides of a rectangle, mm, first the one from vertex 0; null where a corner is not square. */
function rectangleSides(ring: Ring): readonly [number, number] | null {
  if (ring.length !== 4) return null
  const [a, b, c, d] = sideLengths(ring) as [number, number, number, number]
  const isClose = (first: number, second: number) => Math.abs(first - second) <= SAME * Math.max(first, second)
  const hasEqualSides = isClose(a, c) && isClose(b, d)
  return hasEqualSides && isClose(a * b, Math.abs(signedArea(ring))) ? [a, b] : null
}

function sideLengths(ring: Ring): number[] {
  return ring.map((_, index) => distance(...edgeOfRing(ring, index)))
}
