import { describe, expect, it } from 'vitest'
import type { AlsoFigure, FigureKey } from '#shared/alsoCompared/alsoFigure'
import { labourFigures } from '#shared/alsoCompared/labourFigures'
import { labourParts } from '#shared/alsoCompared/labourParts'
import { strikingTimes } from '#shared/alsoCompared/strikingTimes'
import { factors } from '#shared/contracts/factors'
import { ribbedMeasures, solidMeasures } from './sampleMeasures'

const own = (value: number) => ({ value, source: `typed ${value}` })
/** Outputs that make round hours. */
const { labour } = factors.parse({
  labour: {
    concrete: own(2),
    barsTo8: own(10),
    barsTo12: own(20),
    barsTo20: own(30),
    barsOver20: own(40),
    mesh: own(0.1),
    blocks: own(25),
    soffit: own(1.5),
    edge: own(0.5),
    leastGang: 5,
    hoursPerDay: 8,
    daysPerWeek: 5,
    airTemperature: 20,
  },
})
const valueOf = (figures: readonly AlsoFigure[], key: FigureKey) => figures.find((each) => each.key === key)!.value

describe('labour', () => {
  it('is what is measured times the outputs, kind by kind', () => {
    const hours = labourParts(ribbedMeasures(), labour).map((part) => part.hours)
    expect(hours).toEqual([10 * 2, 100 / 10, 200 / 20, 300 / 30, 100 * 0.1, 500 / 25, 100 * 1.5, 20 * 0.5])
  })

  it('adds to 240 hours, six days of a gang of five', () => {
    const figures = labourFigures(ribbedMeasures(), labour)
    expect(valueOf(figures, 'labourHours')).toBe(240)
    expect(valueOf(figures, 'gangDays')).toBe(6)
    expect(figures[0]!.working).toMatch(
      /^concrete 10 m³ × 2 h\/m³ = 20 h; bars to 8 mm 100 kg \/ 10 kg\/h = 10 h; .*together 240 h$/,
    )
    expect(figures[0]!.source).toContain('typed 25')
  })

  it('leaves out what a scheme has not, and puts bars over 20 mm in their own band', () => {
    const parts = labourParts(solidMeasures({ barsKg: { 20: 60, 25: 80 } }), labour)
    expect(parts.map(({ working }) => working.replace(/ \d.*/, ''))).toEqual([
      'concrete',
      'bars',
      'bars',
      'soffit formwork',
      'edge formwork',
    ])
    expect(parts.slice(1, 3).map(({ hours }) => hours)).toEqual([60 / 30, 80 / 40])
  })

  it('keeps formwork and props under a floor for the gang’s weeks and the striking time', () => {
    const figures = labourFigures(ribbedMeasures(), labour)
    const building = 6 / 2 / 5
    expect(valueOf(figures, 'formworkWeeks')).toBeCloseTo(building + 4 / 7, 12)
    expect(valueOf(figures, 'proppingWeeks')).toBeCloseTo(building + 10 / 7, 12)
    expect(valueOf(figures, 'soffitAreaWeeks')).toBeCloseTo(100 * (building + 4 / 7), 10)
    expect(valueOf(figures, 'propAreaWeeks')).toBeCloseTo(100 * (building + 10 / 7), 10)
    expect(figures.find(({ key }) => key === 'formworkWeeks')!.source).toContain('engineer’s word only')
  })
})

/** BS 8110-1:1997, Table 6.2, as quoted: 4 and 10 days at 16 °C and above, else 100/(t + 10) and 250/(t + 10). */
describe('striking times', () => {
  it.each([
    [16, 4, 10],
    [25, 4, 10],
    [15, 4, 10],
    [10, 5, 12.5],
    [6, 6.25, 15.625],
  ])('at %i °C are %d days for the soffit and %d for props', (temperature, soffitDays, propDays) => {
    expect(strikingTimes(temperature)).toMatchObject({ soffitDays, propDays })
  })
})
