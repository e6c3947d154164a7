import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '#shared/appraise'
import type { Panel, RibbedScheme } from '#shared/contracts/appraisal'
import { frameAt } from '#shared/geometry/frame'
import { alignedRows } from '#shared/layout/alignedRows'
import { clearOutline } from '#shared/layout/clearOutline'
import { layoutGround } from '#shared/layout/layoutGround'
import { layOutPanel } from '#shared/layout/layOutPanel'
import { findNeighbours } from '#shared/layout/neighbours'
import type { PanelLayout } from '#shared/layout/panelLayout'
import { fileOf, panelOf, ribbedScheme } from './support/floorParts'
import type { XY } from './support/samplingOracle'
import { isInside, oracleOf } from './support/samplingOracle'

/** Two ribs that ought to be one line miss each other by no more than this, mm. */
const IN_LINE_MM = 0.001
const runs = { numRuns: 150 }

interface Floor {
  readonly panels: readonly Panel[]
  readonly scheme: RibbedScheme
}

const length = fc.integer({ min: 3000, max: 9000 })
const support = fc.integer({ min: 0, max: 400 })

/** Panels in a row from left to right that share upright supports, each of a height and foot of its own, the whole floor turned. */
const floors: fc.Arbitrary<Floor> = fc
  .record({
    bays: fc.array(fc.record({ length, foot: fc.integer({ min: -900, max: 900 }), height: length, support }), {
      minLength: 2,
      maxLength: 5,
    }),
    degrees: fc.oneof(fc.constantFrom(0, 90), fc.double({ min: 0, max: 179, noNaN: true })),
    block: fc.record({
      length: fc.constantFrom(200, 250),
      width: fc.constantFrom(380, 400, 520),
      height: fc.constant(200),
      mass: fc.constant(15),
    }),
    ribWidth: fc.constantFrom(100, 120, 150),
    edgeStrip: fc.constantFrom(0, 100, 215.5),
    cutBlocks: fc.boolean(),
  })
  .map(({ bays, degrees, ...given }) => {
    const { toLevel } = frameAt([0, 0], degrees)
    let x = 0
    const panels = bays.map(({ length: long, foot, height, support: supportWidth }, i) => {
      const corners: XY[] = [
        [x, foot],
        [x + long, foot],
        [x + long, foot + height],
        [x, foot + height],
      ]
      x += long
      const outline = corners.map(([u, v]): [number, number] => [...toLevel([u, v])])
      return panelOf({ mark: `P${i}`, outline, ribDirection: degrees, edges: [{ supportWidth, continuity: 'discontinuous' }] })
    })
    return { panels, scheme: ribbedScheme({ alignRows: true, ...given }) }
  })

function aligned({ panels, scheme }: Floor) {
  return alignedRows(
    panels.map((panel) => ({ panel, clear: clearOutline(panel) })),
    findNeighbours({ panels: [...panels] }),
    scheme,
  )
}

function layouts(floor: Floor): PanelLayout[] {
  const rows = aligned(floor)
  return floor.panels.map((panel, i) =>
    layOutPanel(panel, floor.scheme, 300, null, [], layoutGround(panel, floor.scheme, rows[i]?.starts)),
  )
}

/** Heights of ribs between rows, across the ribs, in one frame for the floor, mm. */
function heightsOf(panel: Panel, layout: PanelLayout): number[] {
  const [x, y] = frameAt([0, 0], panel.ribDirection).toLocal(panel.outline[0]!)
  expect(Number.isFinite(x)).toBe(true)
  return layout.rows.slice(1).map(({ bandStart }) => y + bandStart)
}

