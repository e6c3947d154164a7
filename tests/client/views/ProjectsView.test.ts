import { flushPromises } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { useSessionStore } from '../../../src/stores/session'
import ProjectsView from '../../../src/views/ProjectsView.vue'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { aSession, aSheet, aSummary, bookId, projectId } from '../../support/projectSheetOf'
import { allByRole, byRole, describedBy, type } from '../../support/screen'
import type { Role } from '#shared/contracts/person'
import { createPinia } from 'pinia'

const { edition, project } = aSheet()
const plainEdition = Object.fromEntries(Object.entries(edition!).filter(([key]) => key !== 'rates' && key !== 'blockRates'))
const books = [{ id: bookId, region: 'Eastmere', currency: 'USD', editions: [plainEdition] }]

async function shown(answers: Parameters<typeof fakeApi>[0], role: Role) {
  const api = fakeApi({ 'GET /api/rate-books': () => ({ status: 200, json: books }), ...answers })
  const pinia = createPinia()
  useSessionStore(pinia).session = aSession(role)
  return { api, ...(await mountView(ProjectsView, '/view', {}, pinia)) }
}

describe('ProjectsView', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('opens with the answer and lists both totals with their difference', async () => {
    await shown({ 'GET /api/projects': () => ({ status: 200, json: [aSummary()] }) }, 'surveyor')
    expect(byRole('heading', /Ribbed costs less/).textContent).toBe('Ribbed costs less in the one project priced.')
    const row = byRole('row', /Tarn Court/)
    expect(row.textContent).toContain('80,030')
    expect(row.textContent).toContain('84,135')
    expect(row.textContent).toContain('−4,105')
    expect(row.textContent).toContain('ribbed better')
    expect(byRole('link', 'Tarn Court').getAttribute('href')).toBe(`/projects/${projectId}`)
  })

  it('gives an estimator names and totals without a way in', async () => {
    await shown({ 'GET /api/projects': () => ({ status: 200, json: [aSummary({ canOpen: false })] }) }, 'estimator')
    expect(byRole('row', /Tarn Court/).textContent).toContain('80,030')
    expect(allByRole('link', 'Tarn Court')).toEqual([])
    expect(allByRole('button', 'New project')).toEqual([])
  })

  it('tells how to begin when there is none', async () => {
    await shown({ 'GET /api/projects': () => ({ status: 200, json: [] }) }, 'surveyor')
    expect(byRole('heading', 'No project yet.').tagName).toBe('H1')
    expect(byRole('button', 'New project').tagName).toBe('BUTTON')
  })

  it('shows a failure where it was caused and tries again', async () => {
    let tries = 0
    await shown(
      { 'GET /api/projects': () => (++tries === 1 ? failing(503, 'unavailable') : { status: 200, json: [aSummary()] }) },
      'surveyor',
    )
    expect(document.querySelector('[role=alert]')?.textContent).toContain('cannot reach its database')
    byRole('button', 'Try again').click()
    await flushPromises()
    expect(byRole('row', /Tarn Court/).textContent).toContain('80,030')
  })

  it('starts a project once however often it is sent, and opens its brief', async () => {
    let tries = 0
    const { api, router } = await shown(
      {
        'GET /api/projects': () => ({ status: 200, json: [] }),
        'POST /api/projects': () => (++tries === 1 ? 'no answer' : { status: 201, json: project }),
      },
      'surveyor',
    )
    byRole('button', 'New project').click()
    await flushPromises()
    byRole('button', 'Start the project').click()
    await flushPromises()
    expect(describedBy(byRole('textbox', 'Name'))).toBe('expected a name of one line')
    type(byRole('textbox', 'Name'), 'Tarn Court')
    type(byRole('textbox', 'Reference'), 'TC-02')
    for (let times = 0; times < 2; times++) {
      byRole('button', 'Start the project').click()
      await flushPromises()
    }
    const posts = api.calls.filter(({ method }) => method === 'POST')
    expect(posts).toHaveLength(2)
    expect(new Set(posts.map(({ headers }) => headers.get('Idempotency-Key'))).size).toBe(1)
    expect(posts[1]?.body).toMatchObject({ name: 'Tarn Court', use: 'A', brief: { basis: 'EN1992', imposedLoad: 2 } })
    expect(router.currentRoute.value.fullPath).toBe(`/brief/${projectId}`)
  })
})
