import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Panel, RibbedScheme } from '#shared/contracts/appraisal'
import { layOutPanel } from '#shared/layout/layOutPanel'
import type { BlockRow, RunEnd } from '#shared/layout/panelLayout'
import { randomPanel, randomScheme } from './support/randomPanel'
import type { Oracle, XY } from './support/samplingOracle'
import { oracleOf } from './support/samplingOracle'

/**
 * None missing: a row of each panel is measured again by walking along it in small steps and asking the sampling oracle at every height
 * where a length can change. What is found, and what it ends at, is filled by the stated rule, in plain arithmetic, and compared with what
 * was laid.
 */
const STEP_MM = 60
const PANELS = 2000
const EPSILON_MM = 0.002
/** A fit is forgiven so much on each side of a band: along an edge that runs nearly with the row it counts for much more. */
const FORGIVEN_MM = 0.001
/** Shorter lengths hold no block of any scheme here; near the tip of a void the walk may see such where there is none. */
const LEAST_LENGTH_MM = 60
/** Lengths nearer than this to a multiple of a block are not compared: the walk finds ends to about this. */
const AMBIGUOUS_MM = 0.1
/** Ends nearer than this to a corner may belong to two edges. */
const NEAR_CORNER_MM = 1

interface Found {
  readonly start: number
  readonly end: number
}

/** Panel frame of the layout: origin at the first vertex, x along the ribs. */
function frameOf({ outline, ribDirection }: Panel) {
  const angle = (ribDirection * Math.PI) / 180
  const [cosine, sine] = [Math.cos(angle), Math.sin(angle)]
  const [ox, oy] = outline[0]!
  return {
    toLevel: ([x, y]: XY): XY => [ox + x * cosine - y * sine, oy + x * sine + y * cosine],
    toLocal: ([x, y]: XY): XY => [(x - ox) * cosine + (y - oy) * sine, (y - oy) * cosine - (x - ox) * sine],
  }
}

type Frame = ReturnType<typeof frameOf>

/** Stretches of x where the whole band is clear, by walking. */
function walk(oracle: Oracle, frame: Frame, low: number, high: number): Found[] {
  const corners = oracle.corners.map(frame.toLocal)
  const inBand = corners.map(([, y]) => y).filter((y) => y > low && y < high)
  const spread = Array.from({ length: Math.floor((high - low) / (2 * STEP_MM)) }, (_, i) => low + (2 * i + 1) * STEP_MM)
  const heights = [low, high, ...spread, ...inBand.flatMap((y) => [y - EPSILON_MM, y + EPSILON_MM])].map((y) =>
    Math.min(high - FORGIVEN_MM, Math.max(low + FORGIVEN_MM, y)),
  )
  const isOpen = (x: number) =>
    heights.every((y) => {
      const point = frame.toLevel([x, y])
      return oracle.isClear(point) && !oracle.isInGrownVoid(point)
    })
  const [first, last] = [Math.min(...corners.map(([x]) => x)), Math.max(...corners.map(([x]) => x))]
  const steps = Array.from({ length: Math.ceil((last - first) / STEP_MM) + 2 }, (_, i) => first - STEP_MM / 2 + i * STEP_MM)
  const places = [...steps, ...corners.flatMap(([x]) => [x - EPSILON_MM, x + EPSILON_MM])].sort((a, b) => a - b)
  const found: Found[] = []
  let start: number | null = null
  for (let i = 1; i < places.length; i += 1) {
    const [before, here] = [places[i - 1]!, places[i]!]
    if (isOpen(here) === (start !== null)) continue
    const change = bisect(isOpen, before, here)
    if (start === null) start = change
    else {
      found.push({ start, end: change })
      start = null
    }
  }
  return found
}

function bisect(isOpen: (x: number) => boolean, from: number, to: number): number {
  const atFrom = isOpen(from)
  let [a, b] = [from, to]
  for (let i = 0; i < 40; i += 1) {
    const middle = (a + b) / 2
    if (isOpen(middle) === atFrom) a = middle
    else b = middle
  }
  return (a + b) / 2
}

/**
 * What a length found ends at, from the points just beyond it; null where a corner of the outline lies so near that two edges may count,
 * an edge runs so nearly along the row that none of the points meets it, or a free edge and a support meet there (the mitre between them
 * is the face of one and bounds the other).
 */
function endOf(x: number, outwards: -1 | 1, oracle: Oracle, panel: Panel, [low, high]: readonly [number, number]): RunEnd | null {
  const frame = frameOf(panel)
  const corners = oracle.corners.map(frame.toLocal)
  const isNear = ([cx, cy]: XY) => Math.abs(cx - x) < NEAR_CORNER_MM && cy > low - NEAR_CORNER_MM && cy < high + NEAR_CORNER_MM
  if (corners.some(isNear)) return null
  const heights = Array.from({ length: 16 }, (_, i) => low + EPSILON_MM + ((high - low - 2 * EPSILON_MM) * i) / 15)
  const beyond = heights.map((y) => frame.toLevel([x + outwards * 0.05, y]))
  const shut = beyond.filter((point) => !oracle.isClear(point))
  if (shut.length === 0) return beyond.some(oracle.isInGrownVoid) ? 'trimmer' : null
  const continuity = (edge: number) => (panel.edges.length === 1 ? panel.edges[0]! : panel.edges[edge]!).continuity
  const isFree = (edge: number) => continuity((edge + panel.outline.length) % panel.outline.length) === 'free'
  const met = shut.map(oracle.edgeAt)
  if (met.some((edge) => isFree(edge - 1) !== isFree(edge) || isFree(edge + 1) !== isFree(edge))) return null
  return met.every(isFree) ? 'free' : 'support'
}

