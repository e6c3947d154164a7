/**
 * One ribbed and one solid panel worked by hand by BS 8110-1:1997 from load to bar, the arithmetic written out: every check of both. Panel of
 * 6.0 × 4.5 m on beams 250 wide, simple all round; imposed 2.0, partitions 0.8, finishes 1.5 kN/m²; fcu 37, fy 460 (γm 1.05), cover 25, half an
 * hour of fire.
 */
import { describe, expect, it } from 'vitest'
import type { Check } from '#shared/contracts/appraisalResult'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { britishFileOf, panelOf, rectangle, ribbed, schemeOf, solid } from '../support/floors'

const file = britishFileOf([panelOf('P1', rectangle(0, 0, 6000, 4500), [], 90)])
const SIX_DIGITS = 1e-6

function near(actual: number, expected: number) {
  expect(Math.abs(actual - expected), `${actual} against ${expected}`).toBeLessThanOrEqual(SIX_DIGITS * expected)
}

/** Demand and capacity of the check of a name in a unit whose working opens so. */
function check(checks: readonly Check[], name: Check['name'], unit: string, opening = '') {
  const found = checks.find((each) => each.name === name && each.unit === unit && each.working.startsWith(opening))
  if (!found) throw new Error(`no check ${name} in ${unit} of ${opening}`)
  return [found.demand, found.capacity] as const
}

const area = (...diameters: number[]) => diameters.reduce((sum, each) => sum + (Math.PI * each ** 2) / 4, 0)
/** vc of Table 3.8 for fcu 37, MPa. */
const concreteShear = (steel: number, width: number, depth: number) =>
  ((0.79 * Math.cbrt((100 * steel) / (width * depth)) * (400 / depth) ** 0.25) / 1.25) * Math.cbrt(37 / 25)
/** Modification factor of Table 3.10. */
const factor = (required: number, provided: number, momentMpa: number) =>
  0.55 + (477 - (2 * 460 * required) / (3 * provided)) / (120 * (0.9 + momentMpa))

describe('ribbed: ribs 130 at 530, blocks 200 × 400 × 200 of 12.5 kg, topping 80', () => {
  const panel = sizeScheme(schemeOf({ ...ribbed, ribWidth: 130, topping: 80 }), file).panels[0]!
  const { checks } = panel
  // Rows: floor((5750 + 130)/530) = 11; blocks in a row: floor(4250/200) = 21.
  const clearM2 = 5.75 * 4.25
  const concreteM3 = clearM2 * 0.28 - 231 * 0.2 * 0.4 * 0.2
  const selfWeight = (concreteM3 * 25 + (231 * 12.5 * 9.81) / 1000) / clearM2
  const load = 1.4 * (selfWeight + 1.5) + 1.6 * 2.8
  // Centres 4500; clear and d, 4250 + 280 − 25, is more. One bar of 12 and one of 10, their centroid by area.
  const momentNmm = ((load * 0.53 * 4.5 ** 2) / 8) * 1e6
  const provided = area(12, 10)
  const depth = 280 - 25 - (area(12) * 6 + area(10) * 5) / provided
  const required = momentNmm / (0.95 * 460 * 0.95 * depth)

  it('weighs 4.38 kN/m² and bends with 17.1 kNm a rib', () => {
    near(selfWeight, 4.3780614)
    near(panel.moments.midspan * 1e6, momentNmm)
  })

  it('keeps the proportions of ribs, topping and fire', () => {
    expect(check(checks, 'ribs.proportions', 'mm', 'centres')).toEqual([530, 1500])
    expect(check(checks, 'ribs.proportions', 'mm', 'rib below')).toEqual([200, 520])
    expect(check(checks, 'topping', 'mm')).toEqual([30, 80])
    expect(check(checks, 'fire.size', 'mm', 'flange')).toEqual([75, 80])
    expect(check(checks, 'fire.size', 'mm', 'rib')).toEqual([125, 130])
    expect(check(checks, 'fire.cover', 'mm')).toEqual([20, 25])
  })

  it('needs 165 mm² at 0.95d with its flange of 530 compressed; 192 are provided', () => {
    // Flange: min(130 + 4500/5; 530) = 530; block 2·(d − z) = 0.1d = 25 in the topping of 80.
    const [k, greatestK] = check(checks, 'flexure.midspan', '-')
    near(k, momentNmm / (530 * depth ** 2 * 37))
    expect(greatestK).toBe(0.156)
    const [demand, capacity] = check(checks, 'flexure.midspan', 'mm²')
    near(demand, required)
    near(capacity, provided)
  })

  it('deflects within 16 times the factor for its steel, as bw/b is 130/530', () => {
    const [demand, capacity] = check(checks, 'deflection', '-')
    near(demand, 4500 / depth)
    near(capacity, 16 * factor(required, provided, momentNmm / (530 * depth ** 2)))
  })

  it('has steel between 0.18 % of the rib and 4 %, that fits', () => {
    near(check(checks, 'steel.least', 'mm²', 'midspan')[0], 0.0018 * 130 * 280)
    near(check(checks, 'steel.most', 'mm²')[1], 0.04 * (530 * 80 + 130 * 200))
    // Cover twice, both bars, and 10 + 5 between them.
    expect(check(checks, 'bars.fit', 'mm')).toEqual([2 * 25 + 22 + 15, 130])
  })

  it('carries its shear at the face of the support', () => {
    const [demand, capacity] = check(checks, 'shear', 'kN')
    near(demand, load * 0.53 * (4.5 / 2 - 0.125))
    near(capacity, (concreteShear(provided, 130, depth) * 130 * depth) / 1000)
  })

  it('has a quarter of its midspan steel in the top of either end', () => {
    const [demand, capacity] = check(checks, 'steel.least', 'mm²', 'edge 1, top')
    near(demand, (0.25 * momentNmm) / (0.95 * 460 * 0.95 * (280 - 25 - 4)))
    near(capacity, area(8))
  })

  it('schedules its bars', () => {
    // Bottom: 12·12 + 250/2 past the face exceed the 225 there are: turned up by a least leg. Top: 0.15 · 4500 and 225 into the support,
    // turned down by the rest of 0.95·460/(2·√37) = 35.9 diameters, 62 mm, of which a leg is 115 at least.
    const bars = panel.bars.map(({ diameter, count, shape }) => [diameter, count, shape.code, ...shape.dimensionsMm])
    expect(bars).toEqual([
      [12, 12, '21', 125, 4700, 125],
      [10, 12, '21', 120, 4700, 120],
      [8, 12, '11', 900, 115],
      [8, 12, '11', 900, 115],
    ])
  })

  it('passes', () => {
    expect(checks.filter(({ pass }) => !pass)).toEqual([])
    expect(checks).toHaveLength(16)
  })
})

