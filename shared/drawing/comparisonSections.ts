import type { PatternName } from './patterns'
import { patternDefinitions, patternFill } from './patterns'
import { scaleBar } from './scaleBar'
import type { SectionSubject } from './sectionBody'
import { drawnDepthMm, SECTION_PATTERNS, schemeInk, schemeLine, sectionDepthMm } from './sectionBody'
import { drawCallouts, sectionCallouts } from './sectionCallouts'
import { depthDimensions, DIMENSIONS_BELOW_PX, otherTop, widthDimensions } from './sectionDimensions'
import { framedSection, lengthToShowMm, sectionInWords, soffitLine } from './sectionDrawing'
import type { SectionFrame } from './sectionFrame'
import { heightPx, round } from './sectionFrame'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

const CHART_PATTERNS: readonly PatternName[] = ['chartRibbed']
/** From here on there is room for leaders and three ribs. */
const WIDE_FROM_PX = 760
const MOST_DEPTH_PX = 180

interface Measures {
  readonly isWide: boolean
  readonly pxPerMm: number
  readonly soffitPx: number
  readonly ribbedFrame: SectionFrame
  readonly solidFrame: SectionFrame
}

/**
 * Both sections at one scale on one soffit line; the other scheme's top runs dashed through each.
 * @param id - unique in the page; `widthPx` the width it is shown at
 */
export function comparisonSections(
  { ribbed, solid }: { readonly ribbed: SectionSubject; readonly solid: SectionSubject },
  { id, widthPx }: { readonly id: string; readonly widthPx: number },
): SvgNode {
  const { isWide, pxPerMm, soffitPx, ribbedFrame, solidFrame } = measure(ribbed, solid, id, widthPx)
  const barTop = soffitPx + (isWide ? DIMENSIONS_BELOW_PX : 44)
  const height = round(barTop + 26)
  const words = isWide
    ? [
        ...drawCallouts([...sectionCallouts(ribbed, ribbedFrame), ...sectionCallouts(solid, solidFrame)], CALLOUT_PX, widthPx),
        ...widthDimensions(ribbed, ribbedFrame),
        ...widthDimensions(solid, solidFrame),
      ]
    : []
  return svgNode(
    'svg',
    {
      class: 'drawing section-comparison',
      viewBox: `0 0 ${widthPx} ${height}`,
      width: widthPx,
      height,
      role: 'img',
      'aria-label': `${sectionInWords(ribbed)}. ${sectionInWords(solid)}. Both at one scale on one soffit line.`,
    },
    [
      patternDefinitions(id, [...SECTION_PATTERNS, ...CHART_PATTERNS]),
      heading(ribbed, ribbedFrame, isWide),
      heading(solid, solidFrame, isWide),
      ...framedSection(ribbed, ribbedFrame),
      ...framedSection(solid, solidFrame),
      ...tops(ribbed, solid, ribbedFrame, solidFrame),
      soffitLine(0, widthPx, soffitPx),
      ...(isWide ? [soffitMark(widthPx, soffitPx)] : []),
      ...depthDimensions(isWide ? ribbed : { ...ribbed, scheme: withoutChain(ribbed) }, ribbedFrame, 'left'),
      ...depthDimensions(solid, solidFrame, 'right'),
      ...words,
      scaleBar(widthPx - 4, barTop, isWide ? 290 : widthPx * 0.5, pxPerMm),
    ],
  )
}

const HEADING_PX = 20
const CALLOUT_PX = 82

function measure(ribbed: SectionSubject, solid: SectionSubject, id: string, widthPx: number): Measures {
  const isWide = widthPx >= WIDE_FROM_PX
  const leftPx = isWide ? 96 : 44
  const rightPx = isWide ? 96 : 44
  const gapPx = isWide ? 40 : 18
  const room = widthPx - leftPx - rightPx - gapPx
  const ribbedWidth = round(room * (isWide ? 0.73 : 0.66))
  const depth = Math.max(drawnDepthMm(ribbed), drawnDepthMm(solid))
  const pxPerMm = Math.min(ribbedWidth / lengthToShowMm(ribbed, isWide), MOST_DEPTH_PX / depth)
  const soffitPx = round((isWide ? CALLOUT_PX + 58 : 62) + depth * pxPerMm)
  const frame = { soffitPx, pxPerMm }
  return {
    isWide,
    pxPerMm,
    soffitPx,
    ribbedFrame: { ...frame, id, leftPx, widthPx: ribbedWidth },
    solidFrame: { ...frame, id, leftPx: leftPx + ribbedWidth + gapPx, widthPx: round(room - ribbedWidth) },
  }
}

