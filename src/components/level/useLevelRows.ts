import type { LevelInput, StoredLevel } from '#shared/contracts/project'
import { copyLevel } from '#shared/layout/edit/copyLevel'
import { nextMark } from '#shared/layout/edit/nextMark'
import type { Ref } from 'vue'
import { useTask } from '../../composables/useTask'
import { useProjectStore } from '../../stores/project'

/** Clear height under a new level, as the contract has it where none is given. */
const NEW_PROPPING_HEIGHT_MM = 2800

/** Adds, copies and removes levels of the open project; the new one is shown. */
export function useLevelRows(levelId: Ref<string | null>) {
  const store = useProjectStore()
  const marks = () => store.levels.map(({ mark }) => mark)

  async function show(input: LevelInput): Promise<void> {
    const row = await store.addLevel(input)
    if (row !== null) levelId.value = row.id
  }

  const adding = useTask(() => {
    const mark = nextMark(marks(), 'L1')
    return show({ mark, name: `Level ${mark.replace(/^L/, '')}`, repeat: 1, proppingHeight: NEW_PROPPING_HEIGHT_MM, panels: [] })
  })
  const copying = useTask(({ mark, name, repeat, proppingHeight, panels }: StoredLevel) =>
    show(copyLevel({ mark, name, repeat, proppingHeight, panels }, marks())),
  )
  const removing = useTask(async (id: string) => {
    await store.removeLevel(id)
    levelId.value = store.levels[0]?.id ?? null
  })
  return { adding, copying, removing }
}
