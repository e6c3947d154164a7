/**
 * Self-weights of hollow-block floors.
 *
 * R-ECP-1: Mohamed Mansour, Reinforced Concrete Design, 2nd year: Examples on Hollow Block Slab, Zagazig University, undated, first
 * example (seen in text, scribd document 684506997). Blocks 400 × 200 × 250 of 0.16 kN, ribs 100 at 500, topping 50, concrete
 * 25 kN/m³. The one-way part is printed as 4.10 kN/m². The two-way part (4.78) has 8 blocks/m² in ribs both ways: not built here.
 * R-ACI-1: "13 One Way Ribbed Slab", university lecture, Lebanon, author not named, undated, sizing and design example (seen in text). Its ribs
 *   are trapezoidal, 40 wider at the top: straight ribs of the mean width have the same volume. Concrete 25 kN/m³; blocks of 0.10 kN in the line
 *   of 180 overall; 0.14 kN in that of 240, inferred from its total.
 * two university theses, Algeria, "Predimensionnement et descente de charges", 16 + 4 floor (seen in text): 2.85 kN/m². Ribs 120 at 650 and
 *   blocks of 0.145 kN, which is inferred. Left out: 2.80 and 5.10 of the other thesis, by weight of the whole floor per metre of depth.
 * Q-I1 to Q-I3: identities of one pitch, no source.
 */
import { describe, expect, it } from 'vitest'
import type { Scheme } from '#shared/contracts/appraisal'
import { deadLoadOf } from '#shared/takeoff/deadLoad'
import { measuredPanels } from '#shared/takeoff/measuredPanel'
import { comparingRules } from '#shared/takeoff/rules/comparingRules'
import { takeOffScheme } from '#shared/takeoff/takeOffScheme'
import { GRAVITY_M_PER_S2 } from '#shared/units'
import { handSized, levelOf, rectangle, ribbedOf } from '../support/handSized'
import { expectPrinted, HALF_PERCENT } from './support/expectPrinted'

/** Half of the last printed digit. */
const PRINTED_SELF_WEIGHT = 0.005
const IDENTITY = 1e-9

const length = 200

/**
 * A field without edges: whole pitches across (half a rib at either side), whole blocks along, no supports.
 *
 * @returns dead load, kN/m², blocks, nr/m², and concrete, m³/m²
 */
function fieldOf(scheme: Extract<Scheme, { kind: 'ribbed' }>, rows: number, blocksInRow: number) {
  const outline = rectangle(0, 0, rows * (scheme.block.width + scheme.ribWidth), blocksInRow * length)
  const level = levelOf({ outline, edges: [{ supportWidth: 0, kind: 'beam', continuity: 'discontinuous' }] })
  const sized = handSized(scheme, [level])
  const { perArea } = deadLoadOf(measuredPanels(sized, [level]), scheme, comparingRules)
  const quantities = takeOffScheme(scheme, sized, [level], comparingRules, 'EN1992')
  const areaM2 = (outline[2]![0] * outline[2]![1]) / 1e6
  const perM2 = (item: string) => quantities.find((quantity) => quantity.item === item)!.parts[0]!.value / areaM2
  return { perArea, blocks: perM2('blocks.whole'), concrete: perM2('concrete.slab') }
}

const schemeOf = (ribWidth: number, height: number, topping: number, mass: number, width = 400) =>
  ribbedOf({ ribWidth, topping, block: { length, width, height, mass }, edgeStrip: ribWidth / 2, solidZone: 0, mesh: 'none' })

describe('R-ECP-1', () => {
  it('the one-way part weighs 4.10 kN/m²', () => {
    const massOf016kN = 160 / GRAVITY_M_PER_S2
    const { perArea, blocks } = fieldOf(schemeOf(100, 250, 50, massOf016kN), 20, 50)
    expect(blocks).toBeCloseTo(10, 9)
    expect(Math.abs(perArea - 4.1)).toBeLessThanOrEqual(PRINTED_SELF_WEIGHT)
  })
})

describe('identities of one pitch', () => {
  it.each([
    ['Q-I1', 100, 200, 50, 10, 0.09, 2.25],
    ['Q-I2', 100, 250, 50, 10, 0.1, 2.5],
    ['Q-I3', 120, 200, 70, 1 / (0.52 * 0.2), 0.07 + (0.12 * 0.2) / 0.52, 25 * (0.07 + (0.12 * 0.2) / 0.52)],
  ] as const)(
    '%s: ribs %d, blocks %d, topping %d take %d blocks and %d m³ a square metre',
    (_id, rib, height, topping, blocks, concrete, load) => {
      const field = fieldOf(schemeOf(rib, height, topping, 0), 12, 25)
      expect(Math.abs(field.blocks / blocks - 1)).toBeLessThanOrEqual(IDENTITY)
      expect(Math.abs(field.concrete / concrete - 1)).toBeLessThanOrEqual(IDENTITY)
      expect(Math.abs(field.perArea / load - 1)).toBeLessThanOrEqual(IDENTITY)
    },
  )
})

const massOf = (kilonewton: number) => (1000 * kilonewton) / GRAVITY_M_PER_S2

describe('R-ACI-1', () => {
  it('ribs of 120 with topping, 180 overall, weigh 2.28 and their blocks 0.926 kN/m²', () => {
    const concrete = fieldOf(schemeOf(140, 120, 60, 0), 20, 50)
    const whole = fieldOf(schemeOf(140, 120, 60, massOf(0.1)), 20, 50)
    expectPrinted(concrete.perArea, 2.28, HALF_PERCENT)
    expectPrinted(whole.perArea - concrete.perArea, 0.926, HALF_PERCENT)
  })

  it('ribs of 150 with topping, 240 overall, weigh 4.068 kN/m² with their blocks', () => {
    expectPrinted(fieldOf(schemeOf(170, 180, 60, massOf(0.14)), 20, 50).perArea, 4.068, HALF_PERCENT)
  })
})

describe('Q-9', () => {
  it('blocks 16 high and 4 of topping weigh 2.85 kN/m²', () => {
    expectPrinted(fieldOf(schemeOf(120, 160, 40, massOf(0.145), 530), 20, 50).perArea, 2.85, HALF_PERCENT)
  })
})
