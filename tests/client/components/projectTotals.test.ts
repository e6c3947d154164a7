import { describe, expect, it } from 'vitest'
import { formatAge } from '../../../src/components/base/formatMoment'
import { projectsInWords, projectTotals } from '../../../src/components/project/projectTotals'
import { aSummary } from '../../support/projectSheetOf'

const priced = (ribbed: string | null, solid: string | null) =>
  aSummary({
    totals: [
      { mark: 'R1', kind: 'ribbed', total: ribbed },
      { mark: 'S1', kind: 'solid', total: solid },
    ],
  })

describe('projectTotals', () => {
  it('takes the first of each kind and subtracts without a float', () => {
    expect(projectTotals(priced('0.3', '0.1'))).toEqual({ ribbed: '0.3', solid: '0.1', difference: '0.2', cheaper: 'solid' })
  })

  it('has no difference where one of them has no total', () => {
    expect(projectTotals(priced('1', null))).toMatchObject({ difference: null, cheaper: null })
  })
})

describe('projectsInWords', () => {
  it.each([
    [[priced('1', '2'), priced('1', '2'), priced('2', '1')], 'Ribbed costs less in two of three projects'],
    [[priced('2', '1'), priced('2', '1'), priced('1', null)], 'Solid costs less in both projects'],
    [[priced('1', '2')], 'Ribbed costs less in the one project priced'],
    [[priced('1', null), priced(null, null)], 'Two projects'],
  ])('says of the list %#', (projects, sentence) => {
    expect(projectsInWords(projects)).toBe(sentence)
  })
})

describe('formatAge', () => {
  const now = new Date('2026-12-01T09:00:00Z')
  it.each([
    ['2026-12-01', 'of today'],
    ['2026-11-30', '1 day old'],
    ['2026-09-01', '3 months old'],
    ['2026-09-02', '2 months old'],
    ['2024-11-30', '2 years old'],
    ['2027-01-01', 'for a day to come'],
  ])('writes the age of a price of %s as %s', (day, words) => {
    expect(formatAge(day, now)).toBe(words)
  })
})
