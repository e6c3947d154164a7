import { ref, shallowRef } from 'vue'
import type { Ref, ShallowRef } from 'vue'
import { ApiFailure } from '../api/apiFailure'

export interface Task<Arguments extends unknown[], Result> {
  readonly running: Ref<boolean>
  /** Why the last run failed; null while it runs and after it went well. */
  readonly error: ShallowRef<ApiFailure | null>
  /** The result, or undefined when it failed: the reason then stands in `error`. */
  readonly run: (...given: Arguments) => Promise<Result | undefined>
}

/** A wait that shows: `running` while it lasts, `error` where it was caused. Faults that are no API failure are thrown on. */
export function useTask<Arguments extends unknown[], Result>(
  work: (...given: Arguments) => Promise<Result>,
): Task<Arguments, Result> {
  const running = ref(false)
  const error = shallowRef<ApiFailure | null>(null)

  async function run(...given: Arguments): Promise<Result | undefined> {
    running.value = true
    error.value = null
    try {
      return await work(...given)
    } catch (cause) {
      if (!(cause instanceof ApiFailure)) throw cause
      error.value = cause
      return undefined
    } finally {
      running.value = false
    }
  }

  return { running, error, run }
}
