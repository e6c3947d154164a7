import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { checkInWords } from '../../../src/components/check/checkInWords'
import { checkRows, checksInWords, tightestOfEach } from '../../../src/components/check/checkRows'
import ChecksView from '../../../src/views/ChecksView.vue'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { aCheck, aResult } from '../../support/schemeResultOf'
import { allByRole, byRole, type } from '../../support/screen'

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
    const verdicts = [...document.querySelectorAll('[aria-label=Checks] .verdict')].map((cell) => cell.textContent.trim())
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
    expect(document.querySelectorAll('[aria-label=Checks] .verdict')).toHaveLength(
      store.full!.appraisal.schemes[0]!.checks.length,
    )
  })

  it('works out what would cure a failing check, changes to it, and the check passes', async () => {
    const { store, settle } = await shown()
    const failing = tightestOfEach(store.full!.appraisal.schemes[0]!).find(({ pass }) => !pass)!
    const count = () => store.full!.appraisal.schemes[0]!.checks.filter(({ name, pass }) => name === failing.name && !pass).length
    const before = count()
    allByRole('button', checkInWords(failing.name))[0]!.click()
    await settle()
    const [cure] = allByRole('button', /^Change to /)
    expect(document.querySelector('.cures')?.textContent).toContain(cure!.getAttribute('aria-label')!.slice('Change to '.length))
    cure!.click()
    await settle()
    expect(count()).toBeLessThan(before)
  })

  it('writes the calculation of a panel, every check with its clause and verdict', async () => {
    const { store, settle } = await shown()
    await settle()
    const { checks } = store.full!.sized[0]!.panels[0]!
    const calculation = document.querySelector('[aria-label="Calculation of panel P1"]')!
    expect(calculation.querySelectorAll('td.verdict svg')).toHaveLength(checks.length)
    for (const title of ['Loads', 'Moments and shears', 'Bending', 'Shear', 'Fire and cover'])
      expect(calculation.textContent).toContain(title)
    for (const { clause } of checks) expect(calculation.textContent).toContain(clause)
  })

  it("gives a panel's bars, beginning with those it has, and goes back to the scheme's", async () => {
    const { store, settle } = await shown()
    const given = () => store.schemes[0]!.specification.givenPanels
    const { reinforcement } = store.full!.sized[0]!.panels[0]!
    byRole('button', "Give this panel's bars").click()
    await settle()
    expect(given()).toEqual([
      { level: 'L1', panel: 'P1', ribBars: reinforcement.kind === 'ribbed' ? reinforcement.ribBars : null },
    ])
    type(byRole('textbox', 'Bottom bars of a rib, here: number of bars 1, nr'), '4')
    await settle()
    expect(JSON.stringify(given())).toContain('"count":4')
    expect(store.full!.sized[0]!.panels[0]!.flags.join()).toContain('bars given for this panel')
    byRole('button', "Go back to the scheme's").click()
    await settle()
    expect(given()).toEqual([])
  })

  it('states what was assumed, with the panels it holds for', async () => {
    const { store } = await shown()
    const [flag] = store.full!.sized[0]!.panels[0]!.flags
    expect(document.querySelector('.flags')?.textContent).toContain(flag)
    expect(allByRole('heading', 'Assumed, ribbed R1')).toHaveLength(1)
  })
})
