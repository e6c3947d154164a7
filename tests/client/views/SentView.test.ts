import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { Contact, Dispatch, DispatchInput } from '../../../shared/contracts/dispatch'
import SentView from '../../../src/views/SentView.vue'
import { failing } from '../../support/fakeApi'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { projectId, ribbedId, solidId } from '../../support/projectSheetOf'
import { byRole, describedBy, type } from '../../support/screen'

const PROJECT = `/api/projects/${projectId}`
const contact: Contact = { id: '00000000-0000-4000-8000-000000000060', name: 'Demo client', email: 'client@example.test' }
const dispatch: Dispatch = {
  id: '00000000-0000-4000-8000-000000000061',
  projectId,
  projectName: 'Tarn Court',
  contact,
  between: ['R1', 'S1'],
  note: '',
  state: 'queued',
  tries: 0,
  lastAnswer: null,
  messageId: '<1@example.test>',
  sentBy: 'A person',
  createdAt: '2026-12-01T10:00:00.000Z',
  sentAt: null,
  version: 1,
}
const text = () => document.body.textContent.replace(/\s+/g, ' ')

describe('SentView', () => {
  let unmount = () => {}
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function shown(answers: Parameters<typeof openSheet>[2] = {}, sheet = aPricedSheet()) {
    const opened = await openSheet(SentView, sheet, {
      [`GET ${PROJECT}/contacts`]: () => ({ status: 200, json: [] }),
      [`GET ${PROJECT}/dispatches`]: () => ({ status: 200, json: [] }),
      [`POST ${PROJECT}/contacts`]: () => ({ status: 201, json: contact }),
      [`POST ${PROJECT}/dispatches`]: ({ body }) => ({ status: 201, json: { ...dispatch, note: (body as DispatchInput).note } }),
      ...answers,
    })
    unmount = opened.unmount
    return opened
  }

  async function addContact(): Promise<void> {
    type(byRole('textbox', 'Name'), 'Demo client')
    type(byRole('textbox', 'E-mail'), 'client@example.test')
    byRole('button', 'Keep the contact').click()
    await flushPromises()
  }

  const posts = (calls: readonly { method: string; path: string }[]) =>
    calls.filter(({ method, path }) => method === 'POST' && path.endsWith('/dispatches'))

  it('adds a contact and sends the pair with a note, once', async () => {
    const { api, settle } = await shown()
    await addContact()
    type(byRole('textbox', 'A note to go with it'), '  As agreed. ')
    await flushPromises()
    expect(document.querySelector('[aria-label="What is sent"]')?.textContent).toContain('To Demo client, client@example.test')
    byRole('button', 'Send the comparison').click()
    await settle()
    const [sent, ...more] = posts(api.calls)
    expect(more).toEqual([])
    expect(api.calls.find((call) => call === sent)).toMatchObject({
      body: { contactId: contact.id, ribbedSchemeId: ribbedId, solidSchemeId: solidId, note: 'As agreed.' },
    })
    expect(document.querySelector('[role=status]')?.textContent).toContain('client@example.test')
    expect(byRole('row', /^queued/).textContent).toContain('Demo client')
  })

  it('keeps the key of a sending whose answer was lost, and takes another for another text', async () => {
    const { api, settle } = await shown({ [`POST ${PROJECT}/dispatches`]: () => 'no answer' })
    await addContact()
    const sendOnce = async () => {
      byRole('button', 'Send the comparison').click()
      await settle()
    }
    await sendOnce()
    expect(document.querySelector('[role=alert]')?.textContent).toContain('No answer from the server')
    await sendOnce()
    type(byRole('textbox', 'A note to go with it'), 'Another text')
    await sendOnce()
    const keys = api.calls
      .filter(({ path, method }) => method === 'POST' && path.endsWith('/dispatches'))
      .map(({ headers }) => headers.get('Idempotency-Key'))
    expect(keys[0]).toMatch(/^[0-9a-f-]{36}$/)
    expect(keys[1]).toBe(keys[0])
    expect(keys[2]).not.toBe(keys[0])
    expect((byRole('textbox', 'A note to go with it') as HTMLTextAreaElement).value).toBe('Another text')
  })

  it('asks for an address that is one before it asks the server', async () => {
    const { api } = await shown()
    type(byRole('textbox', 'Name'), 'Demo client')
    type(byRole('textbox', 'E-mail'), 'client@example.test, other@example.test')
    byRole('button', 'Keep the contact').click()
    await flushPromises()
    expect(describedBy(byRole('textbox', 'E-mail'))).toBe('expected one e-mail address, as name@example.com')
    expect(api.calls.some(({ method }) => method === 'POST')).toBe(false)
  })

  it('says in words why nothing can be sent yet', async () => {
    const sheet = aPricedSheet()
    await shown({}, { ...sheet, project: { ...sheet.project, editionId: null }, edition: null })
    expect((byRole('button', 'Send the comparison') as HTMLButtonElement).disabled).toBe(true)
    expect(text()).toContain('choose an edition of a rate book first')
  })

  it('says what the server has against sending it', async () => {
    const refusal = failing(422, 'out_of_scope', [{ path: 'levels', message: 'expected at least one level with a panel' }])
    const { settle } = await shown({ [`POST ${PROJECT}/dispatches`]: () => refusal })
    await addContact()
    byRole('button', 'Send the comparison').click()
    await settle()
    expect(document.querySelector('[role=alert]')?.textContent).toContain('expected at least one level with a panel')
  })

  it('looks again while something is queued, and stops when it is sent', async () => {
    const states: Dispatch[] = [dispatch, { ...dispatch, state: 'sent', tries: 1, sentAt: '2026-12-01T10:00:05.000Z' }]
    const { api, settle } = await shown({
      [`GET ${PROJECT}/dispatches`]: () => ({ status: 200, json: [states.length > 1 ? states.shift() : states[0]] }),
    })
    expect(byRole('row', /^queued/)).toBeTruthy()
    await settle(2500)
    expect(byRole('row', /^sent/).textContent).toContain('Accepted by the mail server')
    const asked = api.calls.length
    await settle(10_000)
    expect(api.calls).toHaveLength(asked)
  })

  it('tells a refusal with what the mail server said, and gives the report as PDF', async () => {
    const refused = { ...dispatch, state: 'refused', tries: 1, lastAnswer: '550 no such mailbox' }
    await shown({ [`GET ${PROJECT}/dispatches`]: () => ({ status: 200, json: [refused] }) })
    expect(byRole('row', /^refused/).textContent).toContain('550 no such mailbox')
    expect(byRole('link', 'PDF').getAttribute('href')).toBe(`/api/dispatches/${dispatch.id}/report.pdf`)
  })
})