/** Narrow drawings show the total depth only: the ribbed scheme as if it had no topping line of its own. */
function withoutChain({ scheme }: SectionSubject): SectionSubject['scheme'] {
  if (scheme.kind === 'solid') return scheme
  return { ...scheme, block: { ...scheme.block, height: scheme.block.height + scheme.topping }, topping: 0 }
}

function heading(subject: SectionSubject, frame: SectionFrame, isWide: boolean): SvgNode {
  const { scheme } = subject
  const x = frame.leftPx
  const depth = sectionDepthMm(subject)
  const overall = depth === null ? 'thickness not known yet' : `${depth} overall`
  const note = scheme.kind === 'ribbed' ? `blocks ${scheme.block.height}, topping ${scheme.topping}, ${overall}` : overall
  const narrow = scheme.kind === 'solid' ? 'concrete' : frame.widthPx < 170 ? 'hollow blocks' : 'hollow blocks between ribs'
  const textX = isWide ? x + 34 : x
  const swatch = svgNode('rect', {
    x,
    y: HEADING_PX - 13,
    width: 22,
    height: 14,
    fill: patternFill(frame.id, scheme.kind === 'ribbed' ? 'chartRibbed' : 'chartSolid'),
    stroke: schemeLine(scheme.kind),
    'stroke-width': 1,
  })
  const name = `${scheme.mark} ${scheme.kind === 'ribbed' ? 'Ribbed' : 'Solid'}`
  return svgNode('g', { class: 'section-heading' }, [
    ...(isWide ? [swatch] : []),
    svgNode(
      'text',
      {
        x: textX,
        y: HEADING_PX,
        'font-size': isWide ? 18 : 15,
        'font-weight': 600,
        fill: isWide ? 'var(--ink)' : schemeInk(scheme.kind),
      },
      [name],
    ),
    svgNode('text', { x: textX, y: HEADING_PX + (isWide ? 22 : 18), 'font-size': isWide ? 14 : 13, fill: 'var(--ink-2)' }, [
      isWide ? note : narrow,
    ]),
  ])
}

function tops(ribbed: SectionSubject, solid: SectionSubject, ribbedFrame: SectionFrame, solidFrame: SectionFrame): SvgNode[] {
  const lines = [
    ...otherTop(solid, ribbed, ribbedFrame, schemeLine('solid')),
    ...otherTop(ribbed, solid, solidFrame, schemeLine('ribbed')),
  ]
  const isRibbedDeeper = drawnDepthMm(ribbed) > drawnDepthMm(solid)
  const [higher, frame] = isRibbedDeeper ? [ribbed, solidFrame] : [solid, ribbedFrame]
  const roomPx = Math.abs(drawnDepthMm(ribbed) - drawnDepthMm(solid)) * frame.pxPerMm
  if (roomPx < 1) return []
  const above = roomPx < 20
  const y = heightPx(frame, drawnDepthMm(higher)) + (above ? -5 : 15)
  const label = svgNode(
    'text',
    { x: round(frame.leftPx + frame.widthPx), y, 'text-anchor': 'end', 'font-size': 13, fill: schemeInk(higher.scheme.kind) },
    [`top of ${higher.scheme.kind}`],
  )
  return [...lines, label]
}

function soffitMark(rightPx: number, y: number): SvgNode {
  return svgNode('g', { class: 'section-soffit-mark' }, [
    svgNode('polygon', {
      points: `${rightPx - 12},${y - 9} ${rightPx},${y - 9} ${rightPx - 6},${y - 1}`,
      fill: 'none',
      stroke: 'var(--ink)',
      'stroke-width': 1,
    }),
    svgNode('text', { x: rightPx, y: y + 17, 'font-size': 13, 'text-anchor': 'end', fill: 'var(--ink-2)' }, ['common soffit']),
  ])
}
