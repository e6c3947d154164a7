import fc from 'fast-check'
import polygonClipping from 'polygon-clipping'
import { describe, expect, it } from 'vitest'
import type { Panel, RibbedScheme } from '#shared/contracts/appraisal'
import { frameAt } from '#shared/geometry/frame'
import { layOutPanel } from '#shared/layout/layOutPanel'
import type { SolidRegion } from '#shared/layout/panelLayout'
import { solidAreas } from '#shared/layout/solidAreas'
import { randomPanel, randomScheme } from './support/randomPanel'
import type { XY } from './support/samplingOracle'
import { coversOf, isInside } from './support/samplingOracle'
import { pointShares, spreadPoints } from './support/spreadPoints'

/** Areas measured a second time by another polygon library (polygon-clipping, Martinez and others' sweep on floating point). */
type Polygons = [number, number][][][]

/** Its coordinates are rounded to a hundred-thousandth of a millimetre: it loses its way among nearly equal points. */
const polygons = (rings: readonly (readonly XY[])[]): Polygons =>
  rings.map((ring) => [ring.map(([x, y]): [number, number] => [Math.round(x * 1e5) / 1e5, Math.round(y * 1e5) / 1e5])])

const ringArea = (ring: readonly XY[]) =>
  ring.reduce((sum, [x, y], i) => {
    const [nextX, nextY] = ring[(i + 1) % ring.length]!
    return sum + (x * nextY - nextX * y) / 2
  }, 0)

const areaOf = (result: Polygons) =>
  result.reduce((sum, [outer, ...holes]) => {
    const size = (ring: readonly XY[]) => Math.abs(ringArea(ring.slice(0, -1)))
    return sum + size(outer!) - holes.reduce((out, hole) => out + size(hole), 0)
  }, 0)

const lay = (panel: Panel, scheme: RibbedScheme) =>
  layOutPanel(panel, scheme, scheme.solidZone === 'least' ? 0 : scheme.solidZone, 2500, [])

/** Slack for rounding to the library's grid or the drawing's, along lines of this length. */
const slack = (gridMm: number, panel: Panel, lines: number) => gridMm * 40_000 * (lines + panel.outline.length)

describe('areas against a second polygon library', () => {
  it('clear, voids and trimmers agree', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, (panel, scheme) => {
        const { areas } = lay(panel, scheme)
        const halves = panel.outline.map(
          (_, i) => (panel.edges.length === 1 ? panel.edges[0]! : panel.edges[i]!).supportWidth / 2,
        )
        const strips = coversOf(panel.outline, halves).filter((ring) => Math.abs(ringArea(ring)) > 1e-3)
        const outline = polygons([panel.outline])
        const clear = polygonClipping.difference(outline, ...polygons(strips).map((each) => [each]))
        expect(Math.abs(areaOf(clear) - areas.clear)).toBeLessThan(slack(1e-5, panel, 0))
        if (panel.voids.length === 0) return
        const voids = polygonClipping.intersection(polygons(panel.voids), clear)
        expect(Math.abs(areaOf(voids) - areas.voids)).toBeLessThan(slack(1e-5, panel, 4))
        const around = panel.voids
          .flatMap((ring) =>
            coversOf(
              [...ring].reverse(),
              ring.map(() => scheme.trimmerWidth),
            ),
          )
          .filter((ring) => Math.abs(ringArea(ring)) > 1e-3)
        const grown = polygonClipping.union(polygons(panel.voids), ...polygons(around).map((each) => [each]))
        const trimmers = polygonClipping.difference(polygonClipping.intersection(grown, clear), voids)
        expect(Math.abs(areaOf(trimmers) - areas.trimmers)).toBeLessThan(slack(1e-5, panel, 20))
      }),
      { numRuns: 300 },
    )
  })

  it('what is drawn is what is counted: regions cover their areas and leave out voids and blocks', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, (panel, scheme) => {
        const layout = lay(panel, scheme)
        const drawn = (kind: SolidRegion['kind']) =>
          layout.regions
            .filter((region) => region.kind === kind)
            .flatMap(({ rings }) => rings)
            .reduce((sum, ring) => sum + ringArea(ring), 0)
        for (const kind of ['edgeStrips', 'solidZones', 'crossRibs', 'trimmers', 'fillers'] as const)
          expect(Math.abs(drawn(kind) - layout.areas[kind]), kind).toBeLessThan(slack(1e-3, panel, 4 + 2 * layout.rows.length))
        const blocks = layout.blocks.reduce((sum, { ring }) => sum + ringArea(ring), 0)
        expect(blocks).toBeCloseTo(layout.areas.blocks, 2)
      }),
      { numRuns: 300 },
    )
  })

  it('blocks, regions and voids share no point, and leave out only ribs', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, pointShares(80), (panel, scheme, at) => {
        const layout = lay(panel, scheme)
        const kinds = [...layout.regions.map(({ rings }) => rings), layout.blocks.map(({ ring }) => ring), panel.voids]
        const coversAt = (point: XY) =>
          kinds.filter((rings) => rings.filter((ring) => isInside(point, ring)).length % 2 === 1).length
        // the drawing is rounded to 0.001 mm: what is shared must be wider than that
        const around = ([x, y]: XY): XY[] => [
          [x, y],
          [x - 0.01, y],
          [x + 0.01, y],
          [x, y - 0.01],
          [x, y + 0.01],
        ]
        const points = spreadPoints(layout.clear, at).filter((point) => isInside(point, layout.clear))
        expect(points.filter((point) => around(point).every((each) => coversAt(each) > 1))).toEqual([])
        const bare = points.filter((point) => around(point).every((each) => coversAt(each) === 0))
        const { toLocal } = frameAt(panel.outline[0]!, panel.ribDirection)
        const isInBand = (y: number) => layout.rows.some(({ bandStart, bandEnd }) => y > bandStart && y < bandEnd)
        expect(bare.filter((point) => isInBand(toLocal(point)[1]))).toEqual([])
      }),
      { numRuns: 200 },
    )
  })
})

describe('a solid panel', () => {
  it('has the clear area, strips and voids of the same panel ribbed, and the rest as one solid zone', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, (panel, scheme) => {
        const [ribbed, solid] = [lay(panel, scheme).areas, solidAreas(panel, [])]
        for (const key of ['gross', 'clear', 'strips', 'wallStrips'] as const) expect(solid[key]).toBe(ribbed[key])
        expect(Math.abs(solid.voids - ribbed.voids)).toBeLessThanOrEqual(1e-9 * solid.gross)
        expect(solid.solidZones + solid.voids).toBeCloseTo(solid.clear, 3)
        for (const key of ['blocks', 'ribs', 'edgeStrips', 'crossRibs', 'trimmers', 'fillers'] as const)
          expect(solid[key]).toBe(0)
      }),
      { numRuns: 200 },
    )
  })
})
