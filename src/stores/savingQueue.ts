import { computed, shallowRef } from 'vue'
import type { ComputedRef, ShallowRef } from 'vue'

export type SavingState = 'saved' | 'unsaved' | 'saving' | 'conflict' | 'failed'
/** refused: the content is wrong and waits for a change; failed: no answer, tried again by itself. */
export type SaveOutcome = 'saved' | 'conflict' | 'refused' | 'failed'

export interface SavingQueue {
  readonly state: ComputedRef<SavingState>
  readonly savedAt: ShallowRef<Date | null>
  /** The row has changed: it is saved after a pause in typing. */
  readonly touch: (key: string) => void
  /** Nothing of this row is waiting any more. */
  readonly settle: (key: string) => void
  /** Saves now what is waiting; resolves when it has been tried. */
  readonly flush: (isLeaving?: boolean) => Promise<void>
  readonly isWaiting: (key: string) => boolean
  readonly reset: () => void
}

const PAUSE_MS = 600
const RETRY_MS = 5000

/** Debounced saving of rows by key, one call at a time, so that versions follow each other. */
export function createSavingQueue(save: (key: string, isLeaving: boolean) => Promise<SaveOutcome>): SavingQueue {
  const waiting = shallowRef<ReadonlySet<string>>(new Set())
  const stopped = shallowRef<ReadonlyMap<string, Exclude<SaveOutcome, 'saved'>>>(new Map())
  const underWay = shallowRef<string | null>(null)
  const savedAt = shallowRef<Date | null>(null)
  let timer: ReturnType<typeof setTimeout> | undefined
  let chain: Promise<void> = Promise.resolve()

  const state = computed<SavingState>(() => {
    const reasons = [...stopped.value.values()]
    if (reasons.includes('conflict')) return 'conflict'
    if (underWay.value !== null) return 'saving'
    if (reasons.length > 0) return 'failed'
    return waiting.value.size > 0 ? 'unsaved' : 'saved'
  })

  function mark(key: string, reason: Exclude<SaveOutcome, 'saved'> | null): void {
    const next = new Map(stopped.value)
    if (reason === null) next.delete(key)
    else next.set(key, reason)
    stopped.value = next
  }

  function schedule(delay: number): void {
    clearTimeout(timer)
    timer = setTimeout(() => void flush(), delay)
  }

  function touch(key: string): void {
    waiting.value = new Set([...waiting.value, key])
    if (stopped.value.get(key) === 'conflict') return
    mark(key, null)
    schedule(PAUSE_MS)
  }

  function settle(key: string): void {
    waiting.value = new Set([...waiting.value].filter((other) => other !== key))
    mark(key, null)
  }

  async function saveOne(key: string, isLeaving: boolean): Promise<void> {
    if (!waiting.value.has(key) || stopped.value.get(key) === 'conflict') return
    settle(key)
    underWay.value = key
    try {
      const outcome = await save(key, isLeaving)
      if (outcome === 'saved') {
        savedAt.value = new Date()
        return
      }
      const isChangedSince = waiting.value.has(key)
      waiting.value = new Set([...waiting.value, key])
      if (outcome === 'conflict' || !isChangedSince) mark(key, outcome)
      if (outcome === 'failed') schedule(RETRY_MS)
    } finally {
      underWay.value = null
    }
  }

  function flush(isLeaving = false): Promise<void> {
    clearTimeout(timer)
    const run = async () => {
      for (const key of waiting.value) if (stopped.value.get(key) !== 'refused') await saveOne(key, isLeaving)
    }
    chain = chain.then(run, run)
    return chain
  }

  function reset(): void {
    clearTimeout(timer)
    waiting.value = new Set()
    stopped.value = new Map()
    savedAt.value = null
  }

  return { state, savedAt, touch, settle, flush, isWaiting: (key) => waiting.value.has(key), reset }
}
