import { round } from './sectionFrame'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** Widest and tallest cell before another web is drawn, mm: the catalogue holds no cells, so they are indicative. */
const CELL_WIDTH_MM = 125
const CELL_HEIGHT_MM = 110
/** Shell and webs of a drawn block, mm. */
const SHELL_MM = 20
const WEB_MM = 18
/** Smaller cells are not worth drawing, mm. */
const LEAST_CELL_MM = 10

/** Where a block stands on the drawing, and the part of the drawing it may show in, px. */
export interface BlockPlace {
  readonly leftPx: number
  readonly topPx: number
  readonly pxPerMm: number
  readonly fromPx: number
  readonly toPx: number
}

/** The rectangle as far as it shows; nothing where it lies outside. Mm from the block's upper left corner. */
function shownRect(
  place: BlockPlace,
  [xMm, yMm, widthMm, heightMm]: readonly [number, number, number, number],
  attributes: Record<string, string | number>,
): SvgNode[] {
  const { leftPx, topPx, pxPerMm, fromPx, toPx } = place
  const start = Math.max(fromPx, leftPx + xMm * pxPerMm)
  const end = Math.min(toPx, leftPx + (xMm + widthMm) * pxPerMm)
  if (end - start < 0.5) return []
  const y = round(topPx + yMm * pxPerMm)
  return [svgNode('rect', { x: round(start), y, width: round(end - start), height: round(heightMm * pxPerMm), ...attributes })]
}

/**
 * One hollow block cut across its length: shell in the material's hatch, cells left paper.
 * Width and height are the block's own; number and size of its cells are indicative.
 */
export function hollowBlock(place: BlockPlace, widthMm: number, heightMm: number, fill: string): SvgNode {
  const columns = Math.max(1, Math.round((widthMm - SHELL_MM) / CELL_WIDTH_MM))
  const rows = Math.max(1, Math.round((heightMm - SHELL_MM) / CELL_HEIGHT_MM))
  const cellWidthMm = (widthMm - 2 * SHELL_MM - (columns - 1) * WEB_MM) / columns
  const cellHeightMm = (heightMm - 2 * SHELL_MM - (rows - 1) * WEB_MM) / rows
  const hasCells = cellWidthMm > LEAST_CELL_MM && cellHeightMm > LEAST_CELL_MM
  const isSmall = place.pxPerMm < 0.2
  const cell = {
    rx: round(Math.min(4, 10 * place.pxPerMm)),
    fill: 'var(--paper)',
    stroke: 'var(--clay)',
    'stroke-width': isSmall ? 0.75 : 1,
  }
  const cells = Array.from({ length: hasCells ? columns * rows : 0 }, (_, index) => {
    const xMm = SHELL_MM + (index % columns) * (cellWidthMm + WEB_MM)
    const yMm = SHELL_MM + Math.floor(index / columns) * (cellHeightMm + WEB_MM)
    return shownRect(place, [xMm, yMm, cellWidthMm, cellHeightMm], cell)
  })
  const shell = { fill, stroke: 'var(--clay)', 'stroke-width': isSmall ? 0.75 : 1.25 }
  return svgNode('g', { class: 'section-block' }, [...shownRect(place, [0, 0, widthMm, heightMm], shell), ...cells.flat()])
}
