import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { checkRows, checksInWords, tightestOfEach } from '../../../src/components/check/checkRows'
import ChecksView from '../../../src/views/ChecksView.vue'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { aCheck, aResult } from '../../support/schemeResultOf'
import { allByRole, byRole } from '../../support/screen'

describe('checks in order', () => {
  const scheme = aResult('ribbed', {
    passes: false,
    checks: [
      aCheck({ utilisation: 0.5 }),
      aCheck({ panel: 'P2', utilisation: 0.9 }),
      aCheck({ name: 'topping', utilisation: 1.2, pass: false }),
    ],
  })

  it('stand failing first, then the tightest', () => {
    expect(checkRows(scheme).map(({ utilisation }) => utilisation)).toEqual([1.2, 0.9, 0.5])
    expect(tightestOfEach(scheme).map(({ panel, name }) => [panel, name])).toEqual([
      ['P1', 'topping'],
      ['P2', 'shear'],
    ])
  })

  it('are summed up in words', () => {
    expect(checksInWords(scheme)).toBe('1 of 3 fails.')
    expect(checksInWords(aResult('solid', { checks: [aCheck(), aCheck()] }))).toBe('All 2 pass; the tightest is used to 0.50.')
    expect(checksInWords(aResult('solid'))).toBe('No check was made.')
  })
})

describe('ChecksView', () => {
  let unmount = () => {}
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function shown() {
    const opened = await openSheet(ChecksView, aPricedSheet())
    unmount = opened.unmount
    return opened
  }

  it('says in words that a floor fails, and puts its failing checks first', async () => {
    const { store } = await shown()
    expect(store.full?.appraisal.schemes[0]?.passes).toBe(false)
    expect(document.querySelector('[role=alert]')?.textContent).toContain('R1')
    const verdicts = [...document.querySelectorAll('.verdict')].map((cell) => cell.textContent.trim())
    expect(verdicts[0]).toBe('fails')
    expect(verdicts.lastIndexOf('fails')).toBeLessThan(verdicts.indexOf('passes'))
  })

  it('opens the working and the clause of a check', async () => {
    const { store } = await shown()
    const shear = byRole('button', 'Shear')
    shear.click()
    await flushPromises()
    const check = tightestOfEach(store.full!.appraisal.schemes[0]!).find(({ name }) => name === 'shear')!
    expect(shear.getAttribute('aria-expanded')).toBe('true')
    expect(document.querySelector('.working-row')?.textContent).toContain(check.clause)
    expect(document.querySelector('.working-row')?.textContent).toContain(check.working.slice(0, 12))
  })

  it('lists every panel on request', async () => {
    const { store } = await shown()
    byRole('checkbox', /^every panel/).click()
    await flushPromises()
    expect(document.querySelectorAll('.verdict')).toHaveLength(store.full!.appraisal.schemes[0]!.checks.length)
  })

  it('states what was assumed, with the panels it holds for', async () => {
    const { store } = await shown()
    const [flag] = store.full!.sized[0]!.panels[0]!.flags
    expect(document.querySelector('.flags')?.textContent).toContain(flag)
    expect(allByRole('heading', 'Assumed, ribbed R1')).toHaveLength(1)
  })
})
