import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Panel, RibbedScheme } from '#shared/contracts/appraisal'
import { layOutPanel } from '#shared/layout/layOutPanel'
import type { PanelAreas, PanelLayout } from '#shared/layout/panelLayout'
import { randomPanel, randomScheme } from './support/randomPanel'
import type { XY } from './support/samplingOracle'
import { isInside, oracleOf } from './support/samplingOracle'

const RELATIVE = 1e-9
/** Points this near a block's rim are left out: a fit is forgiven 0.001 mm, steeper along a slanted face. */
const RIM_MM = 0.02
const runs = { numRuns: 400 }
const PANELS = 2000
const spacing = fc.constantFrom(null, 2500)

const lay = (panel: Panel, scheme: RibbedScheme, crossRibSpacing: number | null) =>
  layOutPanel(
    panel,
    scheme,
    scheme.solidZone === 'least' ? 0 : scheme.solidZone,
    crossRibSpacing,
    panel.outline.map(() => false),
  )

const counts = (layout: PanelLayout) => ({
  rows: layout.rows.length,
  whole: layout.blocksWhole,
  cut: layout.blocksCut,
  closedEnds: layout.closedEnds,
})

/** Points spread over a parallelogram, its rim kept clear of by `rimMm`. */
function pointsIn([a, b, , d]: readonly XY[], rimMm: number): XY[] {
  const [along, across] = [Math.hypot(b![0] - a![0], b![1] - a![1]), Math.hypot(d![0] - a![0], d![1] - a![1])]
  const shares = (length: number) => [rimMm / length, 0.31, 0.74, 1 - rimMm / length]
  return shares(along).flatMap((u) =>
    shares(across).map((v): XY => [
      a![0] + u * (b![0] - a![0]) + v * (d![0] - a![0]),
      a![1] + u * (b![1] - a![1]) + v * (d![1] - a![1]),
    ]),
  )
}

function expectSameAreas(actual: PanelAreas, expected: PanelAreas) {
  for (const key of Object.keys(expected) as (keyof PanelAreas)[])
    expect(Math.abs(actual[key] - expected[key]), key).toBeLessThanOrEqual(RELATIVE * expected.gross)
}

describe('areas of any laid-out panel', () => {
  it('add up: gross = strips + clear, clear = its parts, none negative', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, spacing, (panel, scheme, every) => {
        const { gross, strips, clear, ...rest } = lay(panel, scheme, every).areas
        const { wallStrips, ...parts } = rest
        expect(Math.abs(strips + clear - gross)).toBeLessThanOrEqual(RELATIVE * gross)
        const whole = Object.values(parts).reduce((sum, part) => sum + part, 0)
        expect(Math.abs(whole - clear)).toBeLessThanOrEqual(RELATIVE * gross)
        for (const part of [gross, strips, clear, wallStrips, ...Object.values(parts)]) expect(part).toBeGreaterThanOrEqual(0)
      }),
      runs,
    )
  })

  it('count blocks at their size: whole ones by number, cut ones by length', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, spacing, (panel, scheme, every) => {
        const layout = lay(panel, scheme, every)
        const { length, width } = scheme.block
        expect(layout.areas.blocks).toBeCloseTo((layout.blocksWhole * length + layout.cutLength) * width, 3)
        expect(layout.blocks.filter(({ isCut }) => isCut)).toHaveLength(layout.blocksCut)
        expect(layout.blocks.filter(({ isCut }) => !isCut)).toHaveLength(layout.blocksWhole)
        expect(layout.rows.flatMap((row) => row.runs)).toHaveLength(layout.closedEnds / 2)
      }),
      runs,
    )
  })
})

