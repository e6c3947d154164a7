/**
 * Tables of BS 8110-1:1997 by formula or as data, against every printed cell.
 *
 * Table 3.8 (vc for fcu 25), Table 3.10 (tension steel) and Table 3.27 (anchorage, type 2 bars): printed values from memory, then confirmed by
 * evaluating the standard's own formula. Tables 3.9, 3.17, 3.25, 3.28, 3.4 and Figure 3.2: from memory; Table 3.17 also seen through
 * SANS 10100-1, 4.5.1.2, and 0.13 % of Table 3.25 in a worked example (R-BS-3).
 */
import { describe, expect, it } from 'vitest'
import { bs8110Basis } from '#shared/sizing/bs8110/bs8110Basis'
import { crackDistanceMm } from '#shared/sizing/bs8110/barSpacing'
import { greatestK } from '#shared/sizing/bs8110/flexure'
import { concreteShearMpa } from '#shared/sizing/bs8110/shear'
import { basicSpanDepth, tensionSteelFactor } from '#shared/sizing/bs8110/spanDepthLimit'
import { expectRounded } from './support/expectPrinted'

const basisOf = (fcu: number, fy = 460, cover = 25, gammaSteel: 1.05 | 1.15 = 1.05) =>
  bs8110Basis({ fcu, fy, cover, nationalValues: { gammaSteel } })

describe('Table 3.8, vc of fcu 25', () => {
  const depths = [125, 150, 175, 200, 225, 250, 300, 400]
  const rows: [number, number[]][] = [
    [0.15, [0.45, 0.43, 0.41, 0.4, 0.39, 0.38, 0.36, 0.34]],
    [0.25, [0.53, 0.51, 0.49, 0.47, 0.46, 0.45, 0.43, 0.4]],
    [0.5, [0.67, 0.64, 0.62, 0.6, 0.58, 0.56, 0.54, 0.5]],
    [0.75, [0.77, 0.73, 0.71, 0.68, 0.66, 0.65, 0.62, 0.57]],
    [1, [0.85, 0.81, 0.78, 0.75, 0.73, 0.71, 0.68, 0.63]],
    [1.5, [0.97, 0.92, 0.89, 0.86, 0.84, 0.81, 0.78, 0.72]],
    [2, [1.06, 1.02, 0.98, 0.95, 0.92, 0.9, 0.86, 0.8]],
    [3, [1.22, 1.16, 1.12, 1.08, 1.05, 1.03, 0.98, 0.91]],
  ]
  const at = (percent: number, depthMm: number, fcu = 25) =>
    concreteShearMpa({ widthMm: 1000, depthMm, steelMm2: (percent / 100) * 1000 * depthMm }, fcu)

  it.each(rows)('at %d %% of steel', (percent, printed) => {
    printed.forEach((value, i) => expectRounded(at(percent, depths[i]!), value, 2))
  })

  it('does not grow over 3 % of steel, over fcu 40, nor with a depth factor under 0.67', () => {
    expect(at(4, 200)).toBe(at(3, 200))
    expect(at(1, 200, 60)).toBe(at(1, 200, 40))
    expect(at(1, 200, 40) / at(1, 200)).toBeCloseTo(Math.cbrt(40 / 25), 12)
    expect(at(1, 4000)).toBeCloseTo((0.79 * 0.67) / 1.25, 12)
  })

  it('is held by 0.8√fcu and 5 MPa on a section', () => {
    // A depth of a tenth of a millimetre lifts (400/d)^¼ to 8, so that the caps are reached.
    const stress = (fcu: number) => basisOf(fcu).shearResistanceN({ widthMm: 10, depthMm: 0.1, steelMm2: 1 }).value
    expect(stress(20)).toBeCloseTo(0.8 * Math.sqrt(20), 9)
    expect(stress(60)).toBeCloseTo(5, 9)
  })
})

describe('Table 3.9, span to depth', () => {
  const section = (webShare: number | null) => ({
    widthMm: 1000,
    depthMm: 200,
    flange: webShare === null ? null : { webMm: 1000 * webShare, thicknessMm: 60 },
  })
  it.each([
    ['simple', null, 20],
    ['end', null, 26],
    ['interior', null, 26],
    ['simple', 0.3, 16],
    ['simple', 0.1, 16],
    ['interior', 0.3, 20.8],
    ['end', 0.2, 20.8],
    ['simple', 0.65, 18],
    ['interior', 0.65, 23.4],
  ] as const)('of a %s span with a web of %d is %d', (position, webShare, printed) => {
    expect(basicSpanDepth({ position, section: section(webShare) })).toBeCloseTo(printed, 10)
  })

  it('falls by 10/span over 10 m', () => {
    const limit = (spanMm: number) =>
      basisOf(30).spanDepthLimit({
        position: 'interior',
        spanMm,
        section: section(null),
        momentNmm: 80e6,
        requiredMm2: 1000,
        providedMm2: 1000,
        carriesPartitions: false,
      }).value
    expect(limit(12_500) / limit(10_000)).toBeCloseTo(0.8, 12)
    expect(limit(9_000)).toBe(limit(10_000))
  })
})

