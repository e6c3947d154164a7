import { describe, expect, it } from 'vitest'
import type { Panel, RibbedScheme } from '#shared/contracts/appraisal'
import { layOutPanel } from '#shared/layout/layOutPanel'
import { panelOf, rectangle, ribbedScheme } from './support/floorParts'

const lay = (panel: Panel, scheme: RibbedScheme, crossRibSpacing: number | null = null) =>
  layOutPanel(panel, scheme, Number(scheme.solidZone), crossRibSpacing, [])
const knife = { supportWidth: 0, continuity: 'discontinuous' }
const beam = { supportWidth: 300, continuity: 'discontinuous' }
const free = { supportWidth: 0, continuity: 'free' }

describe('a rectangle of 6.0 × 4.5 m between 300 mm beams', () => {
  it('takes 8 rows of 25 blocks with ribs along the length', () => {
    // clear 5700 × 4200: ⌊(4200 + 100) / 500⌋ = 8 rows, ⌊(5700 − 2 × 300) / 200⌋ = 25 blocks in each
    const layout = lay(panelOf(), ribbedScheme())
    expect(layout.rows).toHaveLength(8)
    expect([layout.blocksWhole, layout.blocksCut, layout.closedEnds, layout.cutLength]).toEqual([200, 0, 16, 0])
    expect([layout.longestRib, layout.solidZone]).toEqual([5700, 300])
    expect(layout.ribLines.map(({ length }) => length)).toEqual(new Array(9).fill(5700))
  })

  it('takes 11 rows of 18 blocks with ribs along the width', () => {
    const layout = lay(panelOf({ ribDirection: 90 }), ribbedScheme())
    expect([layout.rows.length, layout.blocksWhole, layout.longestRib]).toEqual([11, 198, 4200])
  })

  it('divides its clear area by hand: blocks, ribs, edge strips, solid zones, fillers', () => {
    expect(lay(panelOf(), ribbedScheme()).areas).toEqual({
      gross: 6000 * 4500,
      strips: 6000 * 4500 - 5700 * 4200,
      wallStrips: 0,
      clear: 5700 * 4200,
      blocks: 200 * 200 * 400,
      ribs: 7 * 100 * 5100,
      edgeStrips: 2 * 150 * 5700,
      solidZones: 2 * 300 * (8 * 400 + 7 * 100),
      crossRibs: 0,
      fillers: 8 * 100 * 400,
      trimmers: 0,
      voids: 0,
    })
  })

  it('places its blocks in the level, anticlockwise, the first row from the left support', () => {
    const { blocks, rows } = lay(panelOf(), ribbedScheme())
    expect(rows[0]).toEqual({
      bandStart: 300,
      bandEnd: 700,
      lengths: [{ start: 450, end: 5550, startsAt: 'support', endsAt: 'support' }],
      runs: [{ start: 500, end: 5500, blocks: 25 }],
    })
    expect(blocks[0]).toEqual({ ring: rectangle(500, 300, 200, 400), length: 200, isCut: false, row: 0 })
    expect(blocks[199]!.ring).toEqual(rectangle(5300, 3800, 200, 400))
  })

  it('can be copied as plain values, blocks and regions with it', () => {
    const layout = lay(panelOf(), ribbedScheme())
    const copy = structuredClone(layout)
    expect(copy.blocks).toEqual(layout.blocks)
    expect(copy.regions).toEqual(layout.regions)
    expect(copy.blocks).toHaveLength(200)
  })

  it('has no solid zone at a free end', () => {
    // left edge free: clear 5850, less one zone 5550: 27 blocks
    const layout = lay(panelOf({ edges: [beam, beam, beam, free] }), ribbedScheme())
    expect(layout.rows[0]!.lengths).toEqual([{ start: 0, end: 5550, startsAt: 'free', endsAt: 'support' }])
    expect(layout.blocksWhole).toBe(8 * 27)
  })

  it('counts a fit that is exact, still after a turn', () => {
    const exact = rectangle(0, 0, 25 * 200 + 2 * 300, 8 * 500 - 100)
    for (const degrees of [0, 12, 37, 101]) {
      const angle = (degrees * Math.PI) / 180
      const outline = exact.map(([x, y]) => [
        x * Math.cos(angle) - y * Math.sin(angle),
        x * Math.sin(angle) + y * Math.cos(angle),
      ])
      const layout = lay(panelOf({ outline, edges: [knife], ribDirection: degrees }), ribbedScheme())
      expect([layout.rows.length, layout.blocksWhole]).toEqual([8, 200])
    }
  })

  it('forgives a fit 0.0009 mm, and not 0.002 mm', () => {
    const counts = (less: number) => {
      const outline = rectangle(0, 0, 25 * 200 + 2 * 300 - less, 8 * 500 - 100 - less)
      const { rows, blocksWhole } = lay(panelOf({ outline, edges: [knife] }), ribbedScheme())
      return [rows.length, blocksWhole]
    }
    expect(counts(0.0009)).toEqual([8, 200])
    expect(counts(0.002)).toEqual([7, 7 * 24])
  })

  it('is all solid, without rows, when too narrow for one', () => {
    const layout = lay(panelOf({ outline: rectangle(0, 0, 6000, 650) }), ribbedScheme())
    expect([layout.rows, layout.blocks, layout.ribLines, layout.longestRib]).toEqual([[], [], [], 0])
    expect(layout.areas.solidZones).toBe(5700 * 350)
  })

  it('takes a single row', () => {
    const layout = lay(panelOf({ outline: rectangle(0, 0, 6000, 750) }), ribbedScheme())
    expect([layout.rows.length, layout.blocksWhole, layout.ribLines.length]).toEqual([1, 25, 2])
  })

  it('keeps its rows but has no block when the solid zones take all', () => {
    const layout = lay(panelOf(), ribbedScheme({ solidZone: 3000 }))
    expect([layout.rows.length, layout.blocksWhole, layout.closedEnds]).toEqual([8, 0, 0])
    expect(layout.areas.solidZones).toBe(5700 * 3900)
  })
})

