/**
 * EN 12354-1:2000, Annex B (Rw = 37.5 lg m′ − 42) and EN 12354-2:2000, Annex B (Ln,w,eq = 164 − 35 lg m′), from memory. The figures of
 * 150 and 200 mm of concrete are calculated by hand from these formulas at 2400 kg/m³; Ln of m′ = 322 is the worked example of
 * EN 12354-2 as reported, printed in whole decibels.
 */
import { describe, expect, it } from 'vitest'
import { airborneIndexDb, impactLevelDb } from '#shared/alsoCompared/soundByMass'
import { floorMassKgPerM2, soundFigures } from '#shared/alsoCompared/soundFigures'
import { ribbedMeasures, solidMeasures } from './sampleMeasures'

const HALF_OF_A_TENTH = 0.05
const HALF_A_DECIBEL = 0.5

describe('sound by mass', () => {
  it.each([
    [150, 360, 53.9, 74.5],
    [200, 480, 58.5, 70.2],
  ])('of %i mm of concrete is that of %i kg/m²: Rw %d, Ln %d', (thicknessMm, mass, air, impact) => {
    const measures = solidMeasures({ concreteM3: thicknessMm / 10 })
    expect(floorMassKgPerM2(measures)).toBe(mass)
    const [ofAir, ofImpact] = soundFigures(measures)
    expect(Math.abs(ofAir!.value! - air)).toBeLessThanOrEqual(HALF_OF_A_TENTH)
    expect(Math.abs(ofImpact!.value! - impact)).toBeLessThanOrEqual(HALF_OF_A_TENTH)
  })

  it('of 322 kg/m² is the printed 76 dB of the worked example', () => {
    expect(Math.abs(impactLevelDb(322)! - 76)).toBeLessThanOrEqual(HALF_A_DECIBEL)
  })

  it.each([
    [150, null],
    [150.1, 37.5 * Math.log10(150.1) - 42],
  ])('through air holds above 150 kg/m²: %d', (mass, expected) => {
    expect(airborneIndexDb(mass)).toBe(expected)
  })

  it.each([99.9, 600.1])('of steps has no figure at %d kg/m²', (mass) => {
    expect(impactLevelDb(mass)).toBeNull()
  })

  it.each([100, 600])('of steps has one at %d kg/m²', (mass) => {
    expect(impactLevelDb(mass)).toBe(164 - 35 * Math.log10(mass))
  })

  it('counts the blocks of a ribbed floor: (10 × 2400 + 4000) / 100 = 280 kg/m²', () => {
    expect(floorMassKgPerM2(ribbedMeasures())).toBe(280)
    expect(soundFigures(ribbedMeasures())[0]!.working).toBe(
      'm′ = (10 × 2400 + 4000) / 100 = 280 kg/m²; Rw = 37.5 lg 280 − 42 = 49.8 dB',
    )
  })

  it('says why a floor too light or too heavy has no figure', () => {
    const [air, impact] = soundFigures(solidMeasures({ concreteM3: 4 }))
    expect([air!.value, impact!.value]).toEqual([null, null])
    expect(air!.working).toContain('no figure: the formula holds above 150 kg/m²')
    expect(impact!.working).toContain('no figure: the formula holds from 100 to 600 kg/m²')
  })
})
