import type { Comparison, SchemeResult } from '#shared/contracts/appraisalResult'
import type { StoredScheme } from '#shared/contracts/project'
import { compareMarks } from '#shared/comparison/compareSchemes'
import { useSessionStorage } from '@vueuse/core'
import { computed } from 'vue'
import { useProjectStore } from '../../stores/project'
import type { Pair } from './phrase'

/**
 * The ribbed and the solid scheme that are set against each other on every sheet of the open project: the first of each kind
 * unless others were chosen. A choice is kept while the window is open.
 */
export function useComparedPair() {
  const store = useProjectStore()
  const choices = useSessionStorage<Record<string, Partial<Pair<string>>>>('bothways.pair', {})
  const projectId = computed(() => store.project?.id ?? '')

  const ofKind = (kind: StoredScheme['specification']['kind']) =>
    store.schemes.filter(({ specification }) => specification.kind === kind)
  const chosenIn = (kind: 'ribbed' | 'solid') => {
    const wanted = choices.value[projectId.value]?.[kind]
    const rows = ofKind(kind)
    return rows.find(({ id }) => id === wanted) ?? rows[0] ?? null
  }
  const choose = (kind: 'ribbed' | 'solid', id: string) => {
    choices.value = { ...choices.value, [projectId.value]: { ...choices.value[projectId.value], [kind]: id } }
  }

  const stored = computed(() => ({ ribbed: chosenIn('ribbed'), solid: chosenIn('solid') }))
  const options = computed(() => ({ ribbed: ofKind('ribbed'), solid: ofKind('solid') }))
  const resultOf = (row: StoredScheme | null): SchemeResult | null =>
    store.full?.appraisal.schemes.find(({ mark }) => mark === row?.specification.mark) ?? null

  const pair = computed<Pair<SchemeResult> | null>(() => {
    const [ribbed, solid] = [resultOf(stored.value.ribbed), resultOf(stored.value.solid)]
    return ribbed && solid ? { ribbed, solid } : null
  })
  const comparison = computed<Comparison | null>(() => {
    if (pair.value === null) return null
    const { ribbed, solid } = pair.value
    return compareMarks(store.full?.appraisal.schemes ?? [], [ribbed.mark, solid.mark])
  })

  return { stored, options, pair, comparison, choose }
}
