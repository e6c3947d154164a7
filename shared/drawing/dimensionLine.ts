import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** A dimension: thin line, oblique ticks at both ends, its figure above the line, no unit. */
export interface DimensionLine {
  /** Both ends along the measured direction, px. */
  readonly from: number
  readonly to: number
  /** Where the dimension line stands across it, px. */
  readonly at: number
  readonly text: string
  /** Ends of the extension lines on the side of the object, px; absent: none are drawn. */
  readonly extendFrom?: number
}

const INK = 'var(--ink)'
const THIN = 0.75
const OVERSHOOT = 6
const FIGURE_PX = 13
/** Mean advance of a figure at 13 px, to see whether it fits between its ticks. */
const ADVANCE = 6.7

function tick(x: number, y: number): SvgNode {
  return svgNode('line', { x1: x - 4, y1: y + 4, x2: x + 4, y2: y - 4, stroke: INK, 'stroke-width': 1.4 })
}

function line(x1: number, y1: number, x2: number, y2: number): SvgNode {
  return svgNode('line', { x1, y1, x2, y2, stroke: INK, 'stroke-width': THIN })
}

/** Horizontal dimension; its figure stands 5 px over the line. */
export function horizontalDimension({ from, to, at, text, extendFrom }: DimensionLine): SvgNode {
  const ends = [from, to]
  const toward = extendFrom === undefined ? 0 : Math.sign(at - extendFrom)
  return svgNode('g', { class: 'dimension' }, [
    ...(extendFrom === undefined ? [] : ends.map((x) => line(x, extendFrom + toward * 6, x, at + toward * OVERSHOOT))),
    line(from - OVERSHOOT, at, to + OVERSHOOT, at),
    ...ends.map((x) => tick(x, at)),
    svgNode('text', { x: (from + to) / 2, y: at - 5, 'text-anchor': 'middle', 'font-size': FIGURE_PX, fill: INK }, [text]),
  ])
}

/** Vertical dimension; its figure is turned when there is room, else it stands beside the line on the side away from the object. */
export function verticalDimension({ from, to, at, text, extendFrom }: DimensionLine): SvgNode {
  const ends = [from, to]
  const toward = extendFrom === undefined ? -1 : Math.sign(at - extendFrom)
  const middle = (from + to) / 2
  const isTurned = Math.abs(to - from) > text.length * ADVANCE + 12
  const figure = isTurned
    ? svgNode(
        'text',
        {
          x: at - 5,
          y: middle,
          'text-anchor': 'middle',
          'font-size': FIGURE_PX,
          fill: INK,
          transform: `rotate(-90 ${at - 5} ${middle})`,
        },
        [text],
      )
    : svgNode(
        'text',
        {
          x: at + toward * 8,
          y: middle + 4.5,
          'text-anchor': toward < 0 ? 'end' : 'start',
          'font-size': FIGURE_PX,
          fill: INK,
        },
        [text],
      )
  return svgNode('g', { class: 'dimension' }, [
    ...(extendFrom === undefined ? [] : ends.map((y) => line(extendFrom + toward * 6, y, at + toward * OVERSHOOT, y))),
    line(at, from, at, to),
    ...ends.map((y) => tick(at, y)),
    figure,
  ])
}
