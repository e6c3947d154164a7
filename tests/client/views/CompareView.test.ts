import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import CompareView from '../../../src/views/CompareView.vue'
import { openSheet, aPricedSheet } from '../../support/openSheet'
import { scheme as schemeContract } from '#shared/contracts/appraisal'
import { allByRole, byRole } from '../../support/screen'

const drawn = vi.hoisted(() => ({ options: [] as unknown[] }))
vi.mock('../../../src/components/compare/drawCostChart', () => ({
  drawCostChart: () => ({ show: (option: unknown) => drawn.options.push(option), resize: () => {}, dispose: () => {} }),
}))

const text = () => document.body.textContent.replace(/\s+/g, ' ')

describe('CompareView', () => {
  let unmount = () => {}
  beforeEach(() => {
    drawn.options.length = 0
    vi.useFakeTimers()
  })
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function shown(...given: Parameters<typeof aPricedSheet>) {
    const opened = await openSheet(CompareView, aPricedSheet(...given))
    unmount = opened.unmount
    return opened
  }

  it('opens with the sentence that answers, from the totals of the engine', async () => {
    const { store } = await shown()
    const [ribbed, solid] = store.full!.appraisal.schemes
    const isRibbedCheaper = Number(ribbed!.cost!.total) < Number(solid!.cost!.total)
    const [heading] = allByRole('heading')
    expect(heading?.tagName).toBe('H1')
    const sentence = heading!.textContent
    expect(sentence.indexOf('costs')).toBeGreaterThan(0)
    expect(sentence.slice(0, sentence.indexOf('less than')).toLowerCase()).toContain(isRibbedCheaper ? 'ribbed' : 'solid')
  })

  it('draws both sections on one sheet and tells them in words', async () => {
    await shown()
    const labels = [...document.querySelectorAll('[role=img]')].map((node) => node.getAttribute('aria-label') ?? '')
    expect(labels.some((label) => /R1, ribbed, 250 mm.*S1, solid, \d+ mm thick.*one scale/.test(label))).toBe(true)
  })

  it('adds the ledger up to both totals', async () => {
    const { store } = await shown()
    const [ribbed, solid] = store.full!.appraisal.schemes
    const cells = [...byRole('row', /^Floors.*[+−]/).querySelectorAll('td')].map((cell) => cell.textContent.trim())
    const plain = (shown: string | undefined) => Number(shown?.replaceAll(',', '').replace('−', '-'))
    expect(plain(cells[0])).toBe(Number(ribbed!.cost!.total))
    expect(plain(cells[1])).toBe(Number(solid!.cost!.total))
    expect(plain(cells[3])).toBeCloseTo(Number(ribbed!.cost!.total) - Number(solid!.cost!.total), 6)
  })

  it('charts the work sections that the table beside it lists', async () => {
    const { settle } = await shown()
    await vi.dynamicImportSettled()
    await settle()
    const option = drawn.options.at(-1) as { yAxis: { data: string[] }; tooltip: { renderMode: string } }
    expect(option.tooltip.renderMode).toBe('richText')
    const rows = allByRole('row').map((row) => row.firstElementChild?.textContent.trim())
    expect(rows).toEqual(expect.arrayContaining(option.yAxis.data))
  })

  it('names in both totals what has no rate', async () => {
    await shown(['propping.area'])
    expect(text()).toContain('Without a rate in this edition, and so in neither total: propping.')
    expect(byRole('heading', /As far as they are priced/).tagName).toBe('H1')
  })

  it('compares the pair that was chosen', async () => {
    const sheet = aPricedSheet()
    const [ribbed, solid] = sheet.schemes
    const specification = schemeContract.parse({ mark: 'S2', kind: 'solid', thickness: 300 })
    const other = { ...solid!, id: '00000000-0000-4000-8000-000000000044', name: 'thick', specification }
    const schemes = [ribbed!, solid!, other]
    unmount = (await openSheet(CompareView, { ...sheet, schemes }, {}, { solid: other.id })).unmount
    expect(text()).toContain('S2 Solid')
    expect(text()).not.toContain('S1 Solid')
    expect(allByRole('combobox', 'Solid scheme')).toHaveLength(1)
    expect(allByRole('combobox', 'Ribbed scheme')).toEqual([])
  })

  it('says which scheme is missing and leads to it', async () => {
    const sheet = aPricedSheet()
    const opened = await openSheet(CompareView, { ...sheet, schemes: sheet.schemes.slice(0, 1) })
    unmount = opened.unmount
    expect(text()).toContain('There is no solid scheme yet')
    expect(byRole('link', 'Add a solid scheme').getAttribute('href')).toContain('schemes')
  })

  it('leads to the sheet from which the comparison is sent', async () => {
    await shown()
    expect(byRole('link', 'Send to the client').getAttribute('href')).toContain('/sent')
  })
})
