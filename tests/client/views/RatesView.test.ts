import { flushPromises } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { Role } from '#shared/contracts/person'
import type { Edition, EditionWithRates } from '#shared/contracts/rateBook'
import { useSessionStore } from '../../../src/stores/session'
import RatesView from '../../../src/views/RatesView.vue'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { aSession } from '../../support/projectSheetOf'
import { aDraft } from '../../support/samplePriceAnswers'
import { allByRole, byRole, describedBy, type } from '../../support/screen'

const dated = { now: new Date('2026-12-01T12:00:00Z'), toFake: ['Date' as const, 'setTimeout' as const, 'clearTimeout' as const] }
const text = () => document.body.textContent.replace(/\s+/g, ' ')
const answer =
  (json: unknown, status = 200) =>
  () => ({ status, json })

/** An edition as lists and steps answer it. */
function withoutRates(edition: EditionWithRates): Edition {
  const listed: Partial<EditionWithRates> = { ...edition }
  delete listed.rates
  delete listed.blockRates
  return listed as Edition
}

async function open(edition: EditionWithRates, answers: Parameters<typeof fakeApi>[0] = {}, role: Role = 'estimator') {
  const listed = withoutRates(edition)
  const at = `/api/editions/${edition.id}`
  const book = { id: edition.bookId, region: edition.region, currency: edition.currency, editions: [listed] }
  const api = fakeApi({
    'GET /api/rate-books': answer([book]),
    [`GET ${at}`]: answer(edition),
    ...Object.fromEntries(Object.entries(answers).map(([key, value]) => [key.replace(' /edition', ` ${at}`), value])),
  })
  const pinia = createPinia()
  useSessionStore(pinia).session = aSession(role)
  await mountView(RatesView, '/view', {}, pinia)
  const click = async (name: string | RegExp, within: 'dialog' | 'page' = 'page') => {
    await vi.advanceTimersByTimeAsync(10)
    const found = allByRole('button', name).filter((one) => (one.closest('[role=dialog]') !== null) === (within === 'dialog'))
    expect(found).toHaveLength(1)
    found[0]!.click()
    await flushPromises()
  }
  return { ...api, listed, click }
}
const sent = (calls: readonly { method: string; body: unknown }[], method: string) =>
  calls.filter((call) => call.method === method).map(({ body }) => body)

