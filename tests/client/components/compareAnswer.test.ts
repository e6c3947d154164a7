import { describe, expect, it } from 'vitest'
import { compareAnswer } from '../../../src/components/compare/compareAnswer'
import { plainText } from '../../../src/components/compare/phrase'
import { aCost, aResult } from '../../support/schemeResultOf'

const ribbed = aResult('ribbed', { depth: 250, deadLoad: { perArea: 4, total: 4000 }, cost: aCost('80030.08') })
const solid = aResult('solid', { depth: 200, deadLoad: { perArea: 5, total: 5000 }, cost: aCost('84134.67') })
const said = (pair: Parameters<typeof compareAnswer>[0]) => plainText(compareAnswer(pair))

describe('the sentence that answers', () => {
  it('names the cheaper floor, what it saves, its load and the deeper one', () => {
    expect(said({ ribbed, solid })).toBe('Ribbed costs $4,105 less than solid and weighs 20% less. Ribbed is 50 mm deeper.')
  })

  it('says so as plainly when solid is the cheaper one', () => {
    const dearer = { ...ribbed, cost: aCost('90000.00') }
    expect(said({ ribbed: dearer, solid })).toBe(
      'Solid costs $5,865 less than ribbed but weighs 25% more. Ribbed is 50 mm deeper.',
    )
  })

  it('calls equal totals the same', () => {
    expect(said({ ribbed: { ...ribbed, cost: solid.cost }, solid })).toBe(
      'Ribbed and solid cost the same; ribbed weighs 20% less. Ribbed is 50 mm deeper.',
    )
  })

  it('calls equal loads and depths the same', () => {
    const alike = { ...ribbed, depth: 200, deadLoad: solid.deadLoad }
    expect(said({ ribbed: alike, solid })).toBe('Ribbed costs $4,105 less than solid and weighs the same. Both are 200 mm deep.')
  })

  it('says failing checks first', () => {
    expect(said({ ribbed: { ...ribbed, passes: false }, solid })).toMatch(/^Ribbed does not pass its checks\. Ribbed costs/)
    expect(said({ ribbed: { ...ribbed, passes: false }, solid: { ...solid, passes: false } })).toMatch(/^Neither floor passes/)
  })

  it('promises no saving where nothing is priced', () => {
    const pair = { ribbed: { ...ribbed, cost: null }, solid: { ...solid, cost: null } }
    expect(said(pair)).toBe('Ribbed weighs 20% less than solid; neither is priced yet. Ribbed is 50 mm deeper.')
  })

  it('limits itself to what is priced where a rate is missing', () => {
    const partly = { ...ribbed, cost: aCost('80030.08', { unpriced: ['propping.area'] }) }
    expect(said({ ribbed: partly, solid })).toMatch(/^As far as they are priced, ribbed costs/)
  })

  it('keeps the cents of a small difference', () => {
    expect(said({ ribbed: { ...ribbed, cost: aCost('84134.17') }, solid })).toContain('costs $0.50 less')
  })

  it('colours only the words that mean a scheme', () => {
    expect(
      compareAnswer({ ribbed, solid })
        .filter(({ kind }) => kind)
        .map(({ kind, text }) => [kind, text]),
    ).toEqual([
      ['ribbed', 'Ribbed'],
      ['solid', 'solid'],
      ['ribbed', 'Ribbed'],
    ])
  })
})
