import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { edgeOfRing, signedArea } from '#shared/geometry/ring'
import { distanceToSegment } from '#shared/geometry/segment'
import { OutOfScopeError } from '#shared/outOfScope'
import { clearOutline } from '#shared/layout/clearOutline'
import { panelOf, rectangle } from './support/floorParts'
import { randomPanel } from './support/randomPanel'
import { isInside, oracleOf } from './support/samplingOracle'

const supports = (...widths: number[]) =>
  widths.map((supportWidth) => ({ supportWidth, continuity: supportWidth ? 'continuous' : 'free' }))

describe('clearOutline', () => {
  it('moves each edge in by half its own support, free edges not at all', () => {
    const { ring, sources } = clearOutline(panelOf({ edges: supports(300, 200, 0, 500) }))
    expect(ring).toEqual([
      [250, 150],
      [5900, 150],
      [5900, 4500],
      [250, 4500],
    ])
    expect(sources).toEqual([0, 1, 2, 3])
  })

  it('mitres a re-entrant corner', () => {
    const outline = [
      [0, 0],
      [8000, 0],
      [8000, 3000],
      [3000, 3000],
      [3000, 6000],
      [0, 6000],
    ]
    const { ring } = clearOutline(panelOf({ outline, edges: supports(200, 200, 200, 400, 200, 200) }))
    expect(ring[3]).toEqual([2800, 2900])
  })

  it('steps square where two supports in one line have different widths', () => {
    const outline = [[0, 0], [2500, 0], ...rectangle(0, 0, 6000, 4500).slice(1)]
    const { ring, sources } = clearOutline(panelOf({ outline, edges: supports(300, 600, 300, 300, 300) }))
    expect(ring).toEqual([
      [150, 150],
      [2500, 150],
      [2500, 300],
      [5850, 300],
      [5850, 4350],
      [150, 4350],
    ])
    expect(sources).toEqual([0, 1, 1, 2, 3, 4])
    expect(signedArea(ring)).toBe(5700 * 4200 - 3350 * 150)
  })

  it('goes straight on where two supports in one line have the same width', () => {
    const outline = [[0, 0], [2500, 0], ...rectangle(0, 0, 6000, 4500).slice(1)]
    expect(clearOutline(panelOf({ outline })).ring[1]).toEqual([2500, 150])
  })

  it('refuses supports that leave an edge no clear length, naming the support', () => {
    const chamfered = [
      [0, 0],
      [5950, 0],
      [6000, 50],
      [6000, 4500],
      [0, 4500],
    ]
    expect(() => clearOutline(panelOf({ outline: chamfered, edges: supports(300, 300, 300, 300, 300) }))).toThrow(OutOfScopeError)
    expect(() => clearOutline(panelOf({ outline: chamfered, edges: supports(300, 300, 300, 300, 300) }))).toThrow(
      /^edges\.1\.supportWidth: .*expected a longer edge or narrower supports/,
    )
    expect(() =>
      clearOutline(panelOf({ edges: [{ supportWidth: 3000, continuity: 'continuous' }], outline: rectangle(0, 0, 6000, 3000) })),
    ).toThrow(/^edges\.0\.supportWidth/)
  })

  /** Shares along x and y that are never equal: no point lies on a diagonal, where the mitres of a square meet. */
  const shares = fc.tuple(
    fc.nat(99_999).map((part) => (part + 0.417) / 100_000),
    fc.nat(99_990).map((part) => (part + 0.283) / 99_991),
  )
  /** On an edge, which side a point lies on is a matter of rounding. */
  const isOnEdge = (point: readonly [number, number], ring: [number, number][]) =>
    ring.some((_, i) => distanceToSegment(point, ...edgeOfRing(ring, i)) < 0.001)

  it('of any panel holds exactly the points that lie inside it and off its supports', () => {
    fc.assert(
      fc.property(randomPanel, fc.array(shares, { minLength: 60, maxLength: 60 }), (panel, spread) => {
        const { ring } = clearOutline(panel)
        const oracle = oracleOf(panel, 0)
        const [xs, ys] = [panel.outline.map(([x]) => x), panel.outline.map(([, y]) => y)]
        const [left, bottom] = [Math.min(...xs), Math.min(...ys)]
        const points = spread
          .map(([u, v]) => [left + u * (Math.max(...xs) - left), bottom + v * (Math.max(...ys) - bottom)] as const)
          .filter((point) => !isOnEdge(point, ring) && !isOnEdge(point, panel.outline))
        expect(points.filter((point) => isInside(point, ring) !== oracle.isClear(point))).toEqual([])
      }),
      { numRuns: 300 },
    )
  })
})
