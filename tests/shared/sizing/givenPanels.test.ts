import { describe, expect, it } from 'vitest'
import { AppraisalRefusedError } from '#shared/appraisalRefused'
import { appraiseInFull } from '#shared/appraise'
import { type AppraisalFileInput, appraisalFile } from '#shared/contracts/appraisal'
import { parseAppraisalFile } from '#shared/parseAppraisalFile'
import type { SizedPanel } from '#shared/sizing/sizedPanel'
import { brief, ribbed, row, solid } from './support/floors'

type SchemeInput = AppraisalFileInput['schemes'][number]
type SolidInput = Extract<SchemeInput, { kind: 'solid' }>
type RibbedInput = Extract<SchemeInput, { kind: 'ribbed' }>

const fileWith = (scheme: SchemeInput, panels = row([5200, 4600, 5000], 6100)): AppraisalFileInput => ({
  format: 'bothways.appraisal/1',
  brief,
  levels: [{ mark: 'L1', panels }],
  schemes: [scheme],
})

function sizedWith(scheme: SchemeInput) {
  return appraiseInFull(appraisalFile.parse(fileWith(scheme))).sized[0]!
}

function issuesOf(scheme: SchemeInput) {
  try {
    parseAppraisalFile(fileWith(scheme))
  } catch (error) {
    if (error instanceof AppraisalRefusedError) return error.issues
    throw error
  }
  return []
}

/** What a panel is designed for and with; bars over a shared support belong to both sides. */
const designOf = ({ checks, moments, steel, depth, flags }: SizedPanel) => ({ checks, moments, steel, depth, flags })

const layers = { bottomX: { diameter: 12, spacing: 125 }, bottomY: { diameter: 10, spacing: 200 } } as const
const fixedSolid: SolidInput = { ...solid, thickness: 180 }
const fixedRibs: RibbedInput = { ...ribbed, solidZone: 300 }

