import type { EditionWithRates } from '#shared/contracts/rateBook'
import type { ImportMatching, ImportRowPage, ImportRowState, RateImport } from '#shared/contracts/rateImport'
import { computed, onUnmounted, ref, shallowRef, watch } from 'vue'
import { idempotencyKey } from '../../api/idempotencyKey'
import { readEdition } from '../../api/rateBooks'
import { commitImport, listImportRows, listImports, matchImport, readImport, undoImport, uploadList } from '../../api/rateImports'
import { useTask } from '../../composables/useTask'
import { useSessionStore } from '../../stores/session'

const LOOK_EVERY_MS = 400
const UNDER_WAY: readonly RateImport['state'][] = ['reading', 'checking', 'committing']

/** The import of a list on screen: the edition, the import in hand, its preview, the earlier ones. */
export function useImport(editionId: () => string) {
  const session = useSessionStore()
  const edition = shallowRef<EditionWithRates | null>(null)
  const earlier = shallowRef<readonly RateImport[]>([])
  const current = shallowRef<RateImport | null>(null)
  const rows = shallowRef<ImportRowPage | null>(null)
  const filter = ref<ImportRowState | null>(null)
  const page = ref(1)
  const isUnderWay = computed(() => current.value !== null && UNDER_WAY.includes(current.value.state))
  const mayImport = computed(() => session.hasRole('estimator') && edition.value?.state === 'draft')
  let waiting: ReturnType<typeof setTimeout> | undefined

  const list = useTask(async () => {
    const now = { id: current.value?.id ?? '', state: filter.value, page: page.value }
    if (now.id === '') return
    const answer = await listImportRows(now.id, now.state, now.page)
    if (current.value?.id === now.id && filter.value === now.state && page.value === now.page) rows.value = answer
  })
  const look = useTask(async () => {
    const id = current.value?.id
    if (id === undefined) return
    const answer = await readImport(id)
    if (current.value?.id === id) await take(answer)
  })
  const load = useTask(async () => {
    edition.value = await readEdition(editionId())
    earlier.value = session.hasRole('estimator') ? await listImports(editionId()) : []
  })

  /** Goes on with an import as it stands, and looks again while a step of it is under way. */
  async function take(answer: RateImport | null): Promise<void> {
    clearTimeout(waiting)
    const isStep = answer?.state !== current.value?.state || answer?.id !== current.value?.id
    current.value = answer
    if (answer !== null && UNDER_WAY.includes(answer.state)) waiting = setTimeout(() => void look.run(), LOOK_EVERY_MS)
    if (!isStep) return
    rows.value = null
    page.value = 1
    filter.value = answer?.counts && answer.counts.refused > 0 ? 'refused' : null
    if (answer?.counts && (answer.state === 'previewed' || answer.state === 'committed')) await list.run()
    if (answer === null || answer.state === 'committed' || answer.state === 'undone') await load.run()
  }

  const upload = useTask(async (file: File) => await take(await uploadList(editionId(), file, idempotencyKey())))
  const match = useTask(async (matching: ImportMatching) => {
    if (current.value) await take(await matchImport(current.value.id, matching))
  })
  const commit = useTask(async (leaveOutRefused: boolean) => {
    if (current.value) await take(await commitImport(current.value.id, leaveOutRefused))
  })
  const undo = useTask(async () => {
    if (current.value) await take(await undoImport(current.value.id))
  })

  watch([filter, page], () => void list.run())
  async function begin(): Promise<void> {
    await take(null)
    edition.value = null
    await load.run()
  }
  watch(editionId, () => void begin(), { immediate: true })
  onUnmounted(() => clearTimeout(waiting))
  return {
    edition,
    earlier,
    current,
    rows,
    filter,
    page,
    isUnderWay,
    mayImport,
    list,
    look,
    load,
    take,
    upload,
    match,
    commit,
    undo,
  }
}
