import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { ScopeDeclaration } from '#shared/contracts/sameScope'
import { projectInputOf } from '../../../src/stores/sheetRow'
import ScopeView from '../../../src/views/ScopeView.vue'
import { aPricedSheet, openSheet } from '../../support/openSheet'
import { byRole } from '../../support/screen'

const text = () => document.body.textContent.replace(/\s+/g, ' ')

describe('ScopeView', () => {
  let unmount = () => {}
  beforeEach(() => void vi.useFakeTimers())
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function shown(scope: ScopeDeclaration[]) {
    const sheet = aPricedSheet()
    const opened = await openSheet(ScopeView, { ...sheet, project: { ...sheet.project, scope } })
    unmount = opened.unmount
    return opened
  }

  it('says which totals are not like for like, and what an entry comes to', async () => {
    const { store } = await shown([
      { scheme: 'R1', entry: 'ceiling', state: 'priced', rate: '7.20', per: 'grossArea', note: '' },
      { scheme: 'S1', entry: 'ceiling', state: 'leftOut', note: 'painted' },
    ])
    expect(text()).toContain('Not like for like in plaster or ceiling: priced for R1, left out for S1.')
    expect(text()).toContain('36.00 m² × 7.20 per m² of gross floor = 259.20, before markups')
    const line = store.full!.appraisal.schemes[0]!.cost!.lines.find(({ item }) => item === 'scope.ceiling')
    expect(line).toMatchObject({ quantity: '36.00', amount: '259.20' })
    expect(store.full!.appraisal.schemes[1]!.cost!.lines.some(({ item }) => item === 'scope.ceiling')).toBe(false)
  })

  it('keeps an entry that is left out without a word, says what is wanted, and counts it nowhere', async () => {
    const { store, settle } = await shown([])
    const scope: ScopeDeclaration[] = [{ scheme: 'S1', entry: 'deck', state: 'leftOut', note: '' }]
    await store.changeProject({ ...projectInputOf(store.sheet!.project), scope })
    await settle()
    expect(store.problems.map(({ path }) => path)).toContain('scope.0.note')
    expect(store.sheet!.project.scope).toHaveLength(1)
    expect(store.full!.scopeDifferences.find(({ entry }) => entry === 'deck')?.states).toEqual(['undeclared', 'undeclared'])
    expect(document.querySelector('[aria-invalid="true"]')?.getAttribute('aria-label')).toBe(
      'Why it is left out, Full or open deck, S1',
    )
  })

  it('takes out what was declared for a scheme that is no more', async () => {
    const { store, settle } = await shown([{ scheme: 'R9', entry: 'deck', state: 'inRates', note: '' }])
    expect(text()).toContain('1 declared for R9, which no scheme is called.')
    byRole('button', 'Take them out').click()
    await settle()
    expect(store.sheet!.project.scope).toEqual([])
  })

  it('lets declarations follow a scheme to its new mark', async () => {
    const { store, settle } = await shown([{ scheme: 'R1', entry: 'deck', state: 'inRates', note: '' }])
    const row = store.schemes[0]!
    const { name, blockId, specification } = row
    store.changeScheme(row.id, { name, blockId, specification: { ...specification, mark: 'R7' } })
    await settle()
    expect(store.sheet!.project.scope).toEqual([{ scheme: 'R7', entry: 'deck', state: 'inRates', note: '' }])
  })
})
