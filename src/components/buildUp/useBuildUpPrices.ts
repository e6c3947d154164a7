import type { BuildUp } from '#shared/contracts/buildUp'
import { buildUp as buildUpContract } from '#shared/contracts/buildUp'
import type { OpenedBuildUp } from '#shared/contracts/openedRate'
import type { Gang, Resource } from '#shared/contracts/resource'
import type { BuiltUpLine, BuiltUpRate } from '#shared/pricing/builtUpRate'
import { builtUpRate } from '#shared/pricing/builtUpRate'
import { BuildUpRefusedError } from '#shared/pricing/buildUpRefused'
import { computed, shallowRef, triggerRef } from 'vue'
import { listGangs, readResource } from '../../api/resources'
import { useTask } from '../../composables/useTask'

/**
 * Prices that a build-up on screen is worked out by: those of the opened rate, and of whatever is chosen since. The rate is worked out
 * by the same function that the server stores it by.
 */
export function useBuildUpPrices(editionId: string, currency: string, opened: OpenedBuildUp | null) {
  const resources = shallowRef(new Map<string, Resource>((opened?.resources ?? []).map((row) => [row.code, row])))
  const gangs = shallowRef<ReadonlyMap<string, Gang>>(new Map((opened?.gangs ?? []).map((row) => [row.code, row])))
  const prices = computed(() => ({ resources: resources.value, gangs: gangs.value }))

  function know(resource: Resource): void {
    resources.value.set(resource.code, resource)
    triggerRef(resources)
  }
  const load = useTask(async () => {
    gangs.value = new Map((await listGangs(editionId)).map((gang) => [gang.code, gang]))
  })
  /** Reads what the members of a gang cost, where that is not known yet. */
  const needGang = useTask(async (code: string) => {
    const members = gangs.value.get(code)?.members.map(({ resource }) => resource) ?? []
    const unknown = members.filter((member) => !resources.value.has(member))
    for (const { resource } of await Promise.all(unknown.map((member) => readResource(editionId, member)))) know(resource)
  })

  /** The rate that a build-up makes; null while it cannot be worked out. */
  function rateOf(draft: BuildUp): BuiltUpRate | null {
    const reading = buildUpContract.safeParse(draft)
    if (!reading.success) return null
    try {
      return builtUpRate(reading.data, prices.value, currency)
    } catch (cause) {
      if (cause instanceof BuildUpRefusedError) return null
      throw cause
    }
  }
  /** What one line makes by itself; null while it cannot be worked out. */
  function lineOf(line: Partial<Pick<BuildUp, 'materials' | 'labour' | 'plant'>>): BuiltUpLine | null {
    const alone = { materials: [], labour: [], plant: [], overheadsPercent: '0', profitPercent: '0', ...line }
    return rateOf(alone)?.lines[0] ?? null
  }

  return { resources, gangs, know, load, needGang, rateOf, lineOf }
}
export type BuildUpPricesOnScreen = ReturnType<typeof useBuildUpPrices>
