import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { appraise, appraiseInFull } from '#shared/appraise'
import { AppraisalRefusedError } from '#shared/appraisalRefused'
import { type AppraisalFile } from '#shared/contracts/appraisal'
import { type Appraisal, appraisal as appraisalContract } from '#shared/contracts/appraisalResult'
import { OutOfScopeError } from '#shared/outOfScope'
import { Decimal, sumOf } from '#shared/pricing/decimal'
import { parseAppraisalFile } from '#shared/parseAppraisalFile'
import { RULE_SETS } from '#shared/takeoff/ruleSets'
import { evaluate } from './support/evaluate'
import { computedFile, givenFile } from './support/richFiles'

const ARITHMETIC = 1e-9

const readExample = (name: string) =>
  parseAppraisalFile(JSON.parse(readFileSync(new URL(`../../shared/examples/${name}`, import.meta.url), 'utf8')))

const files: [string, AppraisalFile][] = [
  ['tarn-court.json', readExample('tarn-court.json')],
  ['one-panel.json', readExample('one-panel.json')],
  ['sizes left to the engine', parseAppraisalFile(computedFile)],
  ['sizes given', parseAppraisalFile(givenFile)],
]

describe.each(files)('%s', (_name, file) => {
  const result = appraise(file)

  it('gives what the contract promises, unchanged by JSON', () => {
    expect(appraisalContract.parse(JSON.parse(JSON.stringify(result)))).toEqual(result)
  })

  it('gives the same result again', () => {
    expect(appraise(file)).toEqual(result)
  })

  it('shows arithmetic that yields every part, and parts that add up to every quantity', () => {
    for (const { item, unit, net, parts, split } of result.schemes.flatMap(({ quantities }) => quantities)) {
      for (const { expression, value } of parts) {
        expect(Math.abs(evaluate(expression) - value), `${item}: ${expression}`).toBeLessThanOrEqual(ARITHMETIC * value)
      }
      const whole = parts.reduce((sum, { value }) => sum + value, 0)
      expect(Math.abs(net - whole)).toBeLessThanOrEqual(
        0.5 * 10 ** -RULE_SETS[file.measurement].decimals[unit] + ARITHMETIC * whole,
      )
      const splitSum = Object.values(split ?? { whole }).reduce((sum, value) => sum + value, 0)
      expect(Math.abs(splitSum - whole), item).toBeLessThanOrEqual(ARITHMETIC * whole)
    }
  })

  it('names only panels of the file, and every one of them in the concrete', () => {
    const panels = file.levels.flatMap((level) => level.panels.map((panel) => `${level.mark} ${panel.mark}`))
    for (const { quantities } of result.schemes) {
      const named = quantities.map(({ parts }) => parts.map(({ level, panel }) => `${level} ${panel}`))
      expect(new Set(named.flat())).toEqual(new Set(panels))
      expect(named[0]).toEqual(panels)
    }
  })

  it('prints bills that add up, and a ledger that ends at their difference', () => {
    for (const { cost } of result.schemes) {
      const printed = [...cost!.lines, ...cost!.markups].map(({ amount }) => new Decimal(amount))
      expect(sumOf(printed).toFixed(2)).toBe(cost!.total)
    }
    const [ribbed, solid] = (['ribbed', 'solid'] as const).map((kind) => result.schemes.find((scheme) => scheme.kind === kind)!)
    expect(result.comparison!.between).toEqual([ribbed!.mark, solid!.mark])
    const difference = new Decimal(ribbed!.cost!.total).minus(solid!.cost!.total)
    expect(result.comparison!.ledger.at(-1)!.running).toBe(difference.toFixed(2))
  })

  it('weighs what it measured', () => {
    for (const { deadLoad, panels, quantities } of result.schemes) {
      const areaM2 = file.levels
        .flatMap((level) => level.panels.map((panel) => level.repeat * panel.repeat))
        .reduce((sum, repeats, index) => sum + repeats * panels[index]!.grossArea, 0)
      expect(deadLoad.total).toBeCloseTo(deadLoad.perArea * areaM2, 6)
      const concrete = quantities[0]!.parts.reduce((sum, { value }) => sum + value, 0)
      expect(deadLoad.total).toBeGreaterThanOrEqual(25 * concrete * (1 - ARITHMETIC))
    }
  })

  it('never gets cheaper by a dearer rate', () => {
    for (const [item, rate] of Object.entries(file.rates!.items)) {
      const dearer = new Decimal(rate).times('1.1').plus('0.01').toFixed(6)
      const after = appraise({ ...file, rates: { ...file.rates!, items: { ...file.rates!.items, [item]: dearer } } })
      after.schemes.forEach(({ cost }, index) => {
        expect(new Decimal(cost!.total).greaterThanOrEqualTo(result.schemes[index]!.cost!.total)).toBe(true)
      })
    }
  })

  it('leaves cost and comparison empty where there are no rates', () => {
    const unpriced = appraise({ ...file, rates: undefined })
    expect(unpriced.comparison).toBeNull()
    expect(unpriced.schemes.map(({ cost }) => cost)).toEqual(file.schemes.map(() => null))
    expect(unpriced.schemes.map(({ quantities }) => quantities)).toEqual(result.schemes.map(({ quantities }) => quantities))
  })
})

