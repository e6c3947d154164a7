import type { EditionWithRates } from '#shared/contracts/rateBook'
import type { Gang, Resource } from '#shared/contracts/resource'
import type { ResourcePage, ResourceSheet } from '#shared/contracts/resourceSheet'
import { ref, shallowRef, watch } from 'vue'
import { readEdition } from '../../api/rateBooks'
import type { AskedResources } from '../../api/resources'
import { listGangs, listResources, readResource } from '../../api/resources'
import { useTask } from '../../composables/useTask'

/** The resources of an edition on screen: the page that is asked for, the one that is opened, and the gangs. */
export function useResources(editionId: () => string) {
  const edition = shallowRef<EditionWithRates | null>(null)
  const gangs = shallowRef<readonly Gang[]>([])
  const page = shallowRef<ResourcePage | null>(null)
  const asked = ref<AskedResources>({ search: '', kind: null, page: 1 })
  const sheet = shallowRef<ResourceSheet | null>(null)

  const list = useTask(async () => {
    const now = asked.value
    const answer = await listResources(editionId(), now)
    if (asked.value === now) page.value = answer
  })
  const load = useTask(async () => {
    const [row, all] = await Promise.all([readEdition(editionId()), listGangs(editionId()), list.run()])
    edition.value = row
    gangs.value = all
  })
  let wanted = ''
  const open = useTask(async (code: string) => {
    wanted = code
    const answer = await readResource(editionId(), code)
    if (wanted === code) sheet.value = answer
  })
  const loadGangs = useTask(async () => {
    gangs.value = await listGangs(editionId())
  })
  /** What the members of a gang are. */
  const members = useTask(async ({ members: all }: Gang): Promise<readonly Resource[]> => {
    const sheets = await Promise.all(all.map(({ resource }) => readResource(editionId(), resource)))
    return sheets.map(({ resource }) => resource)
  })

  /** Reads again what a change may have touched. */
  async function follow(code: string | null): Promise<void> {
    if (code === null) sheet.value = null
    await Promise.all([list.run(), code === null ? undefined : open.run(code)])
  }
  watch(asked, () => void list.run())
  watch(
    editionId,
    () => {
      sheet.value = null
      page.value = null
      void load.run()
    },
    { immediate: true },
  )
  return { edition, gangs, page, asked, sheet, list, load, open, loadGangs, members, follow }
}
