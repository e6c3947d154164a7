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

  it('names what the project prices otherwise, with reason, author and day, and no rate; nothing in what was sent before', () => {
    const own = { reason: 'quoted for this site.', author: 'A Surveyor', changedAt: '2026-11-30T10:00:00.000Z' }
    const overrides = [
      { item: 'formwork.soffit' as const, ...own },
      { item: 'steel.bar.12' as const, ...own, reason: 'tender' },
    ]
    expect(textOf(frozenExample({ overrides }), 'Rates of this project’s own')).toBe(
      'Formwork to soffits, quoted for this site (A Surveyor, 30 November 2026); 12 mm bars, tender (A Surveyor, 30 November 2026).',
    )
    expect(textOf(frozenExample(), 'Rates of this project’s own')).toBeUndefined()
  })

  it('tells every markup once, whatever it is charged by', () => {
    const markups = ['preliminaries', 'preliminariesFixed', 'preliminariesPerWeek', 'overheadsAndProfit', 'tax'] as const
    expect(textOf(frozenExample({ markups: [...markups] }), 'Markups')).toContain(
      'In both totals: preliminaries, overheads and profit and tax.',
    )
  })

  it('tells of moments moved and of exposure only where the brief asks for them', () => {
    const asked = frozenExample({ brief: { ...brief, redistribution: 20, exposure: 'XC3' } as typeof brief })
    expect(textOf(asked, 'Moments')).toContain('20 % of elastic support moments')
    expect(textOf(asked, 'Fire and cover')).toMatch(/, checked for exposure XC3\.$/)
    expect(textOf(frozenExample(), 'Moments')).toBeUndefined()
    expect(textOf(frozenExample(), 'Fire and cover')).not.toContain('exposure')
  })
})
