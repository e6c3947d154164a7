import type { Bar, BarLayer } from '../contracts/appraisal'
import { ribBarCentres, ribStarts } from './ribbedSection'
import type { SectionSubject } from './sectionBody'
import { drawnDepthMm } from './sectionBody'
import type { SectionFrame } from './sectionFrame'
import { heightPx, round } from './sectionFrame'
import { cutBarCentres } from './solidSection'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** Words with a leader to what they name. */
export interface SectionCallout {
  readonly targetX: number
  readonly targetY: number
  readonly title: string
  readonly note: string
}

/** Mean advance of a letter at 13 px, to keep labels apart. */
const ADVANCE = 6.2
const LABEL_GAP = 30

/** Bars as the trade writes them: 2H12 + 1H10. */
export function barsInWords(bars: readonly Bar[]): string {
  return bars.map(({ count, diameter }) => `${count}H${diameter}`).join(' + ')
}

/** A layer as the trade writes it: H10 at 200. */
export function layerInWords(layer: BarLayer): string {
  return `H${layer.diameter} at ${layer.spacing}`
}

/** What a section's parts are called, from left to right. */
export function sectionCallouts(subject: SectionSubject, frame: SectionFrame): SectionCallout[] {
  return subject.scheme.kind === 'ribbed' ? ribbedCallouts(subject, frame) : solidCallouts(subject, frame)
}

function ribbedCallouts(subject: SectionSubject, frame: SectionFrame): SectionCallout[] {
  const { scheme, reinforcement, blockMaterial } = subject
  if (scheme.kind !== 'ribbed') return []
  const { block, ribWidth, topping, mesh, link } = scheme
  const spacing = block.width + ribWidth
  const visible = ribStarts(scheme, frame.widthPx / frame.pxPerMm).filter((start) => start >= 0)
  const x = (mm: number) => round(frame.leftPx + mm * frame.pxPerMm)
  const firstRib = visible[0] ?? 0
  const lastRib = visible.at(-1) ?? firstRib
  const bars = ribBarCentres(reinforcement.ribBars, ribWidth, reinforcement.coverMm, link)
  const bar = bars[0] ?? { xMm: ribWidth / 2, yMm: reinforcement.coverMm, diameterMm: 0 }
  const cover = `cover ${reinforcement.coverMm}`
  return [
    ...(topping > 0
      ? [
          {
            targetX: x(Math.max(12, firstRib / 3)),
            targetY: heightPx(frame, block.height + topping / 2),
            title: mesh === 'none' ? `Topping ${topping}` : `Mesh ${mesh}`,
            note: mesh === 'none' ? 'no mesh' : `in a ${topping} mm topping`,
          },
        ]
      : []),
    {
      targetX: x(firstRib + ribWidth + block.width / 2),
      targetY: heightPx(frame, block.height - 10),
      title: `${material(blockMaterial)} block ${block.width} × ${block.length} × ${block.height}`,
      note: `${block.mass} kg, ends closed`,
    },
    {
      targetX: x((lastRib === firstRib ? firstRib : firstRib + Math.round((lastRib - firstRib) / spacing) * spacing) + bar.xMm),
      targetY: heightPx(frame, bar.yMm),
      title: reinforcement.ribBars.length > 0 ? `Rib ${ribWidth}, ${barsInWords(reinforcement.ribBars)}` : `Rib ${ribWidth}`,
      note: link > 0 ? `link H${link}, ${cover}` : `no link, ${cover}`,
    },
  ]
}

function material(name: SectionSubject['blockMaterial']): string {
  if (name === undefined) return 'Hollow'
  const words = { 'fired clay': 'Hollow clay', concrete: 'Hollow concrete', 'lightweight concrete': 'Lightweight concrete' }
  return words[name]
}

function solidCallouts(subject: SectionSubject, frame: SectionFrame): SectionCallout[] {
  const { cutLayer, lyingLayer, coverMm } = subject.reinforcement
  const middle = round(frame.leftPx + frame.widthPx / 2)
  if (!cutLayer) {
    return [
      {
        targetX: middle,
        targetY: heightPx(frame, drawnDepthMm(subject) / 2),
        title: subject.depthMm === null ? 'Thickness not known yet' : 'Concrete',
        note: `cover ${coverMm}`,
      },
    ]
  }
  const centres = cutBarCentres(cutLayer.spacing, frame.widthPx / frame.pxPerMm)
  const target = centres[Math.floor(centres.length / 2)] ?? 0
  const isBothWays = lyingLayer && lyingLayer.diameter === cutLayer.diameter && lyingLayer.spacing === cutLayer.spacing
  return [
    {
      targetX: round(frame.leftPx + target * frame.pxPerMm),
      targetY: heightPx(frame, coverMm + cutLayer.diameter / 2),
      title: isBothWays
        ? `${layerInWords(cutLayer)} both ways`
        : [cutLayer, ...(lyingLayer ? [lyingLayer] : [])].map(layerInWords).join(', across '),
      note: `bottom, cover ${coverMm}`,
    },
  ]
}

/**
 * Leaders and words over the sections, kept apart from left to right; whatever would run past `rightPx` moves left.
 * @param baselinePx - base line of the titles
 */
export function drawCallouts(callouts: readonly SectionCallout[], baselinePx: number, rightPx: number): SvgNode[] {
  const widths = callouts.map(({ title, note }) => Math.max(title.length, note.length) * ADVANCE)
  const starts: number[] = []
  callouts.forEach(({ targetX }, index) => {
    const before = index === 0 ? -Infinity : starts[index - 1]! + widths[index - 1]! + LABEL_GAP
    starts.push(Math.max(targetX + 28, before))
  })
  let limit = rightPx
  for (let index = callouts.length - 1; index >= 0; index--) {
    starts[index] = Math.min(starts[index]!, limit - widths[index]!)
    limit = starts[index]! - LABEL_GAP
  }
  return callouts.map((callout, index) => drawCallout(callout, round(starts[index]!), baselinePx))
}

function drawCallout({ targetX, targetY, title, note }: SectionCallout, x: number, y: number): SvgNode {
  const text = (content: string, dy: number, fill: string) => svgNode('text', { x, y: y + dy, 'font-size': 13, fill }, [content])
  return svgNode('g', { class: 'section-callout' }, [
    svgNode('path', {
      d: `M${x - 6} ${y - 4.5}H${x - 18}L${targetX} ${targetY}`,
      fill: 'none',
      stroke: 'var(--ink)',
      'stroke-width': 0.75,
    }),
    svgNode('circle', { cx: targetX, cy: targetY, r: 1.8, fill: 'var(--ink)' }),
    text(title, 0, 'var(--ink)'),
    text(note, 17, 'var(--ink-2)'),
  ])
}
