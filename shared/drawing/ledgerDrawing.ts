import { niceTicks } from './niceTicks'
import { patternDefinitions, patternFill } from './patterns'
import { round } from './sectionFrame'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** A line of the ledger as it is drawn: both in units of money, ribbed less solid; negative means that ribbed is cheaper. */
export interface LedgerEntry {
  readonly label: string
  readonly difference: number
  readonly running: number
}

/** Position of an amount on the ledger's axis. */
export interface LedgerScale {
  readonly ticks: readonly number[]
  readonly x: (amount: number) => number
}

/** `id` unique in the page; `rowPx` the height of a row of the table beside. */
export interface LedgerSize {
  readonly id: string
  readonly widthPx: number
  readonly rowPx: number
}

const MARGIN_PX = 22
const BAR_PX = 16

/** The axis that holds every bar and every running total of `entries`, across `widthPx`. */
export function ledgerScale(entries: readonly LedgerEntry[], widthPx: number): LedgerScale {
  const amounts = entries.flatMap(({ difference, running }) => [difference, running])
  const ticks = niceTicks(Math.min(0, ...amounts), Math.max(0, ...amounts), Math.max(2, Math.floor(widthPx / 62)))
  const [low, high] = [ticks[0]!, ticks.at(-1)!]
  return { ticks, x: (amount) => round(MARGIN_PX + ((amount - low) / (high - low)) * (widthPx - 2 * MARGIN_PX)) }
}

/** Amount as an axis says it: −10k, 0, +5k. */
export function signedShort(amount: number): string {
  if (amount === 0) return '0'
  const size = Math.abs(amount)
  const [divisor, letter] = size >= 1e6 ? [1e6, 'M'] : size >= 1000 ? [1000, 'k'] : [1, '']
  return `${amount < 0 ? '−' : '+'}${Number((size / divisor).toPrecision(3))}${letter}`
}

/** Head of the ledger's drawing: which side means what, and the figures of the axis; to stand on `ledgerDrawing`. */
export function ledgerAxis(entries: readonly LedgerEntry[], { widthPx }: { readonly widthPx: number }): SvgNode {
  const { ticks, x } = ledgerScale(entries, widthPx)
  const text = (at: number, y: number, content: string, anchor: string, fill: string) =>
    svgNode('text', { x: at, y, 'text-anchor': anchor, 'font-size': 12, fill }, [content])
  const sides = [
    ...(ticks[0]! < 0 ? [text(x(0) - 8, 13, 'ribbed cheaper', 'end', 'var(--clay-ink)')] : []),
    ...(ticks.at(-1)! > 0 ? [text(x(0) + 8, 13, 'solid cheaper', 'start', 'var(--slate)')] : []),
  ]
  return svgNode(
    'svg',
    {
      class: 'drawing ledger-axis',
      viewBox: `0 0 ${widthPx} 36`,
      width: widthPx,
      height: 36,
      'aria-hidden': 'true',
      overflow: 'visible',
    },
    [...sides, ...ticks.map((tick) => text(x(tick), 31, signedShort(tick), 'middle', 'var(--ink-2)'))],
  )
}

/**
 * Bars of the differences from zero and the running total as a stepped line with a diamond on every row, the last one filled.
 * Rows are `rowPx` high, so that it can stand in a table whose rows are as high.
 * @param id - unique in the page
 */
export function ledgerDrawing(entries: readonly LedgerEntry[], { id, widthPx, rowPx }: LedgerSize): SvgNode {
  const scale = ledgerScale(entries, widthPx)
  const height = entries.length * rowPx
  const last = entries.at(-1)
  return svgNode(
    'svg',
    {
      class: 'drawing ledger-drawing',
      viewBox: `0 0 ${widthPx} ${height}`,
      width: widthPx,
      height,
      role: 'img',
      'aria-label': `Differences, largest first, with the running total${last ? `; it ends at ${signedShort(Math.round(last.running))}` : ''}`,
    },
    [
      patternDefinitions(id, ['chartRibbed', 'chartSolid']),
      ...entries.map((_, index) => rowLine((index + 1) * rowPx, widthPx)),
      ...scale.ticks.map((tick) => gridLine(scale.x(tick), height, tick === 0)),
      ...entries.flatMap((entry, index) => bar(entry, index * rowPx, scale, id, rowPx)),
      runningLine(entries, scale, rowPx),
      ...entries.map((entry, index) => diamond(scale.x(entry.running), diamondY(index, rowPx), index === entries.length - 1)),
    ],
  )
}

