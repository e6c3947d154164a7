import type { SectionFrame } from './sectionFrame'
import { heightPx, round } from './sectionFrame'
import type { SectionReinforcement } from './sectionReinforcement'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

const LEAST_DOT_PX = 1.4

/** Centres of the cut bars, mm from the section's left end, at their true spacing and as a group in the middle. */
export function cutBarCentres(spacingMm: number, lengthMm: number): number[] {
  const count = Math.max(1, Math.floor((lengthMm - spacingMm * 0.2) / spacingMm))
  const first = (lengthMm - (count - 1) * spacingMm) / 2
  return Array.from({ length: count }, (_, index) => first + index * spacingMm)
}

function barNodes(frame: SectionFrame, { coverMm, cutLayer, lyingLayer }: SectionReinforcement): SvgNode[] {
  const scale = frame.pxPerMm
  const cut = cutLayer
    ? cutBarCentres(cutLayer.spacing, frame.widthPx / scale).map((centre) =>
        svgNode('circle', {
          class: 'section-bar',
          cx: round(frame.leftPx + centre * scale),
          cy: heightPx(frame, coverMm + cutLayer.diameter / 2),
          r: Math.max(LEAST_DOT_PX, round((cutLayer.diameter * scale) / 2)),
          fill: 'var(--ink)',
        }),
      )
    : []
  if (!lyingLayer) return cut
  const y = heightPx(frame, coverMm + (cutLayer?.diameter ?? 0) + lyingLayer.diameter / 2)
  return [
    ...cut,
    svgNode('line', {
      class: 'section-bar',
      x1: frame.leftPx,
      y1: y,
      x2: round(frame.leftPx + frame.widthPx),
      y2: y,
      stroke: 'var(--ink)',
      'stroke-width': Math.max(1, round(lyingLayer.diameter * scale)),
    }),
  ]
}

/** Body of a solid floor cut across its main bars, to scale. */
export function solidSection(
  thicknessMm: number,
  frame: SectionFrame,
  fill: string,
  reinforcement: SectionReinforcement,
): SvgNode {
  const top = heightPx(frame, thicknessMm)
  return svgNode('g', { class: 'section-solid' }, [
    svgNode('rect', { x: frame.leftPx, y: top, width: frame.widthPx, height: round(frame.soffitPx - top), fill }),
    ...barNodes(frame, reinforcement),
    svgNode('line', {
      class: 'section-top',
      x1: frame.leftPx,
      y1: top,
      x2: round(frame.leftPx + frame.widthPx),
      y2: top,
      stroke: 'var(--slate)',
      'stroke-width': 2,
    }),
  ])
}
