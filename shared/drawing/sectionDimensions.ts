import { horizontalDimension, verticalDimension } from './dimensionLine'
import { ribStarts } from './ribbedSection'
import type { SectionSubject } from './sectionBody'
import { drawnDepthMm, sectionDepthMm } from './sectionBody'
import type { SectionFrame } from './sectionFrame'
import { heightPx, round } from './sectionFrame'
import { cutBarCentres } from './solidSection'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/** Rows of dimensions under the soffit: nearest smallest, total outermost, px. */
const FIRST_ROW_PX = 34
const SECOND_ROW_PX = 64
/** Height that the dimensions under a section need, px. */
export const DIMENSIONS_BELOW_PX = SECOND_ROW_PX + 12

/** Depth beside a section: topping and block near, total outside. `side` says on which side of the section. */
export function depthDimensions(subject: SectionSubject, frame: SectionFrame, side: 'left' | 'right'): SvgNode[] {
  const depth = sectionDepthMm(subject)
  if (depth === null) return []
  const direction = side === 'left' ? -1 : 1
  const edge = side === 'left' ? frame.leftPx : frame.leftPx + frame.widthPx
  const at = (row: number) => edge + direction * row
  const top = heightPx(frame, depth)
  const { scheme } = subject
  const nearPx = 24
  if (scheme.kind === 'solid' || scheme.topping === 0) {
    return [verticalDimension({ from: top, to: frame.soffitPx, at: at(nearPx), text: String(depth), extendFrom: edge })]
  }
  const level = heightPx(frame, scheme.block.height)
  const chain = [
    verticalDimension({ from: top, to: level, at: at(nearPx), text: String(scheme.topping), extendFrom: edge }),
    verticalDimension({ from: level, to: frame.soffitPx, at: at(nearPx), text: String(scheme.block.height), extendFrom: edge }),
  ]
  return [
    ...chain,
    verticalDimension({ from: top, to: frame.soffitPx, at: at(nearPx + 42), text: String(depth), extendFrom: at(nearPx) }),
  ]
}

/** Widths under a section: ribs and blocks near, their spacing outside; or the spacing of the cut bars of a solid floor. */
export function widthDimensions(subject: SectionSubject, frame: SectionFrame): SvgNode[] {
  return subject.scheme.kind === 'ribbed' ? ribDimensions(subject, frame) : barDimension(subject, frame)
}

function ribDimensions({ scheme }: SectionSubject, frame: SectionFrame): SvgNode[] {
  if (scheme.kind !== 'ribbed') return []
  const { block, ribWidth } = scheme
  const lengthMm = frame.widthPx / frame.pxPerMm
  const x = (mm: number) => round(frame.leftPx + mm * frame.pxPerMm)
  const whole = ribStarts(scheme, lengthMm).filter((start) => start >= 0 && start + ribWidth <= lengthMm)
  const near = { at: frame.soffitPx + FIRST_ROW_PX, extendFrom: frame.soffitPx }
  const ribs = whole.map((start) =>
    horizontalDimension({ from: x(start), to: x(start + ribWidth), text: String(ribWidth), ...near }),
  )
  const blocks = whole.slice(0, -1).map((start) =>
    horizontalDimension({
      from: x(start + ribWidth),
      to: x(start + ribWidth + block.width),
      text: String(block.width),
      ...near,
    }),
  )
  const spacing = block.width + ribWidth
  const between = whole.slice(0, -1).map((start, index) =>
    horizontalDimension({
      from: x(start + ribWidth / 2),
      to: x(start + ribWidth / 2 + spacing),
      text: index === 0 ? `ribs at ${spacing}` : String(spacing),
      at: frame.soffitPx + SECOND_ROW_PX,
      extendFrom: frame.soffitPx + FIRST_ROW_PX,
    }),
  )
  return [...ribs, ...blocks, ...between]
}

function barDimension({ reinforcement }: SectionSubject, frame: SectionFrame): SvgNode[] {
  const layer = reinforcement.cutLayer
  if (!layer) return []
  const [first, second] = cutBarCentres(layer.spacing, frame.widthPx / frame.pxPerMm)
  if (first === undefined || second === undefined) return []
  const x = (mm: number) => round(frame.leftPx + mm * frame.pxPerMm)
  return [
    horizontalDimension({
      from: x(first),
      to: x(second),
      text: layer.spacing * frame.pxPerMm > 90 ? `bars at ${layer.spacing}` : String(layer.spacing),
      at: frame.soffitPx + FIRST_ROW_PX,
      extendFrom: frame.soffitPx,
    }),
  ]
}

/** Top of the other scheme, dashed in its colour, across a section; empty where both are as deep. */
export function otherTop(other: SectionSubject, own: SectionSubject, frame: SectionFrame, colour: string): SvgNode[] {
  if (Math.abs(drawnDepthMm(other) - drawnDepthMm(own)) < 0.5) return []
  const y = heightPx(frame, drawnDepthMm(other))
  return [
    svgNode('line', {
      class: 'section-other-top',
      x1: round(frame.leftPx - 6),
      y1: y,
      x2: round(frame.leftPx + frame.widthPx + 6),
      y2: y,
      stroke: colour,
      'stroke-width': 1.5,
      'stroke-dasharray': '9 4',
    }),
  ]
}
