import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '#shared/appraise'
import type { CalculationEntry, CalculationLine, PanelCalculation } from '#shared/calculation/calculation'
import { calculationOf } from '#shared/calculation/calculationOf'
import { readWorking } from '#shared/calculation/readWorking'
import { appraisalFile, type AppraisalFileInput } from '#shared/contracts/appraisal'
import { loads, panelOf, rectangle, ribbed, row, solid } from '../sizing/support/floors'
import { evaluate } from '../support/evaluate'

type BriefInput = AppraisalFileInput['brief']

const BRIEFS: BriefInput[] = [
  { basis: 'EN1992', ...loads, fireMinutes: 60, exposure: 'XC1', fck: 30, fyk: 500 },
  { basis: 'BS8110', ...loads, fireMinutes: 60, exposure: 'mild', fcu: 35, fy: 460 },
]

/** A row of unequal two-way panels, and a long one-way slab apart. */
const panels = [...row([6600, 5000], 6200, 90), panelOf('Q1', rectangle(0, 9000, 9000, 3600), [], 90)]

const fileOf = (brief: BriefInput) =>
  appraisalFile.parse({
    format: 'bothways.appraisal/1',
    brief,
    levels: [{ mark: 'L1', panels }],
    schemes: [
      { ...ribbed, ribWidth: 140 },
      { ...solid, thicknessPer: 'panel' },
    ],
  })

const every = BRIEFS.flatMap((brief) =>
  ['R1', 'S1'].flatMap((scheme) =>
    panels.map(({ mark }) => ({ basis: brief.basis, file: fileOf(brief), target: { scheme, level: 'L1', panel: mark } })),
  ),
)

const entriesOf = ({ sections }: PanelCalculation) => sections.flatMap(({ entries }) => entries)
const textOf = ({ lines }: CalculationEntry) =>
  lines.map(({ symbol, formula, numbers, result, note }) => [symbol, formula, numbers, result, note].join(' ')).join(' ')

/** Whether a text prints a value: within half of the last digit printed, or 1e-3 of it where a power of ten is printed. */
function prints(text: string, value: number): boolean {
  return (text.match(/\d+(?:\.\d+)?(?:e\d)?/g) ?? []).some((printed) => {
    const lastDigit = 10 ** -(printed.split('e')[0]!.split('.')[1]?.length ?? 0)
    return Math.abs(Number(printed) - value) <= Math.max(0.501 * lastDigit, 1e-3 * Math.abs(value))
  })
}

/** Arithmetic of the calculation as the tests' evaluator reads it. */
const arithmetic = (numbers: string) =>
  numbers
    .replace(/([\d.]+)²/g, '($1*$1)')
    .replaceAll('·', '*')
    .replaceAll('−', '-')

/** Value of the numbers of a line; of two, the greater. */
function valueOf(numbers: string): number {
  const two = /^max\((.*); (.*)\)$/.exec(numbers)
  return two ? Math.max(...two.slice(1).map((each) => evaluate(arithmetic(each)))) : evaluate(arithmetic(numbers))
}

