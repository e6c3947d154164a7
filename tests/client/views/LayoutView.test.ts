import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import LayoutView from '../../../src/views/LayoutView.vue'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { byRole } from '../../support/screen'

describe('LayoutView', () => {
  let unmount = () => {}
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function shown(sheet = aPricedSheet()) {
    const opened = await openSheet(LayoutView, sheet)
    await opened.settle()
    unmount = opened.unmount
    return opened
  }

  it('draws the blocks that are counted and names the scale in the title block', async () => {
    const { store } = await shown()
    const paper = document.querySelector('.paper')!
    const counted = store.full!.appraisal.schemes[0]!.panels.reduce((sum, each) => sum + each.blocksWhole + each.blocksCut, 0)
    expect(counted).toBeGreaterThan(0)
    expect(paper.querySelectorAll('.block:is(polygon)')).toHaveLength(counted)
    expect(paper.textContent).toMatch(/Scale\s*1 : \d+ on A4/)
    expect(paper.textContent).toContain(store.project!.reference)
  })

  it('lays the paper as asked', async () => {
    const { settle } = await shown()
    const option = (words: string) =>
      [...document.querySelectorAll<HTMLElement>('[role=option]')].find(({ textContent }) => textContent.includes(words))!
    for (const words of ['portrait', 'landscape']) {
      byRole('combobox', 'Paper lies').click()
      await flushPromises()
      option(words).click()
      await settle()
      expect(document.querySelector(`.paper.a4-${words}`)).not.toBeNull()
      expect(document.querySelector('.type-standfirst')!.textContent).toContain(`A4 ${words}`)
    }
  })

  it('prints when asked', async () => {
    const print = vi.fn()
    vi.stubGlobal('print', print)
    await shown()
    byRole('button', 'Print at true scale').click()
    await flushPromises()
    expect(print).toHaveBeenCalledOnce()
  })

  it('says where to draw panels while there are none', async () => {
    const sheet = aPricedSheet()
    await shown({ ...sheet, levels: sheet.levels.map((row) => ({ ...row, panels: [] })) })
    expect(document.body.textContent).toContain('No level has a panel yet')
    expect(document.querySelector('.paper')).toBeNull()
  })
})
