import { describe, expect, it } from 'vitest'
import { headline, sentenceText, standfirst } from '../../../server/reports/content/headline'
import { turningPoints, turningSentences } from '../../../server/reports/content/turningPoints'
import { frozenExample } from './frozenExample'

const base = frozenExample()
const costs = (ribbed: string, solid: string) =>
  frozenExample({ ribbed: { ...base.ribbed, total: ribbed }, solid: { ...base.solid, total: solid } })
const weighs = (ribbed: number, solid: number) =>
  frozenExample({
    ribbed: { ...base.ribbed, deadLoad: { perArea: ribbed, total: ribbed } },
    solid: { ...base.solid, deadLoad: { perArea: solid, total: solid } },
  })
const said = (frozen: typeof base) => sentenceText(headline(frozen))

describe('the sentence that answers', () => {
  it('says which costs less, by how much, and what it weighs', () => {
    expect(said(base)).toBe('Ribbed costs 4,105 USD less than solid and weighs 18% less.')
  })

  it('says so as plainly when solid is the cheaper', () => {
    expect(said(costs('84134.67', '80030.08'))).toBe('Solid costs 4,105 USD less than ribbed but weighs 22% more.')
  })

  it('says that both cost the same when they do as printed', () => {
    expect(said(costs('80030.08', '80030.40'))).toBe('Ribbed and solid cost the same, 80,030 USD; ribbed weighs 18% less.')
  })

  it('says that both weigh the same when they do as printed', () => {
    expect(said(weighs(4.99, 5))).toBe('Ribbed costs 4,105 USD less than solid and weighs the same.')
  })

  it('says first which checks fail', () => {
    const failing = frozenExample({ solid: { ...base.solid, passes: false, failedCount: 3 } })
    expect(said(failing)).toMatch(/^Solid fails 3 of its 70 checks\. Ribbed costs/)
    expect(standfirst(failing)).toContain('is not the cost of a floor that can be built')
    expect(standfirst(base)).not.toContain('fails')
  })

  it('colours the two schemes by name', () => {
    expect(headline(base).filter(({ scheme }) => scheme)).toEqual([
      { text: 'Ribbed', scheme: 'ribbed' },
      { text: 'solid', scheme: 'solid' },
    ])
  })
})

describe('the standfirst', () => {
  it('gives the difference as a share of the dearer floors, and which is deeper', () => {
    expect(standfirst(base)).toMatch(
      /^The difference is 4\.9% of what the solid floors cost\. Ribbed is 50 mm deeper on every floor\./,
    )
    expect(standfirst(costs('84134.67', '80030.08'))).toMatch(/^The difference is 4\.9% of what the ribbed floors cost\./)
  })
})

describe('what would turn it', () => {
  it('tells by how much the prices of a group must move for the totals to meet', () => {
    const [first, second] = turningPoints(base)
    // −D / s: D = 80030.08 − 84134.67 = −4104.59; concrete, bars and mesh −12659.17; blocks 8554.58
    expect(first!.percent).toBeCloseTo((100 * 4104.59) / -12659.17, 6)
    expect(second!.percent).toBeCloseTo((100 * 4104.59) / 8554.58, 6)
    expect([first!.text, second!.text]).toEqual([
      'If all prices of concrete, bars and mesh fell by more than 32%, solid would be the cheaper floor.',
      'If all prices of blocks and closing of their ends rose by more than 48%, solid would be the cheaper floor.',
    ])
  })

  it('tells nothing where prices would have to fall below zero, rise threefold, or where both cost the same', () => {
    const group = (sway: string) => frozenExample({ groups: [{ label: 'Concrete and bars', difference: '-1', sway }] })
    expect(turningPoints(group('-4000'))).toEqual([])
    expect(turningPoints(group('2000'))).toEqual([])
    expect(turningPoints(group('0'))).toEqual([])
    expect(turningPoints(costs('80030.08', '80030.40'))).toEqual([])
    expect(turningSentences(group('2000'))).toEqual([
      'No group of prices alone, falling to nothing or trebling, would make solid the cheaper floor.',
    ])
    expect(turningSentences(costs('80030.08', '80030.40'))).toEqual([])
  })
})
