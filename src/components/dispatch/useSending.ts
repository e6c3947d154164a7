import type { Dispatch, DispatchInput } from '#shared/contracts/dispatch'
import { ApiFailure } from '../../api/apiFailure'
import { createDispatch } from '../../api/dispatches'
import { idempotencyKey } from '../../api/idempotencyKey'
import { useTask } from '../../composables/useTask'
import { useProjectStore } from '../../stores/project'

/**
 * Sends what stands on the sheet: stores first what was typed, then asks once. A repeat after a lost answer carries the same key,
 * so that nothing goes out twice; another text gets another key.
 */
export function useSending() {
  const store = useProjectStore()
  let key = ''
  let sentText = ''

  return useTask(async (projectId: string, input: DispatchInput): Promise<Dispatch> => {
    await store.flush()
    if (store.saving !== 'saved') throw new ApiFailure('conflict', 'Not everything typed is stored yet, so it was not sent.')
    const text = JSON.stringify(input)
    if (key === '' || text !== sentText) key = idempotencyKey()
    sentText = text
    const dispatch = await createDispatch(projectId, input, key)
    key = ''
    return dispatch
  })
}
