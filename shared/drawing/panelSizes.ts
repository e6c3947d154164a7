import { boundsOf } from '../geometry/ring'
import type { Point } from '../geometry/point'
import type { PanelLayout } from '../layout/panelLayout'
import { dimensionChain } from './dimensionChain'
import type { PlanMargins, PlanScale } from './planScale'
import { toPx } from './planScale'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** The chain nearest to the panel is that of its rows or solid zones. */
const CLEAR_CHAIN_PX = 46
const OVERALL_CHAIN_PX = 70
const VOID_CHAIN_PX = 24
/** Room for words beside solid zones and trimmers. */
const WORDS_PX = 92

/** Room for the chains around a panel drawn with all its dimensions; each void has one above and one at the right. */
export function panelMargins(voids: number): PlanMargins {
  const chains = voids * VOID_CHAIN_PX
  return { left: 92, right: 34 + WORDS_PX + chains, top: 34 + chains, bottom: 92 }
}

/**
 * Sizes of a panel below it and at its left: supports and clear length, then support line to support line.
 *
 * @param clear - the clear outline, level coordinates
 */
export function panelSizes(outline: readonly Point[], clear: readonly Point[], scale: PlanScale): SvgNode {
  const [box, face] = [boundsOf(outline), boundsOf(clear)]
  const [left, bottom] = toPx(scale, [box.minX, box.minY])
  const across = [box.minX, face.minX, face.maxX, box.maxX]
  const upwards = [box.minY, face.minY, face.maxY, box.maxY]
  const chain = (direction: 'horizontal' | 'vertical', stations: readonly number[], away: number) =>
    dimensionChain({
      direction,
      stationsPx: stations.map((mm) => (direction === 'horizontal' ? toPx(scale, [mm, 0])[0] : toPx(scale, [0, mm])[1])),
      figures: stations.slice(1).map((mm, i) => figure(mm - stations[i]!)),
      atPx: direction === 'horizontal' ? bottom + away : left - away,
      objectPx: direction === 'horizontal' ? bottom : left,
    })
  const ends = (stations: readonly number[]) => [stations[0]!, stations.at(-1)!]
  return svgNode('g', { class: 'panel-sizes' }, [
    chain('horizontal', across, CLEAR_CHAIN_PX),
    chain('horizontal', ends(across), OVERALL_CHAIN_PX),
    chain('vertical', upwards, CLEAR_CHAIN_PX),
    chain('vertical', ends(upwards), OVERALL_CHAIN_PX),
  ])
}

/** Centre-lines of the ribs, as they are reinforced. */
export function ribCentres({ ribLines }: PanelLayout, scale: PlanScale): SvgNode {
  const d = ribLines.map(({ start, end }) => `M${toPx(scale, start).join(' ')}L${toPx(scale, end).join(' ')}`).join('')
  return svgNode('path', {
    class: 'rib-centres',
    d,
    fill: 'none',
    stroke: 'var(--clay)',
    'stroke-width': 0.6,
    'stroke-dasharray': '8 2 1 2',
  })
}

function figure(lengthMm: number): string {
  return lengthMm < 0.05 ? '' : Number(lengthMm.toFixed(1)).toLocaleString('en')
}
