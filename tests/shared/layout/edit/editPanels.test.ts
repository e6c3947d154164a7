import { describe, expect, it } from 'vitest'
import { addRectangle, usualEdge } from '../../../../shared/layout/edit/addRectangle'
import { copyLevel } from '../../../../shared/layout/edit/copyLevel'
import { edgeRecords } from '../../../../shared/layout/edit/edgeRecords'
import { floorFault } from '../../../../shared/layout/edit/floorFault'
import { copyPanel, movePanel, removePanel } from '../../../../shared/layout/edit/movePanel'
import { nextMark } from '../../../../shared/layout/edit/nextMark'
import { rectangleRing } from '../../../../shared/layout/edit/rectangle'
import { setEdge } from '../../../../shared/layout/edit/setEdge'
import { addPolygon, setOutline, setVoids, voidRectangle } from '../../../../shared/layout/edit/setOutline'
import { gridPanels } from './support/gridPanels'

const row = (mark: string, alongX: number, alongY: number) => ({ mark, alongX, alongY, ribDirection: 90, repeat: 1 })
const continuities = (panel: Parameters<typeof edgeRecords>[0]) => edgeRecords(panel).map(({ continuity }) => continuity)

describe('addRectangle', () => {
  it('puts the first panel at the origin and the next one beside it, joined on both sides', () => {
    const panels = addRectangle(addRectangle([], row('P1', 6600, 6000)), row('P2', 4500, 6000))
    expect(panels.map(({ outline }) => outline)).toEqual([
      rectangleRing([0, 0], 6600, 6000),
      rectangleRing([6600, 0], 4500, 6000),
    ])
    expect(continuities(panels[0]!)).toEqual(['discontinuous', 'continuous', 'discontinuous', 'discontinuous'])
    expect(continuities(panels[1]!)).toEqual(['discontinuous', 'discontinuous', 'discontinuous', 'continuous'])
  })

  it('takes the neighbour’s support width and kind on the shared line, and the usual ones elsewhere', () => {
    const panels = gridPanels([6000], [5000])
    panels[0]!.edges[1] = { supportWidth: 400, kind: 'wall', continuity: 'discontinuous' }
    const added = addRectangle(panels, row('P2', 4000, 5000))[1]!
    expect(edgeRecords(added)[3]).toEqual({ supportWidth: 400, kind: 'wall', continuity: 'continuous' })
    expect(edgeRecords(added)[0]).toEqual({ supportWidth: 250, kind: 'beam', continuity: 'discontinuous' })
  })

  it('begins a row above the level when the place beside the last panel is taken', () => {
    const [first, second, third] = gridPanels([6000, 6000], [5000, 5000])
    const panels = addRectangle([second!, third!, first!], row('P9', 4000, 5000))
    expect(panels[3]!.outline[0]).toEqual([0, 10_000])
    expect(floorFault(panels)).toBeNull()
  })

  it('begins a row above the level when the row would be longer than 36 m', () => {
    const marks = Array.from({ length: 14 }, (_, i) => `P${i + 1}`)
    const panels = marks.reduce((made, mark) => addRectangle(made, row(mark, 7000, 6000)), gridPanels([], []))
    expect(panels.map(({ outline }) => outline[0])).toEqual(marks.map((_, i) => [(i % 5) * 7000, Math.floor(i / 5) * 6000]))
    expect(floorFault(panels)).toBeNull()
  })
})

describe('moving, copying and removing a panel', () => {
  it('parts the edges that are left alone and joins those that meet', () => {
    const panels = gridPanels([6000, 6000], [5000])
    const apart = movePanel(panels, 1, [9000, 0])
    expect(continuities(apart[0]!)[1]).toBe('discontinuous')
    expect(movePanel(apart, 1, [6000, 0])).toEqual(panels)
  })

  it('moves voids with the panel', () => {
    const [panel] = gridPanels([6000], [5000])
    panel!.voids = [rectangleRing([1000, 1000], 1000, 1000)]
    expect(movePanel([panel!], 0, [500, -200])[0]!.voids).toEqual([rectangleRing([1500, 800], 1000, 1000)])
  })

  it('copies a panel beside the level under the next free mark', () => {
    const panels = copyPanel(gridPanels([6000, 6000], [5000]), 0)
    expect(panels[2]).toMatchObject({ mark: 'P3', outline: rectangleRing([12_000, 0], 6000, 5000) })
    expect(floorFault(panels)).toBeNull()
  })

  it('turns a neighbour’s edge discontinuous when its panel is removed', () => {
    const left = removePanel(gridPanels([6000, 6000], [5000]), 1)
    expect(left).toHaveLength(1)
    expect(continuities(left[0]!)).toEqual(Array(4).fill('discontinuous'))
  })
})

