import { describe, expect, it } from 'vitest'
import { comparisonMail } from '../../../server/mail/templates/comparisonMail'
import { besideTheCost } from '../../../server/reports/content/besideTheCost'
import { leftOut } from '../../../server/reports/content/leftOut'
import { freezeAlsoRows, freezeScope } from '../../../server/reports/freezeBeside'
import { frozenComparison } from '../../../server/reports/frozenComparison'
import { reportPage } from '../../../server/reports/reportPage'
import type { AlsoCompared } from '../../../shared/alsoCompared/alsoCompared'
import { FIGURE_KEYS } from '../../../shared/alsoCompared/alsoFigure'
import { scopeDifferences } from '../../../shared/alsoCompared/scopeDifferences'
import type { ScopeDeclaration } from '../../../shared/contracts/sameScope'
import { frozenExample } from './frozenExample'

const VALUES = { ribbed: { soundAir: 49.21, deadLoadArea: 3.9 }, solid: { soundAir: 53.86, deadLoadArea: 4.8 } }

function compared(kind: 'ribbed' | 'solid'): AlsoCompared {
  const values: Partial<Record<string, number>> = VALUES[kind]
  const figures = FIGURE_KEYS.map((key) => ({
    key,
    value: values[key] ?? 1,
    working: `working of ${key}, ${kind}`,
    source: 'somewhere',
    lacks: [],
  }))
  return { mark: kind === 'ribbed' ? 'R1' : 'S1', kind, figures, scope: [] }
}

const scope: ScopeDeclaration[] = [
  { scheme: 'R1', entry: 'ceiling', state: 'priced', rate: '7.77', per: 'grossArea', note: 'plaster' },
  { scheme: 'S1', entry: 'ceiling', state: 'leftOut', note: 'painted <b>' },
  { scheme: 'R1', entry: 'hoisting', state: 'inRates', note: '' },
  { scheme: 'S1', entry: 'hoisting', state: 'inRates', note: '' },
]

/** As sent now, and as sent before anything was compared beside the cost. */
const before = frozenExample()
const now = frozenExample({
  alsoCompared: freezeAlsoRows(compared('ribbed'), compared('solid')),
  scope: freezeScope(scope, scopeDifferences(scope, ['R1', 'S1']), { ribbed: 'R1', solid: 'S1' }),
})
const textOf = (document: string) =>
  document
    .replace(/<style>[\s\S]*?<\/style>/, '')
    .replace(/<[^>]*>/g, ' ')
    .replace(/\s+/g, ' ')

describe('what is compared beside the cost', () => {
  it('stands in the page, the mail and its text: figures, the better in words, the worse of the ribbed floor', () => {
    const { html, text } = comparisonMail(now)
    for (const shown of [textOf(reportPage(now).document), textOf(html), text]) {
      expect(shown).toContain('Also compared')
      expect(shown).toContain('49.2')
      expect(shown).toContain('solid better')
      expect(shown).toContain('Airborne sound by mass, Rw: the ribbed floor is the worse one, 49.2 against 53.9 dB')
    }
  })

  it('opens to its formula, but never to the labour outputs of the firm', () => {
    const shown = textOf(reportPage(now).document)
    expect(shown).toContain('R1: working of soundAir, ribbed. S1: working of soundAir, solid. Source: somewhere.')
    expect(shown).not.toContain('working of labourHours')
  })

  it('tells of sound what the figures beside the cost tell', () => {
    const [sound] = besideTheCost(now, 'solid')
    expect(sound?.text).toContain('49 dB ribbed, 54 dB solid')
  })

  it('is absent from what was sent before, which still reads as it did', () => {
    const kept = frozenComparison.parse(JSON.parse(JSON.stringify(before)))
    expect(kept).toEqual(before)
    const { html, text } = comparisonMail(kept)
    for (const shown of [textOf(reportPage(kept).document), textOf(html), text]) {
      expect(shown).not.toContain('Also compared')
      expect(shown).not.toContain('Not like for like')
    }
    expect(leftOut(kept).join(' ')).toContain('Plaster or a ceiling, which hollow blocks need below')
  })
})

describe('scope in what is sent', () => {
  it('is flagged beside the totals, in the page, the mail and its text', () => {
    const { html, text } = comparisonMail(now)
    for (const shown of [textOf(reportPage(now).document), textOf(html), text]) {
      expect(shown).toContain('Not like for like in plaster or ceiling: priced for R1, left out for S1.')
      expect(shown).toContain('Of the same-scope list 11 entries are not declared.')
    }
  })

  it('tells what each total leaves out, with its reason escaped, and no rate', () => {
    const { document } = reportPage(now)
    expect(document).toContain('left out for S1 (painted &lt;b&gt;)')
    expect(JSON.stringify([now.alsoCompared, now.scope])).not.toContain('7.77')
    const left = leftOut(now)
    expect(left).toContain('Left out of the solid total, and held by the ribbed one: plaster or ceiling.')
    expect(left.join(' ')).not.toContain('hoisting')
  })

  it('survives being kept as JSON', () => {
    expect(frozenComparison.parse(JSON.parse(JSON.stringify(now)))).toEqual(now)
  })
})
