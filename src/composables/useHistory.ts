import { computed, shallowRef } from 'vue'
import type { ComputedRef } from 'vue'

export interface History<Snapshot> {
  readonly canUndo: ComputedRef<boolean>
  readonly canRedo: ComputedRef<boolean>
  /** Keeps `before`, the state that a change is about to replace. */
  readonly record: (before: Snapshot) => void
  /** The state before the last change, or undefined; `current` is kept for redo. */
  readonly undo: (current: Snapshot) => Snapshot | undefined
  readonly redo: (current: Snapshot) => Snapshot | undefined
  readonly clear: () => void
}

/** Undo and redo of whole snapshots, which must never be changed in place. Keeps the last `most` steps. */
export function useHistory<Snapshot>(most = 200): History<Snapshot> {
  const past = shallowRef<readonly Snapshot[]>([])
  const future = shallowRef<readonly Snapshot[]>([])

  function record(before: Snapshot): void {
    past.value = [...past.value, before].slice(-most)
    future.value = []
  }

  function undo(current: Snapshot): Snapshot | undefined {
    const before = past.value.at(-1)
    if (before === undefined) return undefined
    past.value = past.value.slice(0, -1)
    future.value = [...future.value, current]
    return before
  }

  function redo(current: Snapshot): Snapshot | undefined {
    const after = future.value.at(-1)
    if (after === undefined) return undefined
    future.value = future.value.slice(0, -1)
    past.value = [...past.value, current]
    return after
  }

  function clear(): void {
    past.value = []
    future.value = []
  }

  return {
    canUndo: computed(() => past.value.length > 0),
    canRedo: computed(() => future.value.length > 0),
    record,
    undo,
    redo,
    clear,
  }
}
