import type { RateMove } from '#shared/contracts/resource'
import type { ResourceSheet } from '#shared/contracts/resourceSheet'
import { shallowRef } from 'vue'
import { chooseQuotation, previewChoice, readResource } from '../../api/resources'
import { useTask } from '../../composables/useTask'

/**
 * Choosing a quotation: first which rates move, then it is stored. Where somebody changed the resource meanwhile, it is read again and
 * the choice is looked at once more.
 */
export function useQuotationChoice(editionId: string, onChosen: (sheet: ResourceSheet) => void) {
  const proposed = shallowRef<{ readonly id: string | null; readonly moves: readonly RateMove[] } | null>(null)

  const choosing = useTask(async (sheet: ResourceSheet, id: string | null) => {
    const { code, version } = sheet.resource
    onChosen(await chooseQuotation(editionId, code, version, id))
    proposed.value = null
  })
  const looking = useTask(async (sheet: ResourceSheet, id: string | null) => {
    const moves = await previewChoice(editionId, sheet.resource.code, id)
    proposed.value = { id, moves }
    if (moves.length === 0) await choose(sheet, id)
  })
  const reading = useTask(async (code: string) => onChosen(await readResource(editionId, code)))

  async function choose(sheet: ResourceSheet, id: string | null): Promise<void> {
    await choosing.run(sheet, id)
    if (choosing.error.value?.code !== 'stale') return
    proposed.value = null
    await reading.run(sheet.resource.code)
  }

  return { proposed, choose, choosing, looking }
}
