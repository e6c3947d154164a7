import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import BarsView from '../../../src/views/BarsView.vue'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { allByRole, byRole, type } from '../../support/screen'

const table = (caption: RegExp) =>
  [...document.querySelectorAll('table')].find((one) => caption.test(one.caption?.textContent.trim() ?? ''))!
const numberOf = (shown: string | undefined) => Number((shown ?? '').replaceAll(',', ''))
const cellsOf = (row: Element) => [...row.children].map((cell) => cell.textContent.trim())

describe('BarsView', () => {
  let unmount = () => {}
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  function aSheetWithMesh() {
    const sheet = aPricedSheet()
    const schemes = sheet.schemes.map((row) =>
      row.specification.kind === 'ribbed' ? { ...row, specification: { ...row.specification, mesh: 'A142' as const } } : row,
    )
    return { ...sheet, schemes }
  }

  async function shown(sheet = aSheetWithMesh()) {
    const opened = await openSheet(BarsView, sheet)
    await opened.settle()
    unmount = opened.unmount
    return opened
  }

  it('lists every mark with its bars and mass, and totals that are the tonnes of the bill', async () => {
    const { store } = await shown()
    const rows = [...table(/^Bar schedule by mark/).querySelectorAll(':scope > tbody > tr')].map(cellsOf)
    const mass = rows.reduce((sum, cells) => sum + numberOf(cells.at(-1)), 0)
    const billed = store
      .full!.appraisal.schemes[0]!.quantities.filter(({ item }) => item.startsWith('steel.bar.'))
      .reduce((sum, { net }) => sum + 1000 * net, 0)
    expect(Math.abs(mass - billed)).toBeLessThan(0.1 * rows.length + 1)
    const total = cellsOf(table(/^Bars by diameter/).tFoot!.rows[0]!)
    expect(Math.abs(numberOf(total.at(-1)) - billed)).toBeLessThanOrEqual(2)
  })

  it('opens a mark to its members, by key and pointer, and closes it again', async () => {
    await shown()
    const mark = byRole('button', '01')
    expect(mark.getAttribute('aria-expanded')).toBe('false')
    mark.click()
    await flushPromises()
    expect(byRole('button', '01').getAttribute('aria-expanded')).toBe('true')
    const members = table(/^Members of mark/)
    const [, where, built, each, total] = cellsOf(members.tBodies[0]!.rows[0]!)
    expect(where).toMatch(/=/)
    expect(numberOf(total)).toBe(numberOf(built) * numberOf(each))
    byRole('button', '01').click()
    await flushPromises()
    expect(allByRole('row', /^L1 P1/).length).toBe(document.querySelectorAll('[aria-label="Sheets by panel"] tbody tr').length)
  })

  it('draws each mark and says its shape in words', async () => {
    await shown()
    const drawings = [...document.querySelectorAll('[role="img"]')].map((one) => one.getAttribute('aria-label'))
    expect(drawings).toEqual(expect.arrayContaining([expect.stringMatching(/^shape 00, A \d+$/)]))
  })

  it('plans the cuts beside both bounds, every piece in a pattern', async () => {
    await shown()
    const plan = table(/^Stock bars by diameter/)
    const rows = [...plan.tBodies[0]!.rows].map(cellsOf)
    expect(rows.length).toBeGreaterThan(0)
    for (const [, , used, length, linear] of rows) {
      expect(numberOf(used)).toBeGreaterThanOrEqual(numberOf(length))
      expect(numberOf(used)).toBeGreaterThanOrEqual(Math.floor(numberOf(linear)))
    }
    const pieces = rows.reduce((sum, cells) => sum + numberOf(cells[1]), 0)
    const cut = [...document.querySelectorAll('li .line')].reduce((sum, line) => {
      const times = numberOf(/^([\d,]+) ×/.exec(line.textContent.trim())?.[1])
      const each = [...line.textContent.matchAll(/(\d+) of [\d,]+ \(/g)].reduce((count, [, number]) => count + Number(number), 0)
      return sum + times * each
    }, 0)
    expect(cut).toBe(pieces)
  })

  it('lays the mesh of the ribbed floor in sheets, and none of the solid one', async () => {
    const { settle } = await shown()
    expect(document.body.textContent).toContain('Mesh A142 in the topping')
    const solid = [...document.querySelectorAll<HTMLInputElement>('input[type=radio]')].at(-1)!
    solid.click()
    solid.dispatchEvent(new Event('change'))
    await settle()
    expect(document.body.textContent).not.toContain('Mesh A142 in the topping')
    expect(document.body.textContent).toContain('Solid S1:')
  })

  it('takes another stock length into the brief, and says what is wrong with one', async () => {
    const { store, settle } = await shown()
    const field = byRole('textbox', /^Stock length of bars/)
    type(field, '6000')
    await settle()
    expect(store.project?.brief.stockLength).toBe(6000)
    expect(document.body.textContent).toContain('bars of 6,000 mm')
    type(field, '5000')
    await settle()
    expect(store.project?.brief.stockLength).toBe(6000)
    expect(document.body.textContent).toContain('expected a whole number from 6,000 to 18,000')
  })

  it('loses what each cut takes', async () => {
    const { settle } = await shown()
    const usedOf = () => numberOf(cellsOf(table(/^Stock bars by diameter/).tFoot!.rows[0]!)[2])
    const before = usedOf()
    type(byRole('textbox', /^Lost at each cut/), '10')
    await settle()
    expect(usedOf()).toBeGreaterThanOrEqual(before)
  })
})