describe('cut blocks', () => {
  it('fill both ends of a run when half of the remainder is long enough', () => {
    // 5100 − 25 × 200 = 100: 50 at each end
    const layout = lay(panelOf(), ribbedScheme({ cutBlocks: true, leastPiece: 50 }))
    expect([layout.blocksWhole, layout.blocksCut, layout.cutLength, layout.closedEnds]).toEqual([200, 16, 800, 16])
    expect(layout.areas.fillers).toBe(0)
    expect(layout.blocks.filter(({ row }) => row === 0).map(({ length }) => length)).toEqual([
      50,
      ...new Array<number>(25).fill(200),
      50,
    ])
    expect(layout.rows[0]!.runs).toEqual([{ start: 450, end: 5550, blocks: 27 }])
  })

  it('are left out when they would be shorter than the least piece', () => {
    const layout = lay(panelOf(), ribbedScheme({ cutBlocks: true, leastPiece: 51 }))
    expect([layout.blocksWhole, layout.blocksCut, layout.areas.fillers]).toEqual([200, 0, 8 * 100 * 400])
  })
})

describe('cross ribs', () => {
  it('every 2000 mm come to ⌈5700 / 2000⌉ − 1 = 2 in a row and divide it equally', () => {
    // (5100 − 2 × 100) / 3 = 1633.3: 8 blocks in each of three runs
    const layout = lay(panelOf(), ribbedScheme({ crossRibs: { every: 2000, width: 100 } }))
    expect([layout.blocksWhole, layout.closedEnds, layout.areas.crossRibs]).toEqual([
      8 * 24,
      8 * 6,
      expect.closeTo(8 * 2 * 100 * 400, 6),
    ])
    expect(layout.rows[0]!.runs.map(({ start, end }) => [start, end])).toEqual([
      [expect.closeTo(450 + 50 / 3, 9), expect.closeTo(450 + 50 / 3 + 1600, 9)],
      [expect.closeTo(3000 - 800, 9), expect.closeTo(3000 + 800, 9)],
      [expect.closeTo(5550 - 50 / 3 - 1600, 9), expect.closeTo(5550 - 50 / 3, 9)],
    ])
  })

  it.each([
    [1900, 2],
    [1899, 3],
    [5700, 0],
    [6000, 0],
  ])('every %i mm come to %i over 5700 mm', (every, count) => {
    const layout = lay(panelOf(), ribbedScheme({ crossRibs: { every, width: 100 } }))
    expect(layout.rows[0]!.runs).toHaveLength(count + 1)
  })

  it.each([
    [2500, 1], // (5100 − 100) / 2 = 2500, just
    [2499, 2],
    [5100, 0],
    [null, 0],
  ])('by rule, at most %s mm clear apart over 5100 mm, come to %i', (spacing, count) => {
    const layout = lay(panelOf(), ribbedScheme({ crossRibs: 'rule' }), spacing)
    expect(layout.rows[0]!.runs).toHaveLength(count + 1)
  })

  it('have the width given, or that of the ribs', () => {
    const of = (scheme: RibbedScheme) => lay(panelOf(), scheme, 2500).areas.crossRibs
    expect(of(ribbedScheme({ crossRibs: { every: 3000, width: 250 } }))).toBe(8 * 250 * 400)
    expect(of(ribbedScheme({ crossRibs: 'rule', ribWidth: 120 }))).toBe(8 * 120 * 400)
  })
})

