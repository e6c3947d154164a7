import { describe, expect, it } from 'vitest'
import { findNeighbours, findSharedEdges } from '#shared/layout/neighbours'
import { levelOf, panelOf, rectangle } from './support/floorParts'

const at = (mark: string, ...place: [number, number, number, number]) => panelOf({ mark, outline: rectangle(...place) })

describe('findNeighbours', () => {
  it('lists a shared side from both panels, with the length they have in common', () => {
    const level = levelOf([at('P1', 0, 0, 6000, 4500), at('P2', 6000, 1000, 5000, 4500)])
    expect(findNeighbours(level)).toEqual([
      { panel: 0, edge: 1, neighbour: 1, neighbourEdge: 3, overlap: 3500 },
      { panel: 1, edge: 3, neighbour: 0, neighbourEdge: 1, overlap: 3500 },
    ])
  })

  it('finds several neighbours along one side', () => {
    const level = levelOf([at('P1', 0, 0, 9000, 4000), at('P2', 0, 4000, 4000, 4000), at('P3', 4000, 4000, 5000, 4000)])
    expect(findNeighbours(level).filter(({ panel }) => panel === 0)).toEqual([
      { panel: 0, edge: 2, neighbour: 1, neighbourEdge: 0, overlap: 4000 },
      { panel: 0, edge: 2, neighbour: 2, neighbourEdge: 0, overlap: 5000 },
    ])
  })

  it('takes no panels that meet only at a corner, or stand a gap apart', () => {
    expect(findNeighbours(levelOf([at('P1', 0, 0, 6000, 4500), at('P2', 6000, 4500, 6000, 4500)]))).toEqual([])
    expect(findNeighbours(levelOf([at('P1', 0, 0, 6000, 4500), at('P2', 6005, 0, 6000, 4500)]))).toEqual([])
    expect(findNeighbours(levelOf([at('P1', 0, 0, 6000, 4500), at('P2', 6000, 4460, 6000, 4500)]))).toEqual([])
  })

  it('forgives coordinates rounded to the millimetre on a skew support line', () => {
    const skew: [number, number][] = [
      [0, 0],
      [6000, 0],
      [6217, 4471],
      [0, 4471],
    ]
    const beyond: [number, number][] = [
      [6108, 2235],
      [11_000, 2000],
      [11_000, 4471],
      [6217, 4471],
    ]
    const found = findNeighbours(levelOf([panelOf({ mark: 'P1', outline: skew }), panelOf({ mark: 'P2', outline: beyond })]))
    expect(found.map(({ panel, edge, neighbour, neighbourEdge }) => [panel, edge, neighbour, neighbourEdge])).toEqual([
      [0, 1, 1, 3],
      [1, 3, 0, 1],
    ])
    expect(found[0]!.overlap).toBeCloseTo(Math.hypot(109, 2236), 0)
  })

  it('takes no edges that lie in one line but on the same side of it', () => {
    const level = levelOf([at('P1', 0, 0, 6000, 4500), at('P2', 2000, 0, 2000, 2000)])
    expect(findNeighbours(level)).toEqual([])
  })

  it('looks at 500 panels in a moment', () => {
    const panels = Array.from({ length: 500 }, (_, i) => at(`P${i}`, (i % 25) * 6000, Math.floor(i / 25) * 4500, 6000, 4500))
    const start = performance.now()
    expect(findNeighbours(levelOf(panels))).toHaveLength(2 * (24 * 20 + 25 * 19))
    expect(performance.now() - start).toBeLessThan(5000)
  })
})

describe('findSharedEdges', () => {
  it('counts a side as shared when other panels stand along at least half of it', () => {
    const level = levelOf([at('P1', 0, 0, 6000, 4000), at('P2', 6000, 0, 5000, 2000), at('P3', 0, 4000, 2500, 4000)])
    expect(findSharedEdges(level)).toEqual([
      [false, true, false, false],
      [false, false, false, true],
      [true, false, false, false],
    ])
  })
})
