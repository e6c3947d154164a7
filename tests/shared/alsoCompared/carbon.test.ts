import { describe, expect, it } from 'vitest'
import type { FigureKey } from '#shared/alsoCompared/alsoFigure'
import { carbonFigures } from '#shared/alsoCompared/carbonFigures'
import { type CarbonFactor, factors } from '#shared/contracts/factors'
import { ribbedMeasures, solidMeasures } from './sampleMeasures'

const typed = (list: readonly object[]): CarbonFactor[] =>
  factors.parse({ carbon: list.map((each) => ({ source: 'invented', date: '2026-09-01', ...each })) }).carbon

const PRODUCT = typed([
  { material: 'concrete', modules: 'A1-A3', value: 250, unit: 'm³', wastePercent: 4 },
  { material: 'bars', modules: 'A1-A3', value: 1000, unit: 't', wastePercent: 5 },
  { material: 'mesh', modules: 'A1-A3', value: 2, unit: 'm²', wastePercent: 10 },
  { material: 'blocks', modules: 'A1-A3', value: 0.25, unit: 'kg', wastePercent: 2 },
])
const ALL = [
  ...PRODUCT,
  ...typed([
    { material: 'formwork', modules: 'A1-A3', value: 8, unit: 'm²', uses: 4 },
    { material: 'concrete', modules: 'A4', value: 10, unit: 'm³' },
    { material: 'bars', modules: 'A4', value: 100, unit: 't' },
    { material: 'mesh', modules: 'A4', value: 0.1, unit: 'kg' },
    { material: 'blocks', modules: 'A4', value: 0.2, unit: 'nr' },
  ]),
]

const figureOf = (list: readonly CarbonFactor[], key: FigureKey, measures = ribbedMeasures()) =>
  carbonFigures(measures, list).find((each) => each.key === key)!

describe('carbon', () => {
  it('of the product is each quantity times its factor over the gross area', () => {
    const kg = 10 * 250 + 0.6 * 1000 + 100 * 2 + 4000 * 0.25
    expect(figureOf(ALL, 'carbonProduct').value).toBeCloseTo(kg / 125, 12)
    expect(figureOf(ALL, 'carbonProduct').working).toBe(
      '(concrete 10 m³ × 250 + bars 0.6 t × 1000 + mesh 100 m² × 2 + blocks 4000 kg × 0.25) / 125 m² = 34.4 kg CO2e/m²',
    )
    expect(figureOf(ALL, 'carbonProduct').source).toContain('concrete A1-A3: 250 kg CO2e/m³, invented, 2026-09-01')
  })

  it('of carrying counts blocks by number and mesh by mass', () => {
    expect(figureOf(ALL, 'carbonTransport').value).toBeCloseTo((10 * 10 + 0.6 * 100 + 222 * 0.1 + 500 * 0.2) / 125, 12)
  })

  it('of waste counts what was made and carried, and of formwork one use of many', () => {
    const concrete = (10 * 250 + 10 * 10) * 0.04
    const bars = (0.6 * 1000 + 0.6 * 100) * 0.05
    const mesh = (100 * 2 + 222 * 0.1) * 0.1
    const blocks = (4000 * 0.25 + 500 * 0.2) * 0.02
    expect(figureOf(ALL, 'carbonConstruction').value).toBeCloseTo((concrete + bars + mesh + blocks + (100 * 8) / 4) / 125, 12)
  })

  it('in all is the sum of the three in tonnes, and leaves nothing out where every factor is typed', () => {
    const parts = (['carbonProduct', 'carbonTransport', 'carbonConstruction'] as const).map((key) => figureOf(ALL, key).value!)
    const total = figureOf(ALL, 'carbonTotal')
    expect(total.value).toBeCloseTo((parts.reduce((sum, part) => sum + part, 0) * 125) / 1000, 12)
    expect(total.lacks).toEqual([])
  })

  it('names every factor that is missing, and says what the total leaves out', () => {
    const some = PRODUCT.filter(({ material }) => material !== 'blocks').map((factor) => {
      const bare = { ...factor }
      delete bare.wastePercent
      return bare
    })
    expect(figureOf(some, 'carbonProduct').lacks).toEqual(['blocks A1-A3'])
    expect(figureOf(some, 'carbonProduct').value).toBeCloseTo((10 * 250 + 0.6 * 1000 + 100 * 2) / 125, 12)
    expect(figureOf(some, 'carbonTransport')).toMatchObject({ value: null, working: 'no factor is typed' })
    expect(figureOf(some, 'carbonConstruction').lacks).toEqual([
      'waste of concrete',
      'waste of bars',
      'waste of mesh',
      'waste of blocks',
      'formwork',
    ])
    const total = figureOf(some, 'carbonTotal')
    expect(total.value).toBeCloseTo(3.3, 12)
    expect(total.working).toContain('; leaves out blocks A1-A3, concrete A4')
  })

  it('of a solid floor asks no factor for blocks or mesh', () => {
    const concreteAndBars = PRODUCT.filter(({ material }) => material === 'concrete' || material === 'bars')
    expect(figureOf(concreteAndBars, 'carbonProduct', solidMeasures()).lacks).toEqual([])
  })

  it('is not shipped: without factors there is no figure', () => {
    expect(carbonFigures(ribbedMeasures(), []).map(({ value }) => value)).toEqual([null, null, null, null])
  })
})