describe('a void of 1.0 × 0.7 m with trimmers of 100 mm', () => {
  // grown to 2400–3600 × 1800–2700: it stops rows 3 (1800–2200) and 4 (2300–2700), which keep 1950 mm on each side
  const panel = panelOf({ voids: [rectangle(2500, 1900, 1000, 700)] })

  it('stops the rows that it meets, at its trimmers, where no solid zone stands', () => {
    const layout = lay(panel, ribbedScheme())
    expect(layout.rows[3]!.lengths).toEqual([
      { start: 450, end: 2400, startsAt: 'support', endsAt: 'trimmer' },
      { start: 3600, end: 5550, startsAt: 'trimmer', endsAt: 'support' },
    ])
    expect([layout.blocksWhole, layout.closedEnds]).toEqual([6 * 25 + 2 * 18, 6 * 2 + 2 * 4])
  })

  it('divides the clear area by hand', () => {
    expect(lay(panel, ribbedScheme()).areas).toMatchObject({
      blocks: 186 * 200 * 400,
      ribs: (6 * 5100 + 3900) * 100,
      edgeStrips: 2 * 150 * 5700,
      solidZones: 2 * 300 * 3900,
      fillers: 6 * 100 * 400 + 4 * 150 * 400,
      trimmers: 1200 * 900 - 1000 * 700,
      voids: 1000 * 700,
    })
  })

  it('keeps the edge strip clear of its trimmers: 100 mm still fit beside rows 2 and 5, 110 mm do not', () => {
    expect(lay(panel, ribbedScheme({ edgeStrip: 100 })).blocksWhole).toBe(186)
    expect(lay(panel, ribbedScheme({ edgeStrip: 110 })).blocksWhole).toBe(4 * 25 + 4 * 18)
  })

  it('stops rib lines at the trimmers; the longest rib is still from face to face', () => {
    const layout = lay(panel, ribbedScheme())
    // lines at 1750 and 2750 pass beside it, the one at 2250 is cut in two
    expect(layout.ribLines).toHaveLength(10)
    expect(layout.ribLines.filter(({ start }) => start[1] === 2250).map(({ length }) => length)).toEqual([2250, 2250])
    expect(layout.longestRib).toBe(5700)
  })

  it('on a support face has trimmers on its other sides only', () => {
    const { areas } = lay(panelOf({ voids: [rectangle(150, 150, 1000, 700)] }), ribbedScheme())
    expect([areas.voids, areas.trimmers]).toEqual([700_000, 1100 * 800 - 700_000])
  })

  it('has mitred trimmers at slanted corners', () => {
    const rhombus = [
      [3000, 1500],
      [4000, 2250],
      [3000, 3000],
      [2000, 2250],
    ]
    const { areas } = lay(panelOf({ voids: [rhombus] }), ribbedScheme())
    // a rhombus with the same incircle centre: grown by 100 it scales by (r + 100) / r, r = 1000 · 750 / 1250 = 600
    expect(areas.trimmers).toBeCloseTo(1_500_000 * ((700 / 600) ** 2 - 1), 3)
  })
})

