import type { BarShape } from '../sizing/bars/barShape'
import { round } from './sectionFrame'
import { type SvgNode, svgNode } from './svgNode'

const WIDTH = 132
const HEIGHT = 40
/** Length that the longest side of any bar is drawn with, and the least a leg is, px. */
const LONGEST = 96
const LEAST_LEG = 12
const MOST_LEG = 24
const CORNER = 4

/** A leg in the proportion it has to its bar, as far as that can be seen. */
function legPx(legMm: number, sideMm: number): number {
  return Math.min(MOST_LEG, Math.max(LEAST_LEG, (LONGEST * legMm) / sideMm))
}

/** The bent bar as a path, its sides named by the letters of the schedule; a straight bar without letters. */
export function barShapeDrawing({ code, dimensionsMm }: BarShape): SvgNode {
  const [a, b, c] = dimensionsMm as [number, number | undefined, number | undefined]
  const side = code === '21' ? b! : a
  const [left, right, top] = [(WIDTH - LONGEST) / 2, (WIDTH + LONGEST) / 2, code === '00' ? HEIGHT / 2 : 15]
  const legs = { '00': [0, 0], '11': [0, legPx(b ?? 0, side)], '21': [legPx(a, side), legPx(c ?? 0, side)] }[code] as [
    number,
    number,
  ]
  const [first, last] = legs.map(round)
  const start = first ? `M${left} ${top + first}V${top + CORNER}Q${left} ${top} ${left + CORNER} ${top}` : `M${left} ${top}`
  const end = last ? `H${right - CORNER}Q${right} ${top} ${right} ${top + CORNER}V${top + last}` : `H${right}`
  const letter = (text: string, x: number, y: number, anchor: string) =>
    svgNode('text', { x, y, 'font-size': 12, 'text-anchor': anchor, fill: 'var(--ink-2)' }, [text])
  const letters = {
    '00': [],
    '11': [letter('A', WIDTH / 2, top - 4, 'middle'), letter('B', right + 6, top + 12, 'start')],
    '21': [
      letter('A', left - 6, top + 12, 'end'),
      letter('B', WIDTH / 2, top - 4, 'middle'),
      letter('C', right + 6, top + 12, 'start'),
    ],
  }[code]
  return svgNode('svg', { viewBox: `0 0 ${WIDTH} ${HEIGHT}`, width: WIDTH, height: HEIGHT }, [
    svgNode('path', { d: start + end, fill: 'none', stroke: 'var(--ink)', 'stroke-width': 2 }),
    ...letters,
  ])
}
