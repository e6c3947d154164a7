import { patternDefinitions, patternFill } from '#shared/drawing/patterns'
import { svgNode } from '#shared/drawing/svgNode'
import { svgText } from '#shared/drawing/svgText'
import { type Markup, trustedMarkup } from './markup'

const PREFIX = 'bar'
const HALF = 118
const HEIGHT = 16

/** Hatches of the bars, once a page. */
export function barHatches(): Markup {
  const attributes = { width: 0, height: 0, class: 'hatches', 'aria-hidden': 'true' }
  return trustedMarkup(svgText(svgNode('svg', attributes, [patternDefinitions(PREFIX, ['chartRibbed', 'chartSolid'])])))
}

/** A bar from the middle line: to the left where ribbed is the cheaper, to the right where solid is. @param share - −1 to 1 */
export function differenceBar(share: number): Markup {
  const length = Math.round(Math.abs(share) * HALF * 10) / 10
  const isRibbed = share < 0
  const bar = svgNode('rect', {
    x: isRibbed ? 120 - length : 120,
    y: 2,
    width: length,
    height: HEIGHT - 4,
    fill: patternFill(PREFIX, isRibbed ? 'chartRibbed' : 'chartSolid'),
    stroke: isRibbed ? 'var(--clay)' : 'var(--slate)',
  })
  const middle = svgNode('line', { x1: 120, y1: 0, x2: 120, y2: HEIGHT, stroke: 'var(--ink)', 'stroke-width': 1 })
  const attributes = { viewBox: `0 0 240 ${HEIGHT}`, 'aria-hidden': 'true' }
  return trustedMarkup(svgText(svgNode('svg', attributes, length > 0 ? [bar, middle] : [middle])))
}
