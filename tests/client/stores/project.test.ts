import type { FullAppraisal } from '#shared/appraise'
import { createPinia, setActivePinia } from 'pinia'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { useProjectStore } from '../../../src/stores/project'
import { useSessionStore } from '../../../src/stores/session'
import { levelInputOf } from '../../../src/stores/sheetRow'
import { failing, fakeApi } from '../../support/fakeApi'
import { aSession, aSheet, levelId, projectId, ribbedId } from '../../support/projectSheetOf'
import { stillWorkers } from '../../support/stillWorker'

const LEVEL = `PUT /api/projects/${projectId}/levels/${levelId}`
const SHEET = `GET /api/projects/${projectId}`
const empty: FullAppraisal = {
  appraisal: { format: 'bothways.appraisal-result/1', schemes: [], comparison: null },
  sized: [],
  alsoCompared: [],
  scopeDifferences: [],
  problems: [],
}

describe('project store', () => {
  beforeEach(() => {
    vi.useFakeTimers()
    setActivePinia(createPinia())
  })
  afterEach(() => {
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function opened(answers: Parameters<typeof fakeApi>[0] = {}) {
    const workers = stillWorkers()
    const api = fakeApi({ [SHEET]: () => ({ status: 200, json: aSheet() }), ...answers })
    useSessionStore().session = aSession('surveyor')
    const store = useProjectStore()
    await store.open(projectId)
    await vi.advanceTimersByTimeAsync(1)
    return { store, api, worker: workers[0]! }
  }
  const renamed = (store: ReturnType<typeof useProjectStore>, name: string) =>
    store.changeLevel(levelId, { ...levelInputOf(store.levels[0]!), name })

  it('appraises what was opened and shows the answer', async () => {
    const { store, worker } = await opened()
    expect(worker.requests).toHaveLength(1)
    expect(store.isAppraising).toBe(true)
    worker.answer({ file: null, id: worker.requests[0]!.id, full: empty, problems: [] })
    expect(store.full).toEqual(empty)
    expect(store.isAppraising).toBe(false)
  })

  it('lets the latest appraisal win and never shows an older one', async () => {
    const { store, worker } = await opened({ [LEVEL]: () => 'no answer' })
    renamed(store, 'one')
    await vi.advanceTimersByTimeAsync(100)
    renamed(store, 'two')
    await vi.advanceTimersByTimeAsync(100)
    expect(worker.requests).toHaveLength(1)
    worker.answer({ file: null, id: worker.requests[0]!.id, full: empty, problems: [] })
    expect(store.full).toBeNull()
    expect(worker.requests).toHaveLength(2)
    worker.answer({
      file: null,
      id: worker.requests[1]!.id,
      full: empty,
      problems: [{ path: 'schemes.0.topping', message: 'thin' }],
    })
    expect(store.full).toEqual(empty)
    expect(store.problems).toEqual([{ path: 'schemes.0.topping', message: 'thin' }])
  })

  it('changes at once, saves over the version it has seen and takes the new one', async () => {
    const { store, api } = await opened({
      [LEVEL]: ({ body }) => ({ status: 200, json: { ...(body as object), id: levelId, version: 5, position: 1 } }),
    })
    renamed(store, 'Typical floor')
    expect(store.levels[0]?.name).toBe('Typical floor')
    expect(store.saving).toBe('unsaved')
    await vi.advanceTimersByTimeAsync(1000)
    expect(api.calls.at(-1)?.headers.get('If-Match')).toBe('"4"')
    expect(store.levels[0]?.version).toBe(5)
    expect(store.saving).toBe('saved')
  })

  it('keeps what is typed while the row is being saved', async () => {
    let finish: () => void = () => {}
    const { store } = await opened({
      [LEVEL]: async ({ body }) => {
        await new Promise<void>((resolve) => (finish = resolve))
        return { status: 200, json: { ...(body as object), id: levelId, version: 5, position: 1 } }
      },
    })
    renamed(store, 'one')
    await vi.advanceTimersByTimeAsync(700)
    renamed(store, 'two')
    finish()
    await vi.advanceTimersByTimeAsync(0)
    expect(store.levels[0]).toMatchObject({ name: 'two', version: 5 })
  })

  it('puts a refusal to its field by the path of the appraisal file', async () => {
    const { store } = await opened({
      [LEVEL]: () =>
        failing(422, 'out_of_scope', [{ path: 'panels.1.outline', message: 'expected an outline that does not cross' }]),
    })
    renamed(store, 'x')
    await vi.advanceTimersByTimeAsync(1000)
    expect(store.saving).toBe('failed')
    expect(store.problems).toEqual([{ path: 'levels.0.panels.1.outline', message: 'expected an outline that does not cross' }])
    renamed(store, 'y')
    expect(store.problems).toEqual([])
  })

  describe('when somebody else changed the row', () => {
    const theirs = () => {
      const sheet = aSheet()
      return { ...sheet, levels: [{ ...sheet.levels[0]!, name: 'Theirs', version: 9 }] }
    }
    async function inConflict() {
      let stored: () => unknown = () => aSheet()
      let tries = 0
      const given = await opened({
        [SHEET]: () => ({ status: 200, json: stored() }),
        [LEVEL]: ({ body }) =>
          ++tries === 1
            ? failing(412, 'stale')
            : { status: 200, json: { ...(body as object), id: levelId, version: 10, position: 1 } },
      })
      stored = theirs
      renamed(given.store, 'Mine')
      await vi.advanceTimersByTimeAsync(1000)
      return given
    }

    it('keeps both and saves nothing until one is chosen', async () => {
      const { store, api } = await inConflict()
      expect(store.saving).toBe('conflict')
      expect(store.levels[0]?.name).toBe('Mine')
      expect(store.conflict?.theirs?.row).toMatchObject({ name: 'Theirs', version: 9 })
      const calls = api.calls.length
      renamed(store, 'Mine still')
      await vi.advanceTimersByTimeAsync(10_000)
      expect(api.calls).toHaveLength(calls)
    })

    it('stores mine over theirs on request', async () => {
      const { store, api } = await inConflict()
      await store.keepMine()
      await vi.advanceTimersByTimeAsync(1000)
      expect(api.calls.at(-1)?.headers.get('If-Match')).toBe('"9"')
      expect(store.levels[0]).toMatchObject({ name: 'Mine', version: 10 })
      expect(store.saving).toBe('saved')
    })

    it('goes on from theirs on request', async () => {
      const { store } = await inConflict()
      await store.takeTheirs()
      expect(store.levels[0]).toMatchObject({ name: 'Theirs', version: 9 })
      expect(store.saving).toBe('saved')
      expect(store.conflict).toBeNull()
    })
  })

  it('removes a scheme over its newest version', async () => {
    const { store, api } = await opened({ [`DELETE /api/projects/${projectId}/schemes/${ribbedId}`]: () => ({ status: 204 }) })
    await store.removeScheme(ribbedId)
    expect(api.calls.at(-1)?.headers.get('If-Match')).toBe('"2"')
    expect(store.schemes.map(({ specification }) => specification.mark)).toEqual(['S1'])
  })

  it('gives a reader what the server appraised and sends nothing', async () => {
    const workers = stillWorkers()
    const { project, levels, schemes, edition } = aSheet()
    const { id, version, name, reference, place, use, brief, measurement, factors, updatedAt, updatedBy } = project
    const shown = { id, version, name, reference, place, use, brief, measurement, factors, updatedAt, updatedBy }
    const { region, number, currency, baseDate } = edition!
    const reading = {
      project: shown,
      scope: [],
      levels,
      schemes,
      edition: { region, number, currency, baseDate },
      appraisal: empty.appraisal,
    }
    const api = fakeApi({ [`GET /api/projects/${projectId}/reading`]: () => ({ status: 200, json: reading }) })
    useSessionStore().session = aSession('developer')
    const store = useProjectStore()
    await store.open(projectId)
    await vi.advanceTimersByTimeAsync(1)
    expect(store.full?.appraisal).toEqual(empty.appraisal)
    expect(workers[0]?.requests[0]?.file.rates).toBeUndefined()
    store.changeLevel(levelId, { ...levelInputOf(store.levels[0]!), name: 'no' })
    await vi.advanceTimersByTimeAsync(1000)
    expect(api.calls).toHaveLength(1)
  })
})
