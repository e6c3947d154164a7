/**
 * One ribbed and one solid panel worked by hand by EN 1992-1-1:2004 (recommended values, αcc 0.85), the arithmetic written out. Panel of
 * 6.0 × 4.5 m on beams 250 wide, simple all round; imposed 2.0, partitions 0.8, finishes 1.5 kN/m²; C30/37, fyk 500, cover 25.
 */
import { describe, expect, it } from 'vitest'
import type { Check } from '#shared/contracts/appraisalResult'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { fileOf, panelOf, rectangle, ribbed, schemeOf, solid } from './support/floors'

const file = fileOf([panelOf('P1', rectangle(0, 0, 6000, 4500), [], 90)])
const SIX_DIGITS = 1e-6

function near(actual: number, expected: number) {
  expect(Math.abs(actual - expected), `${actual} against ${expected}`).toBeLessThanOrEqual(SIX_DIGITS * expected)
}

function checkOf(checks: readonly Check[], name: Check['name'], unit: string): Check {
  const found = checks.find((check) => check.name === name && check.unit === unit)
  if (!found) throw new Error(`no check ${name} in ${unit}`)
  return found
}

describe('ribbed: ribs 100 at 500, blocks 200 × 400 × 200 of 12.5 kg, topping 60', () => {
  const panel = sizeScheme(schemeOf(ribbed), file).panels[0]!
  const { checks } = panel
  // Rows in the clear width of 5750: floor((5750 + 100)/500) = 11; blocks in the clear length of 4250: floor(4250/200) = 21.
  const blocks = 11 * 21
  const clearM2 = 5.75 * 4.25
  const concreteM3 = clearM2 * 0.26 - blocks * 0.2 * 0.4 * 0.2
  const selfWeight = (concreteM3 * 25 + (blocks * 12.5 * 9.81) / 1000) / clearM2
  const load = 1.35 * (selfWeight + 1.5) + 1.5 * (2 + 0.8)
  // Effective span: 4250 + min(260/2, 250/2) at each end; load on a rib at 500.
  const spanM = 4.25 + 2 * 0.125
  const momentKnm = (load * 0.5 * spanM ** 2) / 8

  it('weighs 3.88 kN/m² and bends with 14.5 kNm a rib', () => {
    near(selfWeight, 3.8780614)
    near(panel.moments.midspan, momentKnm)
  })

  it('needs 153 mm² at the capped lever arm; two bars of 10 give 157', () => {
    const depth = 260 - 25 - 10 / 2
    const k = (momentKnm * 1e6) / (500 * depth ** 2 * 30)
    const lever = Math.min(0.95, 0.5 + Math.sqrt(0.25 - k / 1.134)) * depth
    expect(lever).toBe(0.95 * depth)
    near(checkOf(checks, 'flexure.midspan', '-').demand, k)
    near(panel.steel.midspanRequired, (momentKnm * 1e6) / (0.87 * 500 * lever))
    near(panel.steel.midspanProvided, 2 * Math.PI * 25)
  })

  it('deflects within its span to depth ratio', () => {
    const rho = panel.steel.midspanRequired / (100 * 230 + 400 * 60)
    const reference = 0.001 * Math.sqrt(30)
    const basic = 11 + 1.5 * Math.sqrt(30) * (reference / rho) + 3.2 * Math.sqrt(30) * (reference / rho - 1) ** 1.5
    const { demand, capacity } = checkOf(checks, 'deflection', '-')
    near(demand, 4500 / 230)
    near(capacity, basic * 0.8 * ((500 * panel.steel.midspanProvided) / (500 * panel.steel.midspanRequired)))
  })

  it('carries its shear at the face of the support without a solid zone', () => {
    expect(panel.layout?.solidZone).toBe(0)
    const k = 1 + Math.sqrt(200 / 230)
    const resistance = (0.18 / 1.5) * k * Math.cbrt(100 * (157.07963268 / (100 * 230)) * 30) * 100 * 230
    const { demand, capacity } = checkOf(checks, 'shear', 'kN')
    near(demand, load * 0.5 * (spanM / 2 - 0.125))
    near(capacity, resistance / 1000)
  })

  it('schedules two bars in each of twelve ribs, and a top bar at each end', () => {
    const bars = panel.bars.map(({ diameter, count, lengthMm, shape }) => [
      diameter,
      count,
      lengthMm,
      shape.code,
      ...shape.dimensionsMm,
    ])
    // Past each face max(10·10, 250/2) = 125. Top: 0.2 · 4500 and an anchorage of 8/4 · 435/(2.25 · 0.7 · 0.7 · 2.8965/1.5) = 408.7, of
    // which the beam takes 250 − 25 = 225; the other 183.7 are a leg of 185. Shape 11: 1125 + 185 − 16/2 − 8 = 1294, cut to 1300.
    expect(bars).toEqual([
      [10, 24, 4500, '00', 4500],
      [8, 12, 1300, '11', 1125, 185],
      [8, 12, 1300, '11', 1125, 185],
    ])
  })

  it('passes', () => {
    expect(checks.filter(({ pass }) => !pass)).toEqual([])
  })
})