describe('blocks of any laid-out panel, against point sampling', () => {
  it('stay inside the clear outline and out of voids and trimmers, with their edge strips', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, spacing, (panel, scheme, every) => {
        const oracle = oracleOf(panel, scheme.trimmerWidth)
        const angle = (panel.ribDirection * Math.PI) / 180
        const up: XY = [-Math.sin(angle) * scheme.edgeStrip, Math.cos(angle) * scheme.edgeStrip]
        const misplaced = lay(panel, scheme, every).blocks.flatMap(({ ring }) => {
          const widened = ring.map(([x, y], i): XY => (i < 2 ? [x - up[0], y - up[1]] : [x + up[0], y + up[1]]))
          return pointsIn(widened, RIM_MM).filter((point) => !oracle.isClear(point) || oracle.isInGrownVoid(point))
        })
        expect(misplaced).toEqual([])
      }),
      { numRuns: PANELS },
    )
  })

  it('never overlap', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, spacing, (panel, scheme, every) => {
        const { blocks, rows } = lay(panel, scheme, every)
        expect(new Set(blocks.map(({ row }) => row)).size).toBeLessThanOrEqual(rows.length)
        const middles = blocks.map(({ ring: [a, , c] }): XY => [(a![0] + c![0]) / 2, (a![1] + c![1]) / 2])
        const reach = Math.hypot(scheme.block.length, scheme.block.width)
        const order = [...middles.keys()].sort((i, j) => middles[i]![0] - middles[j]![0])
        const shared = order.flatMap((i, place) => {
          const near: number[] = []
          for (let k = place + 1; k < order.length && middles[order[k]!]![0] - middles[i]![0] < reach; k += 1)
            if (Math.abs(middles[order[k]!]![1] - middles[i]![1]) < reach) near.push(order[k]!)
          const points = near.length === 0 ? [] : pointsIn(blocks[i]!.ring, RIM_MM)
          return near.filter((j) => points.some((point) => isInside(point, blocks[j]!.ring)))
        })
        expect(shared).toEqual([])
      }),
      { numRuns: PANELS },
    )
  })
})

describe('the layout of a floor that is', () => {
  const turned = (panel: Panel, degrees: number, dx: number, dy: number): Panel => {
    const angle = (degrees * Math.PI) / 180
    const place = ([x, y]: readonly [number, number]): [number, number] => [
      dx + x * Math.cos(angle) - y * Math.sin(angle),
      dy + x * Math.sin(angle) + y * Math.cos(angle),
    ]
    return {
      ...panel,
      outline: panel.outline.map(place),
      voids: panel.voids.map((ring) => ring.map(place)),
      ribDirection: (panel.ribDirection + degrees) % 180,
    }
  }
  const expectSame = (panel: Panel, other: Panel, scheme: RibbedScheme, every: number | null) => {
    const [first, second] = [lay(panel, scheme, every), lay(other, scheme, every)]
    expect(counts(second)).toEqual(counts(first))
    expectSameAreas(second.areas, first.areas)
    expect(second.longestRib).toBeCloseTo(first.longestRib, 6)
    expect(second.cutLength).toBeCloseTo(first.cutLength, 5)
  }

  it('moved stays the same', () => {
    const shift = fc.integer({ min: -200_000, max: 200_000 })
    fc.assert(
      fc.property(randomPanel, randomScheme, spacing, shift, shift, (panel, scheme, every, dx, dy) =>
        expectSame(panel, turned(panel, 0, dx, dy), scheme, every),
      ),
      runs,
    )
  })

  it('turned, ribs with it, stays the same', () => {
    const degrees = fc.oneof(fc.constantFrom(30, 90, 180, 270), fc.double({ min: 0, max: 360, noNaN: true }))
    fc.assert(
      fc.property(randomPanel, randomScheme, spacing, degrees, (panel, scheme, every, by) =>
        expectSame(panel, turned(panel, by, 0, 0), scheme, every),
      ),
      runs,
    )
  })

  it('renamed, or typed from another corner, stays the same', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, spacing, fc.nat(20), (panel, scheme, every, offset) => {
        const from = <Item>(items: readonly Item[]) => items.map((_, i) => items[(i + offset) % items.length]!)
        const edges = panel.edges.length === 1 ? panel.edges : from(panel.edges)
        expectSame(
          panel,
          { ...panel, mark: 'Other', outline: from(panel.outline), edges, voids: panel.voids.map(from) },
          scheme,
          every,
        )
      }),
      runs,
    )
  })
})
