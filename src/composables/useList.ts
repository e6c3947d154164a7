import { computed, onMounted, shallowRef } from 'vue'
import { useTask } from './useTask'

/** A list that a sheet reads when it opens: its rows, whether they came, why not, and how to read them again. */
export function useList<Row>(read: () => Promise<Row[]>) {
  const answer = shallowRef<readonly Row[] | null>(null)
  const { running, error, run } = useTask(async () => {
    answer.value = await read()
  })
  onMounted(run)
  return {
    rows: computed<readonly Row[]>(() => answer.value ?? []),
    isLoaded: computed(() => answer.value !== null),
    running,
    error,
    load: run,
    put: (rows: readonly Row[]) => (answer.value = rows),
  }
}