describe('aligned rows of panels whose ribs run on into each other', () => {
  it('have their ribs in one line', () => {
    fc.assert(
      fc.property(floors, (floor) => {
        const pitch = floor.scheme.block.width + floor.scheme.ribWidth
        const heights = layouts(floor).map((layout, i) => heightsOf(floor.panels[i]!, layout))
        const [first] = heights.flat()
        for (const height of heights.flat()) {
          const spacings = (height - first!) / pitch
          expect(Math.abs(spacings - Math.round(spacings)) * pitch).toBeLessThanOrEqual(IN_LINE_MM)
        }
      }),
      runs,
    )
  })

  it('are as many as fit on the grid, with edge strips of at least what was asked for', () => {
    fc.assert(
      fc.property(floors, (floor) => {
        const { edgeStrip, block, ribWidth } = floor.scheme
        layouts(floor).forEach((layout, i) => {
          const { toLocal } = frameAt(floor.panels[i]!.outline[0]!, floor.panels[i]!.ribDirection)
          const across = layout.clear.map((point) => toLocal(point)[1])
          const below = layout.rows[0]!.bandStart - Math.min(...across)
          const above = Math.max(...across) - layout.rows.at(-1)!.bandEnd
          for (const strip of [below, above]) {
            expect(strip).toBeGreaterThanOrEqual(edgeStrip - IN_LINE_MM)
            expect(strip).toBeLessThan(edgeStrip + block.width + ribWidth)
          }
        })
      }),
      runs,
    )
  })

  it('never lose more than one row a panel, and in all no more than any place of the grid that was tried', () => {
    fc.assert(
      fc.property(floors, fc.array(fc.nat(9999), { minLength: 40, maxLength: 40 }), (floor, shares) => {
        const { edgeStrip, block, ribWidth } = floor.scheme
        const pitch = block.width + ribWidth
        const own = floor.panels.map((panel) => layoutGround(panel, floor.scheme))
        const mean = own.map(({ field }) => field.clearArea / (field.top - field.bottom))
        const rows = aligned(floor)
        rows.forEach((each, i) => {
          expect(each!.fewer).toBe(own[i]!.rows.length - each!.starts.length)
          expect([0, 1]).toContain(each!.fewer)
        })
        const worth = (counts: readonly number[]) => counts.reduce((sum, count, i) => sum + count * mean[i]!, 0)
        const heights = floor.panels.map((panel, i) => {
          const [, y] = frameAt([0, 0], panel.ribDirection).toLocal(panel.outline[0]!)
          return { from: y + own[i]!.field.bottom + edgeStrip, to: y + own[i]!.field.top - edgeStrip - block.width }
        })
        const tried = shares.map((share) => {
          const at = (share / 10_000) * pitch
          return worth(heights.map(({ from, to }) => Math.floor((to - at) / pitch) - Math.ceil((from - at) / pitch) + 1))
        })
        expect(worth(rows.map((each) => each!.starts.length)) * (1 + 1e-9)).toBeGreaterThanOrEqual(Math.max(...tried))
      }),
      runs,
    )
  })

  it('keep blocks inside the clear outline, and apart', () => {
    fc.assert(
      fc.property(floors, (floor) => {
        layouts(floor).forEach(({ blocks }, i) => {
          const oracle = oracleOf(floor.panels[i]!, floor.scheme.trimmerWidth)
          const middles = blocks.map(({ ring: [a, , c] }): XY => [(a![0] + c![0]) / 2, (a![1] + c![1]) / 2])
          const corners = blocks.flatMap(({ ring }, k) =>
            ring.map(([x, y]): XY => [x + (middles[k]![0] - x) * 1e-3, y + (middles[k]![1] - y) * 1e-3]),
          )
          expect(corners.filter((corner) => !oracle.isClear(corner))).toEqual([])
          const near = (k: number) => blocks.slice(Math.max(0, k - 60), k + 60)
          const shared = middles.filter((middle, k) => near(k).filter(({ ring }) => isInside(middle, ring)).length !== 1)
          expect(shared).toEqual([])
        })
      }),
      { numRuns: 40 },
    )
  })
})

describe('rows that are not aligned', () => {
  it('belong to panels side by side, of other rib directions, or alone', () => {
    const upper = panelOf({ mark: 'P1', outline: [[0, 0], [6000, 0], [6000, 4000], [0, 4000]] }) // prettier-ignore
    const side = panelOf({ mark: 'P2', outline: [[0, 4000], [6000, 4000], [6000, 7300], [0, 7300]] }) // prettier-ignore
    const turned = panelOf({ mark: 'P3', ribDirection: 90, outline: [[6000, 0], [11_000, 0], [11_000, 4000], [6000, 4000]] }) // prettier-ignore
    expect(aligned({ panels: [upper, side, turned], scheme: ribbedScheme({ alignRows: true }) })).toEqual([null, null, null])
  })

  it('belong to a panel that the grid leaves without a row', () => {
    const wide = panelOf({ mark: 'P1', outline: [[0, 0], [6000, 0], [6000, 4800], [0, 4800]] }) // prettier-ignore
    const narrow = panelOf({ mark: 'P2', outline: [[6000, 1200], [9000, 1200], [9000, 1900], [6000, 1900]] }) // prettier-ignore
    const rows = aligned({ panels: [wide, narrow], scheme: ribbedScheme({ alignRows: true }) })
    expect(rows[0]).toMatchObject({ fewer: 0 })
    expect(rows[1]).toBeNull()
  })
})

describe('an appraisal of two panels alike, one 200 mm further up', () => {
  const panels = [0, 1].map((i) =>
    panelOf({
      mark: `P${i + 1}`,
      outline: [[i * 6000, i * 200], [i * 6000 + 6000, i * 200], [i * 6000 + 6000, i * 200 + 4300], [i * 6000, i * 200 + 4300]], // prettier-ignore
    }),
  )
  const appraised = (alignRows: boolean) => appraiseInFull(fileOf(panels, { schemes: [ribbedScheme({ alignRows })] })).sized[0]!
  const heights = (alignRows: boolean) => appraised(alignRows).panels.map(({ layout }, i) => heightsOf(panels[i]!, layout!))

  it('brings their ribs into line only where it is asked to', () => {
    const [first, second] = heights(true)
    expect(first!.length).toBeGreaterThan(4)
    for (const height of second!) expect(Math.abs((((height - first![0]!) % 500) + 500) % 500)).toBeLessThan(IN_LINE_MM)
    const [own, other] = heights(false)
    expect(other![0]! - own![0]!).toBeCloseTo(200, 6)
  })

  it('says how many rows that costs', () => {
    const flags = appraised(true).panels.map((panel) => panel.flags.filter((flag) => flag.startsWith('rows stand on one grid')))
    expect(flags.map(([flag]) => /(\d fewer|as many as) (than )?alone/.exec(flag!)?.[1])).toEqual(['as many as', '1 fewer'])
    expect(
      appraised(false)
        .panels.flatMap((panel) => panel.flags)
        .join(),
    ).not.toContain('grid')
  })
})
