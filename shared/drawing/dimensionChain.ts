import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** A row of dimensions along one direction, between neighbouring stations. */
export interface DimensionChain {
  readonly direction: 'horizontal' | 'vertical'
  /** Where each station stands along the chain, px, in order. */
  readonly stationsPx: readonly number[]
  /** Figure of each stretch, one fewer than stations; empty: the stretch is left out. */
  readonly figures: readonly string[]
  /** Where the line stands across its direction, px. */
  readonly atPx: number
  /** End of the object that extension lines start from, px; they are left out when absent. */
  readonly objectPx?: number
  /** Stretches drawn in pencil: those being typed. */
  readonly typed?: ReadonlySet<number>
  /** Of a vertical chain: figures are words and stand upright, to its right. */
  readonly isWorded?: boolean
}

const THIN = 0.75
const CLEAR_PX = 6
const FIGURE_PX = 13
/** Mean advance of a figure at 13 px: one wider than its stretch stands outside the chain's end, or is left to the total. */
const ADVANCE_PX = 6.6

/** Thin line with oblique ticks, the figures over it (to its left when vertical), extension lines 6 clear and 6 over. */
export function dimensionChain(chain: DimensionChain): SvgNode {
  const { stationsPx, figures, typed } = chain
  const given = figures.flatMap((figure, i) => (figure === '' ? [] : [i]))
  const stretches = given.map((i) => {
    const colour = typed?.has(i) === true ? 'var(--pencil)' : 'var(--ink)'
    const outside = i === given.at(-1) ? 'after' : i === given[0] ? 'before' : null
    return stretch(chain, [stationsPx[i]!, stationsPx[i + 1]!], figures[i]!, colour, outside)
  })
  const used = stationsPx.filter((_, i) => (figures[i] ?? '') !== '' || (figures[i - 1] ?? '') !== '')
  return svgNode('g', { class: 'dimension-chain' }, [...used.flatMap((at) => extension(chain, at)), ...stretches])
}

function extension(chain: DimensionChain, stationPx: number): SvgNode[] {
  if (chain.objectPx === undefined) return []
  const toward = Math.sign(chain.atPx - chain.objectPx)
  return [across(chain, stationPx, chain.objectPx + toward * CLEAR_PX, chain.atPx + toward * CLEAR_PX, 'var(--ink-3)')]
}

function stretch(
  chain: DimensionChain,
  [from, to]: readonly [number, number],
  figure: string,
  colour: string,
  outside: 'before' | 'after' | null,
): SvgNode {
  const { atPx, direction } = chain
  const isHorizontal = direction === 'horizontal'
  const ends = isHorizontal ? { x1: from - 4, y1: atPx, x2: to + 4, y2: atPx } : { x1: atPx, y1: from, x2: atPx, y2: to }
  const lines = [
    svgNode('line', { ...ends, stroke: colour, 'stroke-width': THIN }),
    ...[from, to].map((at) => tick(chain, at, colour)),
  ]
  if (chain.isWorded === true) {
    const words = { x: atPx + 8, y: round((from + to) / 2 + 4.5), 'font-size': FIGURE_PX, fill: colour }
    return svgNode('g', {}, [...lines, svgNode('text', words, [figure])])
  }
  const isNarrow = Math.abs(to - from) < figure.length * ADVANCE_PX + 4
  if (isNarrow && outside === null) return svgNode('g', {}, lines)
  const half = (figure.length * ADVANCE_PX) / 2 + 7
  const onward = Math.sign(to - from)
  const along = !isNarrow ? (from + to) / 2 : outside === 'after' ? to + onward * half : from - onward * half
  const across = isNarrow ? atPx + 4 : atPx - 5
  const [x, y] = isHorizontal ? [round(along), across] : [across, round(along)]
  const turn = isHorizontal ? undefined : `rotate(-90 ${x} ${y})`
  const attributes = { x, y, 'text-anchor': 'middle', 'font-size': FIGURE_PX, fill: colour, transform: turn }
  return svgNode('g', {}, [...lines, svgNode('text', attributes, [figure])])
}

function tick(chain: DimensionChain, stationPx: number, colour: string): SvgNode {
  const [x, y] = chain.direction === 'horizontal' ? [stationPx, chain.atPx] : [chain.atPx, stationPx]
  return svgNode('line', {
    x1: round(x - 4),
    y1: round(y + 4),
    x2: round(x + 4),
    y2: round(y - 4),
    stroke: colour,
    'stroke-width': 1.4,
  })
}

function across(chain: DimensionChain, stationPx: number, from: number, to: number, colour: string): SvgNode {
  const ends =
    chain.direction === 'horizontal'
      ? { x1: stationPx, y1: from, x2: stationPx, y2: to }
      : { x1: from, y1: stationPx, x2: to, y2: stationPx }
  return svgNode('line', { ...ends, stroke: colour, 'stroke-width': THIN })
}

function round(value: number): number {
  return Math.round(value * 100) / 100
}
