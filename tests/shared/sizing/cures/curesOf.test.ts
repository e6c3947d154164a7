import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '#shared/appraise'
import { type AppraisalFile, appraisalFile, type AppraisalFileInput } from '#shared/contracts/appraisal'
import { type Check } from '#shared/contracts/appraisalResult'
import type { Cure, CureInput } from '#shared/sizing/cures/cure'
import { curesOf } from '#shared/sizing/cures/curesOf'
import { firstPassing } from '#shared/sizing/cures/firstPassing'
import { brief, ribbed, row, solid } from '../support/floors'

type SchemeInput = AppraisalFileInput['schemes'][number]
type BriefInput = Extract<AppraisalFileInput['brief'], { basis: 'EN1992' }>

function fileWith(scheme: SchemeInput, changes: Partial<BriefInput> = {}, panels = row([6600, 5000], 6200)): AppraisalFile {
  return appraisalFile.parse({
    format: 'bothways.appraisal/1',
    brief: { ...brief, ...changes },
    levels: [{ mark: 'L1', panels }],
    schemes: [scheme],
  })
}

const inputOf = ({ schemes, brief: asked, levels }: AppraisalFile): CureInput => ({ scheme: schemes[0]!, brief: asked, levels })
const panelsOf = (file: AppraisalFile) => appraiseInFull(file).sized[0]!.panels

/** The file with a cure applied, appraised through the front door. */
const curedPanels = (file: AppraisalFile, cure: Cure) => panelsOf({ ...file, brief: cure.brief, schemes: [cure.scheme] })

interface Failing {
  readonly panel: string
  readonly index: number
  readonly check: Check
  readonly place: string
}

const failingOf = (file: AppraisalFile): Failing[] =>
  panelsOf(file).flatMap(({ mark, checks, places }) =>
    checks.flatMap((check, index) => (check.pass ? [] : [{ panel: mark, index, check, place: places[index]! }])),
  )

const curesFor = (file: AppraisalFile, { panel, index }: Failing) => curesOf(inputOf(file), { level: 'L1', panel, index })

/** Checks of one name at one place of one panel. */
const alike = (panels: ReturnType<typeof panelsOf>, { panel, check, place }: Failing) => {
  const found = panels.find(({ mark }) => mark === panel)!
  return found.checks.filter(({ name }, i) => name === check.name && found.places[i] === place)
}

const fewBars = { bottomX: { diameter: 8, spacing: 300 }, bottomY: { diameter: 8, spacing: 300 } } as const
const weak: [string, AppraisalFile][] = [
  ['a thin slab', fileWith({ ...solid, thickness: 110 })],
  ['a thin slab under heavy load', fileWith({ ...solid, thickness: 120 }, { imposedLoad: 15 })],
  ['few bars in a slab', fileWith({ ...solid, thickness: 220, bars: fewBars })],
  ['a slab too thin for fire', fileWith({ ...solid, thickness: 100 }, { fireMinutes: 120 }, row([2600], 2600))],
  ['narrow ribs', fileWith({ ...ribbed, ribWidth: 80, topping: 40, solidZone: 0 }, { imposedLoad: 5 })],
  [
    'few bars in ribs',
    fileWith({ ...ribbed, ribWidth: 140, ribBars: [{ diameter: 8, count: 1 }], topBars: [{ diameter: 8, count: 1 }] }),
  ],
  ['bars that do not fit', fileWith({ ...ribbed, ribWidth: 100, ribBars: [{ diameter: 25, count: 3 }] })],
  ['a topping too thin', fileWith({ ...ribbed, topping: 30 }, { fireMinutes: 60 })],
]

