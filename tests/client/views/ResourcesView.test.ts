import { flushPromises } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { EditionWithRates } from '#shared/contracts/rateBook'
import { useSessionStore } from '../../../src/stores/session'
import ResourcesView from '../../../src/views/ResourcesView.vue'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { aSession } from '../../support/projectSheetOf'
import { aDraft, aGang, aMove, aQuotation, aResource, aSheetOf } from '../../support/samplePriceAnswers'
import { allByRole, byRole, describedBy, type } from '../../support/screen'

const answer =
  (json: unknown, status = 200) =>
  () => ({ status, json })
const dated = { now: new Date('2026-12-01T12:00:00Z'), toFake: ['Date' as const, 'setTimeout' as const, 'clearTimeout' as const] }

async function open(answers: Parameters<typeof fakeApi>[0] = {}, edition: EditionWithRates = aDraft()) {
  const at = `/api/editions/${edition.id}`
  const [code, other] = ['HC%20200', aResource({ code: 'TIMBER', description: 'Softwood', sourceDate: '2025-06-16' })]
  const page = { resources: [aResource(), other], page: 1, total: 2 }
  const api = fakeApi({
    [`GET ${at}`]: answer(edition),
    [`GET ${at}/gangs`]: answer([aGang()]),
    [`GET ${at}/resources?search=&page=1`]: answer(page),
    [`GET ${at}/resources/${code}`]: answer(aSheetOf(aResource(), [aQuotation()])),
    ...Object.fromEntries(Object.entries(answers).map(([key, value]) => [key.replace(' /', ` ${at}/`), value])),
  })
  const pinia = createPinia()
  useSessionStore(pinia).session = aSession('estimator')
  await mountView(ResourcesView, '/view', { editionId: edition.id }, pinia)
  const text = () => document.body.textContent.replace(/\s+/g, ' ')
  const click = async (name: string | RegExp) => {
    await vi.advanceTimersByTimeAsync(10) // a listener hears only what happens after it was put there
    byRole('button', name).click()
    await flushPromises()
  }
  return { ...api, at, text, click }
}

