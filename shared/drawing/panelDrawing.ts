import { boundsOf, edgeOfRing, signedArea } from '../geometry/ring'
import type { Point } from '../geometry/point'
import { offsetRing } from '../geometry/offsetRing'
import { edgeRecords } from '../layout/edit/edgeRecords'
import { patternDefinitions, patternFill } from './patterns'
import { panelDimensions } from './panelDimensions'
import { panelSizes, ribCentres } from './panelSizes'
import type { PlanPanel } from './planPanel'
import { blockNodes, solidParts, voidNode } from './planPanel'
import type { PlanFit, PlanMargins, PlanScale } from './planScale'
import { placePlan, pointsText, toPx } from './planScale'
import { SCALE_BAR_PX } from './planDrawing'
import { scaleBar } from './scaleBar'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** Where an edge's fields stand: the middle of the edge, and which way is out, in px with y down. */
export interface EdgePlace {
  readonly middlePx: Point
  readonly outward: Point
}

/** One panel drawn large, and the places for what is typed around it. */
export interface PanelDrawing {
  readonly node: SvgNode
  readonly widthPx: number
  readonly heightPx: number
  readonly edges: readonly EdgePlace[]
}

export interface PanelDrawingInput {
  /** Unique in the page: prefix of the hatches. */
  readonly id: string
  readonly panel: PlanPanel
  readonly fit: PlanFit
  /** Room for the fields around the drawing: left, right, above and below, px. */
  readonly margins: PlanMargins
  /** Width of the solid strip around voids, mm; null: there is no room to dimension it and the solid zones. */
  readonly trimmerMm: number | null
  /** With its sizes and the centre-lines of its ribs, as a drawing that stands alone. */
  readonly isWhole?: boolean
}

/** A panel opened: support strips, clear outline, every block, solid parts, voids and their dimensions. */
export function panelDrawing({ id, panel: input, fit, margins, trimmerMm, isWhole }: PanelDrawingInput): PanelDrawing {
  const { panel, kind, layout } = input
  const half = edgeRecords(panel).map(({ supportWidth }) => supportWidth / 2)
  const { scale, widthPx, heightPx } = placePlan(boundsOf(panel.outline), margins, fit)
  const clear = layout?.clear ?? offsetRing(panel.outline, half).ring
  const colour = kind === 'ribbed' ? 'var(--clay)' : 'var(--slate)'
  const body =
    layout === null
      ? [
          svgNode('polygon', {
            points: pointsText(scale, panel.outline),
            fill: kind === 'solid' ? patternFill(id, 'chartSolid') : 'var(--paper)',
          }),
        ]
      : [
          svgNode('polygon', { points: pointsText(scale, panel.outline), fill: 'var(--paper)' }),
          ...solidParts(panel, layout, scale, id),
          ...blockNodes(layout.blocks, panel.mark, scale, { each: 'shape', fill: patternFill(id, 'firedClay') }),
        ]
  const fullHeightPx = heightPx + SCALE_BAR_PX
  const size = { viewBox: `0 0 ${widthPx} ${fullHeightPx}`, width: widthPx, height: fullHeightPx }
  const node = svgNode('svg', { class: 'panel-drawing', ...size }, [
    patternDefinitions(id, ['solidOnPlan', 'chartSolid', 'firedClay']),
    ...body,
    svgNode('polygon', { points: pointsText(scale, clear), fill: 'none', stroke: colour, 'stroke-width': 1.25 }),
    ...panel.voids.map((ring) => voidNode(ring, scale)),
    svgNode('polygon', {
      points: pointsText(scale, panel.outline),
      fill: 'none',
      stroke: 'var(--ink)',
      'stroke-width': 0.75,
      'stroke-dasharray': '10 3 2 3',
    }),
    ...(isWhole === true && layout !== null ? [ribCentres(layout, scale)] : []),
    ...panelDimensions(input, scale, clear, trimmerMm),
    ...(isWhole === true ? [panelSizes(panel.outline, clear, scale)] : []),
    scaleBar(widthPx - 8, heightPx + 4, Math.min(240, widthPx * 0.4), scale.pxPerMm),
  ])
  return { node, widthPx, heightPx: fullHeightPx, edges: panel.outline.map((_, i) => edgePlace(panel.outline, i, scale)) }
}

function edgePlace(outline: readonly Point[], i: number, scale: PlanScale): EdgePlace {
  const [a, b] = edgeOfRing(outline, i).map((point) => toPx(scale, point)) as [Point, Point]
  const length = Math.hypot(b[0] - a[0], b[1] - a[1])
  const turn = signedArea(outline) < 0 ? -1 : 1
  const outward: Point = [(-turn * (b[1] - a[1])) / length, (turn * (b[0] - a[0])) / length]
  return { middlePx: [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2], outward }
}