describe('curesOf', () => {
  it.each(weak)('finds changes that make the check pass when applied: %s', (_name, file) => {
    const failing = failingOf(file)
    expect(failing.length).toBeGreaterThan(0)
    for (const each of failing) {
      const { cures, inVain } = curesFor(file, each)
      expect(cures.length + inVain.length, `${each.check.name} ${each.place}`).toBeGreaterThan(0)
      const before = alike(panelsOf(file), each).filter(({ pass }) => !pass).length
      for (const cure of cures) {
        const after = curedPanels(file, cure)
        expect(alike(after, each).filter(({ pass }) => !pass).length, `${each.place}: ${cure.change}`).toBeLessThan(before)
        const broken = after.find(({ mark }) => mark === each.panel)!
        for (const { name, place } of cure.breaks)
          expect(broken.checks.some((check, i) => check.name === name && broken.places[i] === place && !check.pass)).toBe(true)
      }
    }
  })

  it('takes the least thickness: 5 mm less still fails', () => {
    const file = fileWith({ ...solid, thickness: 110 })
    const deflection = failingOf(file).find(({ check }) => check.name === 'deflection')!
    const cure = curesFor(file, deflection).cures.find(({ change }) => change.startsWith('thickness'))!
    if (cure.scheme.kind !== 'solid' || cure.scheme.thickness === 'least') throw new Error('expected a thickness')
    const { thickness } = cure.scheme
    expect(cure.change).toBe(`thickness ${thickness} mm instead of 110 mm`)
    const thinner = panelsOf({ ...file, schemes: [{ ...cure.scheme, thickness: thickness - 5 }] })
    expect(alike(thinner, deflection)[0]!.pass).toBe(false)
    expect(alike(curedPanels(file, cure), deflection)[0]!.pass).toBe(true)
  })

  it('names bars by number and diameter, with the steel they give against the steel asked', () => {
    const bars = [{ diameter: 8, count: 1 }] as const
    const file = fileWith({ ...ribbed, ribWidth: 140, ribBars: [...bars] })
    const steel = failingOf(file).find(({ check }) => check.name === 'flexure.midspan' && check.unit === 'mm²')!
    const cure = curesFor(file, steel).cures.find(({ change }) => change.startsWith('bottom bars'))!
    expect(cure.change).toMatch(/^bottom bars \d × \d+ instead of 1 × 8 in each rib of P\d$/)
    expect(cure.result).toMatch(/^\d+ ≥ \d+ mm²$/)
    expect(cure.breaks).toEqual([])
  })

  it('gives the zone that shear needs where the zone was given', () => {
    const file = fileWith({ ...ribbed, ribWidth: 120, solidZone: 50 }, { imposedLoad: 5 })
    const shear = failingOf(file).find(({ check, place }) => check.name === 'shear' && place.endsWith('rib'))!
    const cure = curesFor(file, shear).cures.find(({ change }) => change.startsWith('solid zone'))!
    expect(cure.change).toMatch(/^solid zone \d+ mm instead of 50 mm$/)
  })

  it('asks more cover for the axis distance in fire', () => {
    const file = fileWith({ ...solid, thickness: 200 }, { fireMinutes: 240, cover: 15 })
    const fire = failingOf(file).find(({ check }) => check.name === 'fire.cover')!
    const [cure] = curesFor(file, fire).cures
    expect(cure!.change).toMatch(/^cover \d+ mm instead of 15 mm$/)
  })

  it('says what was tried where nothing within limits helps', () => {
    const file = fileWith({ ...ribbed, ribWidth: 100, solidZone: 'least' }, { imposedLoad: 60 }, row([9000], 6000))
    const hopeless = failingOf(file).map((each) => curesFor(file, each))
    expect(hopeless.some(({ inVain }) => inVain.length > 0)).toBe(true)
    for (const { inVain } of hopeless) for (const text of inVain) expect(text).toMatch(/ to \d/)
  })

  it('refuses a check, panel or level that is not there', () => {
    const file = fileWith({ ...solid, thickness: 110 })
    for (const target of [
      { level: 'L1', panel: 'P1', index: 999 },
      { level: 'L1', panel: 'P9', index: 0 },
      { level: 'L9', panel: 'P1', index: 0 },
    ])
      expect(() => curesOf(inputOf(file), target)).toThrow(RangeError)
  })
})

describe('firstPassing', () => {
  const numbers = Array.from({ length: 100 }, (_, i) => i)

  it.each([0, 1, 2, 3, 6, 7, 8, 50, 99])('finds the first of a run to the end, from %i', (from) => {
    let asked = 0
    const found = firstPassing(numbers, (each) => {
      asked += 1
      return each >= from
    })
    expect(found).toBe(from)
    expect(asked).toBeLessThan(20)
  })

  it('finds nothing where none passes, or there is none', () => {
    expect(firstPassing(numbers, () => false)).toBeNull()
    expect(firstPassing([], () => true)).toBeNull()
  })
})
