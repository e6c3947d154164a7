import fc from 'fast-check'
import polygonClipping from 'polygon-clipping'
import { describe, expect, it } from 'vitest'
import type { Panel, RibbedScheme } from '#shared/contracts/appraisal'
import { layOutPanel } from '#shared/layout/layOutPanel'
import type { SolidRegion } from '#shared/layout/panelLayout'
import { solidAreas } from '#shared/layout/solidAreas'
import { randomPanel, randomScheme } from './support/randomPanel'
import type { XY } from './support/samplingOracle'
import { coversOf } from './support/samplingOracle'

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

  it('blocks and each kind of region do not lie over each other', () => {
    fc.assert(
      fc.property(randomPanel, randomScheme, (panel, scheme) => {
        const layout = lay(panel, scheme)
        const parts = [
          ...layout.regions.map(({ rings }) => polygonClipping.xor([], ...polygons(rings).map((each) => [each]))),
          polygonClipping.union([], ...polygons(layout.blocks.map(({ ring }) => ring)).map((each) => [each])),
        ]
        const apart = parts.reduce((sum, part) => sum + areaOf(part as Polygons), 0)
        const together = areaOf(polygonClipping.union([], ...(parts as Polygons[])))
        expect(Math.abs(apart - together)).toBeLessThan(slack(2e-3, panel, 4 + 2 * layout.rows.length))
      }),
      { numRuns: 40 },
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
