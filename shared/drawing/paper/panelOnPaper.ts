import { boundsOf } from '../../geometry/ring'
import { panelMargins } from '../panelSizes'
import { panelDrawing } from '../panelDrawing'
import { SCALE_BAR_PX } from '../planDrawing'
import type { PlanPanel } from '../planPanel'
import { svgNode } from '../svgNode'
import type { OnPaper, PaperAsked } from './levelOnPaper'
import { paperPlan } from './paperPlan'

/**
 * One panel drawn for a sheet of paper at the largest standard scale: every block, ribs, solid parts, voids, and all dimensions.
 *
 * @param id - unique in the page: prefix of the hatches
 * @param trimmerMm - width of the solid strip around voids
 * @throws RangeError as `paperPlan` does
 */
export function panelOnPaper(
  id: string,
  panel: PlanPanel,
  trimmerMm: number,
  { paper, turn }: PaperAsked,
  title: string,
): OnPaper {
  const box = boundsOf(panel.panel.outline)
  const margins = panelMargins(panel.panel.voids.length)
  const subject = { lengthsMm: [box.maxX - box.minX, box.maxY - box.minY] as const, margins, footPx: SCALE_BAR_PX }
  const plan = paperPlan(subject, paper, turn)
  const { node } = panelDrawing({ id, panel, fit: { pxPerMm: plan.pxPerMm }, margins, trimmerMm, isWhole: true })
  return { plan, node: svgNode('svg', { ...node.attributes, role: 'img', 'aria-label': title }, node.children) }
}
