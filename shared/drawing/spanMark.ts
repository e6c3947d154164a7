import type { Point } from '../geometry/point'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** A panel's mark with its span arrows: one pair along the ribs, two where the panel spans both ways. */
export interface SpanMark {
  readonly text: string
  /** Middle of the mark, px. */
  readonly placePx: Point
  /** Direction of the span, degrees from x, anticlockwise. */
  readonly directionDegrees: number
  readonly isBothWays: boolean
  /** Room around the place, px: without enough of it the arrows are left away, and then the mark. */
  readonly roomPx: number
}

const HALF_TEXT_HEIGHT = 9
const ARROW_PX = 20
const LEAST_ARROW_PX = 8
/** Part of a mark's half width that must be clear on every side, or marks of narrow panels would cover each other. */
const LEAST_ROOM = 0.55

/** The mark on a ground of paper, so that it is read over blocks. */
export function spanMark({ text, placePx, directionDegrees, isBothWays, roomPx }: SpanMark): SvgNode {
  const halfText = text.length * 4 + 4
  if (roomPx < halfText * LEAST_ROOM) return svgNode('g', { class: 'span-mark' })
  const directions = isBothWays ? [directionDegrees, directionDegrees + 90] : [directionDegrees]
  const arms = directions.map((degrees) => arm(degrees, halfText, roomPx))
  const [x, y] = placePx
  return svgNode('g', { class: 'span-mark', transform: `translate(${x} ${y})` }, [
    ...arms.map(({ ground }) => ground),
    ...arms.flatMap(({ arrows }) => arrows),
    svgNode('text', { y: 4.5, 'text-anchor': 'middle', 'font-size': 13, 'font-weight': 600, fill: 'var(--ink)' }, [text]),
  ])
}

function arm(degrees: number, halfText: number, roomPx: number): { ground: SvgNode; arrows: SvgNode[] } {
  const radians = (degrees * Math.PI) / 180
  const along = Math.abs(Math.cos(radians)) * halfText + Math.abs(Math.sin(radians)) * HALF_TEXT_HEIGHT
  const across = Math.abs(Math.sin(radians)) * halfText + Math.abs(Math.cos(radians)) * HALF_TEXT_HEIGHT
  const room = Math.min(ARROW_PX, roomPx - along - 4)
  const length = room >= LEAST_ARROW_PX ? room : 0
  const reach = along + length + 2
  const turn = `rotate(${-degrees})`
  const ground = svgNode('rect', {
    x: -round(reach),
    y: -round(across),
    width: round(2 * reach),
    height: round(2 * across),
    transform: turn,
    fill: 'var(--paper)',
  })
  if (length === 0) return { ground, arrows: [] }
  const arrow = (sign: number) => {
    const [from, to, barb] = [sign * (along + 1), sign * (along + length), sign * (along + length - 5)].map(round)
    return svgNode('path', {
      d: `M${from} 0L${to} 0M${barb} -3.2L${to} 0L${barb} 3.2`,
      transform: turn,
      fill: 'none',
      stroke: 'var(--ink)',
      'stroke-width': 1.1,
    })
  }
  return { ground, arrows: [arrow(1), arrow(-1)] }
}

function round(value: number): number {
  return Math.round(value * 100) / 100
}
