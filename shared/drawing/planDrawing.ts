import type { SizedScheme } from '../sizing/sizedPanel'
import type { Level, Panel } from '../contracts/appraisal'
import { boundsOf } from '../geometry/ring'
import { labelPlace } from './labelPlace'
import { patternDefinitions } from './patterns'
import { planDimensions, planMargins } from './planDimensions'
import type { TypedLength } from './planDimensions'
import type { PlanPanel } from './planPanel'
import { planPanel } from './planPanel'
import type { PlanFit, PlanScale } from './planScale'
import { placePlan, toPx } from './planScale'
import { planSupports } from './planSupports'
import { scaleBar } from './scaleBar'
import { spanMark } from './spanMark'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** Up to so many blocks each is an element of its own; beyond, each is a subpath of its panel's path. */
const MOST_BLOCK_ELEMENTS = 6000
/** Height of the scale bar below a drawing. */
export const SCALE_BAR_PX = 34

/** What a plan is drawn from. */
export interface PlanInput {
  /** Unique in the page: prefix of the hatches. */
  readonly id: string
  readonly panels: readonly PlanPanel[]
  readonly fit: PlanFit
  /** Ground shown around the floor on every side, to draw on, mm; a level without a panel shows twice that. */
  readonly aroundMm?: number
}

/** A plan in layers, so that a screen redraws only what changes; `planSvg` puts them together. */
export interface PlanLayers {
  readonly widthPx: number
  readonly heightPx: number
  readonly scale: PlanScale
  readonly definitions: SvgNode
  /** In the order of the panels given. */
  readonly panels: readonly SvgNode[]
  readonly supports: SvgNode
  readonly marks: SvgNode
  readonly scaleBar: SvgNode
}

/**
 * A level drawn to scale from the blocks that are counted: ground, solid parts, blocks, voids, support lines, marks with span
 * arrows, scale bar. Dimensions are a layer of their own (`planDimensions`).
 */
export function planLayers({ id, panels, fit, aroundMm = 0 }: PlanInput): PlanLayers {
  const outlines = panels.map(({ panel }) => panel.outline)
  const corners = outlines.length === 0 ? [[aroundMm, aroundMm] as const] : outlines.flat()
  const box = boundsOf(
    corners.flatMap(([x, y]) => [
      [x - aroundMm, y - aroundMm],
      [x + aroundMm, y + aroundMm],
    ]),
  )
  const margins = planMargins(outlines)
  const { scale, widthPx, heightPx } = placePlan(box, margins, fit)
  const blockCount = panels.reduce((sum, { layout }) => sum + (layout?.blocks.length ?? 0), 0)
  const each = blockCount > MOST_BLOCK_ELEMENTS ? 'subpath' : 'shape'
  return {
    widthPx,
    heightPx: heightPx + SCALE_BAR_PX,
    scale,
    definitions: patternDefinitions(id, ['solidOnPlan', 'chartSolid']),
    panels: panels.map((panel) => planPanel(panel, scale, id, { each, fill: 'var(--paper)' })),
    supports: planSupports(
      panels.map(({ panel }) => panel),
      scale,
    ),
    marks: svgNode(
      'g',
      { class: 'plan-marks' },
      panels.map((panel) => panelMark(panel, scale)),
    ),
    scaleBar: scaleBar(widthPx - margins.right, heightPx + 4, Math.min(240, widthPx * 0.4), scale.pxPerMm),
  }
}

/** The whole plan as one drawing, for a page or a report. */
export function planSvg(layers: PlanLayers, panels: readonly Panel[], title: string, typed: TypedLength | null = null): SvgNode {
  const { widthPx, heightPx } = layers
  const attributes = { viewBox: `0 0 ${widthPx} ${heightPx}`, width: widthPx, height: heightPx, role: 'img', 'aria-label': title }
  return svgNode('svg', { class: 'drawing plan-drawing', ...attributes }, [
    layers.definitions,
    ...layers.panels,
    layers.supports,
    planDimensions(panels, layers.scale, typed),
    layers.marks,
    layers.scaleBar,
  ])
}

/** Panels of a level with what one sized scheme makes of them; one that was left out is drawn as not counted, all of them plain while `sized` is null. */
export function planPanels(
  level: Pick<Level, 'mark' | 'panels'>,
  sized: SizedScheme | null,
  kind: 'ribbed' | 'solid',
): PlanPanel[] {
  return level.panels.map((panel) => {
    const found = sized?.panels.find((each) => each.level === level.mark && each.mark === panel.mark)
    const isBothWays = found?.moments.midspanLong !== undefined
    return { panel, kind, layout: found?.layout ?? null, isCounted: sized === null || found !== undefined, isBothWays }
  })
}

function panelMark({ panel, kind, isBothWays }: PlanPanel, scale: PlanScale): SvgNode {
  const { place, roomMm } = labelPlace(panel.outline, panel.voids)
  return spanMark({
    text: panel.mark,
    placePx: toPx(scale, place),
    directionDegrees: isBothWays ? 0 : kind === 'solid' ? shortDirection(panel) : panel.ribDirection,
    isBothWays,
    roomPx: roomMm * scale.pxPerMm,
  })
}

/** A one-way slab spans the shorter way of its box. */
function shortDirection({ outline }: Panel): number {
  const { minX, minY, maxX, maxY } = boundsOf(outline)
  return maxX - minX < maxY - minY ? 0 : 90
}
