import { useProjectStore } from '../stores/project'

/** What is wrong with the field of the open project at a path (`brief.cover`), or anything below it; null when nothing is. */
export function useProblemAt() {
  const store = useProjectStore()
  return (path: string): string | null =>
    store.problems.find((problem) => problem.path === path || problem.path.startsWith(`${path}.`))?.message ?? null
}
