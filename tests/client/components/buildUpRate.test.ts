import { flushPromises } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { defineComponent, h, ref } from 'vue'
import type { ItemCode } from '#shared/contracts/appraisal'
import { buildUp } from '#shared/contracts/buildUp'
import type { OpenedRate } from '#shared/contracts/openedRate'
import BuildUpRateDialog from '../../../src/components/buildUp/BuildUpRateDialog.vue'
import { priceAgeInWords } from '../../../src/components/resource/priceAgeInWords'
import { useSessionStore } from '../../../src/stores/session'
import { failing, fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { aSession } from '../../support/projectSheetOf'
import { aDraft, aGang, aResource } from '../../support/samplePriceAnswers'
import { byRole, describedBy, type } from '../../support/screen'

const edition = aDraft()
const at = `/api/editions/${edition.id}`
const helper = aResource({
  code: 'HELPER',
  kind: 'labour',
  unit: 'h',
  description: 'Helper',
  price: { low: '4', likely: '4', high: '5' },
})
const made = buildUp.parse({
  materials: [{ resource: 'HC 200', quantity: '1', wastePercent: '5', isBlock: true }],
  labour: [{ gang: 'gang.blocks', basis: 'output', value: '40', source: 'site diary' }],
  plant: [],
})
const three = (text: string) => ({ low: text, likely: text, high: text })
const opened: OpenedRate = {
  currency: 'USD',
  rate: { ...edition.rates.find(({ item }) => item === 'blocks.whole')!, buildUp: made, version: 7 },
  built: {
    lines: [
      {
        ...{ kind: 'material', code: 'HC 200', name: 'Hollow block 400 × 200', expression: '1 nr × 0.8 × (1 + 5 %)' },
        ...three('0.8400'),
        ...{ source: '', inputs: ['HC 200'] },
      },
      {
        ...{ kind: 'labour', code: 'gang.blocks', name: 'One helper', expression: '(1 × 4) ÷ 40 an hour' },
        ...three('0.1000'),
        ...{ source: 'site diary', inputs: ['HELPER'] },
      },
    ],
    ...{ net: three('0.9400'), overheads: three('0.0000'), profit: three('0.0000'), price: three('0.94') },
    resources: [aResource({ sourceDate: '2024-01-05' }), helper],
    gangs: [aGang()],
    chosen: [],
  },
}

async function open(answers: Parameters<typeof fakeApi>[0] = {}, mayEdit = true, item: ItemCode = 'blocks.whole') {
  const api = fakeApi({
    [`GET ${at}/build-up/blocks.whole`]: () => ({ status: 200, json: opened }),
    [`GET ${at}/gangs`]: () => ({ status: 200, json: [aGang()] }),
    ...answers,
  })
  const changed = vi.fn()
  const host = defineComponent(() => {
    const shown = ref<ItemCode | null>(item)
    return () =>
      h(BuildUpRateDialog, {
        ...{ modelValue: shown.value, edition, mayEdit, onChanged: changed },
        'onUpdate:modelValue': (next: ItemCode | null) => (shown.value = next),
      })
  })
  const pinia = createPinia()
  useSessionStore(pinia).session = aSession('estimator')
  await mountView(host, '/view', {}, pinia)
  await flushPromises()
  const text = () => document.body.textContent.replace(/\s+/g, ' ')
  const click = async (name: string | RegExp) => {
    byRole('button', name).click()
    await flushPromises()
  }
  return { ...api, changed, text, click }
}

describe('a built-up rate on screen', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('is worked out anew with each figure that is typed, by line and in all', async () => {
    const { text } = await open()
    expect(text()).toContain('1 nr × 0.8 × (1 + 5 %) = 0.8400')
    type(byRole('textbox', 'Waste, %'), '10')
    type(byRole('textbox', 'Profit on both, %'), '5')
    await flushPromises()
    expect(text()).toContain('1 nr × 0.8 × (1 + 10 %) = 0.8800')
    expect(byRole('row', /^Rate/).textContent).toContain('1.03') // (0.88 + 0.1) × 1.05 = 1.029
  })

  it('says what is missing at its field, and sends nothing until it is there', async () => {
    const { click, calls, text } = await open({
      [`PUT ${at}/rates/blocks.whole`]: () => ({ status: 200, json: { ...opened.rate, version: 8 } }),
    })
    type(byRole('textbox', 'Output, nr/h'), 'many')
    await flushPromises()
    expect(text()).toContain('Not worked out yet: something is missing.')
    await click('Save the rate')
    expect(describedBy(byRole('textbox', 'Output, nr/h'))).toContain('expected a decimal number')
    expect(calls.every(({ method }) => method === 'GET')).toBe(true)
    type(byRole('textbox', 'Output, nr/h'), '32')
    await flushPromises()
    await click('Save the rate')
    const put = calls.find(({ method }) => method === 'PUT')!
    expect(put.headers.get('If-Match')).toBe('"7"')
    expect(put.body).toMatchObject({ price: null, buildUp: { labour: [{ value: '32', basis: 'output' }] } })
  })

  it('does not save a number of uses that cannot be read', async () => {
    const { click, calls } = await open()
    type(byRole('textbox', 'Uses'), '2.5')
    await flushPromises()
    await click('Save the rate')
    expect(describedBy(byRole('textbox', 'Uses'))).toContain('expected a whole number from 1 to 200')
    expect(calls.every(({ method }) => method === 'GET')).toBe(true)
  })

  it('shows what the server refuses at the line that it names', async () => {
    const issue = { path: 'buildUp.labour.0.gang', message: 'expected the code of a gang, got "gang.blocks"' }
    const { click } = await open({ [`PUT ${at}/rates/blocks.whole`]: () => failing(400, 'invalid_request', [issue]) })
    await click('Save the rate')
    const field = byRole('combobox', 'Gang').closest('.field')
    expect(field?.textContent).toContain('expected the code of a gang')
  })

  it('keeps both versions of a build-up that two estimators changed', async () => {
    const theirs = { ...opened, rate: { ...opened.rate, version: 8, description: 'Blocks, theirs' } }
    const { click, answers, text } = await open({ [`PUT ${at}/rates/blocks.whole`]: () => failing(412, 'stale') })
    answers[`GET ${at}/build-up/blocks.whole`] = () => ({ status: 200, json: theirs })
    type(byRole('textbox', 'Waste, %'), '7')
    await click('Save the rate')
    expect(byRole('row', /materials 1, waste, %/).textContent).toMatch(/7.*5/)
    expect(text()).toContain('Blocks, theirs')
    await click('Take theirs')
    expect((byRole('textbox', 'Description') as HTMLInputElement).value).toBe('Blocks, theirs')
    expect((byRole('textbox', 'Waste, %') as HTMLInputElement).value).toBe('5')
  })

  it('gives a rate to an item that has none', async () => {
    const { click, calls, changed } = await open(
      { [`POST ${at}/rates/steel.bar.6`]: () => ({ status: 201, json: { ...opened.rate, item: 'steel.bar.6', buildUp: null } }) },
      true,
      'steel.bar.6',
    )
    for (const level of ['Low', 'Likely', 'High']) type(byRole('textbox', `${level}, USD`), '1,500')
    await flushPromises()
    await click('Add the rate')
    expect(calls.find(({ method }) => method === 'POST')?.body).toMatchObject({ unit: 't', price: three('1500'), buildUp: null })
    expect(changed).toHaveBeenCalledOnce()
  })

  it('is to read for who may not edit: lines, sources, days and old prices in words', async () => {
    const { text } = await open({}, false)
    expect(document.querySelector('[role=dialog] form')).toBeNull()
    expect(text()).toContain('Price: Price list, 5 January 2024')
    expect(text()).toContain('Ask again: price of 5 January 2024, older than a year')
    expect(text()).toContain('Amount: site diary')
    expect(document.querySelector('[role=img]')?.getAttribute('aria-label')).toBe('Hollow block 400 × 200 89%, One helper 11%')
  })
})

describe('the age of a price', () => {
  it.each([
    ['2025-11-30', null, 'price of 30 November 2025, older than a year'],
    ['2025-12-01', null, null],
    [null, null, null],
    ['2026-08-01', '2026-11-30', 'the quotation ran out on 30 November 2026'],
    ['2026-08-01', '2026-12-01', null],
  ])('of %s, holding until %s, reads %s on 1 December 2026', (sourceDate, validUntil, words) => {
    expect(priceAgeInWords({ sourceDate, validUntil }, '2026-12-01')).toBe(words)
  })
})
