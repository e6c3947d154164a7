import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '#shared/appraise'
import { type AppraisalFile, appraisalFile } from '#shared/contracts/appraisal'
import { panelOf, rectangle, ribbed, row } from './support/floors'

const diameter = fc.constantFrom(6, 8, 10, 12, 16, 20, 25, 32, 40)
const bar = fc.record({ diameter, count: fc.integer({ min: 1, max: 4 }) })
const layer = fc.record({ diameter, spacing: fc.integer({ min: 2, max: 20 }).map((steps) => steps * 25) })
const layers = fc.record({ bottomX: layer, bottomY: layer, topX: layer, topY: layer }, { requiredKeys: ['bottomX', 'bottomY'] })
const orComputed = <Given>(given: fc.Arbitrary<Given>) => fc.oneof(fc.constant('computed' as const), given)

const widths = fc.array(
  fc.integer({ min: 24, max: 90 }).map((steps) => steps * 100),
  { minLength: 1, maxLength: 3 },
)
/** A row of panels, and one apart with every edge simple. */
const panels = fc
  .tuple(
    widths,
    fc.integer({ min: 24, max: 90 }).map((steps) => steps * 100),
    fc.constantFrom(0, 90),
  )
  .map(([across, height, ribDirection]) => [
    ...row(across, height, ribDirection),
    panelOf('Q1', rectangle(0, height + 2000, across[0]!, height), [], ribDirection),
  ])

const schemes = fc.record({
  thickness: fc.oneof(
    fc.constant('least' as const),
    fc.integer({ min: 12, max: 80 }).map((steps) => steps * 5),
  ),
  isPerPanel: fc.boolean(),
  slabBars: orComputed(layers),
  givenSlab: fc.option(layers),
  solidZone: fc.oneof(
    fc.constant('least' as const),
    fc.integer({ min: 0, max: 20 }).map((steps) => steps * 50),
  ),
  ribBars: orComputed(fc.array(bar, { minLength: 1, maxLength: 2 })),
  topBars: orComputed(fc.array(bar, { maxLength: 2 })),
  givenRibs: fc.option(
    fc.record({ ribBars: fc.array(bar, { minLength: 1, maxLength: 3 }), topBars: fc.array(bar, { maxLength: 3 }) }),
  ),
})
const brief = fc.record({
  imposedLoad: fc.integer({ min: 0, max: 15 }),
  partitionsLoad: fc.constantFrom(0, 1),
  cover: fc.constantFrom(15, 25, 40),
  fireMinutes: fc.constantFrom(0, 60, 120),
})

const files = fc
  .tuple(panels, schemes, brief, fc.constantFrom('EN1992', 'BS8110'))
  .map(([floor, given, loads, basis]): AppraisalFile => {
    const target = { level: 'L1', panel: floor[0]!.mark }
    return appraisalFile.parse({
      format: 'bothways.appraisal/1',
      brief: basis === 'EN1992' ? { basis, ...loads, fck: 30, fyk: 500 } : { basis, ...loads, fcu: 35, fy: 460 },
      levels: [{ mark: 'L1', panels: floor }],
      schemes: [
        {
          mark: 'S1',
          kind: 'solid',
          thickness: given.thickness,
          thicknessPer: given.isPerPanel && given.thickness === 'least' ? 'panel' : 'scheme',
          bars: given.slabBars,
          givenPanels: given.givenSlab ? [{ ...target, bars: given.givenSlab }] : [],
        },
        {
          ...ribbed,
          solidZone: given.solidZone,
          ribBars: given.ribBars,
          topBars: given.topBars,
          givenPanels: given.givenRibs ? [{ ...target, ...given.givenRibs }] : [],
        },
      ],
    })
  })

/** Numbers inside a value that JSON could not write. */
function notFinite(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path]
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, inner]) => notFinite(inner, `${path}.${key}`))
}

const ALWAYS = ['flexure.midspan', 'shear', 'deflection', 'steel.least', 'steel.most'] as const

describe('every mix of least, computed and given', () => {
  it('sizes every panel of both kinds, by either basis: checks present, every number finite, given bars kept', () => {
    fc.assert(
      fc.property(files, (file) => {
        const { sized, appraisal, problems } = appraiseInFull(file)
        expect(problems).toEqual([])
        expect(notFinite(appraisal)).toEqual([])
        for (const { panels: done, passes } of sized) {
          expect(done).toHaveLength(file.levels[0]!.panels.length)
          for (const { checks, places, mark } of done) {
            const names = new Set(checks.map(({ name }) => name))
            expect(
              ALWAYS.filter((name) => !names.has(name)),
              mark,
            ).toEqual([])
            expect(places).toHaveLength(checks.length)
          }
          expect(passes).toBe(done.every(({ checks }) => checks.every(({ pass }) => pass)))
        }
        for (const scheme of file.schemes) {
          const first = sized.find(({ mark }) => mark === scheme.mark)!.panels[0]!
          const [given] = scheme.givenPanels
          if (given && 'bars' in given) {
            const { diameter: size, spacing } = given.bars.bottomX
            expect(first.steel.midspanProvided).toBeCloseTo((Math.PI * size ** 2 * 250) / spacing, 6)
          }
          if (scheme.kind === 'solid' && scheme.thickness !== 'least') expect(first.depth).toBe(scheme.thickness)
        }
      }),
      { numRuns: 25 },
    )
  })
})
