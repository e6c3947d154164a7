import type { Ring } from '../contracts/appraisal'
import { boundsOf } from '../geometry/ring'
import type { Point } from '../geometry/point'
import { isRectangle } from '../layout/edit/rectangle'
import type { BlockRow, PanelLayout } from '../layout/panelLayout'
import { dimensionChain } from './dimensionChain'
import type { PlanPanel } from './planPanel'
import type { PlanScale } from './planScale'
import { toPx } from './planScale'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

const FIRST_CHAIN_PX = 22
const NEXT_CHAIN_PX = 24

/** Room right of the panel for the words of solid zones and trimmers, px. */
const WORDS_PX = 92

/**
 * Dimensions of an opened panel: each rectangular void's size inside it and its offset from the outline, in pencil since
 * they are typed; of a rectangle whose ribs run along x or y also the rows with both edge strips, across the ribs, and the
 * solid zones and trimmers along them.
 *
 * @param trimmerMm - width of the solid strip around voids; null: neither it nor the solid zones are dimensioned
 */
export function panelDimensions(
  { panel, layout }: PlanPanel,
  scale: PlanScale,
  clear: readonly Point[],
  trimmerMm: number | null,
): SvgNode[] {
  const box = boundsOf(panel.outline)
  const isUpright = panel.ribDirection % 90 === 0 && isRectangle(panel)
  const hasRows = layout !== null && layout.rows.length > 0 && isUpright
  const isAlongY = panel.ribDirection === 90
  const voids = panel.voids.flatMap((ring, i) =>
    voidDimensions(ring, i, box, scale, hasRows && isAlongY && trimmerMm !== null ? WORDS_PX : 0),
  )
  if (!hasRows) return voids
  const face = boundsOf(clear)
  return [
    ...voids,
    rowDimension(layout.rows, face, box, scale, isAlongY),
    ...(trimmerMm === null ? [] : [solidDimension(panel.voids, layout, face, box, scale, isAlongY, trimmerMm)]),
  ]
}

/** Solid zones at supported ends, and the trimmers below voids: along ribs that run along y, else the zones alone. */
function solidDimension(
  voids: readonly Ring[],
  layout: PanelLayout,
  face: Box,
  box: Box,
  scale: PlanScale,
  isAlongY: boolean,
  trimmerMm: number,
): SvgNode {
  const [from, to] = isAlongY ? [face.minY, face.maxY] : [face.minX, face.maxX]
  const isSupported = (end: 'startsAt' | 'endsAt') =>
    layout.rows.some(({ lengths }) => (end === 'startsAt' ? lengths[0] : lengths.at(-1))?.[end] === 'support')
  const zone = layout.solidZone
  const stretches = [
    ...(isSupported('startsAt') && zone > 0 ? [{ from, to: from + zone, words: `solid ${figure(zone)}` }] : []),
    ...(isAlongY && trimmerMm > 0 ? voids.slice(0, 1).map((ring) => trimmerBelow(ring, trimmerMm)) : []),
    ...(isSupported('endsAt') && zone > 0 ? [{ from: to - zone, to, words: `solid ${figure(zone)}` }] : []),
  ]
  const [boxRight, boxBottom] = toPx(scale, [box.maxX, box.minY])
  const nodes = stretches.map((stretch) =>
    isAlongY
      ? dimensionChain({
          direction: 'vertical',
          stationsPx: [stretch.from, stretch.to].map((y) => toPx(scale, [box.maxX, y])[1]),
          figures: [stretch.words],
          atPx: boxRight + FIRST_CHAIN_PX,
          objectPx: boxRight,
          isWorded: true,
        })
      : dimensionChain({
          direction: 'horizontal',
          stationsPx: [stretch.from, stretch.to].map((x) => toPx(scale, [x, box.minY])[0]),
          figures: [stretch.words],
          atPx: boxBottom + FIRST_CHAIN_PX,
          objectPx: boxBottom,
        }),
  )
  return svgNode('g', { class: 'solid-dimensions' }, nodes)
}

function trimmerBelow(ring: Ring, trimmerMm: number): { from: number; to: number; words: string } {
  const { minY } = boundsOf(ring)
  return { from: minY - trimmerMm, to: minY, words: `trimmer ${figure(trimmerMm)}` }
}

type Box = ReturnType<typeof boundsOf>

function voidDimensions(ring: Ring, index: number, box: Box, scale: PlanScale, wordsPx: number): SvgNode[] {
  const own = boundsOf(ring)
  const typed = new Set([0])
  const [left, top] = toPx(scale, [own.minX, own.maxY])
  const [right, bottom] = toPx(scale, [own.maxX, own.minY])
  const [boxLeft, boxBottom] = toPx(scale, [box.minX, box.minY])
  const [boxRight, boxTop] = toPx(scale, [box.maxX, box.maxY])
  const step = index * NEXT_CHAIN_PX
  return [
    dimensionChain({
      direction: 'horizontal',
      stationsPx: [left, right],
      figures: [figure(own.maxX - own.minX)],
      atPx: top + 22,
      typed,
    }),
    dimensionChain({
      direction: 'vertical',
      stationsPx: [bottom, top],
      figures: [figure(own.maxY - own.minY)],
      atPx: right - 14,
      typed,
    }),
    dimensionChain({
      direction: 'horizontal',
      stationsPx: [boxLeft, left],
      figures: [own.minX > box.minX ? figure(own.minX - box.minX) : ''],
      atPx: boxTop - FIRST_CHAIN_PX - step,
      objectPx: boxTop,
      typed,
    }),
    dimensionChain({
      direction: 'vertical',
      stationsPx: [boxBottom, bottom],
      figures: [own.minY > box.minY ? figure(own.minY - box.minY) : ''],
      atPx: boxRight + FIRST_CHAIN_PX + wordsPx + step,
      objectPx: boxRight,
      typed,
    }),
  ]
}

/** Edge strip, rows, edge strip, across the ribs; the figure of the rows names their number and width. */
function rowDimension(rows: readonly BlockRow[], clear: Box, box: Box, scale: PlanScale, isAlongY: boolean): SvgNode {
  const [first, last] = [rows[0]!, rows.at(-1)!]
  const width = last.bandEnd - first.bandStart
  const [from, to] = isAlongY ? [clear.minX, clear.maxX] : [clear.minY, clear.maxY]
  const strip = (to - from - width) / 2
  const stations = [from, from + strip, to - strip, to]
  const rib = rows.length > 1 ? rows[1]!.bandStart - first.bandEnd : 0
  const middle = `${rows.length} ${rows.length === 1 ? 'row' : 'rows'} of ${figure(first.bandEnd - first.bandStart)}${
    rib > 0 ? `, ribs of ${figure(rib)}` : ''
  }: ${figure(width)}`
  const figures = [figure(strip), middle, figure(strip)]
  return isAlongY
    ? dimensionChain({
        direction: 'horizontal',
        stationsPx: stations.map((x) => toPx(scale, [x, box.minY])[0]),
        figures,
        atPx: toPx(scale, [box.minX, box.minY])[1] + FIRST_CHAIN_PX,
        objectPx: toPx(scale, [box.minX, box.minY])[1],
      })
    : dimensionChain({
        direction: 'vertical',
        stationsPx: stations.map((y) => toPx(scale, [box.minX, y])[1]),
        figures,
        atPx: toPx(scale, [box.minX, box.minY])[0] - FIRST_CHAIN_PX,
        objectPx: toPx(scale, [box.minX, box.minY])[0],
      })
}

function figure(lengthMm: number): string {
  return Number(lengthMm.toFixed(1)).toLocaleString('en')
}
