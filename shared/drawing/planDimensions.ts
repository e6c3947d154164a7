import type { Panel, Ring } from '../contracts/appraisal'
import { boundsOf } from '../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../geometry/tolerance'
import { dimensionChain } from './dimensionChain'
import type { PlanGrid } from './planGrid'
import { gridName, planGrid } from './planGrid'
import type { PlanMargins, PlanScale } from './planScale'
import { toPx } from './planScale'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** The length being typed: it turns pencil on the plan. */
export interface TypedLength {
  readonly mark: string
  readonly axis: 'x' | 'y'
}

const FIRST_CHAIN_PX = 26
const NEXT_CHAIN_PX = 26
const BUBBLE_PX = 10
const BUBBLE_CLEAR_PX = 34

/** Room that chains and bubbles need around a floor. */
export function planMargins(outlines: readonly Ring[]): PlanMargins {
  if (outlines.length === 0) return { left: 14, right: 14, top: 14, bottom: 14 }
  const depth = (axis: 'x' | 'y') => {
    const grid = planGrid(outlines, axis)
    return FIRST_CHAIN_PX + (chainCount(grid) - 1) * NEXT_CHAIN_PX + BUBBLE_CLEAR_PX + BUBBLE_PX + 2
  }
  const { corners, lines } = planGrid(outlines, 'x')
  return { left: depth('y'), right: corners.length > lines.length ? 40 : 14, top: 28, bottom: depth('x') }
}

/** Dimension chains below and to the left of a floor, the nearest the smallest, with bubbles at their lines. */
export function planDimensions(panels: readonly Panel[], scale: PlanScale, typed: TypedLength | null): SvgNode {
  if (panels.length === 0) return svgNode('g')
  const box = boundsOf(panels.flatMap(({ outline }) => outline))
  const [left, bottom] = toPx(scale, [box.minX, box.minY])
  return svgNode('g', { class: 'plan-dimensions' }, [
    ...axisDimensions(panels, 'x', (mm) => toPx(scale, [mm, box.minY])[0], bottom, typed),
    ...axisDimensions(panels, 'y', (mm) => toPx(scale, [box.minX, mm])[1], left, typed),
  ])
}

function axisDimensions(
  panels: readonly Panel[],
  axis: 'x' | 'y',
  toStation: (mm: number) => number,
  objectPx: number,
  typed: TypedLength | null,
): SvgNode[] {
  const grid = planGrid(
    panels.map(({ outline }) => outline),
    axis,
  )
  const away = axis === 'x' ? 1 : -1
  const direction = axis === 'x' ? ('horizontal' as const) : ('vertical' as const)
  const typedPanel = typed?.axis === axis ? panels.find(({ mark }) => mark === typed.mark) : undefined
  const typedRange = typedPanel === undefined ? null : rangeOf(typedPanel.outline, axis)
  const chains = chainsOf(grid)
  const nodes = chains.map(({ stations, figures }, i) => {
    const atPx = objectPx + away * (FIRST_CHAIN_PX + i * NEXT_CHAIN_PX)
    const inPencil = new Set(figures.flatMap((_, s) => (typedRange !== null && isStretch(stations, s, typedRange) ? [s] : [])))
    return dimensionChain({ direction, stationsPx: stations.map(toStation), figures, atPx, objectPx, typed: inPencil })
  })
  const bubbleAt = objectPx + away * (FIRST_CHAIN_PX + (chains.length - 1) * NEXT_CHAIN_PX + BUBBLE_CLEAR_PX)
  return [...nodes, ...bubbles(grid, axis, toStation, bubbleAt)]
}

/** Chains of one direction: corners between lines where there are any, the lines, the whole. */
function chainsOf({ corners, lines }: PlanGrid): { stations: readonly number[]; figures: string[] }[] {
  const figure = (from: number, to: number) => Number((to - from).toFixed(1)).toLocaleString('en')
  const all = (stations: readonly number[]) => stations.slice(1).map((to, i) => figure(stations[i]!, to))
  const isLine = (mm: number) => lines.some((line) => Math.abs(line - mm) <= DRAWN_TOLERANCE_MM)
  const detail = all(corners).map((text, i) => (isLine(corners[i]!) && isLine(corners[i + 1]!) ? '' : text))
  const whole = [lines[0]!, lines.at(-1)!]
  return [
    ...(corners.length > lines.length ? [{ stations: corners, figures: detail }] : []),
    { stations: lines, figures: all(lines) },
    ...(lines.length > 2 ? [{ stations: whole, figures: all(whole) }] : []),
  ]
}

function chainCount({ corners, lines }: PlanGrid): number {
  return 1 + Number(corners.length > lines.length) + Number(lines.length > 2)
}

function bubbles(grid: PlanGrid, axis: 'x' | 'y', toStation: (mm: number) => number, atPx: number): SvgNode[] {
  const spaced = grid.lines.map((mm, i) => ({ station: toStation(mm), name: gridName(i, axis) }))
  return spaced
    .filter(({ station }, i) => i === 0 || Math.abs(station - spaced[i - 1]!.station) > 2 * BUBBLE_PX)
    .map(({ station, name }) => {
      const [cx, cy] = axis === 'x' ? [station, atPx] : [atPx, station]
      return svgNode('g', { class: 'grid-bubble' }, [
        svgNode('circle', { cx, cy, r: BUBBLE_PX, fill: 'var(--paper)', stroke: 'var(--ink)', 'stroke-width': 0.9 }),
        svgNode('text', { x: cx, y: cy + 4.5, 'text-anchor': 'middle', 'font-size': 12, fill: 'var(--ink)' }, [name]),
      ])
    })
}

function rangeOf(outline: Ring, axis: 'x' | 'y'): readonly [number, number] {
  const { minX, minY, maxX, maxY } = boundsOf(outline)
  return axis === 'x' ? [minX, maxX] : [minY, maxY]
}

function isStretch(stations: readonly number[], i: number, [from, to]: readonly [number, number]): boolean {
  return Math.abs(stations[i]! - from) <= DRAWN_TOLERANCE_MM && Math.abs(stations[i + 1]! - to) <= DRAWN_TOLERANCE_MM
}
