import { describe, expect, it } from 'vitest'
import type { Point } from '#shared/geometry/point'
import { areaOutside, commonArea, isMoreThanSliver } from '#shared/geometry/overlap'

const square = (x: number, y: number, side: number): Point[] => [
  [x, y],
  [x + side, y],
  [x + side, y + side],
  [x, y + side],
]

describe('two rings', () => {
  it('have the area in common that both cover', () => {
    expect(commonArea(square(0, 0, 10), square(6, 7, 10))).toBe(4 * 3)
    expect(commonArea(square(0, 0, 10), square(2, 2, 3))).toBe(9)
    expect(commonArea(square(0, 0, 10), square(10, 0, 10))).toBe(0)
  })

  it('leave outside what only one covers', () => {
    expect(areaOutside(square(6, 7, 10), square(0, 0, 10))).toBe(100 - 12)
    expect(areaOutside(square(2, 2, 3), square(0, 0, 10))).toBe(0)
  })

  it('may overlap by a sliver a millimetre deep', () => {
    const [a, b] = [square(0, 0, 6000), square(5999.2, 0, 6000)]
    expect(isMoreThanSliver(commonArea(a, b), a, b)).toBe(false)
    const c = square(5997, 0, 6000)
    expect(isMoreThanSliver(commonArea(a, c), a, c)).toBe(true)
  })
})
