import { round } from './sectionFrame'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** Widest and tallest cell before another web is drawn, mm: the catalogue holds no cells, so they are indicative. */
const CELL_WIDTH_MM = 125
const CELL_HEIGHT_MM = 110
/** Shell and webs of a drawn block, mm. */
const SHELL_MM = 20
const WEB_MM = 18

/**
 * One hollow block cut across its length: shell in the material's hatch, cells left paper.
 * Width and height are the block's own; number and size of its cells are indicative.
 * @param leftPx - left edge; `topPx` upper edge; both px
 */
export function hollowBlock(
  leftPx: number,
  topPx: number,
  widthMm: number,
  heightMm: number,
  pxPerMm: number,
  fill: string,
): SvgNode {
  const columns = Math.max(1, Math.round((widthMm - SHELL_MM) / CELL_WIDTH_MM))
  const rows = Math.max(1, Math.round((heightMm - SHELL_MM) / CELL_HEIGHT_MM))
  const cellWidthMm = (widthMm - 2 * SHELL_MM - (columns - 1) * WEB_MM) / columns
  const cellHeightMm = (heightMm - 2 * SHELL_MM - (rows - 1) * WEB_MM) / rows
  const cells = Array.from({ length: columns * rows }, (_, index) => {
    const column = index % columns
    const row = Math.floor(index / columns)
    return svgNode('rect', {
      x: round(leftPx + (SHELL_MM + column * (cellWidthMm + WEB_MM)) * pxPerMm),
      y: round(topPx + (SHELL_MM + row * (cellHeightMm + WEB_MM)) * pxPerMm),
      width: round(cellWidthMm * pxPerMm),
      height: round(cellHeightMm * pxPerMm),
      rx: round(Math.min(4, 10 * pxPerMm)),
      fill: 'var(--paper)',
      stroke: 'var(--clay)',
      'stroke-width': pxPerMm < 0.2 ? 0.75 : 1,
    })
  })
  return svgNode('g', { class: 'section-block' }, [
    svgNode('rect', {
      x: round(leftPx),
      y: round(topPx),
      width: round(widthMm * pxPerMm),
      height: round(heightMm * pxPerMm),
      fill,
      stroke: 'var(--clay)',
      'stroke-width': pxPerMm < 0.2 ? 0.75 : 1.25,
    }),
    ...(cellWidthMm > 10 && cellHeightMm > 10 ? cells : []),
  ])
}
