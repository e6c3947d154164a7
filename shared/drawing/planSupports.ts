import type { Panel } from '../contracts/appraisal'
import type { Point } from '../geometry/point'
import { offsetRing } from '../geometry/offsetRing'
import { distance, edgeOfRing } from '../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../geometry/tolerance'
import { edgeRecords } from '../layout/edit/edgeRecords'
import type { Neighbour } from '../layout/neighbours'
import { findNeighbours } from '../layout/neighbours'
import type { PlanScale } from './planScale'
import { toPx } from './planScale'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** A stretch of an edge, mm from its first vertex. */
type Stretch = readonly [from: number, to: number]

/**
 * Lines of a level's supports: dash-dot on every support line, and the floor's outer face, half a support outside the line,
 * wherever no neighbour stands. A free edge has no support: its face is the line itself.
 */
export function planSupports(panels: readonly Panel[], scale: PlanScale): SvgNode {
  const neighbours = findNeighbours({ panels: [...panels] })
  const lines: string[] = []
  const faces: string[] = []
  panels.forEach((panel, p) => {
    const records = edgeRecords(panel)
    const halves = records.map(({ supportWidth }) => supportWidth / 2)
    const outer = offsetRing(
      panel.outline,
      halves.map((half) => -half),
    ).moved
    records.forEach(({ supportWidth }, e) => {
      const met = neighbours.filter(({ panel: own, edge }) => own === p && edge === e)
      const edge = edgeOfRing(panel.outline, e)
      const isDrawnByOther = met.some(({ neighbour }) => neighbour < p)
      const alone = stretchesAlone(edge, met, panels)
      if (supportWidth > 0)
        lines.push(...(isDrawnByOther ? alone : [[0, distance(...edge)] as const]).map((s) => onEdge(scale, edge, s)))
      faces.push(...alone.map((stretch) => faceOf(scale, edge, stretch, halves[e]!, outer[e]!)))
    })
  })
  return svgNode('g', { class: 'plan-supports' }, [
    svgNode('path', {
      d: lines.join(''),
      fill: 'none',
      stroke: 'var(--ink)',
      'stroke-width': 0.75,
      'stroke-dasharray': '10 3 2 3',
    }),
    svgNode('path', { d: faces.join(''), fill: 'none', stroke: 'var(--ink)', 'stroke-width': 1.5, 'stroke-linecap': 'square' }),
  ])
}

/** Stretches of an edge where no neighbour stands, in order. */
function stretchesAlone(edge: readonly [Point, Point], met: readonly Neighbour[], panels: readonly Panel[]): Stretch[] {
  const length = distance(...edge)
  const taken = met
    .map(({ neighbour, neighbourEdge }): Stretch => {
      const [start, end] = edgeOfRing(panels[neighbour]!.outline, neighbourEdge)
      return [station(edge, end), station(edge, start)]
    })
    .sort(([a], [b]) => a - b)
  const alone: Stretch[] = []
  let from = 0
  for (const [start, end] of [...taken, [length, length] as const]) {
    if (start - from > DRAWN_TOLERANCE_MM) alone.push([from, start])
    from = Math.max(from, end)
  }
  return alone
}

/** The outer face along a stretch: it runs to the mitred corner where the stretch reaches the edge's end. */
function faceOf(
  scale: PlanScale,
  edge: readonly [Point, Point],
  [from, to]: Stretch,
  half: number,
  outer: { readonly start: Point; readonly end: Point },
): string {
  const length = distance(...edge)
  const out: Point = [((edge[1][1] - edge[0][1]) / length) * half, ((edge[0][0] - edge[1][0]) / length) * half]
  const offset = ([x, y]: Point): Point => [x + out[0], y + out[1]]
  const start = from <= DRAWN_TOLERANCE_MM ? outer.start : offset(pointAt(edge, from))
  const end = to >= length - DRAWN_TOLERANCE_MM ? outer.end : offset(pointAt(edge, to))
  return segment(scale, start, end)
}

function onEdge(scale: PlanScale, edge: readonly [Point, Point], [from, to]: Stretch): string {
  return segment(scale, pointAt(edge, from), pointAt(edge, to))
}

function station([a, b]: readonly [Point, Point], [x, y]: Point): number {
  const length = distance(a, b)
  return ((x - a[0]) * (b[0] - a[0]) + (y - a[1]) * (b[1] - a[1])) / length
}

function pointAt([a, b]: readonly [Point, Point], along: number): Point {
  const ratio = along / distance(a, b)
  return [a[0] + (b[0] - a[0]) * ratio, a[1] + (b[1] - a[1]) * ratio]
}

function segment(scale: PlanScale, a: Point, b: Point): string {
  return `M${toPx(scale, a).join(' ')}L${toPx(scale, b).join(' ')}`
}
