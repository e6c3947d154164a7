import { FIT_TOLERANCE_MM } from './tolerance'
import type { Slab, SlabEdge } from './slabs'
import { xAt } from './slabs'

/** A stretch of a slab that belongs to the region, between two edges. */
export interface Span {
  readonly left: SlabEdge
  readonly right: SlabEdge
}

/** A part of the plane as level bands, lowest first; spans of a band from left to right. */
export type Region = readonly { readonly bottom: number; readonly top: number; readonly spans: readonly Span[] }[]

/** An upright window; sides may be infinite. */
export interface Window {
  readonly left: number
  readonly right: number
  readonly bottom: number
  readonly top: number
}

/**
 * The part of the plane where `isInside` holds.
 *
 * @param isInside - told the winding number of every ring, in the order the slabs were cut from
 */
export function regionWhere(
  slabs: readonly Slab[],
  ringCount: number,
  isInside: (windings: readonly number[]) => boolean,
): Region {
  return slabs.map(({ bottom, top, edges }) => {
    const windings = new Array<number>(ringCount).fill(0)
    const spans: Span[] = []
    let left: SlabEdge | null = null
    for (const edge of edges) {
      windings[edge.ring] = windings[edge.ring]! + edge.winding
      const inside = isInside(windings)
      if (inside && left === null) left = edge
      if (!inside && left !== null) {
        spans.push({ left, right: edge })
        left = null
      }
    }
    return { bottom, top, spans }
  })
}

/** Area of a region within a window (everywhere unless given), mm². */
export function areaOf(region: Region, window?: Window): number {
  const { left, right, bottom, top } = window ?? { left: -Infinity, right: Infinity, bottom: -Infinity, top: Infinity }
  let area = 0
  for (const slab of region) {
    if (slab.top <= bottom) continue
    if (slab.bottom >= top) break
    const [low, high] = [Math.max(bottom, slab.bottom), Math.min(top, slab.top)]
    for (const span of slab.spans)
      area += areaLeftOf(span.right, low, high, left, right) - areaLeftOf(span.left, low, high, left, right)
  }
  return area
}

/** Integral over y from `low` to `high` of the edge's x, held between `least` and `most`. */
function areaLeftOf(edge: SlabEdge, low: number, high: number, least: number, most: number): number {
  const [a, b] = [xAt(edge, low), xAt(edge, high)]
  const [small, large] = [Math.min(a, b), Math.max(a, b)]
  if (small >= least && large <= most) return ((a + b) / 2) * (high - low)
  if (large <= least) return least * (high - low)
  if (small >= most) return most * (high - low)
  const [from, to] = [Math.max(small, least), Math.min(large, most)]
  const atLeast = from > small ? (from - small) * least : 0
  const atMost = large > to ? (large - to) * most : 0
  return ((atLeast + ((from + to) / 2) * (to - from) + atMost) * (high - low)) / (large - small)
}

/** An interval of x over which a level band lies wholly inside a region, and the edges that end it. */
export interface ClearInterval {
  readonly start: number
  readonly end: number
  readonly startEdges: readonly SlabEdge[]
  readonly endEdges: readonly SlabEdge[]
}

interface Blocked {
  start: number
  end: number
  /** Edges met at `start` and at `end`; none at infinity. */
  startEdges: SlabEdge[]
  endEdges: SlabEdge[]
}

/**
 * Intervals of x over which the whole height of a band lies inside a region, from left to right. The band is taken
 * `FIT_TOLERANCE_MM` narrower on each side, so that what fits exactly fits.
 *
 * @param bottom - of the band, mm
 * @param top - of the band, mm
 */
export function clearIntervals(region: Region, bottom: number, top: number): ClearInterval[] {
  const [low, high] = [bottom + FIT_TOLERANCE_MM, top - FIT_TOLERANCE_MM]
  if (region.length === 0 || low < region[0]!.bottom || high > region[region.length - 1]!.top) return []
  const blocked = merged(region.flatMap((slab) => (slab.top > low && slab.bottom < high ? blockedIn(slab, low, high) : [])))
  const intervals: ClearInterval[] = []
  for (let i = 0; i + 1 < blocked.length; i += 1) {
    const [before, after] = [blocked[i]!, blocked[i + 1]!]
    intervals.push({ start: before.end, end: after.start, startEdges: before.endEdges, endEdges: after.startEdges })
  }
  return intervals
}

/** Stretches of x that a slab's gaps take out of a band. */
function blockedIn(slab: Region[number], bandLow: number, bandHigh: number): Blocked[] {
  const [low, high] = [Math.max(bandLow, slab.bottom), Math.min(bandHigh, slab.top)]
  const leftmost = (edge: SlabEdge) => Math.min(xAt(edge, low), xAt(edge, high))
  const rightmost = (edge: SlabEdge) => Math.max(xAt(edge, low), xAt(edge, high))
  const gaps: Blocked[] = []
  for (let i = 0; i <= slab.spans.length; i += 1) {
    const [start, end] = [slab.spans[i - 1]?.right, slab.spans[i]?.left]
    gaps.push({
      start: start ? leftmost(start) : -Infinity,
      end: end ? rightmost(end) : Infinity,
      startEdges: start ? [start] : [],
      endEdges: end ? [end] : [],
    })
  }
  return gaps
}

/** Blocked stretches joined where they overlap or touch, with all edges that bound the joined stretch. */
function merged(stretches: Blocked[]): Blocked[] {
  const result: Blocked[] = []
  for (const next of stretches.sort((a, b) => a.start - b.start)) {
    const last = result[result.length - 1]
    if (!last || next.start > last.end + FIT_TOLERANCE_MM) {
      result.push({ ...next })
      continue
    }
    if (next.start <= last.start + FIT_TOLERANCE_MM) last.startEdges = [...last.startEdges, ...next.startEdges]
    if (next.end > last.end + FIT_TOLERANCE_MM) last.endEdges = next.endEdges
    else if (next.end >= last.end - FIT_TOLERANCE_MM) last.endEdges = [...last.endEdges, ...next.endEdges]
    last.end = Math.max(last.end, next.end)
  }
  return result
}

/** Where a level line lies inside a region, from left to right, mm. */
export function chordsAt(region: Region, y: number): { readonly start: number; readonly end: number }[] {
  const slab = region.find(({ bottom, top }) => y >= bottom && y <= top)
  return slab?.spans.map(({ left, right }) => ({ start: xAt(left, y), end: xAt(right, y) })) ?? []
}
