import type { AnalysisRules } from '../analysis/analysisRules'
import { bayAreas, overhangBehind, type SpanLine, stripOf } from '../analysis/levelStrips'
import { momentFromBehind, raisedTo } from '../analysis/sharedSupports'
import { type EndOfSpan, liftedEnds, type SpanForces } from '../analysis/spanForces'
import type { Strip } from '../analysis/strip'
import { positionIn, stripForces } from '../analysis/stripForces'
import type { CodeBasis, SpanPosition } from '../codeBasis'
import type { LevelSite } from '../panelSite'
import type { RibbedPanel } from './ribbedPanel'

/** Span and forces of a ribbed panel, per metre of width. */
export interface RibAnalysis {
  readonly spanMm: number
  readonly position: SpanPosition
  readonly forces: SpanForces
  /** From the line of support to its face, mm. */
  readonly faceMm: Readonly<Record<EndOfSpan, number>>
  /** Number of ends beyond which an equal span was assumed. */
  readonly assumedEnds: number
  /** Length of a cantilever that goes on behind each end, mm; 0 without one. */
  readonly overhangMm: Readonly<Record<EndOfSpan, number>>
  /** The strip it was analysed in. */
  readonly strip: Strip
  /** Share of redistribution that was asked for. */
  readonly askedShare: number
  /** Ends off which load on other spans may lift it. */
  readonly lifted: readonly EndOfSpan[]
}

/** Overall depth of the ribs, and to the near side of their bars, mm. */
export interface RibDepths {
  readonly heightMm: number
  readonly depthMm: number
}

/**
 * Effective span and forces of every ribbed panel of a level: one way along the ribs, continuous with neighbours whose ribs run
 * the same way.
 *
 * Source: EN 1992-1-1:2004, 5.3.2.2, or the basis' own rule; BS 8110-1:1997, Table 3.12 or elastic analysis (engine design section 4)
 */
export function analyseRibs(
  { panels: sites, neighboursOf }: LevelSite,
  panels: readonly RibbedPanel[],
  depths: RibDepths,
  basis: CodeBasis,
  rules: AnalysisRules,
): RibAnalysis[] {
  const marks = sites.map(({ panel }) => panel.mark)
  const lines = spanLines(panels, marks, depths, basis)
  const bays = bayAreas(lines, neighboursOf)
  const withBays = lines.map((line, i) => ({ ...line, span: { ...line.span, bayMm2: bays[i]! } }))
  const raw = panels.map((_, i) => {
    const strip = stripOf(i, withBays, neighboursOf)
    return { strip, forces: stripForces(strip, rules) }
  })
  const moments = panels.map(({ ends }, i) => {
    const at = (end: EndOfSpan) => ends[end].edges.map((edge) => [edge, raw[i]!.forces.hoggingNmm(end, 0)] as const)
    return new Map([...at('start'), ...at('end')])
  })
  return panels.map(({ ends }, i) => {
    const { strip, forces } = raw[i]!
    const spanMm = lines[i]!.span.spanMm
    const behind = (end: EndOfSpan) => (ends[end].isContinuous ? momentFromBehind(i, ends[end].edges, moments, neighboursOf) : 0)
    return {
      spanMm,
      position: positionIn(strip),
      forces: raisedTo(forces, spanMm, { start: behind('start'), end: behind('end') }),
      faceMm: faceDistances(panels[i]!, spanMm, depths, basis),
      assumedEnds: strip.assumedEnds,
      overhangMm: {
        start: overhangBehind(i, ends.start.edges, lines, neighboursOf),
        end: overhangBehind(i, ends.end.edges, lines, neighboursOf),
      },
      strip,
      askedShare: rules.redistributedShare,
      lifted: strip.spans[strip.index]!.isCantilever
        ? []
        : liftedEnds(forces, { start: ends.start.isContinuous, end: ends.end.isContinuous }),
    }
  })
}

function spanLines(
  panels: readonly RibbedPanel[],
  marks: readonly string[],
  { heightMm, depthMm }: RibDepths,
  basis: CodeBasis,
): SpanLine[] {
  return panels.map(({ direction, ends, isCantilever, clearMm, loads, grossMm2 }, i) => {
    const span = basis.effectiveSpanMm(clearMm, heightMm, depthMm, [ends.start, ends.end])
    return { mark: marks[i]!, direction, ends, span: { spanMm: span, loads, bayMm2: grossMm2, isCantilever } }
  })
}

/** What the effective span adds to the clear one, shared between its ends as each would add alone. */
function faceDistances(
  { clearMm, ends }: RibbedPanel,
  spanMm: number,
  { heightMm, depthMm }: RibDepths,
  basis: CodeBasis,
): Record<EndOfSpan, number> {
  const none = { supportMm: 0, isContinuous: false }
  const start = basis.effectiveSpanMm(clearMm, heightMm, depthMm, [ends.start, none]) - clearMm
  const end = basis.effectiveSpanMm(clearMm, heightMm, depthMm, [none, ends.end]) - clearMm
  const share = start + end === 0 ? 0 : (spanMm - clearMm) / (start + end)
  return { start: start * share, end: end * share }
}