/**
 * Bars only, low in their rows, so that a name and an amount have room above each: for narrow pages.
 * @param size - `id` unique in the page
 */
export function ledgerBarList(entries: readonly LedgerEntry[], { id, widthPx, rowPx }: LedgerSize): SvgNode {
  const scale = ledgerScale(entries, widthPx)
  const height = entries.length * rowPx
  const shiftPx = round(rowPx * 0.3)
  const zero = scale.x(0)
  return svgNode(
    'svg',
    { class: 'drawing ledger-bar-list', viewBox: `0 0 ${widthPx} ${height}`, width: widthPx, height, 'aria-hidden': 'true' },
    [
      patternDefinitions(id, ['chartRibbed', 'chartSolid']),
      ...entries.flatMap((entry, index) => bar(entry, index * rowPx + shiftPx, scale, id, rowPx)),
      ...entries.map((_, index) => {
        const middle = round(index * rowPx + shiftPx + rowPx * 0.37)
        return svgNode('line', {
          x1: zero,
          y1: middle - 12,
          x2: zero,
          y2: middle + 12,
          stroke: 'var(--ink)',
          'stroke-width': 1.25,
        })
      }),
    ],
  )
}

/** The diamonds stand under the bars, on the line of the working. */
function diamondY(index: number, rowPx: number): number {
  return round((index + 0.75) * rowPx)
}

function gridLine(x: number, height: number, isZero: boolean): SvgNode {
  return svgNode('line', {
    x1: x,
    y1: 0,
    x2: x,
    y2: height,
    stroke: isZero ? 'var(--ink)' : 'var(--hair)',
    'stroke-width': isZero ? 1.25 : 1,
  })
}

function rowLine(y: number, widthPx: number): SvgNode {
  return svgNode('line', { x1: 0, y1: y - 0.5, x2: widthPx, y2: y - 0.5, stroke: 'var(--hair)', 'stroke-width': 1 })
}

function bar({ difference }: LedgerEntry, top: number, scale: LedgerScale, id: string, rowPx: number): SvgNode[] {
  if (difference === 0) return []
  const [from, to] = [scale.x(Math.min(0, difference)), scale.x(Math.max(0, difference))]
  const isRibbedCheaper = difference < 0
  return [
    svgNode('rect', {
      class: isRibbedCheaper ? 'ledger-bar-ribbed' : 'ledger-bar-solid',
      x: from,
      y: round(top + rowPx * 0.37 - BAR_PX / 2),
      width: round(Math.max(1.5, to - from)),
      height: BAR_PX,
      fill: patternFill(id, isRibbedCheaper ? 'chartRibbed' : 'chartSolid'),
      stroke: isRibbedCheaper ? 'var(--clay)' : 'var(--slate)',
      'stroke-width': 1,
    }),
  ]
}

function runningLine(entries: readonly LedgerEntry[], scale: LedgerScale, rowPx: number): SvgNode {
  const steps = entries.map(({ running }, index) => {
    const turn = index * rowPx + 5
    return `V${turn}H${scale.x(running)}V${diamondY(index, rowPx)}`
  })
  return svgNode('path', {
    class: 'ledger-running',
    d: `M${scale.x(0)} 0${steps.join('')}`,
    fill: 'none',
    stroke: 'var(--ink)',
    'stroke-width': 1.4,
  })
}

function diamond(x: number, y: number, isFilled: boolean): SvgNode {
  return svgNode('polygon', {
    class: 'ledger-diamond',
    points: `${x},${y - 5} ${x + 5},${y} ${x},${y + 5} ${x - 5},${y}`,
    fill: isFilled ? 'var(--ink)' : 'var(--paper)',
    stroke: 'var(--ink)',
    'stroke-width': 1.25,
  })
}
