import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { SaveOutcome } from '../../../src/stores/savingQueue'
import { createSavingQueue } from '../../../src/stores/savingQueue'

describe('saving queue', () => {
  beforeEach(() => vi.useFakeTimers())
  afterEach(() => vi.useRealTimers())

  function queueWith(...outcomes: SaveOutcome[]) {
    const saved: string[] = []
    const queue = createSavingQueue((key) => {
      saved.push(key)
      return Promise.resolve(outcomes.shift() ?? 'saved')
    })
    return { queue, saved }
  }

  it('saves once after a pause in typing', async () => {
    const { queue, saved } = queueWith()
    for (let key = 0; key < 5; key++) queue.touch('level:1')
    expect(queue.state.value).toBe('unsaved')
    await vi.advanceTimersByTimeAsync(1000)
    expect(saved).toEqual(['level:1'])
    expect(queue.state.value).toBe('saved')
    expect(queue.savedAt.value).not.toBeNull()
  })

  it('tries a failed save again by itself', async () => {
    const { queue, saved } = queueWith('failed')
    queue.touch('level:1')
    await vi.advanceTimersByTimeAsync(700)
    expect(queue.state.value).toBe('failed')
    await vi.advanceTimersByTimeAsync(6000)
    expect(saved).toHaveLength(2)
    expect(queue.state.value).toBe('saved')
  })

  it('waits with a refused row until it is changed', async () => {
    const { queue, saved } = queueWith('refused')
    queue.touch('level:1')
    await vi.advanceTimersByTimeAsync(60_000)
    await queue.flush()
    expect(saved).toHaveLength(1)
    expect(queue.state.value).toBe('failed')
    queue.touch('level:1')
    await vi.advanceTimersByTimeAsync(700)
    expect(queue.state.value).toBe('saved')
  })

  it('holds a row in conflict back, saves the others, and goes on when settled', async () => {
    const { queue, saved } = queueWith('conflict')
    queue.touch('level:1')
    await vi.advanceTimersByTimeAsync(700)
    queue.touch('level:1')
    queue.touch('scheme:1')
    await vi.advanceTimersByTimeAsync(700)
    expect(saved).toEqual(['level:1', 'scheme:1'])
    expect(queue.state.value).toBe('conflict')
    queue.settle('level:1')
    expect(queue.state.value).toBe('saved')
  })

  it('saves again what was changed while it was being saved', async () => {
    const order: string[] = []
    let finish: (outcome: SaveOutcome) => void = () => {}
    const queue = createSavingQueue((key) => {
      order.push(key)
      return new Promise((resolve) => (finish = resolve))
    })
    queue.touch('level:1')
    await vi.advanceTimersByTimeAsync(700)
    expect(queue.state.value).toBe('saving')
    queue.touch('level:1')
    finish('saved')
    await vi.advanceTimersByTimeAsync(700)
    expect(order).toEqual(['level:1', 'level:1'])
    finish('saved')
    await vi.advanceTimersByTimeAsync(0)
    expect(queue.state.value).toBe('saved')
  })
})
