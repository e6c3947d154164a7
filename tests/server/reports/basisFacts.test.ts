import { describe, expect, it } from 'vitest'
import { basisFacts } from '../../../server/reports/content/basisFacts'
import { frozenExample } from './frozenExample'

const { brief } = frozenExample()
const textOf = (frozen: Parameters<typeof basisFacts>[0], title: string) =>
  basisFacts(frozen).find((fact) => fact.title === title)?.text

describe('what the report rests on', () => {
  it('names the rules of measuring with their source, and nothing where they were not kept', () => {
    const measuredBy = { name: 'NRM2 section 11, as billed', source: 'RICS New Rules of Measurement 2 (2012)' }
    expect(textOf(frozenExample({ measuredBy }), 'Measured by')).toBe(
      'NRM2 section 11, as billed: RICS New Rules of Measurement 2 (2012).',
    )
    expect(textOf(frozenExample(), 'Measured by')).toBeUndefined()
  })

  it('tells of moments moved and of exposure only where the brief asks for them', () => {
    const asked = frozenExample({ brief: { ...brief, redistribution: 20, exposure: 'XC3' } as typeof brief })
    expect(textOf(asked, 'Moments')).toContain('20 % of elastic support moments')
    expect(textOf(asked, 'Fire and cover')).toMatch(/, checked for exposure XC3\.$/)
    expect(textOf(frozenExample(), 'Moments')).toBeUndefined()
    expect(textOf(frozenExample(), 'Fire and cover')).not.toContain('exposure')
  })
})