describe('Table 3.10, tension steel', () => {
  const moments = [0.5, 0.75, 1, 1.5, 2, 3, 4, 5, 6]
  const rows: [number, number[]][] = [
    [100, [2, 2, 2, 1.86, 1.63, 1.36, 1.19, 1.08, 1.01]],
    [150, [2, 2, 1.98, 1.69, 1.49, 1.25, 1.11, 1.01, 0.94]],
    [167, [2, 2, 1.91, 1.63, 1.44, 1.21, 1.08, 0.99, 0.92]],
    [200, [2, 1.95, 1.76, 1.51, 1.35, 1.14, 1.02, 0.94, 0.88]],
    [250, [1.9, 1.7, 1.55, 1.34, 1.2, 1.04, 0.94, 0.87, 0.82]],
    [300, [1.6, 1.44, 1.33, 1.16, 1.06, 0.93, 0.85, 0.8, 0.76]],
    [307, [1.56, 1.41, 1.3, 1.14, 1.04, 0.91, 0.84, 0.79, 0.76]],
    [333, [1.41, 1.28, 1.18, 1.05, 0.96, 0.86, 0.79, 0.75, 0.72]],
  ]
  it.each(rows)('at fs %d', (serviceMpa, printed) => {
    printed.forEach((value, i) => expectRounded(tensionSteelFactor(serviceMpa, moments[i]!), value, 2))
  })

  it('has fs 307 and 167 for fully used steel of fy 460 and 250, less for more steel', () => {
    const working = (fy: number, providedMm2: number) =>
      basisOf(30, fy)
        .spanDepthLimit({
          position: 'simple',
          spanMm: 5000,
          section: { widthMm: 1000, depthMm: 200, flange: null },
          momentNmm: 40e6,
          requiredMm2: 500,
          providedMm2,
          carriesPartitions: false,
        })
        .working()
    expect(working(460, 500)).toContain('= 307 MPa')
    expect(working(250, 500)).toContain('= 167 MPa')
    expect(working(460, 1000)).toContain('= 153 MPa')
  })
})

describe('3.4.4.4, greatest K', () => {
  it.each([
    [0, 0.156],
    [0.1, 0.156],
    [0.2, 0.132],
    [0.3, 0.104],
  ])('after redistribution of %d is %d', (share, printed) => {
    expectRounded(greatestK(share), printed, 3)
  })
})

describe('3.4.4.4 and 3.4.4.5, T-sections', () => {
  const section = { widthMm: 500, depthMm: 230, flange: { webMm: 150, thicknessMm: 40 } }
  // Moment that the flange alone carries, 0.45·fcu·b·hf·(d − 0.5·hf): as the code prints it (seen in several worked examples).
  const flangeNmm = 0.45 * 30 * 500 * 40 * (230 - 20)
  const at = (share: number) => basisOf(30).flexure(section, share * flangeNmm, 0)

  it('have their stress block in the flange up to 0.45·fcu·b·hf·(d − 0.5·hf)', () => {
    expect(at(0.999).steelWorking()).toContain('in the flange')
    expect(at(1.001).steelWorking()).toMatch(/^flange /)
    expect(at(1).requiredMm2).toBeCloseTo(flangeNmm / (0.95 * 460 * 210), 6)
  })

  it('are in equilibrium beyond it', () => {
    const { requiredMm2 } = at(1.1)
    const tensionN = 0.95 * 460 * requiredMm2
    const blockMm = 40 + (tensionN - 0.45 * 30 * 500 * 40) / (0.45 * 30 * 150)
    const resistedNmm = 0.45 * 30 * (500 * 40 * 210 + 150 * (blockMm - 40) * (230 - (blockMm + 40) / 2))
    expect(resistedNmm / (1.1 * flangeNmm)).toBeCloseTo(1, 9)
  })
})

describe('Table 3.17, topping over permanent blocks', () => {
  it.each([
    [400, 30],
    [500, 30],
    [501, 50.1],
    [700, 70],
  ])('at a clear distance of %d mm is %d mm', (clearMm, printed) => {
    const shape = { clearMm, ribMm: 125, blockHeightMm: 200, toppingMm: 50 }
    expect(basisOf(30).leastToppingMm(shape).value).toBeCloseTo(printed, 10)
  })
})

