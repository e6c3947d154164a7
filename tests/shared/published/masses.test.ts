/**
 * Nominal masses of bars and mesh as printed.
 *
 * BS 4449:2005+A3:2016, Steel for the reinforcement of concrete, nominal masses per metre: 8 to 32 as the engine's design quotes
 * them from the standard; 6 and 40 from BS 8666:2020, which prints 9.864 for 40 (seen in a copied text, not in the standard).
 * BS 4483:2005, Steel fabric for the reinforcement of concrete, Table 1, square mesh (A252 and A393 seen in several copies, the
 * others from memory and recalculated from their wires).
 */
import { describe, expect, it } from 'vitest'
import type { BarDiameter } from '#shared/contracts/appraisal'
import type { Quantity } from '#shared/contracts/appraisalResult'
import { FABRIC } from '#shared/sizing/tables/fabric'
import { comparingRules } from '#shared/takeoff/rules/comparingRules'
import { steelMassKg } from '#shared/takeoff/steelMass'
import { takeOffScheme } from '#shared/takeoff/takeOffScheme'
import { barRun, handSized, levelOf, rectangle, solidOf } from '../support/handSized'

/** Steel of 7 850 kg/m³ (EN 1991-1-1 Table A.4, 77 to 78.5 kN/m³). */
const STEEL_KG_PER_M3 = 7850
/** Printed masses are rounded to three figures: half of the last one at most. */
const HALF_LAST_FIGURE = 0.005

const bars: [BarDiameter, number][] = [
  [6, 0.222],
  [8, 0.395],
  [10, 0.616],
  [12, 0.888],
  [16, 1.58],
  [20, 2.47],
  [25, 3.85],
  [32, 6.31],
  [40, 9.864],
]

/** Tonnes that the take-off gives for bars of one diameter. */
function tonnesOf(diameter: BarDiameter, count: number, lengthMm: number): number {
  const level = levelOf({ outline: rectangle(0, 0, 4000, 3000) })
  const sized = handSized(solidOf(150), [level], [barRun(diameter, count, lengthMm)])
  const quantities = takeOffScheme(solidOf(150), sized, [level], comparingRules, 'EN1992')
  return quantities.find(({ item }) => item === `steel.bar.${diameter}`)!.net
}

describe('bars, BS 4449', () => {
  it.each(bars)('a thousand metres of %d mm weigh %d t', (diameter, printed) => {
    expect(tonnesOf(diameter, 100, 10_000)).toBe(Number(printed.toFixed(3)))
  })

  it.each(bars)('%d mm: the printed mass is that of a round of steel', (diameter, printed) => {
    const massKgPerM = ((Math.PI * diameter ** 2) / 4 / 1e6) * STEEL_KG_PER_M3
    expect(Math.abs(printed - massKgPerM)).toBeLessThanOrEqual(HALF_LAST_FIGURE)
  })
})

/** Reference, diameter of the wires, mm, at 200 mm both ways, printed mass, kg/m². */
const meshes = [
  ['A98', 5, 1.54],
  ['A142', 6, 2.22],
  ['A193', 7, 3.02],
  ['A252', 8, 3.95],
  ['A393', 10, 6.16],
] as const

describe('mesh, BS 4483', () => {
  it.each(meshes)('a hundred square metres of %s, wires of %d, weigh %d kg each', (reference, _wire, printed) => {
    const quantity: Quantity = { item: `steel.mesh.${reference}`, unit: 'm²', net: 100, parts: [] }
    expect(steelMassKg([quantity])).toBeCloseTo(100 * printed, 9)
  })

  it.each(meshes)('%s: area and mass follow from wires of %d at 200 both ways', (reference, wire, printed) => {
    const areaMm2PerM = ((Math.PI * wire ** 2) / 4) * 5
    expect(Math.abs(FABRIC[reference].areaMm2PerM - areaMm2PerM)).toBeLessThanOrEqual(0.05)
    expect(Math.abs(printed - (2 * areaMm2PerM * STEEL_KG_PER_M3) / 1e6)).toBeLessThanOrEqual(2 * HALF_LAST_FIGURE)
  })
})
