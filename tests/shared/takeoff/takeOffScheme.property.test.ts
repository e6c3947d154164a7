import fc from 'fast-check'
import { expect, it } from 'vitest'
import { comparingRules } from '#shared/takeoff/rules/comparingRules'
import { takeOffScheme } from '#shared/takeoff/takeOffScheme'
import { evaluate } from '../support/evaluate'
import { handSized, levelOf, rectangle, ribbedOf, solidOf } from '../support/handSized'

const ARITHMETIC = 1e-9

/** A skewed bay with a void, over beams or walls, of any size and direction of ribs. */
const arbitraryLevel = fc
  .record({
    lx: fc.integer({ min: 4000, max: 12_000 }),
    ly: fc.integer({ min: 4000, max: 12_000 }),
    skew: fc.integer({ min: -900, max: 900 }),
    support: fc.integer({ min: 100, max: 400 }),
    kind: fc.constantFrom('beam' as const, 'wall' as const),
    ribDirection: fc.integer({ min: 0, max: 179 }),
    voidSide: fc.integer({ min: 200, max: 1500 }),
    repeat: fc.integer({ min: 1, max: 30 }),
  })
  .map(({ lx, ly, skew, support, kind, ribDirection, voidSide, repeat }) =>
    levelOf({
      outline: [
        [0, 0],
        [lx, 0],
        [lx + skew, ly],
        [0, ly],
      ],
      edges: [{ supportWidth: support, kind, continuity: 'discontinuous' }],
      ribDirection,
      voids: [rectangle(800, 900, voidSide, voidSide * 0.75)],
      repeat,
    }),
  )

const arbitraryScheme = fc.oneof(
  fc.integer({ min: 100, max: 400 }).map(solidOf),
  fc
    .record({
      ribWidth: fc.integer({ min: 80, max: 250 }),
      topping: fc.integer({ min: 0, max: 120 }),
      edgeStrip: fc.integer({ min: 0, max: 400 }),
      solidZone: fc.integer({ min: 0, max: 800 }),
      trimmerWidth: fc.integer({ min: 0, max: 300 }),
      cutBlocks: fc.boolean(),
      crossRibs: fc.constantFrom('none' as const, { every: 2000, width: 100 }),
    })
    .map(ribbedOf),
)

it('yields arithmetic that evaluates, and concrete whose members add up, on any bay', () => {
  fc.assert(
    fc.property(arbitraryLevel, arbitraryScheme, (level, scheme) => {
      const quantities = takeOffScheme(scheme, handSized(scheme, [level]), [level], comparingRules, 'EN1992')
      for (const { expression, value } of quantities.flatMap(({ parts }) => parts)) {
        expect(Math.abs(evaluate(expression) - value)).toBeLessThanOrEqual(ARITHMETIC * value)
      }
      const [{ split, parts } = { parts: [], split: undefined }] = quantities
      const members = Object.values(split!)
      const concrete = parts.reduce((sum, { value }) => sum + value, 0)
      expect(members.every((member) => member >= -ARITHMETIC * concrete)).toBe(true)
      expect(Math.abs(members.reduce((sum, member) => sum + member, 0) - concrete)).toBeLessThanOrEqual(ARITHMETIC * concrete)
    }),
    { numRuns: 300 },
  )
})
