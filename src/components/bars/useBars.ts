import type { AppraisalFile, Brief, Scheme } from '#shared/contracts/appraisal'
import type { StoredScheme } from '#shared/contracts/project'
import { barSchedule } from '#shared/schedule/barSchedule'
import { meshSheets } from '#shared/schedule/meshSheets'
import type { SizedScheme } from '#shared/sizing/sizedPanel'
import type { Ref } from 'vue'
import { computed, ref, shallowRef, watch } from 'vue'
import { useCuttingPlans } from '../../composables/useCuttingPlans'
import { useProjectStore } from '../../stores/project'

/** A scheme as it was sized, with the floor and the brief it was sized from. */
interface Sized {
  readonly sized: SizedScheme
  readonly specification: Scheme
  readonly levels: AppraisalFile['levels']
  readonly brief: Brief
}

/** The bars of the chosen scheme: their schedule, the sheets of mesh and how they are cut from stock. */
export function useBars(row: Ref<StoredScheme | null>) {
  const store = useProjectStore()
  const sawCutMm = ref(0)
  const shown = shallowRef<Sized | null>(null)
  watch(
    [row, () => store.full, () => store.isAppraising],
    () => {
      if (store.isAppraising) return
      const specification = row.value?.specification
      const sized = store.full?.sized.find(({ mark }) => mark === specification?.mark)
      const brief = store.project?.brief
      shown.value = sized && specification && brief ? { sized, specification, levels: [...store.levels], brief } : null
    },
    { immediate: true },
  )
  const schedule = computed(() => shown.value && barSchedule(shown.value.sized, shown.value.levels))
  const sheets = computed(() => {
    if (shown.value === null) return null
    const { sized, specification, levels, brief } = shown.value
    const mesh = specification.kind === 'ribbed' ? specification.mesh : 'none'
    return mesh === 'none' ? null : meshSheets(sized, mesh, levels, brief.basis)
  })
  const cutting = useCuttingPlans(() => {
    if (schedule.value === null || shown.value === null) return null
    const { marks, totals } = schedule.value
    const wanted = totals.map(({ diameter }) => ({
      diameter,
      lengths: marks.filter((mark) => mark.diameter === diameter).map(({ lengthMm, total }) => ({ lengthMm, count: total })),
    }))
    return { wanted, stockMm: shown.value.brief.stockLength, sawCutMm: sawCutMm.value }
  })
  return { schedule, sheets, cutting, sawCutMm }
}