describe('3.6.1.3 and 3.6.6.2, ribs and their topping', () => {
  it('keeps ribs within 1.5 m and four widths, and meshes 0.12 % of the topping', () => {
    const [spacing, depth] = basisOf(30).ribProportions({ clearMm: 400, ribMm: 120, blockHeightMm: 200, toppingMm: 60 })
    expect([spacing?.demand, spacing?.capacity, depth?.demand, depth?.capacity]).toEqual([520, 1500, 200, 480])
    expect(basisOf(30).toppingMeshMm2(60).value).toBeCloseTo(72, 10)
    expect(basisOf(30).crossRibSpacingMm(260)).toBeNull()
  })
})

describe('Table 3.25, least steel', () => {
  const zone = { widthMm: 0, heightMm: 250, depthMm: 220 }
  const rectangle = { ...zone, tension: 'rectangle', webMm: 1000, flangeMm: 1000 } as const
  const web = (webMm: number) => ({ ...zone, tension: 'web', webMm, flangeMm: 500 }) as const
  const flange = (flangeMm: number) => ({ ...zone, tension: 'flange', webMm: 150, flangeMm }) as const
  const percent = (mm2: number, webMm: number) => (100 * mm2) / (webMm * 250)

  it.each([
    [250, 0.24, 0.32, 0.24, 0.48],
    [460, 0.13, 0.18, 0.13, 0.26],
  ])('of fy %d is %d %% in a rectangle, %d and %d in webs, %d over a rib', (fy, rectangular, narrow, wide, tee) => {
    const least = (of: Parameters<ReturnType<typeof basisOf>['leastSteelMm2']>[0]) => basisOf(30, fy).leastSteelMm2(of).value
    expect(percent(least(rectangle), 1000)).toBeCloseTo(rectangular, 10)
    expect(percent(least(web(199)), 199)).toBeCloseTo(narrow, 10)
    expect(percent(least(web(200)), 200)).toBeCloseTo(wide, 10)
    expect(percent(least(flange(150)), 150)).toBeCloseTo(tee, 10)
    // Over the support the section is solid as wide as the spacing, which asks more from twice the rib on.
    expect(percent(least(flange(600)), 600)).toBeCloseTo(rectangular, 10)
  })

  it('is that of a slab across the principal bars, 4 % at most', () => {
    expect(basisOf(30).secondarySteelMm2(5000, rectangle).value).toBeCloseTo(325, 10)
    expect(basisOf(30).mostSteelMm2(250_000).value).toBeCloseTo(10_000, 10)
  })
})

describe('3.12.11, distances between bars', () => {
  const bars = { place: 'greatestMoment', redistributedShare: 0 } as const

  it('are 3d or 750 mm clear in thin slabs', () => {
    expect(basisOf(30).greatestSpacingMm({ ...bars, heightMm: 200, depthMm: 170, diameterMm: 10 }).value).toBe(520)
    expect(basisOf(30, 250).greatestSpacingMm({ ...bars, heightMm: 250, depthMm: 220, diameterMm: 10 }).value).toBe(670)
    expect(basisOf(30).greatestSpacingMm({ ...bars, heightMm: 400, depthMm: 370, diameterMm: 10 }).value).toBe(760)
  })

  it('are 155 mm clear (Table 3.28) where slabs over 200 mm have thick bars, which are over 0.3 % at any spacing', () => {
    expect(basisOf(30).greatestSpacingMm({ ...bars, heightMm: 250, depthMm: 212, diameterMm: 25 }).value).toBe(155 + 25)
    expect(basisOf(30).greatestSpacingMm({ ...bars, heightMm: 200, depthMm: 162, diameterMm: 25 }).value).toBe(3 * 162 + 25)
    const redistributed = { ...bars, heightMm: 250, depthMm: 212, diameterMm: 25, redistributedShare: 0.2 } as const
    expect(basisOf(30).greatestSpacingMm(redistributed).value).toBe(125 + 25)
  })

  it('follow the rule of 155 over the percentage at every spacing of a search', () => {
    for (const [depthMm, diameterMm] of [
      [200, 10],
      [215, 16],
      [215, 20],
      [215, 25],
      [320, 25],
    ] as const) {
      const most = basisOf(30).greatestSpacingMm({ ...bars, heightMm: depthMm + 40, depthMm, diameterMm }).value
      for (let spacing = 75; spacing <= 500; spacing += 25) {
        const percent = (100 * ((Math.PI * diameterMm ** 2) / 4) * (1000 / spacing)) / (1000 * depthMm)
        const limit = percent < 0.3 ? Infinity : 155 / Math.min(1, percent)
        const isMet = spacing - diameterMm <= Math.min(3 * depthMm, 750, limit)
        expect(spacing <= most, `φ${diameterMm} at ${spacing}, d ${depthMm}`).toBe(isMet)
      }
    }
  })

  it.each([
    [460, 0, 155],
    [460, 0.2, 125],
    [250, 0, 280],
  ])('of fy %d after redistribution of %d are %d mm by Table 3.28', (fy, share, printed) => {
    expect(crackDistanceMm(fy, share)).toBe(printed)
  })

  it('leave gaps of 5 mm over the aggregate, and of thick bars themselves', () => {
    expect(basisOf(30).leastGapMm(12, 10).value).toBe(15)
    expect(basisOf(30).leastGapMm(25, 10).value).toBe(25)
    expect(basisOf(30).leastGapMm(20, 20).value).toBe(25)
  })
})

