import type { CatalogueBlock } from '../contracts/blockCatalogue'
import type { Scheme } from '../contracts/appraisal'
import type { PatternName } from './patterns'
import { patternFill } from './patterns'
import { ribbedSection } from './ribbedSection'
import type { SectionFrame } from './sectionFrame'
import { heightPx, round } from './sectionFrame'
import type { SectionReinforcement } from './sectionReinforcement'
import { solidSection } from './solidSection'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** A scheme as its cross-section shows it. */
export interface SectionSubject {
  readonly scheme: Scheme
  /** Depth as sized, mm; null where the floor could not be sized. */
  readonly depthMm: number | null
  readonly reinforcement: SectionReinforcement
  /** Absent where the reader does not see the catalogue: hatched as fired clay, named a hollow block. */
  readonly blockMaterial?: CatalogueBlock['material']
}

/** Smaller scales leave out stones and hatches, which would be larger than what they fill. */
const HATCH_FROM_PX_PER_MM = 0.15

/** Hatches that sections of both kinds use. */
export const SECTION_PATTERNS: readonly PatternName[] = [
  'concreteRibbed',
  'concreteSolid',
  'firedClay',
  'castBlock',
  'chartSolid',
]
/** Drawn depth of a solid floor whose thickness is not known yet, mm; its outline is dashed. */
const UNKNOWN_DEPTH_MM = 150

/** Depth the section is drawn with, mm: a scheme's own sizes first, then what was sized; null where neither says. */
export function sectionDepthMm({ scheme, depthMm }: Pick<SectionSubject, 'scheme' | 'depthMm'>): number | null {
  if (scheme.kind === 'ribbed') return scheme.block.height + scheme.topping
  return scheme.thickness === 'least' ? depthMm : scheme.thickness
}

/** Depth to leave room for, mm. */
export function drawnDepthMm(subject: Pick<SectionSubject, 'scheme' | 'depthMm'>): number {
  return sectionDepthMm(subject) ?? UNKNOWN_DEPTH_MM
}

/** The section itself between its two break lines, without words or dimensions. */
export function sectionBody(subject: SectionSubject, frame: SectionFrame): SvgNode {
  const { scheme } = subject
  const isSmall = frame.pxPerMm < HATCH_FROM_PX_PER_MM
  if (scheme.kind === 'ribbed') {
    const block = subject.blockMaterial === undefined || subject.blockMaterial === 'fired clay' ? 'firedClay' : 'castBlock'
    const fills = isSmall
      ? { concrete: 'var(--clay-wash)', block: 'var(--paper)' }
      : { concrete: patternFill(frame.id, 'concreteRibbed'), block: patternFill(frame.id, block) }
    return ribbedSection(scheme, frame, fills, subject.reinforcement)
  }
  const depth = sectionDepthMm(subject)
  if (depth === null) return unsized(frame)
  return solidSection(depth, frame, patternFill(frame.id, isSmall ? 'chartSolid' : 'concreteSolid'), subject.reinforcement)
}

function unsized(frame: SectionFrame): SvgNode {
  const top = heightPx(frame, UNKNOWN_DEPTH_MM)
  return svgNode('rect', {
    class: 'section-unsized',
    x: frame.leftPx,
    y: top,
    width: round(frame.widthPx),
    height: round(frame.soffitPx - top),
    fill: 'none',
    stroke: 'var(--slate)',
    'stroke-width': 1.25,
    'stroke-dasharray': '6 4',
  })
}

/** Break line at one end of a section: the floor goes on. */
export function breakLine(xPx: number, topPx: number, soffitPx: number, colour: string): SvgNode {
  const middle = round((topPx + soffitPx) / 2)
  return svgNode('path', {
    class: 'section-break',
    d: `M${xPx} ${topPx - 7}V${middle - 8}l-6 4l12 7l-6 4V${soffitPx + 7}`,
    fill: 'none',
    stroke: colour,
    'stroke-width': 0.9,
  })
}

/** Line colour of a kind of scheme. */
export function schemeLine(kind: Scheme['kind']): string {
  return kind === 'ribbed' ? 'var(--clay)' : 'var(--slate)'
}

/** Text colour of a kind of scheme. */
export function schemeInk(kind: Scheme['kind']): string {
  return kind === 'ribbed' ? 'var(--clay-ink)' : 'var(--slate)'
}