describe('RatesView', () => {
  beforeEach(() => void vi.useFakeTimers(dated))
  afterEach(() => {
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  it('lets a reader read, and move nothing on', async () => {
    await open({ ...aDraft(), state: 'published' }, {}, 'surveyor')
    expect(text()).toContain('Edition 4, published')
    for (const name of ['Withdraw', 'New edition from this one', 'New rate book']) expect(allByRole('button', name)).toEqual([])
  })

  it('marks an edition as checked over the version it shows, by somebody else than its compiler', async () => {
    const { calls, listed, click } = await open(aDraft(), { 'POST /edition/steps': answer({ ...aDraft(), rates: undefined }) })
    await click('Mark as checked')
    await click('Mark as checked', 'dialog')
    const step = calls.find(({ path }) => path.endsWith('/steps'))!
    expect(step.body).toEqual({ step: 'check', reason: '' })
    expect(step.headers.get('If-Match')).toBe(`"${listed.version}"`)
  })

  it('says why a compiler cannot check', async () => {
    await open(aDraft({ isOwnWork: true }))
    const button = byRole('button', 'Mark as checked')
    expect((button as HTMLButtonElement).disabled).toBe(true)
    expect(describedBy(button)).toContain('somebody else does this')
  })

  it('wants a reason to withdraw, and says so at its field', async () => {
    const { calls, click } = await open({ ...aDraft(), state: 'published' }, { 'POST /edition/steps': answer(aDraft()) })
    await click('Withdraw')
    await click('Withdraw', 'dialog')
    const reason = byRole('textbox', 'Why it is withdrawn')
    expect(describedBy(reason)).toBe('expected a reason')
    type(reason, 'Wrong base date')
    await click('Withdraw', 'dialog')
    expect(sent(calls, 'POST')).toEqual([{ step: 'withdraw', reason: 'Wrong base date' }])
  })

  it('reads an edition again that somebody changed after it was shown', async () => {
    const { calls, click } = await open(aDraft(), { 'POST /edition/steps': () => failing(412, 'stale') })
    const before = calls.length
    await click('Mark as checked')
    await click('Mark as checked', 'dialog')
    expect(text()).toContain('Somebody changed this edition after you opened it')
    expect(calls.slice(before).map(({ method, path }) => `${method} ${path}`)).toContain('GET /api/rate-books')
  })

  it('begins a draft from an edition, and a correction only with what it puts right', async () => {
    const begun = { ...aDraft(), id: '00000000-0000-4000-8000-000000000077', number: 5 }
    const published = { ...aDraft(), state: 'published' as const }
    const { calls, click } = await open(published, {
      [`POST /api/rate-books/${published.bookId}/editions`]: answer(withoutRates(begun), 201),
    })
    await click('New edition from this one')
    byRole('checkbox', 'It puts edition 4 right').click()
    await flushPromises()
    await click('Begin the draft', 'dialog')
    const reason = byRole('textbox', 'What is put right')
    expect(describedBy(reason)).toBe('expected what is put right')
    type(reason, 'Mesh by the sheet')
    await click('Begin the draft', 'dialog')
    expect(sent(calls, 'POST')).toEqual([
      {
        ...{ from: published.id, isCorrection: true, reason: 'Mesh by the sheet' },
        particulars: { baseDate: '2026-12-01', validUntil: null, taxBasis: 'before tax', note: '', holdsOverheads: true },
      },
    ])
  })

  it('shows what somebody else stated beside what was typed, and loses nothing', async () => {
    const theirs = aDraft({ taxBasis: 'after tax', version: 8 })
    let tries = 0
    const { calls, answers, click } = await open(aDraft(), {
      'PUT /edition': () => (++tries === 1 ? failing(412, 'stale') : { status: 200, json: { ...theirs, rates: undefined } }),
    })
    await click('Change what is stated')
    type(byRole('textbox', 'Note'), 'Steel fell')
    answers[`GET /api/editions/${theirs.id}`] = answer(theirs)
    await click('Keep it', 'dialog')
    expect(text()).toContain('Both are kept; nothing you typed is lost.')
    expect(text()).toContain('after tax')
    await click('Keep mine', 'dialog')
    const puts = calls.filter(({ method }) => method === 'PUT')
    expect(puts.map(({ headers }) => headers.get('If-Match'))).toEqual(['"1"', '"8"'])
    expect(puts.at(-1)!.body).toMatchObject({ note: 'Steel fell', taxBasis: 'before tax' })
  })

  it('warns of prices that have run out or are old, and of what was withdrawn', async () => {
    await open({ ...aDraft(), state: 'withdrawn', stateReason: 'Wrong base date', validUntil: '2026-08-31' })
    expect(text()).toContain('Withdrawn: Wrong base date')
    expect(text()).toContain('Its prices held until 31 August 2026.')
    expect(text()).toContain('Its prices are 9 months old')
  })

  it('opens a book of a region, and says when there is one already', async () => {
    const { click } = await open(aDraft(), {
      'POST /api/rate-books': () => failing(409, 'conflict', [{ path: 'region', message: 'the firm has one already' }]),
    })
    await click('New rate book')
    await click('Open the book', 'dialog')
    expect(describedBy(byRole('textbox', 'Money'))).toContain('expected a code of three letters')
    type(byRole('textbox', 'Region'), 'Eastmere')
    type(byRole('textbox', 'Money'), 'usd')
    await click('Open the book', 'dialog')
    expect(describedBy(byRole('textbox', 'Region'))).toBe('the firm has one already')
  })
})
