import { flushPromises } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { useSessionStore } from '../../../src/stores/session'
import ReceivedView from '../../../src/views/ReceivedView.vue'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { aSession, projectId } from '../../support/projectSheetOf'
import { byRole } from '../../support/screen'

const received = {
  id: '00000000-0000-4000-8000-000000000071',
  projectId,
  projectName: 'Tarn Court',
  contact: { id: '00000000-0000-4000-8000-000000000070', name: 'Demo client', email: 'person@example.test' },
  between: ['R1', 'S1'],
  note: 'As agreed.',
  state: 'sent',
  tries: 1,
  lastAnswer: null,
  messageId: '<1@example.test>',
  sentBy: 'Demo surveyor',
  createdAt: '2026-12-01T10:00:00.000Z',
  sentAt: '2026-12-01T10:00:05.000Z',
  version: 2,
}

describe('ReceivedView', () => {
  afterEach(() => vi.unstubAllGlobals())

  async function shown(answer: ReturnType<typeof failing>) {
    const api = fakeApi({ 'GET /api/dispatches': () => answer })
    const pinia = createPinia()
    useSessionStore(pinia).session = aSession('client')
    await mountView(ReceivedView, '/view', {}, pinia)
    return api
  }

  it('lists what was sent, with report and PDF', async () => {
    await shown({ status: 200, json: [received] })
    expect(byRole('heading', 'Tarn Court').parentElement?.textContent).toContain('sent by Demo surveyor on 1 December 2026')
    expect(byRole('link', 'Open the report').getAttribute('href')).toBe(`/api/dispatches/${received.id}/report.html`)
    expect(byRole('link', 'The PDF').getAttribute('href')).toBe(`/api/dispatches/${received.id}/report.pdf`)
  })

  it('says so when nothing was sent', async () => {
    await shown({ status: 200, json: [] })
    expect(document.body.textContent).toContain('Nothing was sent to person@example.test yet.')
  })

  it('tells a failure and tries again', async () => {
    const api = await shown(failing(503, 'unavailable'))
    expect(document.querySelector('[role=alert]')?.textContent).toContain('cannot reach its database')
    api.answers['GET /api/dispatches'] = () => ({ status: 200, json: [received] })
    byRole('button', 'Try again').click()
    await flushPromises()
    expect(byRole('heading', 'Tarn Court')).toBeTruthy()
  })
})
