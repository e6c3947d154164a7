import type { SolidScheme } from '#shared/contracts/appraisal'
import { computed, ref } from 'vue'
import { useProjectStore } from '../stores/project'
import { StudyRefused, useStudies } from '../workers/studies'

/** A thickness for a scheme, and how it was found. */
export interface FoundThickness {
  readonly thickness: SolidScheme['thickness']
  readonly note?: string
}

/** Longest note a thickness may have, by the contract. */
const LONGEST_NOTE = 400

/** The cheapest thickness of a solid scheme on the project's floors, found off the main thread. */
export function useCheapestThickness() {
  const store = useProjectStore()
  const running = ref(false)
  /** Why the thickness is not by cost, or was not found. */
  const said = ref<string | null>(null)
  const offReason = computed(() => (store.file === null ? 'no floor stands yet' : null))

  /** The cheapest thickness; the least where it cannot be priced; null where none was found. */
  async function find(scheme: SolidScheme): Promise<FoundThickness | null> {
    const { file } = store
    if (file === null) return null
    running.value = true
    said.value = null
    try {
      const asked = { ...file, schemes: [scheme], scope: file.scope.filter((each) => each.scheme === scheme.mark) }
      const { by, thicknessMm, note } = await useStudies().ask('thickness', { file: asked, scheme: scheme.mark })
      if (by === 'cost') return { thickness: thicknessMm, note: note.slice(0, LONGEST_NOTE) }
      said.value = note
      return { thickness: 'least' }
    } catch (cause) {
      if (!(cause instanceof StudyRefused)) throw cause
      said.value = cause.message
      return null
    } finally {
      running.value = false
    }
  }

  return { running, said, offReason, find }
}
