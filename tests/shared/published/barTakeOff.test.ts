/**
 * Slabs taken off by others, as far as the engine measures by the same rule.
 *
 * onlinecivilforum.com, "RCC slab roof design example (estimate)", 6 m × 3 m × 0.12 m roof, undated; seen in text. Overall 6.30 × 3.30.
 *   Left out: its counts (one bar more than the spaces, rounded up), its cut lengths (hooks of 9 diameters, cranks) and the mass of its 6 mm
 *   bars (0.22 kg/m, 0.9 % under the nominal).
 * civilplanets.com, "Bar bending schedule for slab", one-way slab 6000 × 2500 × 150, undated; seen in text. Left out: its counts (one bar
 *   more than the spaces), the mass of its 8 mm bars (0.40 kg/m, 1.3 % over), its top bars, weighed at another diameter, and the total with them.
 * engineering-society.com, "How to calculate quantity of steel in slab", 3 m × 4 m, 2018; seen in text. Left out: 16 distribution bars; the
 *   source counts the two directions by different rules, and by its own for the main bars there are 15.
 */
import { describe, it } from 'vitest'
import type { BarDiameter } from '#shared/contracts/appraisal'
import { lineCount } from '#shared/sizing/solid/bars/slabMass'
import { comparingRules } from '#shared/takeoff/rules/comparingRules'
import { takeOffScheme } from '#shared/takeoff/takeOffScheme'
import { barRun, handSized, levelOf, rectangle, solidOf } from '../support/handSized'
import { expectPrinted, HALF_PERCENT, ONE_PERCENT } from './support/expectPrinted'

/** Unrounded quantity that the take-off gives for a slab of one panel with bars of one diameter. */
function measured(item: string, size: readonly [number, number, number], bars: readonly [BarDiameter, number, number][]): number {
  const [lx, ly, thickness] = size
  const edges = [{ supportWidth: 0, kind: 'beam' as const, continuity: 'discontinuous' as const }]
  const level = levelOf({ outline: rectangle(0, 0, lx, ly), edges })
  const runs = bars.map(([diameter, count, lengthMm]) => barRun(diameter, count, lengthMm))
  const quantities = takeOffScheme(
    solidOf(thickness),
    handSized(solidOf(thickness), [level], runs),
    [level],
    comparingRules,
    'EN1992',
  )
  const found = quantities.find((quantity) => quantity.item === item)
  if (!found) throw new Error(`no ${item}`)
  return found.parts.reduce((sum, { value }) => sum + value, 0)
}
const kilograms = (diameter: BarDiameter, count: number, lengthMm: number) =>
  1000 * measured(`steel.bar.${diameter}`, [4000, 3000, 150], [[diameter, count, lengthMm]])

describe('Q-1, roof slab of 120', () => {
  it('takes 2.495 m³ of concrete', () => {
    expectPrinted(measured('concrete.slab', [6300, 3300, 120], []), 2.495, HALF_PERCENT)
  })

  it('has 82.66 kg in 27 bars of 3.44 m and 81.45 kg in 26 of 3.52 m, 12 mm', () => {
    expectPrinted(kilograms(12, 27, 3440), 82.66, HALF_PERCENT)
    expectPrinted(kilograms(12, 26, 3520), 81.45, HALF_PERCENT)
  })

  it('has 197.53 kg of steel in all', () => {
    expectPrinted(kilograms(12, 27, 3440) + kilograms(12, 26, 3520) + kilograms(6, 24, 6330), 197.53, HALF_PERCENT)
  })
})

describe('Q-2, one-way slab of 150', () => {
  it('has 74.98 kg in 41 bars of 2.95 m, 10 mm', () => {
    expectPrinted(kilograms(10, 41, 2950), 74.98, ONE_PERCENT)
  })
})

describe('Q-3, two-way slab of 3 × 4 m', () => {
  it('has 27 main bars at 150 in 3960', () => {
    expectPrinted(lineCount(4000 - 2 * 20, 150), 27, ONE_PERCENT)
  })

  it('has 126.2 kg in 27 bars of 16 and 39.1 kg in 16 bars of 10, 165.3 kg in all', () => {
    const [main, distribution] = [kilograms(16, 27, 2960), kilograms(10, 16, 3960)]
    expectPrinted(main, 126.2, ONE_PERCENT)
    expectPrinted(distribution, 39.1, ONE_PERCENT)
    expectPrinted(main + distribution, 165.3, ONE_PERCENT)
  })
})
