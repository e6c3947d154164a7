import type { Panel } from '../contracts/appraisal'
import type { PanelLayout, PlacedBlock } from '../layout/panelLayout'
import { patternFill } from './patterns'
import type { PlanScale } from './planScale'
import { pointsText, ringsText, toPx } from './planScale'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** One panel as a plan shows it. `layout` is null for a solid scheme and while the panel is not laid out. */
export interface PlanPanel {
  readonly panel: Panel
  readonly kind: 'ribbed' | 'solid'
  readonly layout: PanelLayout | null
  /** False where the panel is left out of the figures: it is drawn as an empty dashed outline. */
  readonly isCounted: boolean
  readonly isBothWays: boolean
}

/** How the blocks are drawn: each on its own, or all of a panel as one path with one subpath a block. */
export type BlockStyle = { readonly each: 'shape' | 'subpath'; readonly fill: string }

/** A panel's ground, solid parts, blocks and voids. Every block drawn is an element `.block`, or a subpath of `.blocks`. */
export function planPanel(input: PlanPanel, scale: PlanScale, id: string, style: BlockStyle): SvgNode {
  const { panel, kind, layout, isCounted } = input
  const outline = pointsText(scale, panel.outline)
  const attributes = { class: 'plan-panel', 'data-panel': panel.mark }
  if (!isCounted)
    return svgNode('g', attributes, [
      svgNode('polygon', {
        points: outline,
        fill: 'var(--error-wash)',
        stroke: 'var(--error)',
        'stroke-width': 1,
        'stroke-dasharray': '5 4',
      }),
    ])
  const ground = { points: outline, fill: kind === 'solid' ? patternFill(id, 'chartSolid') : 'var(--paper)' }
  return svgNode('g', attributes, [
    svgNode('polygon', ground),
    ...(layout === null ? [] : [...solidParts(panel, layout, scale, id), ...blockNodes(layout.blocks, panel.mark, scale, style)]),
    ...panel.voids.map((ring) => voidNode(ring, scale)),
  ])
}

/** Full-depth concrete: what stands over supports, and the solid regions inside the clear outline. */
export function solidParts({ outline }: Pick<Panel, 'outline'>, layout: PanelLayout, scale: PlanScale, id: string): SvgNode[] {
  const fill = patternFill(id, 'solidOnPlan')
  const strips = svgNode('path', {
    class: 'plan-strips',
    d: ringsText(scale, [outline, layout.clear]),
    fill,
    'fill-rule': 'evenodd',
  })
  const regions = layout.regions
    .filter(({ rings }) => rings.length > 0)
    .map(({ kind, rings }) =>
      svgNode('path', { class: `plan-solid ${kind}`, d: ringsText(scale, rings), fill, 'fill-rule': 'evenodd' }),
    )
  return [strips, ...regions]
}

/** The blocks of one panel. */
export function blockNodes(blocks: readonly PlacedBlock[], mark: string, scale: PlanScale, style: BlockStyle): SvgNode[] {
  const paint = { fill: style.fill, stroke: 'var(--clay)', 'stroke-width': 0.6 }
  if (blocks.length === 0) return []
  if (style.each === 'subpath') {
    const d = ringsText(
      scale,
      blocks.map(({ ring }) => ring),
    )
    return [svgNode('path', { class: 'blocks', 'data-panel': mark, 'data-blocks': blocks.length, d, ...paint })]
  }
  return [
    svgNode(
      'g',
      paint,
      blocks.map(({ ring, isCut }) =>
        svgNode('polygon', {
          class: isCut ? 'block cut' : 'block',
          'data-panel': mark,
          points: pointsText(scale, ring),
          fill: isCut ? 'var(--clay-wash)' : undefined,
        }),
      ),
    ),
  ]
}

/** A void: its outline and two diagonals between its farthest corners. */
export function voidNode(ring: Panel['outline'], scale: PlanScale): SvgNode {
  const quarter = Math.max(1, Math.round(ring.length / 4))
  const crossing = [0, quarter].map((from) => {
    const to = (from + Math.floor(ring.length / 2)) % ring.length
    return `M${toPx(scale, ring[from]!).join(' ')}L${toPx(scale, ring[to]!).join(' ')}`
  })
  return svgNode('g', { class: 'plan-void' }, [
    svgNode('polygon', { points: pointsText(scale, ring), fill: 'var(--paper)', stroke: 'var(--ink)', 'stroke-width': 1 }),
    svgNode('path', { d: crossing.join(''), fill: 'none', stroke: 'var(--ink)', 'stroke-width': 0.6 }),
  ])
}