describe('setEdge', () => {
  it('changes both sides of a shared support line and nothing else', () => {
    const panels = setEdge(gridPanels([6000, 6000], [5000]), 0, 1, { supportWidth: 300, kind: 'wall' }, 250)
    expect(edgeRecords(panels[0]!)[1]).toEqual({ supportWidth: 300, kind: 'wall', continuity: 'continuous' })
    expect(edgeRecords(panels[1]!)[3]).toEqual({ supportWidth: 300, kind: 'wall', continuity: 'continuous' })
    expect(edgeRecords(panels[1]!)[1]!.supportWidth).toBe(250)
  })

  it('takes the support from a free edge and gives the usual one back', () => {
    const free = setEdge(gridPanels([6000], [5000]), 0, 2, { continuity: 'free' }, 275)
    expect(edgeRecords(free[0]!)[2]!.supportWidth).toBe(0)
    expect(edgeRecords(setEdge(free, 0, 2, { continuity: 'discontinuous' }, 275)[0]!)[2]!.supportWidth).toBe(275)
  })
})

describe('setOutline, addPolygon and setVoids', () => {
  it('keeps the records of edges that keep both points when a corner is added', () => {
    const panels = gridPanels([6000], [5000])
    panels[0]!.edges[3] = { supportWidth: 400, kind: 'wall', continuity: 'discontinuous' }
    const outcome = setOutline(panels, 0, [
      [0, 0],
      [6000, 0],
      [7000, 2500],
      [6000, 5000],
      [0, 5000],
    ])
    expect(outcome).toHaveProperty('panels')
    const [after] = 'panels' in outcome ? outcome.panels : []
    expect(after!.edges).toHaveLength(5)
    expect(after!.edges[4]).toEqual({ supportWidth: 400, kind: 'wall', continuity: 'discontinuous' })
  })

  it.each([
    ['clockwise', [...rectangleRing([0, 0], 6000, 5000)].reverse(), /clockwise/],
    [
      'crossing itself',
      [
        [0, 0],
        [6000, 5000],
        [6000, 0],
        [0, 5000],
      ],
      /cross/,
    ],
    ['over another panel', rectangleRing([0, 0], 6500, 5000), /lies over/],
  ] as const)('refuses an outline %s, in words', (_, outline, reason) => {
    const outcome = setOutline(
      gridPanels([6000, 6000], [5000]),
      0,
      outline.map(([x, y]) => [x, y]),
    )
    expect(outcome).toMatchObject({ refused: expect.stringMatching(reason) })
  })

  it('adds an L-shaped panel that joins its neighbour', () => {
    const outcome = addPolygon(
      gridPanels([6000], [5000]),
      'P2',
      [
        [6000, 0],
        [10_000, 0],
        [10_000, 3000],
        [8000, 3000],
        [8000, 5000],
        [6000, 5000],
      ],
      0,
    )
    const panels = 'panels' in outcome ? outcome.panels : []
    expect(continuities(panels[1]!)[5]).toBe('continuous')
    expect(continuities(panels[0]!)[1]).toBe('continuous')
  })

  it('takes a void by size and offsets, and refuses one over a support', () => {
    const panels = gridPanels([6000], [5000])
    const ring = voidRectangle(panels[0]!, 2000, 1500, [1000, 500])
    expect(ring).toEqual(rectangleRing([1000, 500], 2000, 1500))
    expect(setVoids(panels, 0, [ring])).toHaveProperty('panels')
    expect(setVoids(panels, 0, [voidRectangle(panels[0]!, 2000, 1500, [0, 0])])).toHaveProperty('refused')
  })
})

describe('marks', () => {
  it('counts on from the last mark and skips those taken', () => {
    expect(nextMark([], 'P1')).toBe('P1')
    expect(nextMark(['P1', 'P3', 'P2'], 'P1')).toBe('P4')
    expect(nextMark(['A-09'], 'P1')).toBe('A-10')
    expect(nextMark(['Stair'], 'P1')).toBe('Stair2')
  })

  it('copies a level once, under a free mark', () => {
    const level = { mark: 'L1', name: 'Typical', repeat: 4, proppingHeight: 3000, panels: gridPanels([6000], [5000]) }
    expect(copyLevel(level, ['L1', 'L2'])).toEqual({ ...level, mark: 'L3', name: 'Typical, copy', repeat: 1 })
  })

  it('takes the support that most edges have as the usual one', () => {
    const panels = gridPanels([6000], [5000])
    panels[0]!.edges = [300, 300, 300, 250].map((supportWidth) => ({ supportWidth, kind: 'wall', continuity: 'continuous' }))
    expect(usualEdge(panels)).toEqual({ supportWidth: 300, kind: 'wall', continuity: 'discontinuous' })
    expect(usualEdge([])).toEqual({ supportWidth: 250, kind: 'beam', continuity: 'discontinuous' })
  })
})
