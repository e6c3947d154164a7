import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '#shared/appraise'
import { type AppraisalFileInput, appraisalFile } from '#shared/contracts/appraisal'
import { fireStanding } from '#shared/sizing/fireStanding'
import { computedFile } from '../support/richFiles'

const finding = (demand: number, capacity: number) => ({
  name: 'fire.size' as const,
  place: () => 'slab',
  clause: 'Table',
  demand,
  capacity,
  unit: 'mm',
  working: () => '',
})

describe('fire standing', () => {
  it('is the longest period before the first that fails, with what stops that one', () => {
    const standing = fireStanding((minutes) => [finding(minutes, 100)])
    expect(standing.minutes).toBe(90)
    expect(standing.limits).toEqual([expect.stringContaining('Table asks 120 mm, here 100 mm')])
  })

  it('is 0 where the shortest fails, and has no limit at the longest', () => {
    expect(fireStanding(() => [finding(200, 100)]).minutes).toBe(0)
    expect(fireStanding(() => [finding(50, 100)])).toEqual({ minutes: 240, limits: [] })
  })

  it.each([30, 60, 90, 120] as const)('agrees with the checks of a brief that asks %i minutes', (fireMinutes) => {
    const thickness = { mark: 'S1', kind: 'solid', thickness: 150 } as const
    const input: AppraisalFileInput = {
      ...computedFile,
      brief: { ...computedFile.brief, fireMinutes },
      schemes: [computedFile.schemes[0]!, thickness],
    }
    for (const { panels } of appraiseInFull(appraisalFile.parse(input)).sized) {
      for (const { checks, fire } of panels) {
        const passes = checks.filter(({ name }) => name.startsWith('fire.')).every(({ pass }) => pass)
        expect(fire.minutes >= fireMinutes).toBe(passes)
      }
    }
  })
})
