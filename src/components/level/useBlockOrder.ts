import type { StoredScheme } from '#shared/contracts/project'
import { orderedBlocks } from '#shared/takeoff/orderedBlocks'
import type { Ref } from 'vue'
import { computed, onMounted, shallowRef } from 'vue'
import { listBlocks } from '../../api/blocks'
import { useTask } from '../../composables/useTask'
import type { LevelMade } from './levelMakes'

/** Blocks to order for one floor, and by what rule, in words. */
export interface BlockOrder {
  readonly count: number
  readonly words: string
}

/**
 * The order for the whole blocks of one floor, by the catalogue block of the scheme; null where that was typed by hand.
 * `failure`: the catalogue could not be read.
 */
export function useBlockOrder(scheme: Ref<StoredScheme | null>, made: Ref<readonly LevelMade[]>) {
  const blocks = shallowRef<Awaited<ReturnType<typeof listBlocks>>>([])
  const { run, error } = useTask(listBlocks)
  onMounted(async () => {
    blocks.value = (await run()) ?? []
  })
  const order = computed<BlockOrder | null>(() => {
    const block = blocks.value.find(({ id }) => id === scheme.value?.blockId)
    const net = made.value.find(({ item }) => item === 'blocks.whole')
    if (block === undefined || net === undefined) return null
    const pallets = block.palletCount === null ? '' : `, in pallets of ${block.palletCount}`
    return {
      count: orderedBlocks(net.value, block),
      words: `the same to order, ${Number(block.breakagePercent)}% breakage${pallets}`,
    }
  })
  return { order, failure: error }
}
