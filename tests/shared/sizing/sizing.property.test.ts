/** Properties that always hold of sizing (engine design, section 8), on rows of panels of random spans, loads and places. */
import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import type { SizedScheme } from '#shared/sizing/sizedPanel'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { BAR_MASS_KG_PER_M } from '#shared/sizing/tables/bars'
import { britishFileOf, fileOf, panelOf, rectangle, ribbed, row, schemeOf, solid } from './support/floors'

const RELATIVE = 1e-9

const spans = fc
  .array(fc.integer({ min: 30, max: 60 }), { minLength: 1, maxLength: 4 })
  .map((all) => all.map((each) => each * 100))
const height = fc.integer({ min: 30, max: 70 }).map((each) => each * 100)
const load = fc.double({ min: 0.5, max: 6, noNaN: true })

const schemes = [
  ['ribbed, zone given', schemeOf({ ...ribbed, ribWidth: 140, solidZone: 300 })],
  ['ribbed, zone left to the engine', schemeOf({ ...ribbed, ribWidth: 140 })],
  ['solid, thickness given', schemeOf({ ...solid, thickness: 170 })],
  ['solid, thickness left to the engine', schemeOf(solid)],
] as const

/** Floors by either code, with the loads that a property varies. */
const bases: readonly [string, (panels: ReturnType<typeof row>, changes: { imposedLoad: number }) => AppraisalFile][] = [
  ['EN 1992', fileOf],
  ['BS 8110', britishFileOf],
]
const cases = bases.flatMap(([basis, fileBy]) => schemes.map(([name, scheme]) => [`${basis}, ${name}`, scheme, fileBy] as const))

const massOf = ({ panels }: SizedScheme) =>
  panels
    .flatMap(({ bars }) => bars)
    .reduce((sum, { diameter, count, lengthMm }) => sum + count * lengthMm * BAR_MASS_KG_PER_M[diameter], 0)

const methodOf = ({ panels }: SizedScheme) => panels.map(({ flags }) => flags[0]).join()

/**
 * Whether a solid zone left to the engine became narrower, which heavier bars can bring about: they carry more shear, and the floor gets
 * lighter. Then the floors compared are not of one shape.
 */
const isNarrower = (most: SizedScheme, less: SizedScheme) =>
  most.panels.some(({ layout }, i) => layout !== null && layout.solidZone < (less.panels[i]?.layout?.solidZone ?? 0))

function moved(file: AppraisalFile, degrees: number, [dx, dy]: readonly [number, number]): AppraisalFile {
  const [cosine, sine] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)]
  const levels = file.levels.map((level) => ({
    ...level,
    mark: `${level.mark}x`,
    panels: level.panels.map((panel) => ({
      ...panel,
      mark: `${panel.mark}x`,
      ribDirection: (panel.ribDirection + degrees) % 180,
      outline: panel.outline.map(([x, y]): [number, number] => [dx + x * cosine - y * sine, dy + x * sine + y * cosine]),
    })),
  }))
  return { ...file, levels }
}

/** Plan length, then the formula of a bent bar's shape, then the length it is cut to, each where it differs. */
const WORKING = /^([\d.+ -]+) = ([\d.]+)(?:; A [^:]+: ([\d.]+))?(?:, cut to (\d+))?$/

function near(actual: number, expected: number) {
  expect(Math.abs(actual - expected), `${actual} against ${expected}`).toBeLessThanOrEqual(
    RELATIVE * Math.max(1, Math.abs(expected)),
  )
}

