import { flushPromises } from '@vue/test-utils'
import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it } from 'vitest'
import type { ImportRow, RateImport } from '../../../shared/contracts/rateImport'
import { useSessionStore } from '../../../src/stores/session'
import RateImportView from '../../../src/views/RateImportView.vue'
import { failing, fakeApi, type ApiCall } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'

const ID = '018f0000-0000-7000-8000-000000000001'
const EDITION = '018f0000-0000-7000-8000-000000000002'
const edition = {
  ...{ id: EDITION, bookId: ID, region: 'Eastmere', currency: 'USD', number: 5, state: 'draft', baseDate: '2026-10-01' },
  ...{ validUntil: null, compiledBy: 'E', checkedBy: null, taxBasis: 'without tax', note: '', holdsOverheads: true },
  ...{ reason: '', corrects: null, stateReason: '', isOwnWork: true, version: 1, rates: [] },
}
const read: RateImport = {
  ...{ id: ID, editionId: EDITION, fileName: 'kiln.xlsx', state: 'matching', progress: 1, failure: null, matching: null },
  ...{ counts: null, moves: null, createdAt: '2026-10-02T08:00:00.000Z', createdBy: 'Emma' },
  sheets: [
    {
      ...{ name: 'List', rowCount: 3, hiddenRowCount: 1, sample: [['Prices'], ['Code', 'Price'], ['A1', '1,50']] },
      proposed: { target: 'resources', headRow: 1, columns: { code: 0, likely: 1 }, decimalMark: ',' },
    },
  ],
}
const checked: RateImport = {
  ...read,
  state: 'previewed',
  counts: { new: 1, changed: 1, unchanged: 0, refused: 1, leftOut: 1 },
  moves: [],
}
const row = (change: Partial<ImportRow>): ImportRow => ({
  ...{ row: 3, state: 'refused', code: 'A1', before: null, after: null, reason: 'missing unit', note: null },
  ...change,
})
const page = () => document.body
const button = (name: RegExp) => [...page().querySelectorAll('button')].find(({ textContent }) => name.test(textContent ?? ''))
async function press(name: RegExp): Promise<void> {
  button(name)!.click()
  await flushPromises()
}

let calls: ApiCall[]
let answers: ReturnType<typeof fakeApi>['answers']
let current: RateImport
async function open(): Promise<void> {
  const pinia = createPinia()
  setActivePinia(pinia)
  useSessionStore().session = { person: { id: ID, name: 'Emma', email: 'e@example.test', roles: ['estimator'] } } as never
  await mountView(RateImportView, '/view', { editionId: EDITION }, pinia)
  await flushPromises()
}
beforeEach(() => {
  current = read
  const rows = () => ({ status: 200, json: { rows: [row({})], total: 1 } })
  ;({ calls, answers } = fakeApi({
    [`GET /api/editions/${EDITION}`]: () => ({ status: 200, json: edition }),
    [`GET /api/editions/${EDITION}/imports`]: () => ({ status: 200, json: [current] }),
    [`GET /api/imports/${ID}`]: () => ({ status: 200, json: current }),
    [`GET /api/imports/${ID}/rows?page=1&state=refused`]: rows,
    [`GET /api/imports/${ID}/rows?page=1`]: rows,
    [`PUT /api/imports/${ID}/matching`]: () => ({ status: 202, json: checked }),
    [`POST /api/imports/${ID}/commit`]: () => ({ status: 202, json: { ...checked, state: 'committed' } }),
    [`POST /api/imports/${ID}/undo`]: () => ({ status: 200, json: { ...checked, state: 'undone' } }),
  }))
})

describe('the sheet of price lists', () => {
  it('goes from the columns over the rows to the draft and back', async () => {
    await open()
    await press(/kiln\.xlsx/)
    expect(page().textContent).toContain('2 of 4. Match the columns')
    await press(/Check the rows/)
    expect(calls.find(({ method }) => method === 'PUT')!.body).toMatchObject({
      columns: { code: 0, likely: 1 },
      decimalMark: ',',
    })
    expect(page().textContent).toContain('missing unit')
    expect(button(/Put 2 rows in/)!.disabled).toBe(true)
    page().querySelector<HTMLInputElement>('input[type=checkbox]')!.click()
    await flushPromises()
    await press(/Put 2 rows in/)
    expect(calls.find(({ path }) => path.endsWith('/commit'))!.body).toEqual({ leaveOutRefused: true })
    expect(page().textContent).toContain('2 rows are put in')
    await press(/Undo this import/)
    expect(page().textContent).toContain('every row is as it was')
  })

  it('says why an undo is refused', async () => {
    current = { ...checked, state: 'committed' }
    answers[`POST /api/imports/${ID}/undo`] = () => failing(409, 'conflict')
    await open()
    await press(/kiln\.xlsx/)
    await press(/Undo this import/)
    expect(page().querySelector('[role=alert]')!.textContent).toContain('refused with conflict')
  })

  it('has the ways to take an edition away', async () => {
    await open()
    const addresses = [...page().querySelectorAll('a[download]')].map((link) => link.getAttribute('href'))
    expect(addresses[0]).toBe(`/api/editions/${EDITION}/workbook`)
    expect(addresses).toHaveLength(6)
  })
})
