import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '#shared/appraise'
import type { AppraisalFileInput } from '#shared/contracts/appraisal'
import { parseAppraisalFile } from '#shared/parseAppraisalFile'
import { barSchedule } from '#shared/schedule/barSchedule'
import { barRun, handSized, levelOf, rectangle, solidOf } from '../support/handSized'
import { computedFile, givenFile } from '../support/richFiles'

const tarnCourt = JSON.parse(readFileSync('shared/examples/tarn-court.json', 'utf8')) as AppraisalFileInput

describe.each([
  ['Tarn Court', tarnCourt],
  ['voids, walls, laps and repeats', computedFile],
  ['given bars', givenFile],
])('the schedule of %s', (_, input) => {
  const file = parseAppraisalFile(input)
  const { appraisal, sized } = appraiseInFull(file)
  const schedules = sized.map((scheme) => barSchedule(scheme, file.levels))

  it('weighs what the take-off weighs, diameter by diameter', () => {
    schedules.forEach(({ totals }, i) => {
      const measured = appraisal.schemes[i]!.quantities.filter(({ item }) => item.startsWith('steel.bar.'))
      expect(totals.map(({ diameter }) => `steel.bar.${diameter}`)).toEqual(measured.map(({ item }) => item))
      totals.forEach(({ massKg }, at) => {
        const { unit, parts } = measured[at]!
        const sum = parts.reduce((total, { value }) => total + value, 0)
        expect(massKg).toBeCloseTo(unit === 't' ? 1000 * sum : sum, 6)
      })
    })
  })

  it('has a mark for each diameter, shape and length, and each bar under one mark', () => {
    schedules.forEach(({ marks, massKg, totals }, i) => {
      expect(new Set(marks.map(({ mark }) => mark)).size).toBe(marks.length)
      const kinds = marks.map(({ diameter, shape, lengthMm }) => JSON.stringify([diameter, shape, lengthMm]))
      expect(new Set(kinds).size).toBe(marks.length)
      for (const { total, members } of marks) {
        expect(total).toBe(members.reduce((sum, { members: built, each }) => sum + built * each, 0))
        expect(members.every(({ total: own, members: built, each }) => own === built * each)).toBe(true)
      }
      const bars = sized[i]!.panels.flatMap(({ bars: runs }) => runs).filter(({ count }) => count > 0)
      expect(marks.flatMap(({ members }) => members)).toHaveLength(bars.length)
      expect(massKg).toBeCloseTo(
        totals.reduce((sum, each) => sum + each.massKg, 0),
        9,
      )
    })
  })

  it('has for every rib of the layout its bottom bars', () => {
    schedules.forEach(({ marks }, i) => {
      for (const { level, mark, layout } of sized[i]!.panels) {
        if (layout === null) continue
        const bottom = marks
          .flatMap(({ members }) => members)
          .filter((member) => member.level === level && member.panel === mark && member.position === 'bottom, along ribs')
        const isLapped = bottom.some(({ lengthWorking }) => lengthWorking.includes('lapped'))
        const bars = bottom.reduce((sum, { each }) => sum + each, 0)
        expect(bars).toBeGreaterThanOrEqual(layout.ribLines.length)
        if (!isLapped) expect(bars % layout.ribLines.length).toBe(0)
      }
    })
  })
})

it('weighs what the bill of Tarn Court weighs, to the kilogram', () => {
  const file = parseAppraisalFile(tarnCourt)
  const { appraisal, sized } = appraiseInFull(file)
  sized.forEach((scheme, i) => {
    const billed = appraisal.schemes[i]!.quantities.filter(({ item }) => item.startsWith('steel.bar.'))
    const { totals } = barSchedule(scheme, file.levels)
    expect(totals.map(({ massKg }) => Math.round(massKg))).toEqual(billed.map(({ net }) => Math.round(1000 * net)))
  })
})

describe('bars by hand', () => {
  const level = { ...levelOf({ outline: rectangle(0, 0, 6000, 5000), repeat: 3 }), repeat: 4 }
  const bars = [barRun(12, 26, 6000), barRun(10, 5, 1500), barRun(12, 4, 6000), barRun(12, 2, 3000)]
  const schedule = barSchedule(handSized(solidOf(150), [level], bars), [level])

  it('share a mark where they are alike, with members times each', () => {
    expect(schedule.marks.map(({ mark, diameter, lengthMm, total }) => [mark, diameter, lengthMm, total])).toEqual([
      ['01', 10, 1500, 60],
      ['02', 12, 6000, 360],
      ['03', 12, 3000, 24],
    ])
    expect(schedule.marks[1]!.members.map(({ members, each, total }) => [members, each, total])).toEqual([
      [12, 26, 312],
      [12, 4, 48],
    ])
  })

  it('weigh number times length times mass per metre', () => {
    expect(schedule.totals).toEqual([
      { diameter: 10, bars: 60, lengthM: 90, massKg: expect.closeTo(90 * 0.616, 9) },
      { diameter: 12, bars: 384, lengthM: 2232, massKg: expect.closeTo(2232 * 0.888, 9) },
    ])
    expect(schedule.massKg).toBeCloseTo(90 * 0.616 + 2232 * 0.888, 9)
  })

  it('are refused where the scheme was sized over other levels', () => {
    expect(() => barSchedule(handSized(solidOf(150), [level], bars), [{ ...level, mark: 'L9' }])).toThrow(/expected panel L1 P1/)
  })
})