describe('bars given panel by panel', () => {
  it('take the place of computed bars in that solid panel, and change no other', () => {
    const before = sizedWith(fixedSolid)
    const after = sizedWith({ ...fixedSolid, givenPanels: [{ level: 'L1', panel: 'P2', bars: layers }] })
    expect(after.panels[1]!.steel.midspanProvided).toBeCloseTo((Math.PI * 36 * 1000) / 125, 6)
    for (const i of [0, 2]) expect(designOf(after.panels[i]!)).toEqual(designOf(before.panels[i]!))
  })

  it('take the place of computed bars in that ribbed panel, and change no other', () => {
    const before = sizedWith(fixedRibs)
    const bars = { ribBars: [{ diameter: 20 as const, count: 2 }], topBars: [{ diameter: 16 as const, count: 1 }] }
    const after = sizedWith({ ...fixedRibs, givenPanels: [{ level: 'L1', panel: 'P2', ...bars }] })
    const { steel } = after.panels[1]!
    expect(steel.midspanProvided).toBeCloseTo(2 * Math.PI * 100, 6)
    expect(steel.supportProvided).toBeCloseTo(Math.PI * 64, 6)
    for (const i of [0, 2]) expect(designOf(after.panels[i]!)).toEqual(designOf(before.panels[i]!))
  })

  it('leave the top bars to the engine where only the bottom ones are given', () => {
    const before = sizedWith(fixedRibs).panels[1]!
    const ribBars = [{ diameter: 20 as const, count: 2 }]
    const { steel } = sizedWith({ ...fixedRibs, givenPanels: [{ level: 'L1', panel: 'P2', ribBars }] }).panels[1]!
    expect(steel.supportProvided).toBe(before.steel.supportProvided)
  })

  it('go before bars given to the whole scheme', () => {
    const bars = { bottomX: { diameter: 16 as const, spacing: 100 }, bottomY: { diameter: 10 as const, spacing: 200 } }
    const { panels } = sizedWith({ ...fixedSolid, bars, givenPanels: [{ level: 'L1', panel: 'P3', bars: layers }] })
    expect(panels[0]!.steel.midspanProvided).toBeCloseTo(Math.PI * 64 * 10, 6)
    expect(panels[2]!.steel.midspanProvided).toBeCloseTo((Math.PI * 36 * 1000) / 125, 6)
  })

  it('are shown failing where they are too few, and not enlarged', () => {
    const few = { bottomX: { diameter: 6 as const, spacing: 300 }, bottomY: { diameter: 6 as const, spacing: 300 } }
    const slab = sizedWith({ ...fixedSolid, givenPanels: [{ level: 'L1', panel: 'P1', bars: few }] })
    const ribs = sizedWith({
      ...fixedRibs,
      givenPanels: [{ level: 'L1', panel: 'P1', ribBars: [{ diameter: 6 as const, count: 1 }] }],
    })
    for (const { passes, panels } of [slab, ribs]) {
      expect(passes).toBe(false)
      const failing = panels[0]!.checks.filter(({ name, pass }) => name === 'flexure.midspan' && !pass)
      expect(failing.length).toBeGreaterThan(0)
      expect(panels[1]!.checks.every(({ name, pass }) => name !== 'flexure.midspan' || pass)).toBe(true)
    }
    expect(slab.panels[0]!.steel.midspanProvided).toBeCloseTo((Math.PI * 9 * 1000) / 300, 6)
    expect(ribs.panels[0]!.steel.midspanProvided).toBeCloseTo(Math.PI * 9, 6)
  })

  it('are told apart in panels of the same shape', () => {
    const panels = row([5200, 5200, 5200, 5200], 6100)
    const given = { level: 'L1', panel: 'P4', ribBars: [{ diameter: 25 as const, count: 2 }] }
    const file = appraisalFile.parse(fileWith({ ...fixedRibs, givenPanels: [given] }, panels))
    const provided = appraiseInFull(file).sized[0]!.panels.map(({ steel }) => steel.midspanProvided)
    expect(provided[3]).toBeCloseTo(2 * Math.PI * 156.25, 6)
    expect(provided[0]).toBeLessThan(provided[3]!)
  })

  it.each([
    ['an unknown level', { level: 'L9', panel: 'P1' }, 'schemes.0.givenPanels.0.level'],
    ['an unknown panel', { level: 'L1', panel: 'P9' }, 'schemes.0.givenPanels.0.panel'],
  ])('are refused for %s', (_name, at, path) => {
    expect(issuesOf({ ...fixedSolid, givenPanels: [{ ...at, bars: layers }] })).toMatchObject([{ path }])
    expect(issuesOf({ ...fixedRibs, givenPanels: [{ ...at, topBars: [] }] })).toMatchObject([{ path }])
  })

  it('are refused where one panel is given twice, or nothing is given', () => {
    const given = { level: 'L1', panel: 'P1', bars: layers }
    expect(issuesOf({ ...fixedSolid, givenPanels: [given, given] })).toMatchObject([{ path: 'schemes.0.givenPanels.1' }])
    const [issue] = issuesOf({ ...fixedRibs, givenPanels: [{ level: 'L1', panel: 'P1' }] })
    expect(issue).toMatchObject({ path: 'schemes.0.givenPanels.0' })
    expect(issue!.message).toContain('expected ribBars, topBars or both')
  })
})

