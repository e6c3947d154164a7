import type { Dispatch } from '#shared/contracts/dispatch'
import { useTimeoutPoll } from '@vueuse/core'
import { computed, watch } from 'vue'
import { useList } from '../../composables/useList'

const WHILE_QUEUED_MS = 2000

/** A list of dispatches that is read again while something in it waits to go out. */
export function useDispatches(read: () => Promise<Dispatch[]>) {
  const list = useList(read)
  const isWaiting = computed(() => list.rows.value.some(({ state }) => state === 'queued'))
  const { pause, resume } = useTimeoutPoll(async () => void (await list.load()), WHILE_QUEUED_MS, { immediate: false })
  watch(isWaiting, (waits) => (waits ? resume() : pause()), { immediate: true })
  return { ...list, isWaiting }
}