describe.each(cases)('%s', (_, scheme, fileBy) => {
  it('is the same wherever the floor stands, however it is turned and whatever it is called', () => {
    fc.assert(
      fc.property(
        spans,
        height,
        load,
        fc.integer({ min: 0, max: 359 }),
        fc.tuple(fc.integer({ min: -5e4, max: 5e4 }), fc.integer({ min: -5e4, max: 5e4 })),
        (widths, deep, imposedLoad, degrees, by) => {
          const file = fileBy(row(widths, deep), { imposedLoad })
          const [here, there] = [sizeScheme(scheme, file), sizeScheme(scheme, moved(file, degrees, by))]
          expect([there.depth, there.passes]).toEqual([here.depth, here.passes])
          near(massOf(there), massOf(here))
          here.panels.forEach(({ moments, steel }, i) => {
            const other = there.panels[i]!
            near(other.moments.midspan, moments.midspan)
            near(other.moments.support, moments.support)
            near(other.steel.midspanRequired, steel.midspanRequired)
            near(other.steel.supportProvided, steel.supportProvided)
          })
        },
      ),
      { numRuns: 25 },
    )
  })

  it('never gets thinner, nor lighter bars at the same thickness, under more load', () => {
    fc.assert(
      fc.property(spans, height, load, fc.double({ min: 0.01, max: 6, noNaN: true }), (widths, deep, imposedLoad, more) => {
        const less = sizeScheme(scheme, fileBy(row(widths, deep), { imposedLoad }))
        const most = sizeScheme(scheme, fileBy(row(widths, deep), { imposedLoad: imposedLoad + more }))
        fc.pre(methodOf(less) === methodOf(most) && !isNarrower(most, less))
        expect(most.depth).toBeGreaterThanOrEqual(less.depth)
        if (most.depth === less.depth) expect(massOf(most)).toBeGreaterThanOrEqual(massOf(less) * (1 - RELATIVE))
      }),
      { numRuns: 60 },
    )
  })

  it('schedules bars whose workings come to their count and length', () => {
    fc.assert(
      fc.property(spans, height, load, (widths, deep, imposedLoad) => {
        const { panels } = sizeScheme(scheme, fileBy(row(widths, deep), { imposedLoad }))
        for (const { count, lengthMm, shape, countWorking, lengthWorking } of panels.flatMap(({ bars }) => bars)) {
          const [, terms, plan, formula, cut] = WORKING.exec(lengthWorking.replaceAll('−', '-')) ?? []
          const sum = terms!.split(/ (?=[+-] )/).reduce((total, term) => total + Number(term.replace(' ', '')), 0)
          expect(Math.abs(sum - Number(plan))).toBeLessThan(0.01)
          expect(shape.code === '00').toBe(formula === undefined)
          expect(Number(cut ?? formula ?? plan)).toBeCloseTo(lengthMm, 3)
          expect(lengthMm % 25).toBe(0)
          expect(lengthMm - Number(formula ?? plan)).toBeLessThan(25)
          const [, lines] = /^(\d+) /.exec(countWorking) ?? []
          const [, each] = /× (\d+) = \d+$/.exec(countWorking) ?? []
          expect(Number(lines) * Number(each ?? 1)).toBe(count)
        }
      }),
      { numRuns: 25 },
    )
  })
})

describe.each(bases)('the least thickness by %s', (_, fileBy) => {
  it('passes, and the next thinner slab does not', () => {
    fc.assert(
      fc.property(spans, height, load, (widths, deep, imposedLoad) => {
        const file = fileBy(row(widths, deep), { imposedLoad })
        const { depth, passes } = sizeScheme(schemeOf(solid), file)
        expect(passes).toBe(true)
        if (depth > 100) expect(sizeScheme(schemeOf({ ...solid, thickness: depth - 5 }), file).passes).toBe(false)
      }),
      { numRuns: 25 },
    )
  })
})

describe.each(bases)('the least solid zone by %s', (_, fileBy) => {
  const passes = ({ panels }: SizedScheme) =>
    panels.every(({ checks }) => checks.every(({ name, pass }) => pass || (name !== 'shear' && name !== 'flexure.support')))

  it('passes in shear and hogging; given one step less, the panel fails or takes more top steel', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 40, max: 60 }),
        fc.constantFrom([], [1], [1, 3]),
        load,
        (decimetres, continuous, imposedLoad) => {
          const file = fileBy([panelOf('P1', rectangle(0, 0, decimetres * 100, 5000), continuous)], { imposedLoad })
          const given = (solidZone: number | 'least') => sizeScheme(schemeOf({ ...ribbed, solidZone }), file)
          const chosen = given('least')
          const zone = chosen.panels[0]!.layout!.solidZone
          expect(passes(chosen)).toBe(true)
          expect(given(zone)).toEqual({
            ...chosen,
            panels: chosen.panels.map((panel) => ({ ...panel, flags: expect.any(Array) })),
          })
          fc.pre(zone > 0)
          const narrower = given(zone - 25)
          expect(passes(narrower) && massOf(narrower) <= massOf(chosen)).toBe(false)
        },
      ),
      { numRuns: 40 },
    )
  })
})