describe.each(every)('$basis, $target.scheme, panel $target.panel', ({ file, target }) => {
  const calculation = calculationOf(file, target)
  const { sized } = appraiseInFull(file)
  const panel = sized.find(({ mark }) => mark === target.scheme)!.panels.find(({ mark }) => mark === target.panel)!

  it('shows every check of the panel once, with its own figures', () => {
    const shown = entriesOf(calculation).flatMap(({ check }) => check ?? [])
    expect(shown).toHaveLength(panel.checks.length)
    for (const check of panel.checks) expect(shown).toContainEqual(check)
  })

  it('prints asked and provided of every check in its lines', () => {
    for (const entry of entriesOf(calculation)) {
      if (!entry.check) continue
      const { name, demand, capacity } = entry.check
      expect(prints(textOf(entry), demand), `${name} asked ${demand}: ${textOf(entry)}`).toBe(true)
      expect(prints(textOf(entry), capacity), `${name} has ${capacity}: ${textOf(entry)}`).toBe(true)
    }
  })

  it('reckons loads, spans and forces to what is printed', () => {
    const opening = calculation.sections.slice(0, 3)
    expect(opening.map(({ title }) => title)).toEqual(['Loads', 'Spans and depths', 'Moments and shears'])
    const lines = opening.flatMap(({ entries }) => entries).flatMap((entry) => entry.lines)
    const reckoned = lines.filter((line): line is CalculationLine & { numbers: string } => line.numbers !== null)
    expect(reckoned.length).toBeGreaterThan(6)
    for (const { symbol, numbers, result } of reckoned) {
      const printed = Number(/^[\d.]+/.exec(result)![0])
      expect(Math.abs(valueOf(numbers) - printed), `${symbol} ${numbers} = ${result}`).toBeLessThanOrEqual(
        Math.max(0.006, 0.005 * printed),
      )
    }
  })

  it('comes to the moments of the panel', () => {
    const forces = calculation.sections.find(({ title }) => title === 'Moments and shears')!.entries
    const results = forces.flatMap(({ lines }) => lines.map(({ result }) => result)).join(' ')
    for (const moment of Object.values(panel.moments)) if (moment > 0) expect(prints(results, moment)).toBe(true)
  })

  it('names a clause at every step and repeats the assumptions', () => {
    for (const { clause, heading } of entriesOf(calculation)) {
      expect(clause).not.toBe('')
      expect(heading).not.toBe('')
    }
    expect(calculation.assumptions).toEqual(panel.flags)
    expect(calculation.depthMm).toBe(panel.depth)
  })
})

describe('calculationOf', () => {
  it('refuses marks that are not there', () => {
    const file = fileOf(BRIEFS[0]!)
    for (const target of [
      { scheme: 'X', level: 'L1', panel: 'P1' },
      { scheme: 'S1', level: 'L9', panel: 'P1' },
      { scheme: 'R1', level: 'L1', panel: 'P9' },
    ])
      expect(() => calculationOf(file, target)).toThrow(RangeError)
  })
})

describe('readWorking', () => {
  it('parts heading, statements, formula, numbers, result and note', () => {
    expect(
      readWorking('edge 2, rib: V = 14.7 kN; VRd,c = max(0.18/γc; vmin)·b = max(0.7; 0.5)·140 = 22.9 kN (k 1.94, ρ (x) 0.01)'),
    ).toEqual({
      heading: 'edge 2, rib',
      lines: [
        { symbol: 'V', formula: null, numbers: null, result: '14.7 kN', note: null },
        {
          symbol: 'VRd,c',
          formula: 'max(0.18/γc; vmin)·b',
          numbers: 'max(0.7; 0.5)·140',
          result: '22.9 kN',
          note: 'k 1.94, ρ (x) 0.01',
        },
      ],
    })
  })

  it('keeps a sentence as it is', () => {
    expect(readWorking('slab 155 mm')).toEqual({
      heading: null,
      lines: [{ symbol: null, formula: null, numbers: null, result: 'slab 155 mm', note: null }],
    })
  })

  it('takes powers of ten for numbers', () => {
    const { lines } = readWorking('K = M/(b·d²·fck) = 23.34e6/(540·227.7²·30) = 0.028 ≤ 0.167')
    expect(lines).toEqual([
      { symbol: 'K', formula: 'M/(b·d²·fck)', numbers: '23.34e6/(540·227.7²·30)', result: '0.028 ≤ 0.167', note: null },
    ])
  })
})

describe('a support whose panels have unequal moments', () => {
  it.each(['EN1992', 'BS8110'] as const)('shows the own moment and the larger one of the floor behind, by %s', (basis) => {
    const file = fileOf(BRIEFS.find((brief) => brief.basis === basis)!)
    const hoggingLines = (panel: string) =>
      calculationOf(file, { scheme: 'S1', level: 'L1', panel })
        .sections.find(({ title }) => title === 'Moments and shears')!
        .entries.flatMap(({ lines }) => lines)
        .filter(({ symbol }) => symbol === 'M own' || symbol === 'M hogging')
    const [larger] = hoggingLines('P1')
    const [own, raised] = hoggingLines('P2')
    expect(larger).toMatchObject({ symbol: 'M hogging', formula: 'c·n·lx²', note: null })
    expect(own).toMatchObject({ symbol: 'M own', formula: 'c·n·lx²' })
    expect(parseFloat(own!.result)).toBeLessThan(parseFloat(larger!.result))
    expect(raised).toMatchObject({ symbol: 'M hogging', formula: 'max(M own; M behind)', result: larger!.result })
  })
})
