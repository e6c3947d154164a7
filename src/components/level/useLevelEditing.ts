import type { Panel } from '#shared/contracts/appraisal'
import type { LevelInput, StoredLevel } from '#shared/contracts/project'
import type { EditOutcome } from '#shared/layout/edit/editOutcome'
import type { Ref } from 'vue'
import { computed } from 'vue'
import { useHistory } from '../../composables/useHistory'
import { useProjectStore } from '../../stores/project'

/** Every level as it was before a change; contents are shared, never changed in place. */
type LevelsSnapshot = ReadonlyMap<string, LevelInput>

/** Edits of the level that is shown, each one a step that can be undone; undo shows the level that it changes. */
export function useLevelEditing(levelId: Ref<string | null>) {
  const store = useProjectStore()
  const history = useHistory<LevelsSnapshot>()
  const level = computed<StoredLevel | null>(() => store.levels.find(({ id }) => id === levelId.value) ?? null)
  const panels = computed<readonly Panel[]>(() => level.value?.panels ?? [])

  function change(input: Partial<LevelInput>): void {
    if (level.value === null) return
    history.record(snapshotOf(store.levels))
    store.changeLevel(level.value.id, { ...inputOf(level.value), ...input })
  }

  const setPanels = (next: readonly Panel[]): void => change({ panels: [...next] })

  /** Carries an edit out, or yields why it was refused. */
  function apply(outcome: EditOutcome): string | null {
    if ('refused' in outcome) return outcome.refused
    setPanels(outcome.panels)
    return null
  }

  function restore(step: (current: LevelsSnapshot) => LevelsSnapshot | undefined): void {
    const current = snapshotOf(store.levels)
    for (const [id, input] of step(current) ?? []) {
      if (!current.has(id) || isSame(input, current.get(id)!)) continue
      levelId.value = id
      store.changeLevel(id, input)
    }
  }

  return {
    level,
    panels,
    change,
    setPanels,
    apply,
    undo: () => restore(history.undo),
    redo: () => restore(history.redo),
    canUndo: history.canUndo,
    canRedo: history.canRedo,
  }
}

export type LevelEditing = ReturnType<typeof useLevelEditing>

function inputOf({ mark, name, repeat, proppingHeight, panels }: StoredLevel): LevelInput {
  return { mark, name, repeat, proppingHeight, panels }
}

function snapshotOf(levels: readonly StoredLevel[]): LevelsSnapshot {
  return new Map(levels.map((level) => [level.id, inputOf(level)]))
}

function isSame(a: LevelInput, b: LevelInput): boolean {
  const keys = ['mark', 'name', 'repeat', 'proppingHeight', 'panels'] as const
  return keys.every((key) => a[key] === b[key])
}
