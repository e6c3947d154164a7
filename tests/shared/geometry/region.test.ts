import { describe, expect, it } from 'vitest'
import type { Point } from '#shared/geometry/point'
import { areaOf, chordsAt, clearIntervals, regionWhere } from '#shared/geometry/region'
import { cutIntoSlabs } from '#shared/geometry/slabs'

const square = (x: number, y: number, side: number): Point[] => [
  [x, y],
  [x + side, y],
  [x + side, y + side],
  [x, y + side],
]
const inFirstOnly = ([first, second]: readonly number[]) => first! > 0 && second! <= 0
const regionOf = (rings: Point[][], isInside: (windings: readonly number[]) => boolean) =>
  regionWhere(cutIntoSlabs(rings), rings.length, isInside)

describe('a region', () => {
  const frame = regionOf([square(0, 0, 10), square(3, 3, 4)], inFirstOnly)

  it('has the area of the outer ring less its hole', () => {
    expect(areaOf(frame)).toBe(100 - 16)
  })

  it('has the area within a window, its sides anywhere', () => {
    expect(areaOf(frame, { left: 2, right: 5, bottom: 2, top: 5 })).toBe(9 - 4)
    expect(areaOf(frame, { left: -Infinity, right: 5, bottom: 0, top: 10 })).toBe(50 - 8)
    expect(areaOf(frame, { left: 20, right: 30, bottom: 0, top: 10 })).toBe(0)
  })

  it('measures slanted sides across a window exactly', () => {
    const triangle = regionOf(
      [
        [
          [0, 0],
          [10, 0],
          [0, 10],
        ],
      ],
      ([winding]) => winding! > 0,
    )
    expect(areaOf(triangle)).toBeCloseTo(50, 12)
    expect(areaOf(triangle, { left: 2, right: 6, bottom: 1, top: 5 })).toBeCloseTo(16 - 0.5, 12)
    expect(areaOf(triangle, { left: 2, right: Infinity, bottom: 0, top: 10 })).toBeCloseTo(32, 12)
  })

  it('is cut where rings cross each other', () => {
    const diamond: Point[] = [
      [5, -3],
      [13, 5],
      [5, 13],
      [-3, 5],
    ]
    const both = regionOf([square(0, 0, 10), diamond], ([a, b]) => a! > 0 && b! > 0)
    // the diamond's four tips are 3 high and 6 wide
    expect(areaOf(both)).toBeCloseTo(128 - 4 * 9, 12)
  })

  it('takes a ring that crosses itself by its winding', () => {
    const bow: Point[] = [
      [0, 0],
      [10, 10],
      [10, 0],
      [0, 10],
    ]
    expect(areaOf(regionOf([bow], ([winding]) => winding! > 0))).toBeCloseTo(25, 12)
    expect(areaOf(regionOf([bow], ([winding]) => winding !== 0))).toBeCloseTo(50, 12)
  })

  it('is clear along a band on each side of a hole', () => {
    expect(clearIntervals(frame, 4, 5).map(({ start, end }) => [start, end])).toEqual([
      [0, 3],
      [7, 10],
    ])
    expect(clearIntervals(frame, 0, 3).map(({ start, end }) => [start, end])).toEqual([[0, 10]])
    expect(clearIntervals(frame, -1, 2)).toEqual([])
  })

  it('is clear along a band as far as the steeper end of a slanted side', () => {
    const skew = regionOf(
      [
        [
          [0, 0],
          [100, 0],
          [140, 40],
          [40, 40],
        ],
      ],
      ([winding]) => winding! > 0,
    )
    const [interval] = clearIntervals(skew, 10, 30)
    expect([interval!.start, interval!.end]).toEqual([expect.closeTo(30, 2), expect.closeTo(110, 2)])
    expect(interval!.startEdges.map(({ edge }) => edge)).toEqual([3])
  })

  it('gives the chords of a level line', () => {
    expect(chordsAt(frame, 5)).toEqual([
      { start: 0, end: 3 },
      { start: 7, end: 10 },
    ])
    expect(chordsAt(frame, 11)).toEqual([])
  })
})
