import type { Beyond } from '../../contracts/appraisal'
import type { Point } from '../../geometry/point'
import type { Neighbour } from '../../layout/neighbours'
import type { EndOfSpan } from './spanForces'
import type { Strip, StripSpan } from './strip'

/** One end of a one-way panel: the outline edges it bears on there, numbers from 0, and what was typed to go on behind them. */
export interface LineEnd {
  readonly edges: readonly number[]
  readonly supportMm: number
  readonly isContinuous: boolean
  /** Some of its edges are free: nothing carries the panel there. */
  readonly isFree: boolean
  /** Length of those edges, mm. */
  readonly supportLengthMm: number
  readonly beyond: Beyond | null
}

/** A panel that spans one way: unit vector from start to end in level coordinates, its ends and its span. `bayMm2` is its own area. */
export interface SpanLine {
  readonly mark: string
  readonly direction: Point
  readonly ends: Readonly<Record<EndOfSpan, LineEnd>>
  readonly span: StripSpan
}

/** One entry for each panel of the level; null for panels that do not span one way. */
export type SpanLines = readonly (SpanLine | null)[]

/** For each panel of a level what stands on its edges. */
export type NeighboursOf = readonly (readonly Neighbour[])[]

/** Spans that turn by less than this against each other span the same way: 1 degree. */
const PARALLEL_SINE = Math.sin(Math.PI / 180)

/**
 * An overhang that takes less than this share of the support behind it does not relieve the span there over its whole width.
 *
 * Source: project rule, on the safe side
 */
const WHOLE_WIDTH_SHARE = 0.95

/** Whether two unit vectors lie in one line, either way round. */
export const isParallel = (a: Point, b: Point) => Math.abs(a[0] * b[1] - a[1] * b[0]) < PARALLEL_SINE

/** The other end of a span. */
export const oppositeEnd: Readonly<Record<EndOfSpan, EndOfSpan>> = { start: 'end', end: 'start' }

/** Whether an edge is the free end of a cantilever. */
const isTip = ({ ends }: SpanLine, edge: number) =>
  (ends.start.isFree && ends.start.edges.includes(edge)) || (ends.end.isFree && ends.end.edges.includes(edge))

/** Panels behind one end that span the same way, and how long they share its support, mm. */
function sharedLengths(panel: number, end: EndOfSpan, lines: SpanLines, neighboursOf: NeighboursOf): Map<number, number> {
  const line = lines[panel]!
  const lengths = new Map<number, number>()
  for (const { edge, neighbour, neighbourEdge, overlap } of neighboursOf[panel]!) {
    const behind = lines[neighbour]
    if (!line.ends[end].edges.includes(edge) || !behind || !isParallel(line.direction, behind.direction)) continue
    if (behind.span.isCantilever && isTip(behind, neighbourEdge)) continue
    lengths.set(neighbour, (lengths.get(neighbour) ?? 0) + overlap)
  }
  return lengths
}

/**
 * The panel that goes on behind one end, spanning the same way: the one named there, else the one with the longest common support; the
 * longer span where two are equal.
 */
function panelBehind(panel: number, end: EndOfSpan, lines: SpanLines, neighboursOf: NeighboursOf): number | null {
  const lengths = sharedLengths(panel, end, lines, neighboursOf)
  const { beyond } = lines[panel]!.ends[end]
  if (beyond && 'panel' in beyond) return [...lengths.keys()].find((each) => lines[each]!.mark === beyond.panel) ?? null
  const spanOf = (each: number) => lines[each]!.span.spanMm
  const order = [...lengths].sort(([a, lengthA], [b, lengthB]) => lengthB - lengthA || spanOf(b) - spanOf(a))
  return order[0]?.[0] ?? null
}

interface Member {
  readonly name: string
  readonly span: StripSpan
}

const metres = (mm: number) => (mm / 1000).toFixed(mm % 100 === 0 ? 1 : 2)

/** A span that is not drawn, loaded like the one before it, with a bay as wide. */
function undrawn({ span }: SpanLine, spanMm: number, word: 'typed' | 'assumed'): Member {
  const { loads, bayMm2 } = span
  const ownBayMm2 = spanMm === span.spanMm ? bayMm2 : (bayMm2 * spanMm) / span.spanMm
  return { name: `(${metres(spanMm)} m ${word})`, span: { spanMm, loads, bayMm2: ownBayMm2 } }
}

