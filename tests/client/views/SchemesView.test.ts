import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { SchemeInput } from '../../../shared/contracts/project'
import { schemeInputOf } from '../../../src/stores/sheetRow'
import SchemesView from '../../../src/views/SchemesView.vue'
import { failing } from '../../support/fakeApi'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { projectId, ribbedId, solidId } from '../../support/projectSheetOf'
import { allByRole, byRole, describedBy, type } from '../../support/screen'

const SCHEMES = `/api/projects/${projectId}/schemes`
const block = {
  id: '00000000-0000-4000-8000-000000000050',
  code: 'HB-16',
  name: 'Hollow block 160',
  material: 'fired clay',
  length: 200,
  width: 400,
  height: 160,
  mass: 12,
  supplier: 'Clayworks',
  palletCount: 80,
  breakagePercent: '3',
  priceCode: null,
  version: 1,
}
const drawing = () => document.querySelector('.section-figure svg')!
const words = () => [...drawing().querySelectorAll('text')].map((node) => node.textContent)

describe('SchemesView', () => {
  let unmount = () => {}
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function shown(answers: Parameters<typeof openSheet>[2] = {}) {
    const opened = await openSheet(SchemesView, aPricedSheet(), {
      'GET /api/blocks': () => ({ status: 200, json: [block] }),
      [`PUT ${SCHEMES}/${ribbedId}`]: ({ body }) => ({
        status: 200,
        json: { ...aPricedSheet().schemes[0], ...(body as SchemeInput), version: 3 },
      }),
      [`POST ${SCHEMES}`]: ({ body }) => ({
        status: 201,
        json: { ...(body as SchemeInput), id: '00000000-0000-4000-8000-000000000077', version: 1, position: 3 },
      }),
      ...answers,
    })
    unmount = opened.unmount
    return opened
  }

  it('shows each scheme by its section, with depth and total', async () => {
    const { store } = await shown()
    const entry = byRole('button', /^R1 ribbed/)
    const total = Math.round(Number(store.full!.appraisal.schemes[0]!.cost!.total)).toLocaleString('en-GB')
    expect(entry.querySelector('svg')).not.toBeNull()
    expect(entry.textContent).toContain('250 mm')
    expect(entry.textContent).toContain(total)
  })

  it('draws the section anew while a size is typed, moves the total and saves over the version', async () => {
    const { api, store, settle } = await shown()
    expect(words()).toContain('120')
    const before = store.full!.appraisal.schemes[0]!.cost!.total
    type(byRole('textbox', 'Rib width, mm'), '150')
    await settle()
    expect(words()).toEqual(expect.arrayContaining(['150', 'ribs at 550']))
    expect(store.full!.appraisal.schemes[0]!.cost!.total).not.toBe(before)
    await settle(1000)
    const put = api.calls.find(({ method }) => method === 'PUT')
    expect(put?.headers.get('If-Match')).toBe('"2"')
    expect(put?.body).toMatchObject({ specification: { ribWidth: 150 } })
  })

  it('keeps a size that cannot be read, says what was expected, and stores nothing', async () => {
    const { api, store, settle } = await shown()
    type(byRole('textbox', 'Topping, mm'), 'fifty')
    await settle(1000)
    expect(describedBy(byRole('textbox', 'Topping, mm'))).toBe('expected a whole number from 0 to 500')
    expect((byRole('textbox', 'Topping, mm') as HTMLInputElement).value).toBe('fifty')
    expect(store.schemes[0]!.specification).toMatchObject({ topping: 50 })
    expect(api.calls.some(({ method }) => method === 'PUT')).toBe(false)
  })

  it('shows at its field what the engine refuses of it, and keeps the other floor', async () => {
    const { store, settle } = await shown()
    type(byRole('textbox', 'Edge strip, least, mm'), '5000')
    await settle()
    expect(describedBy(byRole('textbox', 'Block width, across the ribs, mm'))).toContain('one row of blocks needs 10400 mm')
    expect(byRole('button', /^R1 ribbed/).textContent).toContain('cannot be sized yet')
    expect(store.full?.appraisal.schemes.map(({ mark }) => mark)).toEqual(['S1'])
  })

  it('shows at the field what the server refuses', async () => {
    const { settle } = await shown({
      [`PUT ${SCHEMES}/${ribbedId}`]: () =>
        failing(409, 'conflict', [{ path: 'specification.mark', message: 'another scheme has this mark' }]),
    })
    type(byRole('textbox', 'Mark'), 'S1')
    await settle(1000)
    expect(describedBy(byRole('textbox', 'Mark'))).toBe('another scheme has this mark')
  })

  it('counts blocks and concrete of the field from the sizes', async () => {
    await shown()
    const facts = document.body.textContent.replace(/\s+/g, ' ')
    // 1 / (0.52 × 0.20) and 0.050 + 0.120 × 0.200 / 0.520
    expect(facts).toContain('9.6 /m²')
    expect(facts).toContain('0.096 m³/m²')
  })

  it('adds a ribbed scheme of a catalogue block under the next mark and opens it', async () => {
    const { api, store } = await shown()
    byRole('button', 'Add a ribbed scheme').click()
    await flushPromises()
    const post = api.calls.find(({ method }) => method === 'POST')
    expect(post?.headers.get('Idempotency-Key')).toMatch(/^[0-9a-f-]{36}$/)
    expect(post?.body).toMatchObject({
      blockId: block.id,
      specification: { mark: 'R2', kind: 'ribbed', block: { height: 160, mass: 12 } },
    })
    expect(store.schemes).toHaveLength(3)
    expect(byRole('button', /^R2/).getAttribute('aria-current')).toBe('true')
  })

  it('says why no ribbed scheme can be added while the catalogue cannot be read, and reads it again', async () => {
    const { api } = await shown({ 'GET /api/blocks': () => failing(503, 'unavailable') })
    expect((byRole('button', 'Add a ribbed scheme') as HTMLButtonElement).disabled).toBe(true)
    expect(document.body.textContent).toContain('the block catalogue could not be read')
    api.answers['GET /api/blocks'] = () => ({ status: 200, json: [block] })
    byRole('button', 'Read the catalogue again').click()
    await flushPromises()
    expect((byRole('button', 'Add a ribbed scheme') as HTMLButtonElement).disabled).toBe(false)
  })

  it('adds a solid scheme at the thickness that is cheapest, with a note of how it was found', async () => {
    const { api, settle } = await shown()
    byRole('button', 'Add a solid scheme').click()
    await settle()
    const { body } = api.calls.find(({ method, path }) => method === 'POST' && path === SCHEMES)!
    const { specification } = body as SchemeInput
    if (specification.kind !== 'solid') throw new Error('expected a solid scheme')
    expect(specification.thickness).toBeTypeOf('number')
    expect(specification.thicknessNote).toMatch(/cheapest of \d+ thicknesses/)
  })

  it('finds the cheapest thickness on request, and forgets its note when another is typed', async () => {
    const { store, settle } = await shown({
      [`PUT ${SCHEMES}/${solidId}`]: ({ body }) => ({
        status: 200,
        json: { ...aPricedSheet().schemes[1], ...(body as SchemeInput), version: 3 },
      }),
    })
    byRole('button', /^S1 solid/).click()
    await settle()
    byRole('button', 'Find the cheapest thickness').click()
    await settle()
    const specification = () => store.schemes[1]!.specification
    expect(specification()).toMatchObject({ thicknessNote: expect.stringContaining('cheapest of') as string })
    type(byRole('textbox', 'Thickness, given, mm'), '310')
    await settle()
    expect(specification()).toMatchObject({ thickness: 310 })
    expect(specification()).not.toHaveProperty('thicknessNote')
  })

  it('lets each panel have its least thickness', async () => {
    const { store, settle } = await shown()
    byRole('button', /^S1 solid/).click()
    await settle()
    store.changeScheme(solidId, {
      ...schemeInputOf(store.schemes[1]!),
      specification: { ...store.schemes[1]!.specification, thicknessPer: 'panel' } as SchemeInput['specification'],
    })
    await settle()
    expect(byRole('combobox', 'Thickness of the panels').closest('.el-select')?.textContent).toContain('the least of each panel')
  })

  it('takes a scheme out only after asking, over its version', async () => {
    const { api, store, settle } = await shown({ [`DELETE ${SCHEMES}/${solidId}`]: () => ({ status: 204 }) })
    byRole('button', /^S1 solid/).click()
    await flushPromises()
    byRole('button', 'Take out S1').click()
    await settle()
    expect(api.calls.some(({ method }) => method === 'DELETE')).toBe(false)
    byRole('button', 'Take it out').click()
    await settle()
    expect(api.calls.find(({ method }) => method === 'DELETE')?.headers.get('If-Match')).toBe('"2"')
    expect(store.schemes.map(({ id }) => id)).toEqual([ribbedId])
  })

  it('shows both totals beside the specification', async () => {
    await shown()
    const strip = document.querySelector('[role=status][aria-label="Both totals"]')
    expect(strip?.textContent).toContain('Ribbed R1')
    expect(strip?.textContent).toContain('Solid S1')
    expect(allByRole('heading', /^What R1 comes to/)).toHaveLength(1)
  })
})
