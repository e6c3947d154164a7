import { patternDefinitions, patternFill } from './patterns'
import { round } from './sectionFrame'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** One rate with the value at which the cheaper scheme changes; amounts in units of money, printed beside. */
export interface TippingRate {
  readonly now: number
  readonly nowText: string
  readonly tip: number
  readonly tipText: string
  /** Which kind is cheaper below the tip. */
  readonly cheaperBelow: 'ribbed' | 'solid'
  /** The book's own low and high; absent where the edition is not at hand. */
  readonly range?: { readonly low: number; readonly high: number }
}

/** All bars are drawn on one scale of change against now, so that `now` stands in line: 80 % under to 110 % over. */
const LEAST = -0.8
const GREATEST = 1.1
const BAND_TOP = 24
const BAND_PX = 12
const HEIGHT = 48
const ADVANCE = 6.9

/**
 * Who is cheaper at which value of one rate: a hatched band by who wins, a mark at the tip, now as ▼, the book's range under it.
 * @param id - unique in the page
 */
export function tippingBar(rate: TippingRate, { id, widthPx }: { readonly id: string; readonly widthPx: number }): SvgNode {
  const at = (value: number) =>
    round(((Math.min(GREATEST, Math.max(LEAST, value / rate.now - 1)) - LEAST) / (GREATEST - LEAST)) * widthPx)
  const change = rate.tip / rate.now - 1
  const isOff = change > GREATEST || change < LEAST
  const tipX = at(rate.tip)
  const above = rate.cheaperBelow === 'ribbed' ? 'solid' : 'ribbed'
  return svgNode(
    'svg',
    { class: 'drawing tipping-bar', viewBox: `0 0 ${widthPx} ${HEIGHT}`, width: widthPx, height: HEIGHT, 'aria-hidden': 'true' },
    [
      patternDefinitions(id, ['chartRibbed', 'chartSolid']),
      ...band(id, rate.cheaperBelow, 0, tipX),
      ...band(id, above, tipX, widthPx),
      ...edges(widthPx),
      isOff ? arrow(tipX, change > 0) : tipMark(tipX),
      nowMark(at(rate.now)),
      ...labels(rate, at(rate.now), tipX, widthPx, isOff),
      ...range(rate, at),
    ],
  )
}

function band(id: string, kind: 'ribbed' | 'solid', from: number, to: number): SvgNode[] {
  if (to - from < 0.5) return []
  const fill = patternFill(id, kind === 'ribbed' ? 'chartRibbed' : 'chartSolid')
  return [svgNode('rect', { class: `tipping-${kind}`, x: from, y: BAND_TOP, width: round(to - from), height: BAND_PX, fill })]
}

function edges(widthPx: number): SvgNode[] {
  return [BAND_TOP, BAND_TOP + BAND_PX].map((y) =>
    svgNode('line', { x1: 0, y1: y, x2: widthPx, y2: y, stroke: 'var(--rule)', 'stroke-width': 1 }),
  )
}

function tipMark(x: number): SvgNode {
  return svgNode('rect', {
    class: 'tipping-tip',
    x: x - 1.25,
    y: BAND_TOP - 3,
    width: 2.5,
    height: BAND_PX + 6,
    fill: 'var(--ink)',
  })
}

function arrow(x: number, isRight: boolean): SvgNode {
  const y = BAND_TOP + BAND_PX / 2
  const points = isRight
    ? `${x - 14},${y - 5} ${x - 5},${y} ${x - 14},${y + 5}`
    : `${x + 14},${y - 5} ${x + 5},${y} ${x + 14},${y + 5}`
  return svgNode('polygon', { class: 'tipping-off', points, fill: 'var(--ink)' })
}

function nowMark(x: number): SvgNode {
  return svgNode('g', { class: 'tipping-now' }, [
    svgNode('polygon', { points: `${x - 5},${BAND_TOP - 8} ${x + 5},${BAND_TOP - 8} ${x},${BAND_TOP - 1}`, fill: 'var(--ink)' }),
    svgNode('line', { x1: x, y1: BAND_TOP, x2: x, y2: BAND_TOP + BAND_PX, stroke: 'var(--ink)', 'stroke-width': 1.5 }),
  ])
}

function labels(
  { nowText, tipText, tip, now }: TippingRate,
  nowX: number,
  tipX: number,
  widthPx: number,
  isOff: boolean,
): SvgNode[] {
  const nowWords = `now ${nowText}`
  const nowHalf = (nowWords.length * ADVANCE) / 2
  const isRight = tip > now
  const roomPx = (isRight ? widthPx - nowX : nowX) - nowHalf - 8
  const full = `tips at ${tipText}${isOff ? ', off the line' : ''}`
  const tipWords = full.length * ADVANCE > roomPx ? `tips ${tipText}` : full
  const tipWidth = tipWords.length * ADVANCE
  const start = isRight ? nowX + nowHalf + 8 : nowX - nowHalf - 8 - tipWidth
  const wanted = tipX - tipWidth / 2
  const placed = isRight ? Math.min(Math.max(wanted, start), widthPx - tipWidth) : Math.max(Math.min(wanted, start), 0)
  const text = (x: number, anchor: string, weight: number, words: string) =>
    svgNode('text', { x: round(x), y: 12, 'font-size': 13, 'font-weight': weight, 'text-anchor': anchor, fill: 'var(--ink)' }, [
      words,
    ])
  return [
    text(nowX, 'middle', 400, nowWords),
    isRight ? text(placed + tipWidth, 'end', 600, tipWords) : text(placed, 'start', 600, tipWords),
  ]
}

function range({ range: book }: TippingRate, at: (value: number) => number): SvgNode[] {
  if (book === undefined) return []
  const y = BAND_TOP + BAND_PX + 7
  const [low, high] = [at(book.low), at(book.high)]
  return [
    svgNode('path', {
      class: 'tipping-range',
      d: `M${low} ${y}H${high}M${low} ${y - 3}V${y + 3}M${high} ${y - 3}V${y + 3}`,
      fill: 'none',
      stroke: 'var(--ink-2)',
      'stroke-width': 1,
    }),
  ]
}
