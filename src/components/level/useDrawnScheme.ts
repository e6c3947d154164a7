import type { StoredLevel, StoredScheme } from '#shared/contracts/project'
import { planPanels } from '#shared/drawing/planDrawing'
import { basisName } from '#shared/sizing/basisName'
import type { Ref } from 'vue'
import { computed, ref, shallowRef, watch } from 'vue'
import { useProjectStore } from '../../stores/project'

/** The scheme that a level is drawn and counted as, and what the appraisal made of that level. */
export function useDrawnScheme(level: Ref<StoredLevel | null>) {
  const store = useProjectStore()
  const chosenId = ref<string | null>(null)
  const scheme = computed<StoredScheme | null>(
    () => store.schemes.find(({ id }) => id === chosenId.value) ?? store.schemes[0] ?? null,
  )
  const schemeId = computed({ get: () => scheme.value?.id ?? null, set: (id) => (chosenId.value = id) })
  const kind = computed(() => scheme.value?.specification.kind ?? 'ribbed')
  /** Width of the solid strip around voids, mm; none in a solid slab. */
  const trimmerMm = computed(() => (scheme.value?.specification.kind === 'ribbed' ? scheme.value.specification.trimmerWidth : 0))
  const ribbed = computed(() =>
    store.schemes.flatMap(({ specification }) => (specification.kind === 'ribbed' ? [specification] : [])),
  )
  const basis = computed(() => (store.project === null ? '' : basisName(store.project.brief)))
  const mark = computed(() => scheme.value?.specification.mark)
  const result = computed(() => store.full?.appraisal.schemes.find((each) => each.mark === mark.value) ?? null)
  const sized = computed(() => store.full?.sized.find((each) => each.mark === mark.value) ?? null)
  const depths = computed(() => new Map(store.full?.appraisal.schemes.map((each) => [each.mark, each.depth])))

  const levelMark = computed(() => level.value?.mark ?? '')
  const panelResults = computed(() => result.value?.panels.filter((each) => each.level === levelMark.value) ?? [])
  const checks = computed(() => result.value?.checks.filter((each) => each.level === levelMark.value) ?? [])
  /** The level as the figures shown know it: while a change is being appraised, the plan stays with its blocks. */
  const laidOut = shallowRef(level.value)
  watch(
    [level, () => store.full, () => store.isAppraising],
    () => {
      if (!store.isAppraising || laidOut.value?.id !== level.value?.id) laidOut.value = level.value
    },
    { flush: 'sync' },
  )
  const drawn = computed(() => (laidOut.value === null ? [] : planPanels(laidOut.value, sized.value, kind.value)))
  /** Problems under a path, by path within it. */
  const issuesUnder = (prefix: string) =>
    store.problems
      .filter(({ path }) => path.startsWith(prefix))
      .map(({ path, message }) => ({ path: path.slice(prefix.length), message }))
  const issues = computed(() => issuesUnder(`levels.${store.levels.findIndex(({ id }) => id === level.value?.id)}.`))
  const schemeIssues = computed(() => issuesUnder(`schemes.${store.schemes.findIndex(({ id }) => id === schemeId.value)}.`))

  return {
    scheme,
    schemeId,
    kind,
    result,
    sized,
    depths,
    panelResults,
    checks,
    drawn,
    issues,
    schemeIssues,
    trimmerMm,
    basis,
    ribbed,
  }
}

export type DrawnScheme = ReturnType<typeof useDrawnScheme>