describe('what is stated', () => {
  const flagsOf = (scheme: SchemeInput) => sizedWith(scheme).panels.map(({ flags }) => flags.join('; '))

  it('names the panels whose bars are given', () => {
    const given = [{ level: 'L1', panel: 'P2', bars: layers }]
    const [first, second] = flagsOf({ ...fixedSolid, givenPanels: given })
    expect(first).not.toContain('bars given for this panel')
    expect(second).toContain('bars given for this panel')
  })

  it('repeats the note on a thickness, which only a given one may have', () => {
    expect(flagsOf({ ...fixedSolid, thicknessNote: 'cheapest of 12' })[0]).toContain('thickness: cheapest of 12')
    expect(issuesOf({ ...solid, thicknessNote: 'cheapest of 12' })).toMatchObject([{ path: 'schemes.0.thicknessNote' }])
  })

  it('says why no thickness passes', () => {
    const few = { bottomX: { diameter: 6 as const, spacing: 500 }, bottomY: { diameter: 6 as const, spacing: 500 } }
    const [flags] = flagsOf({ ...solid, bars: few })
    expect(flags).toMatch(/no thickness from 100 to 1500 mm passes .* shown at \d+ mm, where the given bars come nearest/)
    expect(flagsOf(solid).join()).not.toContain('no thickness')
  })

  it('says where solid zones leave little of a panel ribbed', () => {
    const slim = fileWith({ ...ribbed, ribWidth: 100 }, row([9000], 6000))
    const flagsUnder = (imposedLoad: number) =>
      appraiseInFull(appraisalFile.parse({ ...slim, brief: { ...brief, imposedLoad } })).sized[0]!.panels[0]!.flags.join('; ')
    expect(flagsUnder(20)).toMatch(/solid zone widened to \d+ mm .*: the zones take up \d\d % of the ribs, 8750 mm long/)
    expect(flagsUnder(0.5)).not.toContain('take up')
  })

  it('says why no solid zone lets the ribs of a short span beside a long one pass', () => {
    const file = { ...fileWith({ ...ribbed, ribWidth: 100 }, row([2400, 9000], 6000)), brief: { ...brief, imposedLoad: 10 } }
    const { checks, flags, places } = appraiseInFull(appraisalFile.parse(file)).sized[0]!.panels[0]!
    expect(checks.some(({ name, pass }, i) => name === 'shear' && !pass && places[i]!.endsWith('rib'))).toBe(true)
    expect(flags.join('; ')).toMatch(/no solid zone that leaves blocks .* widest, 1050 mm of 2150 mm; edge 2, rib governs/)
  })

  it('offers the bars of each panel in the shape in which they are given, and given so they are the same', () => {
    for (const scheme of [fixedSolid, fixedRibs]) {
      const before = sizedWith(scheme).panels[1]!
      const { reinforcement } = before
      const given =
        reinforcement.kind === 'solid'
          ? { ...fixedSolid, givenPanels: [{ level: 'L1', panel: 'P2', bars: reinforcement.bars }] }
          : {
              ...fixedRibs,
              givenPanels: [
                { level: 'L1', panel: 'P2', ribBars: [...reinforcement.ribBars], topBars: [...reinforcement.topBars] },
              ],
            }
      const after = sizedWith(given).panels[1]!
      expect(after.reinforcement).toEqual(reinforcement)
      expect(after.steel.midspanProvided).toBe(before.steel.midspanProvided)
    }
  })
})

describe('a thickness per panel', () => {
  const perPanel = sizedWith({ ...solid, thicknessPer: 'panel' })
  const together = sizedWith(solid)

  it('gives each panel its least, the greatest of which is the scheme', () => {
    expect(new Set(perPanel.panels.map(({ depth }) => depth)).size).toBeGreaterThan(1)
    expect(perPanel.depth).toBe(Math.max(...perPanel.panels.map(({ depth }) => depth)))
    expect(perPanel.passes).toBe(together.passes)
    expect(Math.min(...perPanel.panels.map(({ depth }) => depth))).toBeLessThan(together.depth)
  })

  it('states where the soffit steps', () => {
    const [first, second] = perPanel.panels
    const step = Math.abs(first!.depth - second!.depth)
    expect(step).toBeGreaterThan(0)
    expect(first!.flags.some((flag) => flag.startsWith(`soffit steps ${step} mm at edge 2 to panel P2`))).toBe(true)
    expect(together.panels.every(({ flags }) => flags.every((flag) => !flag.startsWith('soffit')))).toBe(true)
  })

  it('is measured panel by panel', () => {
    const { appraisal } = appraiseInFull(appraisalFile.parse(fileWith({ ...solid, thicknessPer: 'panel' })))
    const concrete = appraisal.schemes[0]!.quantities.find(({ item }) => item === 'concrete.slab')!
    perPanel.panels.forEach(({ depth, areas, mark }) => {
      const value = concrete.parts.filter(({ panel }) => panel === mark).reduce((sum, part) => sum + part.value, 0)
      expect(value).toBeCloseTo(((areas.clear - areas.voids) * depth) / 1e9, 9)
    })
  })

  it('is refused beside a given thickness', () => {
    const [issue] = issuesOf({ ...fixedSolid, thicknessPer: 'panel' })
    expect(issue).toMatchObject({ path: 'schemes.0.thicknessPer' })
  })
})
