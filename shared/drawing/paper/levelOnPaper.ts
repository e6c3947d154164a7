import { boundsOf } from '../../geometry/ring'
import { planMargins } from '../planDimensions'
import { planLayers, planSvg, SCALE_BAR_PX } from '../planDrawing'
import type { PlanPanel } from '../planPanel'
import type { SvgNode } from '../svgNode'
import type { PaperPlan, PaperTurn } from './paperPlan'
import { paperPlan } from './paperPlan'
import type { PaperName } from './paperSize'

/** The sheet that is asked for. */
export interface PaperAsked {
  readonly paper: PaperName
  readonly turn?: PaperTurn
}

/** A drawing at the stated scale of its paper. */
export interface OnPaper {
  readonly plan: PaperPlan
  readonly node: SvgNode
}

/**
 * A level with at least one panel drawn for a sheet of paper at the largest standard scale, from the blocks that are counted.
 *
 * @param id - unique in the page: prefix of the hatches
 * @throws RangeError as `paperPlan` does
 */
export function levelOnPaper(id: string, panels: readonly PlanPanel[], { paper, turn }: PaperAsked, title: string): OnPaper {
  const outlines = panels.map(({ panel }) => panel.outline)
  const box = boundsOf(outlines.flat())
  const subject = {
    lengthsMm: [box.maxX - box.minX, box.maxY - box.minY] as const,
    margins: planMargins(outlines),
    footPx: SCALE_BAR_PX,
  }
  const plan = paperPlan(subject, paper, turn)
  const layers = planLayers({ id, panels, fit: { pxPerMm: plan.pxPerMm } })
  return {
    plan,
    node: planSvg(
      layers,
      panels.map(({ panel }) => panel),
      title,
    ),
  }
}