describe('solid: 175 thick, two way with four simple edges', () => {
  const panel = sizeScheme(schemeOf({ ...solid, thickness: 175 }), file).panels[0]!
  const { checks } = panel
  const load = 1.4 * (0.175 * 25 + 1.5) + 1.6 * 2.8
  // Effective spans: clear and d of 175 − 25, less than the centres; Table 3.14, case 9, between 1.3 and 1.4.
  const [shortM, longM] = [4.25 + 0.15, 5.75 + 0.15]
  const share = (longM / shortM - 1.3) / 0.1
  const shortNmm = (0.081 + share * (0.087 - 0.081)) * load * shortM ** 2 * 1e6
  const longNmm = 0.056 * load * shortM ** 2 * 1e6
  const perMetre = (diameter: number, spacing: number) => (area(diameter) * 1000) / spacing
  const [main, across] = [perMetre(8, 125), perMetre(8, 200)]
  const [mainDepth, acrossDepth] = [175 - 25 - 4, 175 - 25 - 8 - 4]
  const required = shortNmm / (0.95 * 460 * 0.95 * mainDepth)

  it('bends with 20.5 kNm/m the short way and 13.8 kNm/m the long way', () => {
    near(panel.moments.midspan * 1e6, shortNmm)
    near(panel.moments.midspanLong! * 1e6, longNmm)
    expect(panel.moments.support).toBe(0)
  })

  it('has bars of 8 at 125 the short way, at 200 the long way', () => {
    const [k] = check(checks, 'flexure.midspan', '-', 'short')
    near(k, shortNmm / (1000 * mainDepth ** 2 * 37))
    const [shortNeeds, shortHas] = check(checks, 'flexure.midspan', 'mm²', 'short')
    near(shortNeeds, required)
    near(shortHas, main)
    const [longNeeds, longHas] = check(checks, 'flexure.midspan', 'mm²', 'long')
    near(longNeeds, longNmm / (0.95 * 460 * 0.95 * acrossDepth))
    near(longHas, across)
  })

  it('deflects within 20 times the factor for its steel', () => {
    const [demand, capacity] = check(checks, 'deflection', '-')
    near(demand, 4400 / mainDepth)
    near(capacity, 20 * factor(required, main, shortNmm / (1000 * mainDepth ** 2)))
  })

  it('has at least 0.13 % and at most 4 % of the section, at most 3d apart', () => {
    for (const opening of ['short span, midspan', 'long span, midspan']) {
      near(check(checks, 'steel.least', 'mm²', opening)[0], 0.0013 * 1000 * 175)
      near(check(checks, 'steel.most', 'mm²', opening)[1], 0.04 * 1000 * 175)
    }
    expect(check(checks, 'bars.spacing', 'mm', 'short span, midspan')).toEqual([125, 3 * mainDepth + 8])
    expect(check(checks, 'bars.spacing', 'mm', 'long span, midspan')).toEqual([200, 3 * acrossDepth + 8])
  })

  it('has its edge shears by Table 3.15, and carries them', () => {
    const [longEdge, longCapacity] = check(checks, 'shear', 'kN/m', 'short')
    near(longEdge, (0.41 + share * (0.43 - 0.41)) * load * shortM)
    near(longCapacity, concreteShear(main, 1000, mainDepth) * mainDepth)
    const [shortEdge, shortCapacity] = check(checks, 'shear', 'kN/m', 'long')
    near(shortEdge, 0.33 * load * shortM)
    near(shortCapacity, concreteShear(across, 1000, acrossDepth) * acrossDepth)
  })

  it('has in the top of its edges the least steel, which is more than half of that at midspan', () => {
    expect(0.5 * required).toBeLessThan(0.0013 * 1000 * 175)
    near(check(checks, 'steel.least', 'mm²', 'short span, edge 1')[0], 0.0013 * 1000 * 175)
    near(check(checks, 'steel.least', 'mm²', 'short span, edge 1')[1], perMetre(10, 325))
    near(check(checks, 'steel.least', 'mm²', 'long span, edge 2')[1], perMetre(8, 200))
  })

  it('stands in fire', () => {
    expect(check(checks, 'fire.size', 'mm')).toEqual([75, 175])
    expect(check(checks, 'fire.cover', 'mm')).toEqual([20, 25])
  })

  it('schedules its bars', () => {
    // Past each face 12·8 + 150/2; middle strips three quarters. Top: 0.1 of the span, and 35.9 diameters of which 225 are straight. Corners:
    // a fifth of the short span in each layer, for what three quarters of the midspan steel exceed the least steel that is there anyway.
    const bars = panel.bars.map(({ position, diameter, count, lengthMm }) => [position, diameter, count, lengthMm])
    const past = 12 * 8 + 150 / 2
    const cut = (plan: number) => 25 * Math.ceil(plan / 25)
    const corner = ['bottom, short', 'bottom, long', 'top, short', 'top, long'].map((name) => [
      `torsion, ${name} span`,
      8,
      12,
      cut(880 + past),
    ])
    expect(bars.filter(([position]) => !String(position).startsWith('top'))).toEqual([
      ['bottom, short span, middle strip', 8, Math.ceil((0.75 * 5750) / 125), cut(4250 + 2 * past)],
      ['bottom, short span, edge strips', 8, 2 * Math.ceil(5750 / 8 / 200), cut(4250 + 2 * past)],
      ['bottom, long span, middle strip', 8, Math.ceil((0.75 * 4250) / 200), cut(5750 + 2 * past)],
      ['bottom, long span, edge strips', 8, 2 * Math.ceil(4250 / 8 / 200), cut(5750 + 2 * past)],
      ...corner,
    ])
    expect(
      bars.filter(([position]) => String(position).startsWith('top')).map(([, diameter, count]) => [diameter, count]),
    ).toEqual([
      [10, Math.ceil(5750 / 325)],
      [8, Math.ceil(4250 / 200)],
      [10, Math.ceil(5750 / 325)],
      [8, Math.ceil(4250 / 200)],
    ])
  })

  it('passes', () => {
    expect(checks.filter(({ pass }) => !pass)).toEqual([])
  })
})

