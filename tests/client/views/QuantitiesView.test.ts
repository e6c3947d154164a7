import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { RULE_SETS } from '#shared/takeoff/ruleSets'
import QuantitiesView from '../../../src/views/QuantitiesView.vue'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { allByRole, byRole } from '../../support/screen'

const table = (caption: RegExp) =>
  [...document.querySelectorAll('table')].find((one) => caption.test(one.caption?.textContent.trim() ?? ''))
const numberOf = (shown: string) => Number(shown.replaceAll(',', '').replace('−', '-'))

describe('QuantitiesView', () => {
  let unmount = () => {}
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function shown(sheet = aPricedSheet()) {
    const opened = await openSheet(QuantitiesView, sheet)
    unmount = opened.unmount
    return opened
  }

  it('sets both schemes side by side, by work section', async () => {
    const { store } = await shown()
    const concrete = store.full!.appraisal.schemes.map(
      ({ quantities }) => quantities.find(({ item }) => item === 'concrete.slab')!.net,
    )
    expect(byRole('row', /^Concrete in slabs/).textContent.replace(/\s+/g, ' ')).toContain(
      concrete.map((net) => net.toFixed(2)).join(' '),
    )
    expect(allByRole('row', 'Reinforcement')).toHaveLength(1)
  })

  it('opens a figure to parts that add up to it, with arithmetic that is read as it is written', async () => {
    const { store } = await shown()
    const figure = byRole('button', /^Concrete in slabs, ribbed: /)
    expect(figure.getAttribute('aria-expanded')).toBe('false')
    figure.click()
    await flushPromises()
    expect(figure.getAttribute('aria-expanded')).toBe('true')
    const rows = [...table(/^Parts of Concrete/)!.querySelectorAll(':scope > tbody > tr')]
    const quantity = store.full!.appraisal.schemes[0]!.quantities.find(({ item }) => item === 'concrete.slab')!
    expect(rows).toHaveLength(quantity.parts.length)
    const sum = rows.reduce((total, row) => total + numberOf(row.lastElementChild!.textContent), 0)
    expect(sum).toBeCloseTo(quantity.net, 1)
    expect(rows[0]!.children[2]!.textContent).toMatch(/^[\d.()× −+/]+$/)
    expect(rows[0]!.children[2]!.textContent).toContain('×')
  })

  it('names the rule and its source at the opened figure, and where the concrete goes', async () => {
    await shown()
    byRole('button', /^Concrete in slabs, ribbed: /).click()
    await flushPromises()
    expect(document.body.textContent).toContain('Source: RICS New Rules of Measurement 2')
    const terms = [...document.querySelectorAll('.split dt')].map((term) => term.textContent)
    expect(terms).toEqual(expect.arrayContaining(['topping', 'ribs', 'solid zones']))
  })

  it('opens one figure at a time and closes it again', async () => {
    await shown()
    byRole('button', /^Concrete in slabs, ribbed: /).click()
    await flushPromises()
    byRole('button', /^Concrete in slabs, solid: /).click()
    await flushPromises()
    expect(table(/^Parts of/)?.closest('div.opened')?.textContent).toContain('solid S1')
    byRole('button', 'Close').click()
    await flushPromises()
    expect(table(/^Parts of/)).toBeUndefined()
  })

  it('measures by other rules when they are chosen, says what they change, and opens a composite to what it adds up', async () => {
    const { store, settle } = await shown()
    expect(byRole('row', /^Concrete in slabs/)).toBeTruthy()
    byRole('combobox', 'Measured by').click()
    await flushPromises()
    const { name } = RULE_SETS.composite
    ;[...document.querySelectorAll<HTMLElement>('[role=option]')].find(({ textContent }) => textContent.includes(name))!.click()
    await settle()
    expect(store.project?.measurement).toBe('composite')
    expect(document.body.textContent).toContain('Against the rules for comparing')
    const [ribbed] = store.full!.appraisal.schemes
    const composite = ribbed!.quantities.find(({ item }) => item === 'floor.ribbed')!
    expect(composite.analysis!.map(({ item }) => item)).toContain('concrete.slab')
    byRole('button', /^Floor of ribs/).click()
    await flushPromises()
    const opened = document.querySelector('div.opened')!.textContent
    for (const { net } of composite.analysis!.filter((part) => part.unit === 'm³')) expect(opened).toContain(net.toFixed(2))
  })

  it('says where to begin when there is no panel', async () => {
    const sheet = aPricedSheet()
    await shown({ ...sheet, levels: sheet.levels.map((level) => ({ ...level, panels: [] })) })
    expect(byRole('link', 'Go to the levels').getAttribute('href')).toContain('levels')
  })
})
