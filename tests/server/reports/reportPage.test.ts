import { createHash } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import type { Check } from '../../../shared/contracts/appraisalResult'
import { besideTheCost } from '../../../server/reports/content/besideTheCost'
import { tightestChecks } from '../../../server/reports/content/tightestChecks'
import { soundByMassDb } from '../../../server/reports/content/soundByMass'
import { frozenComparison } from '../../../server/reports/frozenComparison'
import { reportPage } from '../../../server/reports/reportPage'
import { frozenExample } from './frozenExample'

const base = frozenExample()

describe('the report page', () => {
  it('is one document that asks for nothing from outside and runs nothing', () => {
    const { document } = reportPage(base)
    expect(document.match(/<script|<link|<img|@import|\s(src|href|on\w+)=/i)).toBeNull()
    expect([...document.matchAll(/url\(([^)]{0,20})/g)].map(([, address]) => address!.slice(0, 16))).toSatisfy(
      (addresses: string[]) => addresses.every((address) => address.startsWith('data:font/woff2') || address.startsWith('#')),
    )
  })

  it('names the hash of its style sheet', () => {
    const { document, styleHash } = reportPage(base)
    const style = /<style>([\s\S]*?)<\/style>/.exec(document)?.[1] ?? ''
    expect(createHash('sha256').update(style).digest('base64')).toBe(styleHash)
  })

  it('says everything in headings, tables and lists, both floors drawn', () => {
    const { document } = reportPage(base)
    expect(document.match(/<h1/g)).toHaveLength(1)
    const headings = [...document.matchAll(/<h2>(.*?)<\/h2>/g)].map(([, text]) => text)
    expect(headings).toEqual([
      'The two floors',
      'What each makes',
      'Where the difference comes from',
      'What would turn it',
      'Where solid is better',
      'What stands behind it',
      'What is left out',
      'Checks',
      'Before anyone builds',
    ])
    expect(document).toContain('class="drawing section-comparison"')
    for (const scheme of ['section-ribbed', 'section-solid']) expect(document).toContain(`class="${scheme}"`)
  })

  it('escapes whatever was typed, in elements, attributes and the style sheet', () => {
    const typed = `"</style><img src=x onerror=alert(1)>'}@import url(http://x)`
    const { document } = reportPage(
      frozenExample({
        note: typed,
        preparedBy: typed,
        firm: { name: typed, isDemo: true },
        recipient: { name: typed, email: 'client@example.test' },
        project: { ...base.project, name: typed, place: typed, reference: typed },
        edition: { ...base.edition, region: typed, taxBasis: typed },
        ribbed: { ...base.ribbed, name: typed },
        solid: { ...base.solid, name: typed },
      }),
    )
    expect(document.match(/<img/)).toBeNull()
    expect(document.match(/<\/style>/g)).toHaveLength(1)
    expect(/<style>([\s\S]*?)<\/style>/.exec(document)![1]!.match(/@import/)).toBeNull()
    expect(document.match(/&lt;img src=x/g)!.length).toBeGreaterThan(9)
  })

  it('carries the fonts of the scripts that its text is written in, and no others', () => {
    const fontsOf = (name: string) =>
      reportPage(frozenExample({ project: { ...base.project, name } })).document.match(/@font-face/g)!.length
    const plain = fontsOf('Tarn Court')
    expect(fontsOf('Тарн Корт')).toBeGreaterThan(plain)
    expect(plain).toBeLessThan(7)
  })

  it('reads back what was frozen, and refuses anything more', () => {
    const stored: unknown = JSON.parse(JSON.stringify(base))
    expect(reportPage(frozenComparison.parse(stored)).document).toBe(reportPage(base).document)
    expect(frozenComparison.safeParse({ ...base, rates: {} }).success).toBe(false)
  })

  it('lists failing checks as failing', () => {
    const checks = base.solid.checks.map((check) =>
      check.name === 'deflection' ? { ...check, utilisation: 1.2, pass: false } : check,
    )
    const { document } = reportPage(frozenExample({ solid: { ...base.solid, passes: false, failedCount: 1, checks } }))
    expect(document).toMatch(/<tr class="fails">\s*<th scope="row">Deflection<\/th>[\s\S]*?1\.20[\s\S]*?fails/)
    expect(document).toContain('1 of 70 checks fail')
  })
})

describe('what is said beside the cost', () => {
  const titles = (frozen: typeof base, kind: 'ribbed' | 'solid') => besideTheCost(frozen, kind).map(({ title }) => title)

  it('stands with the floor it favours', () => {
    expect(titles(base, 'solid')).toEqual(['Sound', 'Fire', 'Holes', 'Heavy things', 'Water', 'Height'])
    expect(titles(base, 'ribbed')).toEqual([])
    const heavier = {
      ...base.ribbed,
      depth: 180,
      deadLoad: { perArea: 6, total: 6 },
      checks: [{ ...base.ribbed.checks[3]!, utilisation: 0.2 }],
    }
    const turned = frozenExample({ ribbed: heavier })
    expect(titles(turned, 'ribbed')).toEqual(['Sound', 'Fire', 'Height'])
    expect(titles(turned, 'solid')).toEqual(['Holes', 'Heavy things', 'Water'])
    expect(reportPage(turned).document).toContain('<h2>Where ribbed is better</h2>')
  })

  it('gives no figure that was not asked for or is the same for both', () => {
    const same = frozenExample({
      ribbed: { ...base.ribbed, depth: base.solid.depth, deadLoad: base.solid.deadLoad },
      brief: { ...base.brief, fireMinutes: 0 },
    })
    expect([titles(same, 'solid'), titles(same, 'ribbed')]).toEqual([['Holes', 'Heavy things', 'Water'], []])
  })
})

describe('the checks that are told', () => {
  const check = (name: Check['name'], panel: string, utilisation: number, pass = utilisation <= 1): Check => ({
    ...base.solid.checks[0]!,
    name,
    panel,
    utilisation,
    pass,
  })

  it('are the tightest of each kind and every failing one', () => {
    const all = [
      check('shear', 'P1', 0.5),
      check('deflection', 'P1', 1.1),
      check('shear', 'P2', 0.8),
      check('deflection', 'P2', 1.3),
      check('deflection', 'P3', 0.9),
      check('fire.cover', 'P1', 0.7, false),
      check('fire.cover', 'P2', 0.9),
    ]
    expect(tightestChecks(all).map(({ name, panel }) => `${name} ${panel}`)).toEqual([
      'shear P2',
      'deflection P2',
      'fire.cover P1',
      'deflection P1',
    ])
  })
})

describe('sound by mass', () => {
  it('follows 37.5 lg m′ − 42 above 150 kg/m² and says nothing of lighter floors', () => {
    // 200 mm of reinforced concrete at 480 kg/m²: trade.md works out 58.5 dB
    expect(soundByMassDb((480 * 9.81) / 1000)).toBeCloseTo(58.5, 1)
    expect(soundByMassDb((150 * 9.81) / 1000)).toBeNull()
  })
})