/** Blocks in a clear length by the stated rule; null where it is too near to call. */
function blocksIn({ start, end }: Found, ends: readonly RunEnd[], scheme: RibbedScheme, zone: number): number | null {
  const solid = ends.filter((kind) => kind === 'support').length * zone
  const usable = end - start - solid
  if (usable <= 0) return 0
  const { crossRibs, block } = scheme
  const every = typeof crossRibs === 'object' ? crossRibs.every : Infinity
  if (Math.abs((end - start) / every - Math.round((end - start) / every)) * every < AMBIGUOUS_MM && every !== Infinity)
    return null
  const count = Math.max(0, Math.ceil((end - start) / every) - 1)
  const segment = (usable - count * (typeof crossRibs === 'object' ? crossRibs.width : 0)) / (count + 1)
  if (segment <= 0) return 0
  const whole = Math.floor(segment / block.length)
  const half = (segment - whole * block.length) / 2
  if (half < AMBIGUOUS_MM || 2 * half > block.length - AMBIGUOUS_MM) return null
  if (Math.abs(half - scheme.leastPiece) < AMBIGUOUS_MM) return null
  return (count + 1) * (whole + (scheme.cutBlocks && half >= scheme.leastPiece ? 2 : 0))
}

/** What is wrong with a row of the layout, measured again. */
function differences(row: BlockRow, panel: Panel, scheme: RibbedScheme, zone: number): string[] {
  const oracle = oracleOf(panel, scheme.trimmerWidth)
  const band = [row.bandStart - scheme.edgeStrip, row.bandEnd + scheme.edgeStrip] as const
  const lengths = walk(oracle, frameOf(panel), ...band)
  const laid = row.lengths.map(({ start, end, startsAt, endsAt }) => ({
    start: startsAt === 'support' ? start - zone : start,
    end: endsAt === 'support' ? end + zone : end,
    ends: [startsAt, endsAt] as const,
    usable: [start, end] as const,
    runs: row.runs.filter((run) => run.start < end && run.end > start),
    blocks: row.runs
      .filter((run) => run.start >= start - 0.01 && run.end <= end + 0.01)
      .reduce((sum, { blocks }) => sum + blocks, 0),
  }))
  const near = (a: number, b: number) => Math.abs(a - b) <= AMBIGUOUS_MM
  const missing = lengths
    .filter(({ start, end }) => end - start > 2 * zone + LEAST_LENGTH_MM)
    .filter((each) => !laid.some(({ start, end }) => near(start, each.start) && near(end, each.end)))
  const invented = laid.filter((each) => !lengths.some(({ start, end }) => near(start, each.start) && near(end, each.end)))
  const wrong = laid.filter((each) => {
    const expected = blocksIn(each, each.ends, scheme, zone)
    return expected !== null && expected !== each.blocks
  })
  const misnamed = laid.filter(({ start, end, ends }) => {
    const found = [endOf(start, -1, oracle, panel, band), endOf(end, 1, oracle, panel, band)]
    return found.some((kind, i) => kind !== null && kind !== ends[i])
  })
  const solid = laid.filter(({ usable: [from, to], runs }) => runs.some((run) => run.start < from - 0.01 || run.end > to + 0.01))
  return [
    ...misnamed.map((each) => `misnamed ${JSON.stringify(each)}`),
    ...solid.map((each) => `in a solid zone ${JSON.stringify(each)}`),
    ...missing.map((each) => `missing ${JSON.stringify(each)}`),
    ...invented.map((each) => `invented ${JSON.stringify(each)}`),
    ...wrong.map((each) => `wrong ${JSON.stringify(each)}`),
  ]
}

describe('rows of any laid-out panel, walked again by sampling', () => {
  it('have every length that fits, no other, and every block that the rule puts there', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, fc.nat(), (panel, scheme, pick) => {
        const zone = scheme.solidZone === 'least' ? 0 : scheme.solidZone
        const { rows } = layOutPanel(panel, scheme, zone, null, [])
        const row = rows[pick % Math.max(1, rows.length)]
        expect(row ? differences(row, panel, scheme, zone) : []).toEqual([])
      }),
      { numRuns: PANELS },
    )
  })

  it('stand across the whole clear width: n = ⌊(W − 2 edge strips + rib) / (block + rib)⌋, strips equal', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, (panel, scheme) => {
        const layout = layOutPanel(panel, scheme, 0, null, [])
        const across = layout.clear.map(frameOf(panel).toLocal).map(([, y]) => y)
        const [bottom, top] = [Math.min(...across), Math.max(...across)]
        const fit = (top - bottom - 2 * scheme.edgeStrip + scheme.ribWidth) / (scheme.block.width + scheme.ribWidth)
        if (Math.abs(fit - Math.round(fit)) > 1e-5) expect(layout.rows).toHaveLength(Math.max(0, Math.floor(fit)))
        if (layout.rows.length === 0) return
        const [first, last] = [layout.rows[0]!, layout.rows[layout.rows.length - 1]!]
        expect(first.bandStart - bottom).toBeCloseTo(top - last.bandEnd, 6)
        expect(first.bandStart - bottom).toBeGreaterThanOrEqual(scheme.edgeStrip - 0.001)
      }),
      { numRuns: 400 },
    )
  })
})