describe('Table 3.27, anchorage of type 2 bars in tension', () => {
  const bond = { isTop: false, sectionMm: 300, isCorner: false }
  const strengths = [25, 30, 35, 40]
  const rows: [number, 1.05 | 1.15, number[]][] = [
    [460, 1.15, [41, 37, 34, 32]],
    [460, 1.05, [44, 40, 37, 35]],
    [500, 1.05, [48, 44, 41, 38]],
  ]
  it.each(rows)('of fy %d at γm %d', (fy, gammaSteel, printed) => {
    printed.forEach((multiple, i) => {
      const length = basisOf(strengths[i]!, fy, 40, gammaSteel).anchorageMm(16, bond, 1).value
      // The printed multiples are rounded up.
      expect(Math.ceil(length / 16 - 1e-9)).toBe(multiple)
    })
  })

  it('laps as much, 1.4 times at the top or in a corner with little cover, twice in both, and 15φ or 300 mm at least', () => {
    const lap = (cover: number, isTop: boolean, isCorner: boolean) =>
      basisOf(30, 460, cover).lapMm(16, { isTop, sectionMm: 300, isCorner }).value
    const anchorage = basisOf(30).anchorageMm(16, bond, 1).value
    expect(lap(25, false, false)).toBeCloseTo(anchorage, 10)
    expect(lap(25, true, false)).toBeCloseTo(1.4 * anchorage, 10)
    expect(lap(25, false, true)).toBeCloseTo(1.4 * anchorage, 10)
    expect(lap(25, true, true)).toBeCloseTo(2 * anchorage, 10)
    expect(lap(32, true, true)).toBeCloseTo(anchorage, 10)
    expect(basisOf(40, 250).lapMm(8, bond).value).toBe(300)
    expect(basisOf(60, 250, 25, 1.15).lapMm(40, bond).value).toBe(600)
  })

  it('goes half as far for a bar stressed by half', () => {
    expect(basisOf(30).anchorageMm(16, bond, 0.5).value * 2).toBeCloseTo(basisOf(30).anchorageMm(16, bond, 1).value, 10)
  })
})

describe('fire, Table 3.4 and Figure 3.2', () => {
  it.each([
    [30, 20, 20, 20, 20, 75, 125],
    [60, 20, 20, 20, 20, 95, 125],
    [90, 25, 20, 35, 20, 110, 125],
    [120, 35, 25, 45, 35, 125, 125],
    [180, 45, 35, 55, 45, 150, 150],
    [240, 55, 45, 65, 55, 170, 175],
  ])('for %d minutes: floors %d and %d, ribs %d and %d of cover, %d thick, ribs %d wide', (minutes, ...printed) => {
    const basis = basisOf(30)
    const slabs = [false, true].map((isContinuous) => basis.slabFire(minutes, 'oneWay', isContinuous))
    const ribs = [false, true].map((isContinuous) => basis.ribFire(minutes, 125, isContinuous, 0))
    const covers = [...slabs, ...ribs].map(({ bars }) => bars.value)
    expect([...covers, slabs[0]!.size.value, ribs[0]!.size.value]).toEqual(printed)
    expect(new Set([...slabs, ...ribs].map(({ measuredTo }) => measuredTo))).toEqual(new Set(['cover']))
  })
})

describe('3.6.2 and 3.12.10.3.2, edges designed as simple', () => {
  it('have half the midspan steel over 0.1 of the span in slabs, a quarter over 0.15 in ribs', () => {
    const { slab, rib } = basisOf(30).simpleEdge
    expect([slab.share, slab.of, slab.reach, rib.share, rib.of, rib.reach]).toEqual([0.5, 'steel', 0.1, 0.25, 'steel', 0.15])
  })
})
