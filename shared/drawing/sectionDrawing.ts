import { patternDefinitions } from './patterns'
import { scaleBar } from './scaleBar'
import type { SectionSubject } from './sectionBody'
import { breakLine, drawnDepthMm, SECTION_PATTERNS, schemeLine, sectionBody, sectionDepthMm } from './sectionBody'
import { drawCallouts, sectionCallouts } from './sectionCallouts'
import { depthDimensions, DIMENSIONS_BELOW_PX, widthDimensions } from './sectionDimensions'
import type { SectionFrame } from './sectionFrame'
import { heightPx, round } from './sectionFrame'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** Scale of thumbnails, so that they may be compared with each other by eye. */
const THUMBNAIL_PX_PER_MM = 0.1
/** Narrower drawings leave out the words with leaders. */
const LEADERS_FROM_PX = 520
const MOST_DEPTH_PX = 190

/**
 * The section of a scheme as its sign: to scale, the soffit on the lower edge, no words.
 * Deeper floors than fit `heightPx` are drawn smaller, whole.
 * @param id - unique in the page
 */
export function sectionThumbnail(
  subject: Pick<SectionSubject, 'scheme' | 'depthMm' | 'blockMaterial'>,
  size: { readonly id: string; readonly widthPx: number; readonly heightPx: number },
): SvgNode {
  const depth = drawnDepthMm(subject)
  const pxPerMm = Math.min(THUMBNAIL_PX_PER_MM, (size.heightPx - 4) / depth)
  const soffitPx = size.heightPx - 1
  const frame: SectionFrame = { id: size.id, leftPx: 0, widthPx: size.widthPx, soffitPx, pxPerMm }
  const bare = { ...subject, reinforcement: { coverMm: 0, ribBars: [], cutLayer: null, lyingLayer: null } }
  const attributes = {
    class: 'drawing section-thumbnail',
    viewBox: `0 0 ${size.widthPx} ${size.heightPx}`,
    width: size.widthPx,
    height: size.heightPx,
    role: 'img',
    'aria-label': sectionInWords(subject),
  }
  return svgNode('svg', attributes, [
    patternDefinitions(size.id, SECTION_PATTERNS),
    sectionBody(bare, frame),
    soffitLine(0, size.widthPx, soffitPx),
  ])
}

/**
 * The cross-section of one scheme at midspan with words, dimensions and a scale bar, all from its own sizes.
 * @param id - unique in the page; `widthPx` the width it is shown at, so that its words keep their size
 */
export function sectionDrawing(subject: SectionSubject, { id, widthPx }: { id: string; widthPx: number }): SvgNode {
  const hasLeaders = widthPx >= LEADERS_FROM_PX
  const leftPx = subject.scheme.kind === 'ribbed' ? 98 : 48
  const sectionWidth = widthPx - leftPx - 12
  const depth = drawnDepthMm(subject)
  const pxPerMm = Math.min(sectionWidth / lengthToShowMm(subject, hasLeaders), MOST_DEPTH_PX / depth)
  const topPx = hasLeaders ? 76 : 14
  const soffitPx = round(topPx + depth * pxPerMm)
  const frame: SectionFrame = { id, leftPx, widthPx: sectionWidth, soffitPx, pxPerMm }
  const barTop = soffitPx + DIMENSIONS_BELOW_PX
  const heightOfAll = round(barTop + 26)
  return svgNode(
    'svg',
    {
      class: 'drawing section-drawing',
      viewBox: `0 0 ${widthPx} ${heightOfAll}`,
      width: widthPx,
      height: heightOfAll,
      role: 'img',
      'aria-label': sectionInWords(subject),
    },
    [
      patternDefinitions(id, SECTION_PATTERNS),
      ...framedSection(subject, frame),
      soffitLine(leftPx - 40, widthPx, soffitPx),
      ...depthDimensions(subject, frame, 'left'),
      ...widthDimensions(subject, frame),
      ...(hasLeaders ? drawCallouts(sectionCallouts(subject, frame), 20, widthPx) : []),
      scaleBar(widthPx - 4, barTop, Math.min(280, sectionWidth * 0.6), pxPerMm),
    ],
  )
}

/** Section with a break line at both ends. */
export function framedSection(subject: SectionSubject, frame: SectionFrame): SvgNode[] {
  const top = heightPx(frame, drawnDepthMm(subject))
  const colour = schemeLine(subject.scheme.kind)
  return [
    sectionBody(subject, frame),
    breakLine(round(frame.leftPx), top, frame.soffitPx, colour),
    breakLine(round(frame.leftPx + frame.widthPx), top, frame.soffitPx, colour),
  ]
}

/** The common base line of sections. */
export function soffitLine(fromPx: number, toPx: number, yPx: number): SvgNode {
  return svgNode('line', {
    class: 'section-soffit',
    x1: round(fromPx),
    y1: yPx,
    x2: round(toPx),
    y2: yPx,
    stroke: 'var(--ink)',
    'stroke-width': 1.5,
  })
}

/** Length of floor worth showing, mm: three ribs, or two on a narrow drawing; some four depths of a solid floor. */
export function lengthToShowMm(subject: SectionSubject, isWide: boolean): number {
  const { scheme } = subject
  if (scheme.kind === 'ribbed') return (scheme.block.width + scheme.ribWidth) * (isWide ? 2.65 : 1.6)
  return drawnDepthMm(subject) * (isWide ? 4.5 : 3)
}

/** The section told in words, for those who do not see it. */
export function sectionInWords(subject: Pick<SectionSubject, 'scheme' | 'depthMm'>): string {
  const { scheme } = subject
  const depth = sectionDepthMm(subject)
  if (scheme.kind === 'solid') {
    return `Cross-section of ${scheme.mark}, solid, ${depth === null ? 'thickness not known yet' : `${depth} mm thick`}`
  }
  const { block, ribWidth, topping } = scheme
  return `Cross-section of ${scheme.mark}, ribbed, ${depth} mm overall: blocks ${block.width} wide and ${block.height} high, ribs ${ribWidth}, topping ${topping}`
}
