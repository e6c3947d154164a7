import { round } from './sectionFrame'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

const LENGTHS_MM = [5000, 2000, 1000, 500, 200, 100, 50]
const PARTS: Record<number, number> = { 5000: 5, 2000: 4, 1000: 5, 500: 5, 200: 4, 100: 4, 50: 5 }

/** Scale as a bar in black and white parts, right-aligned on `rightPx`; the longest round length that fits `mostPx`. */
export function scaleBar(rightPx: number, topPx: number, mostPx: number, pxPerMm: number): SvgNode {
  const lengthMm = LENGTHS_MM.find((length) => length * pxPerMm <= mostPx) ?? LENGTHS_MM.at(-1)!
  const parts = PARTS[lengthMm] ?? 5
  const partPx = (lengthMm / parts) * pxPerMm
  const unitRoomPx = 36
  const leftPx = round(rightPx - unitRoomPx - partPx * parts)
  const isCrowded = partPx < 34
  const figures = Array.from({ length: parts + 1 }, (_, index) => index).filter((index) => !isCrowded || index % parts === 0)
  const label = (x: number, text: string, anchor: string) =>
    svgNode('text', { x: round(x), y: topPx + 20, 'font-size': 12, fill: 'var(--ink-2)', 'text-anchor': anchor }, [text])
  return svgNode('g', { class: 'scale-bar' }, [
    ...Array.from({ length: parts }, (_, index) =>
      svgNode('rect', {
        x: round(leftPx + index * partPx),
        y: topPx,
        width: round(partPx),
        height: 5,
        fill: index % 2 === 0 ? 'var(--ink)' : 'var(--paper)',
        stroke: 'var(--ink)',
        'stroke-width': 0.75,
      }),
    ),
    ...figures.map((index) => label(leftPx + index * partPx, String((lengthMm / parts) * index), 'middle')),
    label(rightPx, 'mm', 'end'),
  ])
}