describe('the same slab with corners that may lift', () => {
  const panels = [{ ...panelOf('P1', rectangle(0, 0, 6000, 4500), [], 90), corners: 'mayLift' as const }]
  const panel = sizeScheme(schemeOf({ ...solid, thickness: 175 }), britishFileOf(panels)).panels[0]!
  const load = 1.4 * (0.175 * 25 + 1.5) + 1.6 * 2.8

  it('bends by Table 3.13, between 1.3 and 1.4', () => {
    const share = (5.9 / 4.4 - 1.3) / 0.1
    near(panel.moments.midspan, (0.093 + share * (0.099 - 0.093)) * load * 4.4 ** 2)
    near(panel.moments.midspanLong!, (0.055 + share * (0.051 - 0.055)) * load * 4.4 ** 2)
  })

  it('has no corner steel and no edge strips, and half the short span on every edge', () => {
    expect(panel.bars.map(({ position }) => position).filter((position) => /torsion|strip/.test(position))).toEqual([])
    for (const { demand } of panel.checks.filter(({ name }) => name === 'shear')) near(demand, (load * 4.4) / 2)
    expect(panel.flags[0]).toContain('Table 3.13')
  })

  it('keeps its corners where an edge is continuous, and says so', () => {
    const held = [{ ...panelOf('P1', rectangle(0, 0, 6000, 4500), [1], 90), corners: 'mayLift' as const }]
    const { flags } = sizeScheme(schemeOf({ ...solid, thickness: 175 }), britishFileOf(held)).panels[0]!
    expect(flags.some((flag) => flag.startsWith('corners are taken as held'))).toBe(true)
  })
})
