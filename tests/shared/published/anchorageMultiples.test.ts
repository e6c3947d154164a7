/**
 * Anchorage and lap lengths as multiples of the diameter, fyk 500 fully stressed.
 *
 * EN 1992-1-1:2004, 8.4.2 to 8.4.4 and 8.7.3: multiples as design aids print them, from memory, confirmed by evaluating the standard's
 * own formulas. They are rounded to whole diameters.
 */
import { describe, expect, it } from 'vitest'
import { en1992Basis } from '#shared/sizing/en1992/en1992Basis'

const HALF_A_DIAMETER = 0.5
const bottom = { isTop: false, sectionMm: 300, isCorner: false }
const top = { ...bottom, isTop: true }
const rows = [
  [20, 47, 67, 70],
  [25, 40, 58, 61],
  [30, 36, 51, 54],
  [35, 32, 46, 48],
  [40, 30, 42, 44],
] as const

describe.each(rows)('C%d', (fck, good, poor, lap) => {
  const basis = en1992Basis({ fck, fyk: 500, nationalValues: {} })

  it(`anchors a bar in ${good} diameters, in poor bond in ${poor}, and laps it in ${lap}`, () => {
    const near = (actual: number, multiple: number) =>
      expect(Math.abs(actual / 16 - multiple)).toBeLessThanOrEqual(HALF_A_DIAMETER + 0.05)
    near(basis.anchorageMm(16, bottom, 1).value, good)
    near(basis.anchorageMm(16, top, 1).value, poor)
    near(basis.lapMm(16, bottom).value, lap)
  })
})
