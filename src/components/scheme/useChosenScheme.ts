import type { SchemeResult } from '#shared/contracts/appraisalResult'
import type { StoredScheme } from '#shared/contracts/project'
import { computed, ref } from 'vue'
import { useProjectStore } from '../../stores/project'

/** One scheme of the open project that a sheet shows: the first until another is chosen. */
export function useChosenScheme() {
  const store = useProjectStore()
  const chosen = ref<string | null>(null)
  const row = computed<StoredScheme | null>(() => store.schemes.find(({ id }) => id === chosen.value) ?? store.schemes[0] ?? null)
  const id = computed({ get: () => row.value?.id ?? '', set: (value: string) => (chosen.value = value) })
  const results = computed<readonly SchemeResult[]>(() => store.full?.appraisal.schemes ?? [])
  const result = computed(() => results.value.find(({ mark }) => mark === row.value?.specification.mark) ?? null)
  return { id, row, result, results }
}