describe('the front door', () => {
  const file = readExample('one-panel.json')

  it('sets the first ribbed against the first solid scheme, whatever their order', () => {
    const [ribbed, solid] = file.schemes
    const more = [solid!, { ...solid!, mark: 'S2' }, { ...ribbed!, mark: 'R2' }, ribbed!]
    expect(appraise({ ...file, schemes: more }).comparison!.between).toEqual(['R2', 'S1'])
    expect(appraise({ ...file, schemes: [ribbed!, { ...ribbed!, mark: 'R2' }] }).comparison).toBeNull()
  })

  it('gives the sized panels beside the results', () => {
    const { appraisal, sized, problems } = appraiseInFull(file)
    expect(appraisal).toEqual(appraise(file))
    expect(problems).toEqual([])
    expect(sized.map(({ mark }) => mark)).toEqual(['R1', 'S1'])
    expect(sized[0]!.panels[0]!.layout!.blocks.length).toBe(appraisal.schemes[0]!.panels[0]!.blocksWhole)
  })

  it('passes on what lies outside the rules; for screens it is a problem of the scheme', () => {
    const [level] = file.levels
    const edges = [{ supportWidth: 0, kind: 'beam' as const, continuity: 'free' as const }]
    const other = parseAppraisalFile({ ...file, levels: [{ ...level!, panels: [{ ...level!.panels[0]!, edges }] }] })
    expect(() => appraise(other)).toThrow(OutOfScopeError)
    const { appraisal, sized, problems } = appraiseInFull(other)
    expect({ schemes: appraisal.schemes, comparison: appraisal.comparison, sized }).toEqual({
      schemes: [],
      comparison: null,
      sized: [],
    })
    expect(problems.map(({ scheme, issue }) => [scheme, issue.path])).toEqual([
      ['R1', 'levels.0.panels.0.edges'],
      ['S1', 'levels.0.panels.0.edges'],
    ])
  })

  it('refuses a floor that cannot be', () => {
    const [level] = file.levels
    const [panel] = level!.panels
    const clockwise = { ...panel!, outline: [...panel!.outline].reverse() }
    const bad = { ...file, levels: [{ ...level!, panels: [clockwise] }] }
    expect(() => appraise(bad)).toThrow(AppraisalRefusedError)
    expect(() => appraiseInFull(bad)).toThrow(AppraisalRefusedError)
    expect(() => parseAppraisalFile(bad)).toThrow(/levels\.0\.panels\.0\.outline/)
  })
})

