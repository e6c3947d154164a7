import { flushPromises } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { Role } from '#shared/contracts/person'
import { useSessionStore } from '../../../src/stores/session'
import BlocksView from '../../../src/views/BlocksView.vue'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { aSession } from '../../support/projectSheetOf'
import { sampleBlock } from '../../support/samplePrices'
import { allByRole, byRole, type } from '../../support/screen'

const stored = { ...sampleBlock({ priceCode: 'HB-K' }), id: '00000000-0000-4000-8000-000000000050', version: 3 }
const text = () => document.body.textContent.replace(/\s+/g, ' ')

describe('BlocksView', () => {
  let unmount = () => {}
  afterEach(() => {
    unmount()
    vi.unstubAllGlobals()
  })

  async function open(role: Role, answers: Parameters<typeof fakeApi>[0] = {}) {
    const api = fakeApi({ 'GET /api/blocks': () => ({ status: 200, json: [stored] }), ...answers })
    const pinia = createPinia()
    useSessionStore(pinia).session = aSession(role)
    ;({ unmount } = await mountView(BlocksView, '/view', {}, pinia))
    await flushPromises()
    return api
  }
  async function click(name: string) {
    byRole('button', name).click()
    await flushPromises()
  }

  it('shows each block with its size, its section drawn, and blocks per m²', async () => {
    await open('surveyor')
    const row = byRole('row', /HB 200/).textContent.replace(/\s+/g, ' ')
    expect(row).toContain('400 × 200 × 200')
    expect(row).toContain('9.62') // 1 / (0.2 × (0.4 + 0.12))
    expect(row).toContain('HB-K')
    expect(document.querySelector('td svg')!.getAttribute('aria-label')).toBe(
      'Section of the block, 400 wide, 200 high, fired clay',
    )
    for (const name of [/^Add/, /^Change/, /^Remove/]) expect(allByRole('button', name)).toEqual([])
  })

  it('changes a block for an estimator, a code left empty meaning none', async () => {
    const api = await open('estimator', {
      [`PUT /api/blocks/${stored.id}`]: ({ body }) => ({ status: 200, json: { ...stored, ...(body as object), version: 4 } }),
    })
    await click('Change HB 200')
    type(byRole('textbox', /^Price code/), '')
    type(byRole('textbox', /^Blocks on a pallet/), '96')
    await flushPromises()
    await click('Save')
    const put = api.calls.find(({ method }) => method === 'PUT')!
    expect(put.body).toEqual({ ...sampleBlock(), palletCount: 96, priceCode: null })
    expect(put.headers.get('if-match')).toContain('3')
  })

  it('says at the field what a block cannot be, and why one stays', async () => {
    const api = await open('estimator', {
      [`DELETE /api/blocks/${stored.id}`]: () =>
        failing(409, 'conflict', [{ path: 'id', message: '2 schemes are built with it' }]),
    })
    await click('Add a block')
    await click('Add the block')
    expect(api.calls.some(({ method }) => method === 'POST')).toBe(false)
    expect(text()).toContain('Something above is not as expected yet.')
    await click('Leave it')
    await click('Remove HB 200')
    await click('Remove it')
    expect(text()).toContain('2 schemes are built with it')
  })
})