describe('panels that are no rectangle', () => {
  it('an L shape has long rows in its foot and short ones above', () => {
    // clear 7800 and 2800 long, 5800 high: 11 rows from 300 on; the sixth (2800–3200) meets the inner corner at 2900
    const outline = [
      [0, 0],
      [8000, 0],
      [8000, 3000],
      [3000, 3000],
      [3000, 6000],
      [0, 6000],
    ]
    const layout = lay(panelOf({ outline, edges: [{ ...beam, supportWidth: 200 }] }), ribbedScheme())
    expect(layout.rows.map(({ runs }) => runs[0]!.blocks)).toEqual([36, 36, 36, 36, 36, 11, 11, 11, 11, 11, 11])
    expect(layout.longestRib).toBe(7800)
  })

  it('a parallelogram gives every row the same length, each further along', () => {
    // 1 in 4: a band 400 high loses 100 of 6000; 5900 − 600 = 5300: 26 blocks
    const outline = [
      [0, 0],
      [6000, 0],
      [7000, 4000],
      [1000, 4000],
    ]
    const layout = lay(panelOf({ outline, edges: [knife] }), ribbedScheme())
    expect(layout.rows.map(({ runs }) => runs[0]!.blocks)).toEqual(new Array(8).fill(26))
    expect(layout.rows[0]!.lengths[0]!.start).toBeCloseTo(450 / 4 + 300, 2)
    expect(layout.rows[7]!.lengths[0]!.end).toBeCloseTo(6000 + 3550 / 4 - 300, 2)
  })

  it('a right triangle with free sides has ever shorter rows', () => {
    // 12 rows; the band of row k ends at 450 + 500 k, where 5550 − 500 k are left
    const outline = [
      [0, 0],
      [6000, 0],
      [0, 6000],
    ]
    const layout = lay(panelOf({ outline, edges: [free] }), ribbedScheme())
    expect(layout.rows.map(({ runs }) => runs[0]?.blocks ?? 0)).toEqual([27, 25, 22, 20, 17, 15, 12, 10, 7, 5, 2, 0])
  })

  it('a U shape gives a row on each side of its gap', () => {
    const outline = [
      [0, 0],
      [9000, 0],
      [9000, 4000],
      [6000, 4000],
      [6000, 1000],
      [3000, 1000],
      [3000, 4000],
      [0, 4000],
    ]
    const layout = lay(panelOf({ outline, edges: [knife] }), ribbedScheme())
    // rows from 50 on: 50–450 and 550–950 below the gap, 8400 / 200 = 42; 6 above it with 2400 / 200 = 12 on each side
    expect(layout.rows.map(({ runs }) => runs.map(({ blocks }) => blocks))).toEqual([
      [42],
      [42],
      ...new Array<number[]>(6).fill([12, 12]),
    ])
  })
})

describe('strips over walls', () => {
  const wall = { ...beam, kind: 'wall' }
  const strips = (edges: object[], shared: boolean[]) => layOutPanel(panelOf({ edges }), ribbedScheme(), 300, null, shared).areas

  it('reach the centre-line, and the outer face where no other panel shares the wall', () => {
    const areas = strips([wall], [false, false, false, false])
    expect(areas.wallStrips).toBe(6300 * 4800 - 5700 * 4200)
    expect([areas.gross, areas.strips]).toEqual([27_000_000, 27_000_000 - 5700 * 4200])
  })

  it('are divided along the mitre at a corner with a beam', () => {
    const inner = ((6000 + 5700) / 2) * 150
    expect(strips([wall, beam, beam, beam], [true, false, false, false]).wallStrips).toBe(inner)
    expect(strips([wall, beam, beam, beam], [false, false, false, false]).wallStrips).toBe(inner + 6000 * 150)
    expect(strips([beam, beam, beam, beam], [false, false, false, false]).wallStrips).toBe(0)
  })
})