describe('ResourcesView', () => {
  beforeEach(() => void vi.useFakeTimers(dated))
  afterEach(() => {
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  it('lists resources and says which price should be asked for again', async () => {
    await open()
    expect(byRole('row', /TIMBER/).textContent).toContain('price of 16 June 2025, older than a year')
    expect(byRole('row', /HC 200/).textContent).not.toContain('older')
    expect(byRole('row', /gang\.blocks/).textContent).toContain('1 × HELPER')
  })

  it('searches on the server, after a pause, from the first page', async () => {
    const found = { resources: [aResource()], page: 1, total: 1 }
    const { calls, at } = await open({ 'GET /resources?search=hollow&page=1': answer(found) })
    type(byRole('textbox', 'Search in codes and descriptions'), 'hol')
    await vi.advanceTimersByTimeAsync(100)
    type(byRole('textbox', 'Search in codes and descriptions'), 'hollow')
    await vi.advanceTimersByTimeAsync(300)
    await flushPromises()
    expect(calls.filter(({ path }) => path.includes('search=hol')).map(({ path }) => path)).toEqual([
      `${at}/resources?search=hollow&page=1`,
    ])
    expect(allByRole('row', /TIMBER/)).toEqual([])
  })

  it('pages through a long list', async () => {
    const many = { resources: [aResource()], page: 1, total: 250 }
    const { click, text } = await open({
      'GET /resources?search=&page=1': answer(many),
      'GET /resources?search=&page=2': answer({ ...many, resources: [aResource({ code: 'X 101' })], page: 2 }),
    })
    expect(text()).toContain('1 to 100 of 250')
    await click('Next page')
    expect(text()).toContain('101 to 200 of 250')
    expect(allByRole('button', 'X 101')).toHaveLength(1)
  })

  it('opens a resource with what rests on it, and suppliers side by side', async () => {
    const dearer = aQuotation({
      id: '00000000-0000-4000-8000-000000000072',
      supplier: 'Late kiln',
      price: '105',
      validUntil: '2026-11-15',
    })
    const { click, text } = await open({
      'GET /resources/HC%20200': answer(
        aSheetOf(aResource({ hasChosenQuotation: true }), [aQuotation({ isChosen: true }), dearer]),
      ),
    })
    await click('HC 200')
    expect(text()).toContain('What rests on itHollow blocks, whole')
    expect(byRole('row', /Late kiln/).textContent).toMatch(/the quotation ran out on 15 November 2026.*0\.875.*\+9\.4%/s)
    expect(byRole('row', /First kiln/).className).toContain('selected')
  })

  it('shows which rates move and by how much before a change is saved, and saves over the version it has seen', async () => {
    const { click, calls, text } = await open({
      'POST /resources/HC%20200/preview': answer([aMove()]),
      'PUT /resources/HC%20200': answer(aResource({ version: 4 })),
    })
    await click('HC 200')
    await click('Change it')
    type(byRole('textbox', 'Likely price, USD'), '0.89')
    await click('Save')
    expect(text()).toContain('Nothing is saved yet. One rate moves with this:')
    expect(byRole('row', /Hollow blocks laid/).textContent).toMatch(/0\.98.*1\.10.*\+12\.2%/s)
    expect(calls.some(({ method }) => method === 'PUT')).toBe(false)
    await click('Save, and move the rate')
    const put = calls.find(({ method }) => method === 'PUT')!
    expect(put.headers.get('If-Match')).toBe('"3"')
    expect(put.body).toMatchObject({ code: 'HC 200', price: { low: '0.7', likely: '0.89', high: '0.9' } })
    expect(document.querySelector('[role=dialog] form')).toBeNull()
  })

  it('says at the field what is wrong, and sends nothing', async () => {
    const { click, calls } = await open()
    await click('HC 200')
    await click('Change it')
    type(byRole('textbox', 'Low price, USD'), '0.85')
    type(byRole('textbox', 'High price, USD'), 'dear')
    await click('Save')
    expect(describedBy(byRole('textbox', 'High price, USD'))).toContain('expected a decimal number')
    type(byRole('textbox', 'High price, USD'), '0.9')
    await flushPromises()
    expect(describedBy(byRole('textbox', 'Low price, USD'))).toContain('expected at most the likely price')
    expect(calls.every(({ method }) => method === 'GET')).toBe(true)
  })

  it('keeps what was typed when somebody else saved meanwhile, shows both, and goes on with the one that is chosen', async () => {
    const { click, calls, answers, at } = await open({
      'POST /resources/HC%20200/preview': answer([]),
      'PUT /resources/HC%20200': ({ headers }) =>
        headers.get('If-Match') === '"4"' ? { status: 200, json: aResource({ version: 5 }) } : failing(412, 'stale'),
    })
    await click('HC 200')
    await click('Change it')
    const theirs = aResource({ version: 4, price: { low: '0.7', likely: '0.75', high: '0.9' } })
    answers[`GET ${at}/resources/HC%20200`] = answer(aSheetOf(theirs))
    type(byRole('textbox', 'Likely price, USD'), '0.89')
    await click('Save')
    expect(byRole('row', /price, likely/).textContent).toMatch(/0\.89.*0\.75/)
    expect((byRole('textbox', 'Likely price, USD') as HTMLInputElement).value).toBe('0.89')
    await click('Keep mine')
    const puts = calls.filter(({ method }) => method === 'PUT')
    expect(puts.map(({ headers }) => headers.get('If-Match'))).toEqual(['"3"', '"4"'])
    expect(puts[1]!.body).toMatchObject({ price: { likely: '0.89' } })
  })

  it('chooses a quotation once its effect on the rates was seen', async () => {
    const chosen = aSheetOf(aResource({ hasChosenQuotation: true, version: 4 }), [aQuotation({ isChosen: true })])
    const { click, calls, text } = await open({
      'POST /resources/HC%20200/choice/preview': answer([aMove()]),
      'PUT /resources/HC%20200/choice': answer(chosen),
    })
    await click('HC 200')
    await click('Choose First kiln')
    expect(text()).toContain('With this quotation these rates move')
    expect(calls.some(({ method }) => method === 'PUT')).toBe(false)
    await click('Choose it')
    expect(calls.find(({ method }) => method === 'PUT')?.body).toEqual({ quotation: aQuotation().id })
    expect(text()).toContain('Choose none, and type the price')
  })

  it('names what still rests on a resource that is to be removed', async () => {
    const { click, text } = await open({
      'DELETE /resources/HC%20200': () => failing(409, 'conflict', [{ path: 'code', message: 'got the rate of blocks.whole' }]),
    })
    await click('HC 200')
    await click('Remove HC 200')
    await click('Remove it')
    expect(text()).toContain('got the rate of blocks.whole')
  })

  it('is to read where the edition is fixed: nothing can be changed', async () => {
    const { click, text } = await open({}, aDraft({ state: 'published' }))
    await click('HC 200')
    expect(text()).toContain('this edition is published, and its prices stay as they are')
    for (const name of [/^Add/, /^Change/, /^Remove/, /^Choose/]) expect(allByRole('button', name)).toEqual([])
  })

  it('says why the list could not be fetched, and tries again', async () => {
    let isUp = false
    const page = { resources: [aResource()], page: 1, total: 1 }
    const { click, text } = await open({
      'GET /resources?search=&page=1': () => (isUp ? { status: 200, json: page } : failing(503, 'unavailable')),
    })
    expect(text()).toContain('The server cannot reach its database')
    isUp = true
    await click('Try again')
    expect(allByRole('button', 'HC 200')).toHaveLength(1)
  })
})
