import type { Point } from '../../geometry/point'
import type { Neighbour } from '../../layout/neighbours'
import type { EndOfSpan } from './spanForces'
import type { Strip, StripSpan } from './strip'

/** One end of a one-way panel: the outline edges it bears on there, numbers from 0. */
export interface LineEnd {
  readonly edges: readonly number[]
  readonly supportMm: number
  readonly isContinuous: boolean
}

/** A panel that spans one way: unit vector from start to end in level coordinates, its ends and its span. `bayMm2` is its own area. */
export interface SpanLine {
  readonly direction: Point
  readonly ends: Readonly<Record<EndOfSpan, LineEnd>>
  readonly span: StripSpan
}

/** One entry for each panel of the level; null for panels that do not span one way. */
export type SpanLines = readonly (SpanLine | null)[]

/** Spans that turn by less than this against each other span the same way: 1 degree. */
const PARALLEL_SINE = Math.sin(Math.PI / 180)

const isParallel = (a: Point, b: Point) => Math.abs(a[0] * b[1] - a[1] * b[0]) < PARALLEL_SINE
const opposite: Record<EndOfSpan, EndOfSpan> = { start: 'end', end: 'start' }

/** The panel that goes on behind one end, spanning the same way, with the longest common support; the longer span where two are equal. */
function panelBehind(panel: number, end: EndOfSpan, lines: SpanLines, neighbours: readonly Neighbour[]): number | null {
  const line = lines[panel]!
  const overlaps = new Map<number, number>()
  for (const { panel: from, edge, neighbour, overlap } of neighbours) {
    const behind = lines[neighbour]
    if (from !== panel || !line.ends[end].edges.includes(edge) || !behind || !isParallel(line.direction, behind.direction))
      continue
    overlaps.set(neighbour, (overlaps.get(neighbour) ?? 0) + overlap)
  }
  const spanOf = (each: number) => lines[each]!.span.spanMm
  const order = [...overlaps].sort(([a, lengthA], [b, lengthB]) => lengthB - lengthA || spanOf(b) - spanOf(a))
  return order[0]?.[0] ?? null
}

/** Spans beyond one end of a panel, nearest first; a continuous edge without a neighbour is followed by one equal span. */
function spansBeyond(panel: number, end: EndOfSpan, lines: SpanLines, neighbours: readonly Neighbour[]): (number | StripSpan)[] {
  const found: (number | StripSpan)[] = []
  const seen = new Set([panel])
  let [at, out] = [panel, end]
  for (;;) {
    const line = lines[at]!
    if (!line.ends[out].isContinuous) return found
    const next = panelBehind(at, out, lines, neighbours)
    if (next === null || seen.has(next)) return [...found, line.span]
    const { direction } = lines[next]!
    const sameWay = direction[0] * line.direction[0] + direction[1] * line.direction[1] > 0
    found.push(next)
    seen.add(next)
    at = next
    out = sameWay ? out : opposite[out]
  }
}

/**
 * Area of each panel's bay, mm²: the row of panels side by side that span the same way, the full width between support lines.
 *
 * Source: BS 8110-1:1997, 3.5.2.3 and Figure 3.7, definition of a bay (from memory, engine design section 4)
 */
export function bayAreas(lines: SpanLines, neighbours: readonly Neighbour[]): number[] {
  const bays = new Array<number>(lines.length).fill(0)
  const done = new Set<number>()
  lines.forEach((line, first) => {
    if (!line || done.has(first)) return
    const row = [first]
    done.add(first)
    for (const at of row) {
      const { ends, direction } = lines[at]!
      const atEnds = [...ends.start.edges, ...ends.end.edges]
      for (const { panel, edge, neighbour } of neighbours) {
        const beside = lines[neighbour]
        if (panel !== at || atEnds.includes(edge) || done.has(neighbour) || !beside) continue
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
 * The continuous strip that a one-way panel is part of.
 *
 * Source: project rule, engine design section 4 (neighbours share an edge and span the same way; else an equal span, flagged)
 * @param lines - of the level, `lines[panel]` not null, bays as `bayAreas` gives them
 */
export function stripOf(panel: number, lines: SpanLines, neighbours: readonly Neighbour[]): Strip {
  const own = lines[panel]!
  const before = spansBeyond(panel, 'start', lines, neighbours)
  const after = spansBeyond(panel, 'end', lines, neighbours)
  const spanOf = (each: number | StripSpan) => (typeof each === 'number' ? lines[each]!.span : each)
  const assumed = [before[0], after[0]].filter((first) => first === own.span)
  return {
    spans: [...before.reverse().map(spanOf), own.span, ...after.map(spanOf)],
    index: before.length,
    assumedEnds: assumed.length,
  }
}
