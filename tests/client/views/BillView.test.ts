import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { projectInputOf } from '../../../src/stores/sheetRow'
import BillView from '../../../src/views/BillView.vue'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { editionId, projectId } from '../../support/projectSheetOf'
import { byRole, type } from '../../support/screen'

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

  async function shown(sheet = aPricedSheet(), answers: Parameters<typeof openSheet>[2] = {}) {
    const opened = await openSheet(BillView, sheet, answers)
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

  it('shows a rate of the project’s own beside the edition’s, with reason, author and day, and prices by it', async () => {
    const own = {
      item: 'formwork.soffit',
      rate: '24.75',
      reason: 'quoted for this site',
      author: 'A person',
      version: 1,
    } as const
    await shown({ ...aPricedSheet(), overrides: [{ ...own, changedAt: '2026-11-30T10:00:00.000Z' }] })
    const row = byRole('row', /^Formwork to soffits/)
    expect(row.querySelector('del')!.textContent).toContain('21.40')
    const [quantity, amount] = [row.children[1]!.textContent, row.lastElementChild!.textContent].map((each) =>
      Number(each.replace(/[^\d.]/g, '')),
    )
    expect(Math.round(quantity! * 24.75 * 100)).toBe(Math.round(amount! * 100))
    expect(row.textContent).toMatch(/this project’s own, quoted for this site,\s+A person, 30 November 2026/)
  })

  it('opens how a rate is built up, and prices the item otherwise in this project', async () => {
    const sheet = aPricedSheet()
    const rate = sheet.edition!.rates.find(({ item }) => item === 'formwork.soffit')!
    const own = { item: 'formwork.soffit', author: 'A person', changedAt: '2026-11-30T10:00:00.000Z', version: 1 }
    const address = `/api/projects/${projectId}/overrides/formwork.soffit`
    const { api, settle } = await shown(sheet, {
      [`GET /api/editions/${editionId}/build-up/formwork.soffit`]: () => ({
        status: 200,
        json: { currency: 'USD', rate, built: null },
      }),
      [`POST ${address}`]: ({ body }) => ({ status: 201, json: { ...own, ...(body as object) } }),
    })
    byRole('row', /^Formwork to soffits/)
      .querySelector('button')!
      .click()
    await settle()
    expect(text()).toContain('A plain price, not built up. Source: agreed')
    type(byRole('textbox', /^Rate/), '24.75')
    type(byRole('textbox', /^Reason/), 'quoted for this site')
    await flushPromises()
    byRole('button', 'Price by this rate').click()
    await flushPromises()
    expect(api.calls.at(-1)).toMatchObject({ path: address, body: { rate: '24.75', reason: 'quoted for this site' } })
    await settle()
    expect(byRole('row', /^Formwork to soffits/).querySelector('del')!.textContent).toContain('21.40')
  })

  it('says what another edition moved, by which rate, down to the difference of the totals', async () => {
    const sheet = aPricedSheet()
    const other = '00000000-0000-4000-8000-000000000055'
    const rates = sheet.edition!.rates.map((rate) => (rate.item === 'formwork.soffit' ? { ...rate, likely: '24.75' } : rate))
    const { store, settle } = await shown(sheet, {
      [`GET /api/editions/${other}`]: () => ({ status: 200, json: { ...sheet.edition!, id: other, number: 5, rates } }),
      [`PUT /api/projects/${projectId}`]: ({ body }) => ({
        status: 200,
        json: { ...sheet.project, ...(body as object), version: 2 },
      }),
    })
    const before = cents(byRole('row', /^Floors, ribbed R1/))
    await store.changeProject({ ...projectInputOf(store.sheet!.project), editionId: other })
    await settle(5000)
    const [moves] = [...document.querySelectorAll('.moves tbody tr')].map((row) => row.textContent)
    expect(moves).toMatch(/Formwork to soffits\s*21\.40\s*24\.75/)
    const totals = [...document.querySelectorAll('tfoot .total')].map(cents)
    expect(totals[1]! - before).toBe(totals[0])
    const parts = [...document.querySelectorAll('.moves tbody tr')].map(cents)
    expect(parts.reduce((sum, part) => sum + part, 0)).toBe(totals[0])
    byRole('button', 'Put this away').click()
    await settle()
    expect(document.querySelector('.moves')).toBeNull()
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
