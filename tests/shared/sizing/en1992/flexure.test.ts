import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { en1992Basis } from '#shared/sizing/en1992/en1992Basis'

const basis = en1992Basis({ fck: 30, fyk: 500, nationalValues: {} })
const [concrete, steel] = [0.567 * 30, 0.87 * 500]

describe('flexure of a T-section', () => {
  it('is that of a rectangle as wide as the flange while the stress block stays in it', () => {
    const tee = basis.flexure({ widthMm: 500, depthMm: 230, flange: { webMm: 100, thicknessMm: 60 } }, 20e6, 0)
    const rectangle = basis.flexure({ widthMm: 500, depthMm: 230, flange: null }, 20e6, 0)
    expect(tee.requiredMm2).toBe(rectangle.requiredMm2)
    expect(tee.steelWorking()).toContain('in the flange')
  })

  it('carries its moment in equilibrium where the block leaves the flange', () => {
    const [width, web, flange, depth] = [500, 150, 30, 230]
    fc.assert(
      fc.property(fc.double({ min: 56e6, max: 70e6, noNaN: true }), (momentNmm) => {
        const { requiredMm2, steelWorking } = basis.flexure(
          { widthMm: width, depthMm: depth, flange: { webMm: web, thicknessMm: flange } },
          momentNmm,
          0,
        )
        expect(steelWorking()).toMatch(/^flange /)
        // Tension balances full flange and web block; the block's depth follows, and the moment about the steel.
        const blockMm = flange + (steel * requiredMm2 - concrete * width * flange) / (concrete * web)
        const resisted =
          concrete * width * flange * (depth - flange / 2) +
          concrete * web * (blockMm - flange) * (depth - (blockMm + flange) / 2)
        expect(blockMm).toBeGreaterThan(flange)
        expect(Math.abs(resisted - momentNmm)).toBeLessThan(1e-9 * momentNmm)
      }),
    )
  })

  it('carries its moment in equilibrium as a rectangle once the lever arm is below its cap', () => {
    fc.assert(
      fc.property(fc.double({ min: 95e6, max: 260e6, noNaN: true }), (momentNmm) => {
        const { requiredMm2, leverArmMm } = basis.flexure({ widthMm: 1000, depthMm: 230, flange: null }, momentNmm, 0)
        expect(leverArmMm).toBeLessThan(0.95 * 230)
        const blockMm = (steel * requiredMm2) / (concrete * 1000)
        expect(Math.abs(leverArmMm - (230 - blockMm / 2))).toBeLessThan(1e-6)
      }),
    )
  })

  it('fails above the greatest K, 0.116 after redistribution, with steel that still grows', () => {
    const at = (momentNmm: number, redistributedShare: number) =>
      basis.flexure({ widthMm: 100, depthMm: 200, flange: null }, momentNmm, redistributedShare)
    const k = (share: number) => share * 100 * 200 ** 2 * 30
    expect(at(k(0.15), 0).greatestK).toBe(0.167)
    expect(at(k(0.15), 0.2).greatestK).toBe(0.116)
    expect(at(k(0.15), 0.2).k).toBeCloseTo(0.15, 12)
    expect(at(k(0.4), 0).requiredMm2).toBeGreaterThan(at(k(0.3), 0).requiredMm2)
  })
})

describe('shear without links', () => {
  it('is held at vmin for little steel, at 2 % for much', () => {
    const at = (steelMm2: number) => basis.shearResistanceN({ widthMm: 100, depthMm: 200, steelMm2 }).value
    expect(at(0)).toBeCloseTo(0.035 * 2 ** 1.5 * Math.sqrt(30) * 100 * 200, 6)
    expect(at(1000)).toBe(at(400))
  })
})

describe('span to depth', () => {
  const input = {
    position: 'simple',
    spanMm: 6000,
    section: { widthMm: 1000, depthMm: 200, flange: null },
    momentNmm: 0,
    requiredMm2: 1000,
    providedMm2: 1000,
    carriesPartitions: false,
  } as const

  it('gives 20 and 14 for 0.5 and 1.5 % of C30/37, which Table 7.4N prints rounded down', () => {
    const at = (requiredMm2: number) => basis.spanDepthLimit({ ...input, requiredMm2, providedMm2: requiredMm2 }).value
    expect(Math.floor(at(1000))).toBe(20)
    expect(Math.floor(at(3000))).toBe(14)
  })

  it('grows with steel provided to a half more and no further', () => {
    const factor = (providedMm2: number) =>
      basis.spanDepthLimit({ ...input, providedMm2 }).value / basis.spanDepthLimit(input).value
    expect(factor(1250)).toBeCloseTo(1.25, 12)
    expect(factor(2500)).toBeCloseTo(1.5, 12)
  })
})
