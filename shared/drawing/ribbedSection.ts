import type { Bar, Mesh, RibbedScheme } from '../contracts/appraisal'
import { hollowBlock } from './hollowBlock'
import type { SectionFrame } from './sectionFrame'
import { heightPx, round } from './sectionFrame'
import type { SectionReinforcement } from './sectionReinforcement'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/**
 * Wire diameters of the meshes, mm; all have wires at 200 mm.
 * Source: BS 4483:2005, Table 1 (A98 at 5, A142 at 6, A193 at 7, A252 at 8, A393 at 10)
 */
const WIRE_MM: Record<Mesh, number> = { none: 0, A98: 5, A142: 6, A193: 7, A252: 8, A393: 10 }
const WIRE_SPACING_MM = 200
/** Least radius at which a bar can still be seen, px. */
const LEAST_DOT_PX = 1.4

/** Left edges of the ribs that show in a section, mm from its left end; the first may lie outside. */
export function ribStarts(scheme: RibbedScheme, lengthMm: number): number[] {
  const spacing = scheme.block.width + scheme.ribWidth
  const first = firstRibMm(scheme, lengthMm)
  const starts: number[] = []
  for (let start = first - Math.ceil(first / spacing) * spacing; start < lengthMm; start += spacing) starts.push(start)
  return starts
}

/** Offset that puts as many whole ribs as fit symmetrically into the section. */
function firstRibMm(scheme: RibbedScheme, lengthMm: number): number {
  const spacing = scheme.block.width + scheme.ribWidth
  const whole = Math.max(1, Math.floor((lengthMm - scheme.ribWidth) / spacing + 1))
  return (lengthMm - (whole - 1) * spacing - scheme.ribWidth) / 2
}

/** Centres of the bars of one rib, mm from the rib's left edge, left to right, smallest bars between the larger. */
export function ribBarCentres(
  bars: readonly Bar[],
  ribWidthMm: number,
  coverMm: number,
  linkMm: number,
): { readonly xMm: number; readonly yMm: number; readonly diameterMm: number }[] {
  const diameters = bars.flatMap((bar) => Array.from({ length: bar.count }, () => bar.diameter))
  const inset = coverMm + linkMm
  const last = diameters.length - 1
  return diameters.map((diameter, index) => {
    const left = inset + diameter / 2
    const share = last === 0 ? 0.5 : index / last
    return { xMm: left + share * (ribWidthMm - 2 * inset - diameter), yMm: inset + diameter / 2, diameterMm: diameter }
  })
}

function meshNodes(scheme: RibbedScheme, frame: SectionFrame): SvgNode[] {
  const wire = WIRE_MM[scheme.mesh]
  if (wire === 0) return []
  const y = heightPx(frame, scheme.block.height + scheme.topping / 2)
  const radius = Math.max(LEAST_DOT_PX, (wire * frame.pxPerMm) / 2)
  const step = WIRE_SPACING_MM * frame.pxPerMm
  const wires = Math.floor(frame.widthPx / step)
  const first = frame.leftPx + (frame.widthPx - (wires - 1) * step) / 2
  return [
    svgNode('line', {
      x1: frame.leftPx,
      y1: y,
      x2: frame.leftPx + frame.widthPx,
      y2: y,
      stroke: 'var(--ink)',
      'stroke-width': Math.max(1, round(wire * frame.pxPerMm)),
    }),
    ...Array.from({ length: wires }, (_, index) =>
      svgNode('circle', { cx: round(first + index * step), cy: round(y + radius), r: round(radius), fill: 'var(--ink)' }),
    ),
  ]
}

function ribNodes(scheme: RibbedScheme, frame: SectionFrame, startMm: number, reinforcement: SectionReinforcement): SvgNode[] {
  const { coverMm, ribBars } = reinforcement
  const scale = frame.pxPerMm
  const x = (mm: number) => round(frame.leftPx + (startMm + mm) * scale)
  const link = scheme.link
  const inside = coverMm + link / 2
  const links =
    link === 0 || 2 * inside >= scheme.ribWidth
      ? []
      : [
          svgNode('path', {
            d: `M${x(inside)} ${heightPx(frame, scheme.block.height + scheme.topping / 2)}V${heightPx(frame, inside)}H${x(scheme.ribWidth - inside)}V${heightPx(frame, scheme.block.height + scheme.topping / 2)}`,
            fill: 'none',
            stroke: 'var(--ink)',
            'stroke-width': Math.max(1, round(link * scale)),
            'stroke-linejoin': 'round',
          }),
        ]
  const bars = ribBarCentres(ribBars, scheme.ribWidth, coverMm, link).map(({ xMm, yMm, diameterMm }) =>
    svgNode('circle', {
      class: 'section-bar',
      cx: x(xMm),
      cy: heightPx(frame, yMm),
      r: Math.max(LEAST_DOT_PX, round((diameterMm * scale) / 2)),
      fill: 'var(--ink)',
    }),
  )
  return [...links, ...bars]
}

/**
 * Body of a ribbed floor cut across its ribs: topping, blocks, ribs, mesh, links and bars, all to scale.
 * @param fills - hatch of the concrete and of the block's shell
 */
export function ribbedSection(
  scheme: RibbedScheme,
  frame: SectionFrame,
  fills: { readonly concrete: string; readonly block: string },
  reinforcement: SectionReinforcement,
): SvgNode {
  const { block, ribWidth, topping } = scheme
  const scale = frame.pxPerMm
  const lengthMm = frame.widthPx / scale
  const starts = ribStarts(scheme, lengthMm)
  const top = heightPx(frame, block.height + topping)
  const right = frame.leftPx + frame.widthPx
  const place = { topPx: heightPx(frame, block.height), pxPerMm: scale, fromPx: frame.leftPx, toPx: right }
  return svgNode('g', { class: 'section-ribbed' }, [
    svgNode('rect', {
      x: frame.leftPx,
      y: top,
      width: frame.widthPx,
      height: round(frame.soffitPx - top),
      fill: fills.concrete,
    }),
    ...starts.map((start) =>
      hollowBlock({ ...place, leftPx: frame.leftPx + (start + ribWidth) * scale }, block.width, block.height, fills.block),
    ),
    ...meshNodes(scheme, frame),
    ...starts
      .filter((start) => start >= 0 && start + ribWidth <= lengthMm)
      .flatMap((start) => ribNodes(scheme, frame, start, reinforcement)),
    svgNode('line', {
      class: 'section-top',
      x1: frame.leftPx,
      y1: top,
      x2: round(right),
      y2: top,
      stroke: 'var(--clay)',
      'stroke-width': 2,
    }),
  ])
}
