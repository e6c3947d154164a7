/**
 * Self-weights of hollow-block floors.
 *
 * R-ECP-1: Mohamed Mansour, Reinforced Concrete Design, 2nd year: Examples on Hollow Block Slab, Zagazig University, undated, first
 * example (seen in text, scribd document 684506997). Blocks 400 × 200 × 250 of 0.16 kN, ribs 100 at 500, topping 50, concrete
 * 25 kN/m³. The one-way part is printed as 4.10 kN/m². The two-way part (4.78) has 8 blocks/m² in ribs both ways: not built here.
 * Q-I1 to Q-I3: identities of one pitch, no source.
 */
import { describe, expect, it } from 'vitest'
import type { Scheme } from '#shared/contracts/appraisal'
import { deadLoadOf } from '#shared/takeoff/deadLoad'
import { measuredPanels } from '#shared/takeoff/measuredPanel'
import { netRules } from '#shared/takeoff/measurementRules'
import { takeOffScheme } from '#shared/takeoff/takeOffScheme'
import { GRAVITY_M_PER_S2 } from '#shared/units'
import { handSized, levelOf, rectangle, ribbedOf } from '../support/handSized'

/** Half of the last printed digit. */
const PRINTED_SELF_WEIGHT = 0.005
const IDENTITY = 1e-9

const width = 400
const length = 200

/**
 * A field without edges: whole pitches across (half a rib at either side), whole blocks along, no supports.
 *
 * @returns dead load, kN/m², blocks, nr/m², and concrete, m³/m²
 */
function fieldOf(scheme: Extract<Scheme, { kind: 'ribbed' }>, rows: number, blocksInRow: number) {
  const outline = rectangle(0, 0, rows * (width + scheme.ribWidth), blocksInRow * length)
  const level = levelOf({ outline, edges: [{ supportWidth: 0, kind: 'beam', continuity: 'discontinuous' }] })
  const sized = handSized(scheme, [level])
  const { perArea } = deadLoadOf(measuredPanels(sized, [level]), scheme, netRules)
  const quantities = takeOffScheme(scheme, sized, [level], netRules)
  const areaM2 = (outline[2]![0] * outline[2]![1]) / 1e6
  const perM2 = (item: string) => quantities.find((quantity) => quantity.item === item)!.parts[0]!.value / areaM2
  return { perArea, blocks: perM2('blocks.whole'), concrete: perM2('concrete.slab') }
}

const schemeOf = (ribWidth: number, height: number, topping: number, mass: number) =>
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
