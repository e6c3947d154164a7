import { flushPromises } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { useProjectStore } from '../../../src/stores/project'
import { useSessionStore } from '../../../src/stores/session'
import BriefView from '../../../src/views/BriefView.vue'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { aSession, aSheet, personId, projectId } from '../../support/projectSheetOf'
import { byRole, describedBy, type } from '../../support/screen'
import { stillWorkers } from '../../support/stillWorker'

const PROJECT = `/api/projects/${projectId}`
const readers = (isReader: boolean, version: number) => ({
  version,
  people: [{ id: personId, name: 'An engineer', email: 'engineer@example.test', roles: ['engineer'], isReader }],
})

describe('BriefView', () => {
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => {
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function shown(answers: Parameters<typeof fakeApi>[0] = {}) {
    stillWorkers()
    const api = fakeApi({
      [`GET ${PROJECT}`]: () => ({ status: 200, json: aSheet() }),
      [`GET ${PROJECT}/readers`]: () => ({ status: 200, json: readers(false, 1) }),
      [`PUT ${PROJECT}`]: ({ body }) => ({ status: 200, json: { ...aSheet().project, ...(body as object), version: 2 } }),
      'GET /api/rate-books': () => ({ status: 200, json: [] }),
      ...answers,
    })
    const pinia = createPinia()
    useSessionStore(pinia).session = aSession('surveyor')
    const store = useProjectStore(pinia)
    await store.open(projectId)
    await mountView(BriefView, '/view', {}, pinia)
    return { api, store }
  }

  it('changes a load at once and saves it over its version', async () => {
    const { api, store } = await shown()
    type(byRole('textbox', 'Imposed load, kN/m²'), '3.5')
    await flushPromises()
    expect(store.project?.brief.imposedLoad).toBe(3.5)
    expect(describedBy(byRole('textbox', 'Imposed load, kN/m²'))).toContain('typed otherwise')
    await vi.advanceTimersByTimeAsync(1000)
    const put = api.calls.find(({ method }) => method === 'PUT')
    expect(put?.headers.get('If-Match')).toBe('"1"')
    expect(put?.body).toMatchObject({ brief: { imposedLoad: 3.5 } })
    expect(document.querySelector('[role=status]')?.textContent).toContain('nothing waiting')
  })

  it('refuses a cover that the contract refuses and keeps what was typed', async () => {
    const { store } = await shown()
    type(byRole('textbox', /^Nominal cover/), '5')
    await flushPromises()
    expect(describedBy(byRole('textbox', /^Nominal cover/))).toBe('expected a number from 10 to 100')
    expect((byRole('textbox', /^Nominal cover/) as HTMLInputElement).value).toBe('5')
    expect(store.project?.brief.cover).toBe(25)
  })

  it('goes over to BS 8110 by the same class and steel, and keeps every other field', async () => {
    const { store } = await shown()
    const before = store.project!.brief
    if (before.basis !== 'EN1992') throw new Error('the sheet of the test is by EN 1992')
    byRole('combobox', 'Sized by').click()
    await flushPromises()
    ;[...document.querySelectorAll<HTMLElement>('[role=option]')]
      .find(({ textContent }) => textContent.includes('BS 8110'))!
      .click()
    await flushPromises()
    expect(store.project?.brief).toEqual(before)
    const cube = byRole('textbox', 'Concrete, cube strength fcu, MPa') as HTMLInputElement
    expect([before.fck, cube.value]).toEqual([25, '30'])
    type(byRole('textbox', 'Reinforcement, yield strength fy, MPa'), '460')
    await vi.advanceTimersByTimeAsync(1)
    byRole('button', 'Size by BS 8110-1:1997').click()
    await flushPromises()
    const { fck, fyk } = before
    const after = store.project!.brief
    expect(after).toMatchObject({ basis: 'BS8110', fcu: 30, fy: 460, nationalValues: {} })
    expect({ ...after, basis: 'EN1992', fcu: undefined, fy: undefined, fck, fyk }).toEqual(before)
    expect(document.body.textContent).toContain('BS 8110 was withdrawn in 2010; use it only where local practice still does.')
  })

  it('stores a nationally chosen value, and nothing once it is the recommended one again', async () => {
    const { store } = await shown()
    byRole('button', 'Nationally chosen values').click()
    await flushPromises()
    type(byRole('textbox', 'αcc, concrete in bending'), '1')
    await flushPromises()
    expect(store.project?.brief.nationalValues).toEqual({ alphaCc: 1 })
    expect(document.body.textContent).toContain('With αcc = 1; the other values recommended.')
    type(byRole('textbox', 'αcc, concrete in bending'), '0.85')
    await flushPromises()
    expect(store.project?.brief.nationalValues).toEqual({})
    ;(byRole('checkbox', 'Span to depth is capped at K times a value') as HTMLInputElement).click()
    await flushPromises()
    expect(store.project?.brief.nationalValues).toEqual({ greatestSpanDepth: 35 })
  })

  it('shows what the server refuses at its field', async () => {
    await shown({ [`PUT ${PROJECT}`]: () => failing(400, 'invalid_request', [{ path: 'name', message: 'expected a name' }]) })
    type(byRole('textbox', 'Name'), '')
    await vi.advanceTimersByTimeAsync(1000)
    await flushPromises()
    expect(describedBy(byRole('textbox', 'Name'))).toBe('expected a name')
  })

  it('shares the project with an engineer over the version of the list', async () => {
    const { api } = await shown({ [`PUT ${PROJECT}/readers`]: () => ({ status: 200, json: readers(true, 2) }) })
    const box = byRole('checkbox', 'An engineer') as HTMLInputElement
    box.click()
    await flushPromises()
    const put = api.calls.find(({ method, path }) => method === 'PUT' && path.endsWith('/readers'))
    expect(put?.headers.get('If-Match')).toBe('"1"')
    expect(put?.body).toEqual({ personIds: [personId] })
    expect((byRole('checkbox', 'An engineer') as HTMLInputElement).checked).toBe(true)
  })

  it('shows the list as it stands when somebody else changed the readers', async () => {
    let reads = 0
    await shown({
      [`GET ${PROJECT}/readers`]: () => ({ status: 200, json: readers(++reads > 1, reads) }),
      [`PUT ${PROJECT}/readers`]: () => failing(412, 'stale'),
    })
    ;(byRole('checkbox', 'An engineer') as HTMLInputElement).click()
    await flushPromises()
    expect(document.querySelector('[role=alert]')?.textContent).toContain('as it stands now')
    expect((byRole('checkbox', 'An engineer') as HTMLInputElement).checked).toBe(true)
  })
})