describe('a level', () => {
  const file = parseAppraisalFile(computedFile)
  const [level] = file.levels

  /** What a scheme takes in all, unrounded, by item, with its weight. */
  const totalsOf = ({ schemes }: Appraisal) =>
    schemes.map(({ quantities, deadLoad }) => ({
      weight: deadLoad.total,
      ...Object.fromEntries(quantities.map(({ item, parts }) => [item, parts.reduce((sum, { value }) => sum + value, 0)])),
    }))

  function expectSame(actual: object[], expected: object[], factor = 1): void {
    expect(actual.map((totals) => Object.keys(totals))).toEqual(expected.map((totals) => Object.keys(totals)))
    actual.forEach((totals, index) => {
      for (const [item, value] of Object.entries(totals) as [string, number][]) {
        const wanted = factor * (expected[index] as Record<string, number>)[item]!
        expect(Math.abs(value - wanted), item).toBeLessThanOrEqual(ARITHMETIC * wanted)
      }
    })
  }

  /** The level's panels under other marks, also where an edge names one of them. */
  const renamed = (markOf: (mark: string) => string) =>
    level!.panels.map((panel) => ({
      ...panel,
      mark: markOf(panel.mark),
      edges: panel.edges.map(({ beyond, ...edge }) => {
        if (!beyond) return edge
        return { ...edge, beyond: 'panel' in beyond ? { panel: markOf(beyond.panel) } : beyond }
      }),
    }))

  it('split into two that keep their neighbours changes no total', () => {
    const apart = renamed((mark) => `${mark}b`).map((panel) => ({
      ...panel,
      outline: panel.outline.map(([x, y]): [number, number] => [x, y + 20_000]),
      voids: panel.voids.map((ring) => ring.map(([x, y]): [number, number] => [x, y + 20_000])),
    }))
    const whole = appraise({ ...file, levels: [{ ...level!, panels: [...level!.panels, ...apart] }] })
    const split = appraise({ ...file, levels: [level!, { ...level!, mark: 'L2', panels: apart }] })
    expectSame(totalsOf(split), totalsOf(whole))
    expect(split.schemes.map(({ cost }) => cost)).toEqual(whole.schemes.map(({ cost }) => cost))
  })

  it('timesed takes as many times as much', () => {
    const once = appraise({ ...file, levels: [{ ...level!, repeat: 1 }] })
    const seven = appraise({ ...file, levels: [{ ...level!, repeat: 7 }] })
    expectSame(totalsOf(seven), totalsOf(once), 7)
    expect(seven.schemes.map(({ checks }) => checks)).toEqual(once.schemes.map(({ checks }) => checks))
  })

  it('with each panel timesed takes as many times as much', () => {
    const panels = level!.panels.map((panel) => ({ ...panel, repeat: panel.repeat * 5 }))
    expectSame(totalsOf(appraise({ ...file, levels: [{ ...level!, panels }] })), totalsOf(appraise(file)), 5)
  })

  it('under other names takes the same', () => {
    const panels = renamed((mark) => `X-${mark}`)
    expectSame(totalsOf(appraise({ ...file, levels: [{ ...level!, mark: 'roof', panels }] })), totalsOf(appraise(file)))
  })

  it.each([
    [1234.5, -987.25, 0],
    [0, 0, 90],
    [-500, 40, 37],
    [0, 0, 120.7],
  ])('moved by (%d, %d) and turned by %d degrees takes the same', (dx, dy, degrees) => {
    const [cosine, sine] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)]
    const turn = ([x, y]: [number, number]): [number, number] => [cosine * x - sine * y + dx, sine * x + cosine * y + dy]
    const panels = level!.panels.map((panel) => ({
      ...panel,
      outline: panel.outline.map(turn),
      voids: panel.voids.map((ring) => ring.map(turn)),
      ribDirection: (panel.ribDirection + degrees) % 180,
    }))
    expectSame(totalsOf(appraise({ ...file, levels: [{ ...level!, panels }] })), totalsOf(appraise(file)))
  })
})
