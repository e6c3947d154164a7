import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { enclosingRectangle } from '#shared/layout/enclosingRectangle'
import { rectangle } from './support/floorParts'
import { randomPanel } from './support/randomPanel'
import { isInside } from './support/samplingOracle'

type Ring = readonly (readonly [number, number])[]
const turned = (ring: Ring, degrees: number): [number, number][] => {
  const [cosine, sine] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)]
  return ring.map(([x, y]) => [x * cosine - y * sine, x * sine + y * cosine])
}
/** Area of the upright rectangle around a ring. */
const uprightArea = (ring: Ring) => {
  const [xs, ys] = [ring.map(([x]) => x), ring.map(([, y]) => y)]
  return (Math.max(...xs) - Math.min(...xs)) * (Math.max(...ys) - Math.min(...ys))
}

describe('enclosingRectangle', () => {
  it('of a rectangle is itself, corners in its sides or not', () => {
    const withJoint: [number, number][] = [[0, 0], [2000, 0], ...rectangle(0, 0, 6000, 4500).slice(1)]
    for (const ring of [rectangle(0, 0, 6000, 4500), withJoint])
      expect(enclosingRectangle(ring)).toMatchObject({ short: 4500, long: 6000, longDirection: 0, isFilled: true })
    expect(enclosingRectangle(rectangle(0, 0, 4500, 6000)).longDirection).toBe(90)
  })

  it('of a turned rectangle lies along its sides', () => {
    const { short, long, longDirection, isFilled } = enclosingRectangle(turned(rectangle(100, 700, 6000, 4500), 152))
    expect([short, long, longDirection]).toEqual([expect.closeTo(4500, 6), expect.closeTo(6000, 6), expect.closeTo(152, 9)])
    expect(isFilled).toBe(true)
  })

  it('of an L shape is not filled', () => {
    const l: Ring = [
      [0, 0],
      [8000, 0],
      [8000, 3000],
      [3000, 3000],
      [3000, 6000],
      [0, 6000],
    ]
    expect(enclosingRectangle(l)).toMatchObject({ short: 6000, long: 8000, isFilled: false })
  })

  it('of a triangle, whose three are equally small, is the one with the longest short side', () => {
    // legs 3000 and 4000: 3000 × 4000 along a leg, 5000 × 2400 along the hypotenuse
    const triangle: Ring = [
      [0, 0],
      [4000, 0],
      [0, 3000],
    ]
    for (const degrees of [0, 11, 77, 203]) expect(enclosingRectangle(turned(triangle, degrees)).short).toBeCloseTo(3000, 6)
  })

  it('of any panel is not larger than the upright one at any of 720 turns, and holds every corner', () => {
    fc.assert(
      fc.property(randomPanel, ({ outline }) => {
        const { short, long, corners } = enclosingRectangle(outline)
        const least = Math.min(...Array.from({ length: 720 }, (_, i) => uprightArea(turned(outline, i / 4))))
        expect(short * long).toBeLessThanOrEqual(least * (1 + 1e-9))
        expect(short * long).toBeGreaterThan(0.985 * least)
        const centre = [(corners[0]![0] + corners[2]![0]) / 2, (corners[0]![1] + corners[2]![1]) / 2] as const
        const inwards = outline.map(([x, y]) => [x + (centre[0] - x) * 1e-6, y + (centre[1] - y) * 1e-6] as const)
        expect(inwards.filter((point) => !isInside(point, corners))).toEqual([])
      }),
      { numRuns: 200 },
    )
  })
})
