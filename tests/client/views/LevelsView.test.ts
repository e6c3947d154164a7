import { flushPromises } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { LevelInput } from '../../../shared/contracts/project'
import { useProjectStore } from '../../../src/stores/project'
import { useSessionStore } from '../../../src/stores/session'
import LevelsView from '../../../src/views/LevelsView.vue'
import { answeringWorkers } from '../../support/answeringWorker'
import { fakeApi } from '../../support/fakeApi'
import { mountView } from '../../support/mountView'
import { aSession, aSheet, levelId, projectId } from '../../support/projectSheetOf'
import { allByRole, byRole, describedBy, type } from '../../support/screen'

const LEVELS = `/api/projects/${projectId}/levels`

describe('LevelsView', () => {
  let unmount = () => {}
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => {
    unmount()
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  async function settled(): Promise<void> {
    await vi.advanceTimersByTimeAsync(100)
    await flushPromises()
  }

  async function shown(sheet = aSheet()) {
    answeringWorkers()
    const stored = { ...sheet.levels[0]!, version: 5 }
    const api = fakeApi({
      [`GET /api/projects/${projectId}`]: () => ({ status: 200, json: sheet }),
      'GET /api/blocks': () => ({ status: 200, json: [] }),
      [`PUT ${LEVELS}/${levelId}`]: ({ body }) => ({ status: 200, json: { ...stored, ...(body as LevelInput) } }),
      [`POST ${LEVELS}`]: ({ body }) => ({
        status: 201,
        json: { ...(body as LevelInput), id: '00000000-0000-4000-8000-000000000099', version: 1, position: 2 },
      }),
    })
    const pinia = createPinia()
    useSessionStore(pinia).session = aSession('surveyor')
    const store = useProjectStore(pinia)
    await store.open(projectId)
    const view = await mountView(LevelsView, '/view', {}, pinia)
    unmount = view.unmount
    await settled()
    return { api, store, panels: () => store.levels[0]!.panels }
  }

  /** Types into a cell and leaves it by a key, as from the keyboard. */
  async function typeCell(name: string, text: string, key = 'Enter'): Promise<void> {
    const cell = byRole('textbox', name)
    type(cell, text)
    await press(cell, key)
  }

  async function press(target: EventTarget, key: string, more: KeyboardEventInit = {}): Promise<void> {
    target.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...more }))
    await settled()
  }

  const valueOf = (name: string) => (byRole('textbox', name) as HTMLInputElement).value
  const focused = () => document.activeElement?.getAttribute('aria-label')
  const drawn = (mark: string) => document.querySelectorAll(`svg.plan .block[data-panel="${mark}"]`).length
  const counted = (store: ReturnType<typeof useProjectStore>, mark: string) =>
    store.full?.appraisal.schemes[0]?.panels.find((panel) => panel.mark === mark)?.blocksWhole

  it('draws in the plan the blocks that it counts, and again when a span changes', async () => {
    const { store } = await shown()
    expect(drawn('P1')).toBeGreaterThan(0)
    expect(drawn('P1')).toBe(counted(store, 'P1'))
    const before = drawn('P1')
    await typeCell('P1 along x, mm', '7,200')
    expect(drawn('P1')).toBe(counted(store, 'P1'))
    expect(drawn('P1')).toBeGreaterThan(before)
  })

  it('moves the support line, so that the neighbour stays joined, and saves the level over its version', async () => {
    const { api, panels } = await shown()
    await typeCell('P1 along x, mm', '6600')
    expect(panels()[1]!.outline[0]).toEqual([6600, 0])
    expect(valueOf('P2 along x, mm')).toBe('6,000')
    await vi.advanceTimersByTimeAsync(1000)
    await flushPromises()
    const put = api.calls.find(({ method }) => method === 'PUT')
    expect(put?.headers.get('If-Match')).toBe('"4"')
    expect(document.body.textContent).toContain('nothing waiting')
  })

  it('moves between cells by Tab, Enter and arrows', async () => {
    await shown()
    const cell = byRole('textbox', 'P1 along x, mm')
    cell.focus()
    await press(cell, 'Tab')
    expect(focused()).toBe('P1 along y, mm')
    await press(document.activeElement!, 'Enter')
    expect(focused()).toBe('P2 along y, mm')
    await press(document.activeElement!, 'ArrowUp')
    expect(focused()).toBe('P1 along y, mm')
    await press(document.activeElement!, 'Tab', { shiftKey: true })
    expect(focused()).toBe('P1 along x, mm')
  })

  it('takes the cell above by Ctrl D, leaves a cell as it was by Escape', async () => {
    const { panels } = await shown()
    await typeCell('P1 ribs run', 'x')
    const cell = byRole('textbox', 'P2 ribs run')
    cell.focus()
    await press(cell, 'd', { ctrlKey: true })
    expect(panels().map(({ ribDirection }) => ribDirection)).toEqual([0, 0])
    type(cell, '45')
    await press(cell, 'Escape')
    expect(valueOf('P2 ribs run')).toBe('x')
  })

  it('undoes and does again from the keyboard', async () => {
    await shown()
    await typeCell('P1 along x, mm', '6600')
    await press(window, 'z', { ctrlKey: true })
    expect(valueOf('P1 along x, mm')).toBe('6,000')
    await press(window, 'Z', { ctrlKey: true, shiftKey: true })
    expect(valueOf('P1 along x, mm')).toBe('6,600')
  })

  it('keeps text in a number field as typed, says why, and counts the panel as it was', async () => {
    const { panels } = await shown()
    await typeCell('P1 along x, mm', 'six')
    expect(valueOf('P1 along x, mm')).toBe('six')
    expect(byRole('textbox', 'P1 along x, mm').getAttribute('aria-invalid')).toBe('true')
    expect(describedBy(byRole('textbox', 'P1 along x, mm'))).toMatch(/no number: expected millimetres.*P1 is counted as it was/)
    expect(panels()[0]!.outline[1]).toEqual([6000, 0])
    await typeCell('P1 along x, mm', '6600')
    expect(byRole('textbox', 'P1 along x, mm').getAttribute('aria-invalid')).toBeNull()
  })

  it('leaves a panel that takes no blocks out of the count, with the reason and the likely repair', async () => {
    const { store } = await shown()
    await typeCell('P2 along x, mm', '540')
    expect(describedBy(byRole('textbox', 'P2 along x, mm'))).toMatch(
      /540 leaves 290 between two supports of 250; one row of blocks needs 400\.\s+Not counted until it is put right\..*Was it 5,400\?/,
    )
    expect(drawn('P2')).toBe(0)
    expect(drawn('P1')).toBe(counted(store, 'P1'))
    await typeCell('P2 along x, mm', '5400')
    expect(drawn('P2')).toBe(counted(store, 'P2'))
  })

  it('makes a panel of a new row as soon as both lengths stand, and says what is missing once the row is left', async () => {
    const { panels } = await shown()
    await typeCell('New panel along x, mm', '4500', 'Tab')
    expect(panels()).toHaveLength(2)
    byRole('textbox', 'P1 mark').focus()
    await settled()
    expect(document.body.textContent).toContain('along y is missing')
    const [draft] = allByRole('textbox', 'New panel along y, mm')
    type(draft!, '6000')
    await press(draft!, 'Enter')
    expect(panels()[2]).toMatchObject({ mark: 'P3', repeat: 1, ribDirection: 0 })
    expect(panels()[2]!.edges[3]).toMatchObject({ continuity: 'continuous' })
  })

  it('adds the rows of a pasted spreadsheet in one step, keeping the wrong ones', async () => {
    const { panels } = await shown()
    const text = 'P8\t4,200\t5000\tx\t2\nP9\t4200\tfoo'
    const paste = Object.assign(new Event('paste', { bubbles: true, cancelable: true }), {
      clipboardData: { getData: () => text },
    })
    allByRole('textbox', 'New panel mark')[0]!.dispatchEvent(paste)
    await settled()
    expect(panels()[2]).toMatchObject({ mark: 'P8', repeat: 2, ribDirection: 0 })
    expect(valueOf('P9 along y, mm')).toBe('foo')
    expect(document.body.textContent).toContain('1 of 2 pasted rows added. 1 to be put right below.')
    await press(window, 'z', { ctrlKey: true })
    expect(panels()).toHaveLength(2)
  })

  it('changes both sides of a shared support at the opened panel', async () => {
    const { panels } = await shown()
    type(byRole('textbox', 'Edge 2, right, support width, mm'), '300')
    await settled()
    expect(panels()[0]!.edges[1]!.supportWidth).toBe(300)
    expect(panels()[1]!.edges[3]!.supportWidth).toBe(300)
  })

  it('lets the corners of a panel lift once all its edges are discontinuous', async () => {
    const sheet = aSheet()
    const [first, ...rest] = sheet.levels
    const [panel] = first!.panels
    const edges = [{ supportWidth: 250, kind: 'beam' as const, continuity: 'discontinuous' as const }]
    const { panels } = await shown({ ...sheet, levels: [{ ...first!, panels: [{ ...panel!, edges }] }, ...rest] })
    byRole('combobox', 'Corners of a solid slab').click()
    await settled()
    ;[...document.querySelectorAll<HTMLElement>('[role=option]')]
      .find(({ textContent }) => textContent.includes('may lift'))!
      .click()
    await settled()
    expect(panels()[0]!.corners).toBe('mayLift')
  })

  it('asks nothing of corners where an edge is continuous', async () => {
    await shown()
    expect(allByRole('combobox', 'Corners of a solid slab')).toEqual([])
  })

  it('inserts a void, draws it, and refuses one that reaches a support', async () => {
    const { panels } = await shown()
    byRole('button', 'Insert a void').click()
    await settled()
    expect(panels()[0]!.voids).toHaveLength(1)
    expect(document.querySelectorAll('svg.plan .plan-void')).toHaveLength(1)
    type(byRole('textbox', 'from the left, mm'), '0')
    await settled()
    expect(document.querySelector('[role=alert]')?.textContent).toContain('Not taken yet')
    expect(panels()[0]!.voids[0]![0]).toEqual([2000, 2000])
  })

  it('reshapes a panel by its points and refuses points that cross', async () => {
    const { panels } = await shown()
    byRole('button', 'Outline by points').click()
    await settled()
    await typeCell('Point 3 y, mm', '4,000')
    expect(panels()[0]!.outline[2]).toEqual([6000, 4000])
    await typeCell('Point 4 x, mm', '7000')
    expect(document.querySelector('[role=alert]')?.textContent).toContain('Not taken yet')
    expect(panels()[0]!.outline[3]).toEqual([0, 6000])
  })

  it('draws a panel by typed sides from the keyboard, closes it by Enter, and Escape leaves off', async () => {
    const { panels } = await shown()
    byRole('button', 'Draw a panel').click()
    await settled()
    const board = document.querySelector<SVGSVGElement>('svg.plan')!
    expect(board.getAttribute('role')).toBe('application')
    const at = (x: number, y: number) => ({ clientX: x, clientY: y, bubbles: true })
    board.dispatchEvent(new MouseEvent('click', at(20, 60)))
    for (const [x, y, side] of [
      [200, 60, '4000'],
      [200, 500, '3000'],
      [-900, 500, '4000'],
    ] as const) {
      board.dispatchEvent(new MouseEvent('pointermove', at(x, y)))
      for (const digit of side) await press(board, digit)
      await press(board, 'Enter')
    }
    await press(board, 'Enter')
    expect(document.querySelector('[role=alert]')).toBeNull()
    expect(panels()).toHaveLength(3)
    expect(panels()[2]!.outline).toHaveLength(4)
    byRole('button', 'Draw a panel').click()
    await settled()
    await press(document.querySelector('svg.plan')!, 'Escape')
    expect(document.querySelector('svg.plan')!.getAttribute('role')).toBe('img')
  })

  it('counts and draws the solid scheme when it is chosen', async () => {
    await shown()
    const solid = [...document.querySelectorAll<HTMLInputElement>('input[type=radio]')][1]!
    solid.click()
    await settled()
    expect(document.querySelectorAll('svg.plan .block')).toHaveLength(0)
    expect(document.body.textContent).toContain('Checks, solid')
  })

  it('adds, names and repeats a level', async () => {
    const { store } = await shown()
    byRole('button', 'Add a level').click()
    await settled()
    expect(store.levels.map(({ mark }) => mark)).toEqual(['L1', 'L2'])
    expect(document.body.textContent).toContain('No panels on this level')
    byRole('button', 'Name, repeat, copy').click()
    await settled()
    type(byRole('textbox', 'Timesed'), '3')
    await settled()
    expect(store.levels[1]!.repeat).toBe(3)
  })
})