/** A drawn panel as the next member of a strip, `behind` another one. */
function drawn(at: number, behind: { panel: number; end: EndOfSpan }, lines: SpanLines, neighboursOf: NeighboursOf): Member {
  const { mark, span } = lines[at]!
  if (!span.isCantilever) return { name: mark, span }
  const shared = sharedLengths(behind.panel, behind.end, lines, neighboursOf).get(at) ?? 0
  const { supportLengthMm } = lines[behind.panel]!.ends[behind.end]
  return { name: mark, span: { ...span, isPartOfWidth: shared < WHOLE_WIDTH_SHARE * supportLengthMm } }
}

/** What lies beyond one end of a panel, nearest first; a continuous edge without a neighbour is followed by one equal span. */
function membersBeyond(panel: number, end: EndOfSpan, lines: SpanLines, neighboursOf: NeighboursOf) {
  const found: Member[] = []
  const seen = new Set([panel])
  let [at, out] = [panel, end]
  for (;;) {
    const line = lines[at]!
    const { isContinuous, beyond } = line.ends[out]
    if (!isContinuous) return { found, isAssumed: false }
    if (beyond && 'span' in beyond) return { found: [...found, undrawn(line, beyond.span, 'typed')], isAssumed: false }
    const next = panelBehind(at, out, lines, neighboursOf)
    if (next === null || seen.has(next))
      return { found: [...found, undrawn(line, line.span.spanMm, 'assumed')], isAssumed: at === panel }
    const { direction } = lines[next]!
    const sameWay = direction[0] * line.direction[0] + direction[1] * line.direction[1] > 0
    found.push(drawn(next, { panel: at, end: out }, lines, neighboursOf))
    seen.add(next)
    at = next
    out = sameWay ? out : oppositeEnd[out]
  }
}

/**
 * Area of each panel's bay, mm²: the row of panels side by side that span the same way, the full width between support lines.
 *
 * Source: BS 8110-1:1997, 3.5.2.3 and Figure 3.7, definition of a bay (from memory, engine design section 4)
 */
export function bayAreas(lines: SpanLines, neighboursOf: NeighboursOf): number[] {
  const bays = new Array<number>(lines.length).fill(0)
  const done = new Set<number>()
  lines.forEach((line, first) => {
    if (!line || done.has(first)) return
    const row = [first]
    done.add(first)
    for (const at of row) {
      const { ends, direction } = lines[at]!
      const atEnds = [...ends.start.edges, ...ends.end.edges]
      for (const { edge, neighbour } of neighboursOf[at]!) {
        const beside = lines[neighbour]
        if (atEnds.includes(edge) || done.has(neighbour) || !beside) continue
        if (!isParallel(direction, beside.direction)) continue
        done.add(neighbour)
        row.push(neighbour)
      }
    }
    const area = row.reduce((sum, each) => sum + lines[each]!.span.bayMm2, 0)
    for (const each of row) bays[each] = area
  })
  return bays
}

/**
 * Length of the longest cantilever that goes on behind some edges of a panel, mm; 0 without one.
 *
 * Source: project rule, engine design section 4 (neighbours share an edge)
 */
export function overhangBehind(panel: number, edges: readonly number[], lines: SpanLines, neighboursOf: NeighboursOf): number {
  return neighboursOf[panel]!.reduce((longest, { edge, neighbour, neighbourEdge }) => {
    const behind = lines[neighbour]
    const isOverhang = edges.includes(edge) && behind?.span.isCantilever && !isTip(behind, neighbourEdge)
    return isOverhang ? Math.max(longest, behind.span.spanMm) : longest
  }, 0)
}

/**
 * The continuous strip that a one-way panel is part of.
 *
 * Source: project rule, engine design section 4 (neighbours share an edge and span the same way; else an equal span, flagged; what was
 *   typed behind an edge comes before both)
 * @param lines - of the level, `lines[panel]` not null, bays as `bayAreas` gives them
 */
export function stripOf(panel: number, lines: SpanLines, neighboursOf: NeighboursOf): Strip {
  const own = lines[panel]!
  const before = membersBeyond(panel, 'start', lines, neighboursOf)
  const after = membersBeyond(panel, 'end', lines, neighboursOf)
  const members = [...before.found.reverse(), { name: own.mark, span: own.span }, ...after.found]
  return {
    spans: members.map(({ span }) => span),
    names: members.map(({ name }) => name),
    index: before.found.length,
    assumedEnds: Number(before.isAssumed) + Number(after.isAssumed),
  }
}
