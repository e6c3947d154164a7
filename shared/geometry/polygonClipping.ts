import { Clipper, FillRule } from 'clipper2-ts'
import type { Point } from './point'

/** Polygons as rings: outer ones anticlockwise, holes clockwise, mm. */
export type Rings = readonly (readonly Point[])[]

/** Integer grid of the clipping: a thousandth of a millimetre. */
const GRID_PER_MM = 1000

/**
 * `subject` ∩ `kept` − `cut`, to a thousandth of a millimetre: for drawing, not for measuring. Each argument is taken as the union of its
 * rings; a ring may cross itself (where it winds anticlockwise is inside).
 */
export function clipped(subject: Rings, kept: Rings, cut: Rings): [number, number][][] {
  const joined = Clipper.union(toGrid(subject), FillRule.Positive)
  const inside = Clipper.intersect(joined, Clipper.union(toGrid(kept), FillRule.Positive), FillRule.Positive)
  const result =
    cut.length === 0 ? inside : Clipper.difference(inside, Clipper.union(toGrid(cut), FillRule.Positive), FillRule.Positive)
  return result.map((path) => path.map(({ x, y }): [number, number] => [x / GRID_PER_MM, y / GRID_PER_MM]))
}

function toGrid(rings: Rings) {
  return rings.map((ring) => ring.map(([x, y]) => ({ x: Math.round(x * GRID_PER_MM), y: Math.round(y * GRID_PER_MM) })))
}
