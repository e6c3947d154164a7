import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/**
 * Material gives the pattern, the scheme the colour.
 * concrete…: dots and stones; firedClay and castBlock: a block's shell; solidOnPlan: full-depth concrete seen from above; chart…: bars and bands.
 */
export type PatternName =
  'concreteRibbed' | 'concreteSolid' | 'firedClay' | 'castBlock' | 'solidOnPlan' | 'chartRibbed' | 'chartSolid'

const TILE = 48
const DOTS: readonly (readonly [number, number])[] = [
  [5, 9],
  [13, 3],
  [22, 13],
  [31, 5],
  [43, 10],
  [9, 22],
  [18, 29],
  [35, 24],
  [45, 32],
  [4, 37],
  [27, 40],
  [14, 44],
  [39, 45],
]
/** Stones: a corner of each triangle and the turn it lies in, degrees. */
const STONES: readonly (readonly [number, number, number])[] = [
  [38, 15, 12],
  [26, 22, -20],
  [8, 29, 40],
  [20, 36, 8],
  [34, 35, -34],
]

function concrete(id: string, line: string, wash: string): SvgNode {
  return svgNode('pattern', { id, width: TILE, height: TILE, patternUnits: 'userSpaceOnUse' }, [
    svgNode('rect', { width: TILE, height: TILE, fill: wash }),
    ...DOTS.map(([cx, cy], index) => svgNode('circle', { cx, cy, r: index % 3 === 0 ? 1 : 0.7, fill: line })),
    ...STONES.map(([x, y, turn]) =>
      svgNode('polygon', {
        points: '0,-3.8 3.6,2.6 -3.6,2.6',
        transform: `translate(${x} ${y}) rotate(${turn})`,
        fill: 'none',
        stroke: line,
        'stroke-width': 0.9,
      }),
    ),
  ])
}

function hatch(id: string, line: string, ground: string, every: number): SvgNode {
  return svgNode('pattern', { id, width: every, height: every, patternUnits: 'userSpaceOnUse', patternTransform: 'rotate(45)' }, [
    svgNode('rect', { width: every, height: every, fill: ground }),
    svgNode('rect', { width: 1.1, height: every, fill: line }),
  ])
}

function dots(id: string, line: string, ground: string, radius: number, tile: number): SvgNode {
  const quarter = tile / 4
  return svgNode('pattern', { id, width: tile, height: tile, patternUnits: 'userSpaceOnUse' }, [
    svgNode('rect', { width: tile, height: tile, fill: ground }),
    svgNode('circle', { cx: quarter, cy: quarter, r: radius, fill: line }),
    svgNode('circle', { cx: 3 * quarter, cy: 3 * quarter, r: radius, fill: line }),
  ])
}

const MAKE: Record<PatternName, (id: string) => SvgNode> = {
  concreteRibbed: (id) => concrete(id, 'var(--clay)', 'var(--clay-wash)'),
  concreteSolid: (id) => concrete(id, 'var(--slate)', 'var(--slate-wash)'),
  firedClay: (id) => hatch(id, 'var(--clay)', 'var(--paper)', 4),
  castBlock: (id) => dots(id, 'var(--clay)', 'var(--paper)', 0.6, 6),
  solidOnPlan: (id) => dots(id, 'var(--clay)', 'var(--clay-wash)', 0.75, 5),
  chartRibbed: (id) => hatch(id, 'var(--clay)', 'var(--clay-wash)', 6),
  chartSolid: (id) => dots(id, 'var(--slate)', 'var(--slate-wash)', 1.05, 6),
}

/**
 * Definitions of the hatches named, to stand first in a drawing.
 * @param prefix - unique in the page, so that a hidden drawing never hides another one's hatches
 */
export function patternDefinitions(prefix: string, names: readonly PatternName[]): SvgNode {
  return svgNode(
    'defs',
    {},
    names.map((name) => MAKE[name](`${prefix}-${name}`)),
  )
}

/** Value of `fill` that lays the hatch. */
export function patternFill(prefix: string, name: PatternName): string {
  return `url(#${prefix}-${name})`
}
