import { describe, expect, it } from 'vitest'
import { comparisonMail } from '../../../server/mail/templates/comparisonMail'
import { reportContent } from '../../../server/reports/content/reportContent'
import { frozenExample } from '../reports/frozenExample'

/** What a reader sees of HTML: tags gone, entities read, white space folded. */
function seen(html: string): string {
  const text = html.replace(/<title>.*?<\/title>|<div style="display:none.*?<\/div>/gs, '').replace(/<[^>]*>/g, ' ')
  const entities: Record<string, string> = { '&lt;': '<', '&gt;': '>', '&quot;': '"', '&#39;': "'", '&nbsp;': ' ', '&amp;': '&' }
  return text.replace(/&\w+;|&#39;/g, (entity) => entities[entity] ?? entity).replace(/\s+/g, ' ')
}

describe('the mail that brings a comparison', () => {
  const frozen = frozenExample()
  const content = reportContent(frozen)
  const mail = comparisonMail(frozen)
  const html = seen(mail.html)
  const text = mail.text.replace(/\s+/g, ' ')

  it('answers first, in both bodies', () => {
    const answer = 'Ribbed costs 4,105 USD less than solid and weighs 18% less.'
    expect(mail.text).toContain(answer)
    expect(html).toContain(answer)
    expect(mail.subject).toBe('Tarn Court, TC-06: the floor built both ways')
  })

  it('carries the same figures, differences, facts and cautions in both bodies', () => {
    for (const { label, ribbed, solid } of content.figures) {
      for (const body of [html, text]) expect(body).toMatch(new RegExp(`${label}[^A-Z]*.*${ribbed}.*${solid}`))
    }
    for (const { label, amount } of content.bars) {
      expect(html).toContain(`${label} ${amount}`)
      expect(text).toContain(`${label} ${amount}`)
    }
    const sentences = [
      ...content.turning,
      ...content.better.solid.map((fact) => fact.text),
      ...content.basis.map((fact) => fact.text),
      ...content.leftOut,
      ...content.cautions,
    ]
    expect(sentences.length).toBeGreaterThan(20)
    for (const sentence of sentences) {
      expect(html).toContain(sentence)
      expect(text).toContain(sentence)
    }
  })

  it('needs nothing from outside and runs nothing', () => {
    expect(mail.html).not.toMatch(/https?:|<img|<script|<link|@import|url\(|<svg/i)
  })

  it('escapes whatever was typed', () => {
    const typed = '<img src=x onerror=alert(1)>'
    const attacked = comparisonMail(
      frozenExample({
        note: `${typed} </table>`,
        preparedBy: typed,
        firm: { name: typed, isDemo: false },
        recipient: { name: typed, email: 'client@example.test' },
        project: { ...frozen.project, name: typed, place: typed, reference: typed },
        edition: { ...frozen.edition, region: typed, taxBasis: typed },
        ribbed: { ...frozen.ribbed, name: typed },
      }),
    )
    expect(attacked.html).not.toContain('<img')
    expect(attacked.html.match(/&lt;img/g)?.length).toBeGreaterThan(8)
    expect(attacked.html.match(/<table/g)?.length).toBe(attacked.html.match(/<\/table>/g)?.length)
  })

  it('draws each difference to the side of the cheaper scheme, as long as its amount', () => {
    const widths = [...mail.html.matchAll(/<td width="(\d+)%" bgcolor="(#\w+)"/g)].map(([, width, colour]) => [
      colour,
      Number(width),
    ])
    expect(widths).toEqual([
      ['#b4532a', 95],
      ['#46606e', 100],
      ['#b4532a', 50],
      ['#46606e', 34],
      ['#b4532a', 3],
    ])
  })
})
