import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import BillView from '../../../src/views/BillView.vue'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { byRole } from '../../support/screen'

const cents = (row: Element) => Number(row.lastElementChild!.textContent.replace(/[^\d]/g, ''))
const text = () => document.body.textContent.replace(/\s+/g, ' ')

describe('BillView', () => {
  let unmount = () => {}
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function shown(sheet = aPricedSheet()) {
    const opened = await openSheet(BillView, sheet)
    unmount = opened.unmount
    return opened
  }

  it('adds up on paper, from lines to sections to the total', async () => {
    await shown()
    const bodies = [...document.querySelectorAll('.bill tbody')]
    const sections = bodies.map((body) => {
      const rows = [...body.querySelectorAll('tr:not(.group)')]
      const lines = rows.slice(0, -1).map(cents)
      expect(lines.reduce((sum, line) => sum + line, 0)).toBe(cents(rows.at(-1)!))
      return cents(rows.at(-1)!)
    })
    const measured = cents(byRole('row', /^Measured work/))
    expect(sections.reduce((sum, section) => sum + section, 0)).toBe(measured)
    const markups = [byRole('row', /^Preliminaries, 10 %/), byRole('row', /^Contingency, 5 %/), byRole('row', /^Tax, 0 %/)].map(
      cents,
    )
    expect(measured + markups.reduce((sum, markup) => sum + markup, 0)).toBe(cents(byRole('row', /^Floors, ribbed R1/)))
  })

  it('gives each rate with the edition and its source, and at least the cents', async () => {
    await shown()
    const row = byRole('row', /^Formwork to soffits/).textContent.replace(/\s+/g, ' ')
    expect(row).toContain('21.40')
    expect(row).toContain('edition 4, agreed')
  })

  it('bills the scheme that is chosen', async () => {
    await shown()
    const [, solid] = [...document.querySelectorAll<HTMLInputElement>('input[type=radio]')]
    solid!.click()
    await flushPromises()
    expect(byRole('row', /^Floors, solid S1/)).toBeTruthy()
    expect(text()).not.toContain('Hollow blocks')
  })

  it('names what is measured but has no rate, and keeps it out of the total', async () => {
    await shown(aPricedSheet(['propping.area']))
    expect(text()).toMatch(/Not in the total: propping, [\d.,]+ m²\./)
    expect([...document.querySelectorAll('.bill td')].map((cell) => cell.textContent)).not.toContain('Propping')
  })

  it('says how to choose an edition when there is none', async () => {
    const sheet = aPricedSheet()
    await shown({ ...sheet, project: { ...sheet.project, editionId: null }, edition: null })
    expect(text()).toContain('No edition of a rate book is chosen')
    expect(byRole('link', 'Choose a region and edition in the brief').getAttribute('href')).toContain('brief')
  })
})
