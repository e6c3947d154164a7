import { notLikeForLike, undeclaredCount } from '#shared/alsoCompared/scopeDifferences'
import { computed } from 'vue'
import { useProjectStore } from '../../stores/project'

/** Where two schemes of the open project differ in scope: what is unequal, in words, and how much is not declared. */
export function useScopeDifferences(between: () => readonly [string, string] | null) {
  const store = useProjectStore()
  const differences = computed(() => {
    const marks = between()
    const all = store.full?.scopeDifferences ?? []
    return marks === null ? [] : all.filter((each) => each.between[0] === marks[0] && each.between[1] === marks[1])
  })
  return {
    differences,
    unequal: computed(() => notLikeForLike(differences.value)),
    undeclared: computed(() => undeclaredCount(differences.value)),
  }
}