describe('solid: 150 thick, two way with four simple edges', () => {
  const panel = sizeScheme(schemeOf({ ...solid, thickness: 150 }), file).panels[0]!
  const load = 1.35 * (0.15 * 25 + 1.5) + 1.5 * 2.8
  // Effective spans 4250 + 2·75 and 5750 + 2·75; Table 3.14, case 9, between the columns 1.3 and 1.4.
  const [shortM, longM] = [4.4, 5.9]
  const coefficient = 0.081 + ((longM / shortM - 1.3) / 0.1) * (0.087 - 0.081)

  it('bends with 18.2 kNm/m the short way and 12.2 kNm/m the long way', () => {
    near(panel.moments.midspan, coefficient * load * shortM ** 2)
    near(panel.moments.midspanLong ?? 0, 0.056 * load * shortM ** 2)
    expect(panel.moments.support).toBe(0)
  })

  it('needs its steel at 120 mm with bars of 10, the second layer inside them', () => {
    const [short, long] = ['bottom, short span, middle strip', 'bottom, long span, middle strip'].map((position) =>
      panel.bars.find((each) => each.position === position),
    )
    expect([short?.diameter, long?.diameter]).toEqual([10, 8])
    const depth = 150 - 25 - 5
    const k = (coefficient * load * shortM ** 2 * 1e6) / (1000 * depth ** 2 * 30)
    const lever = Math.min(0.95, 0.5 + Math.sqrt(0.25 - k / 1.134)) * depth
    near(panel.steel.midspanRequired, (coefficient * load * shortM ** 2 * 1e6) / (0.87 * 500 * lever))
    const across = panel.checks.find(({ name, working }) => name === 'flexure.midspan' && working.startsWith('long'))
    near(across?.demand ?? 0, (0.056 * load * shortM ** 2 * 1e6) / (1000 * (150 - 25 - 10 - 4) ** 2 * 30))
  })

  it('has its edge shears by Table 3.15', () => {
    const shears = panel.checks.filter(({ name }) => name === 'shear').map(({ demand }) => demand)
    const long = 0.41 + ((longM / shortM - 1.3) / 0.1) * (0.43 - 0.41)
    near(Math.max(...shears), long * load * shortM)
    near(Math.min(...shears), 0.33 * load * shortM)
  })

  it('has corner steel of three quarters of the midspan steel, less what crosses the corner', () => {
    const torsion = panel.bars.filter(({ position }) => position.startsWith('torsion'))
    expect(torsion.map(({ position }) => position)).toEqual([
      'torsion, bottom, short span',
      'torsion, bottom, long span',
      'torsion, top, short span',
      'torsion, top, long span',
    ])
    const width = (shortM * 1000) / 5
    // 880 + 125 = 1005, cut to the next multiple of 25
    expect(width + 125).toBeCloseTo(1005, 9)
    for (const { lengthMm } of torsion) expect(lengthMm).toBe(1025)
    // Layers as scheduled, mm² per metre: π·φ²/4 · 1000/spacing.
    const area = (position: string) => {
      const run = panel.bars.find((each) => each.position === position)
      return (Math.PI * (run?.diameter ?? 0) ** 2 * 1000) / (4 * (run?.spacingMm ?? Infinity))
    }
    const needed = 0.75 * panel.steel.midspanRequired
    const crossing = area('bottom, short span, edge strips')
    expect(crossing).toBeLessThan(needed)
    expect(crossing + area('torsion, bottom, short span')).toBeGreaterThanOrEqual(needed)
    expect(area('top, edge 1') + area('torsion, top, short span')).toBeGreaterThanOrEqual(needed)
    expect(torsion[0]!.count % 4).toBe(0)
  })
})
