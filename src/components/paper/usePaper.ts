import type { StoredLevel, StoredScheme } from '#shared/contracts/project'
import { levelOnPaper } from '#shared/drawing/paper/levelOnPaper'
import type { OnPaper } from '#shared/drawing/paper/levelOnPaper'
import { panelOnPaper } from '#shared/drawing/paper/panelOnPaper'
import type { PaperTurn } from '#shared/drawing/paper/paperPlan'
import type { PaperName } from '#shared/drawing/paper/paperSize'
import { planPanels } from '#shared/drawing/planDrawing'
import type { PlanPanel } from '#shared/drawing/planPanel'
import type { Ref } from 'vue'
import { computed, ref, useId } from 'vue'
import { useProjectStore } from '../../stores/project'

/** What stands on the paper besides the drawing. */
export interface PaperContent extends OnPaper {
  readonly level: StoredLevel
  readonly scheme: StoredScheme
  /** Panels drawn: all of the level, or the one chosen. */
  readonly panels: readonly PlanPanel[]
}

/** Instead of a panel's mark; no mark may have a space. */
export const WHOLE_LEVEL = 'whole level'

/** The level, or one panel of it, that is put on paper, as the chosen scheme builds it. `panelMark` may be `WHOLE_LEVEL`. */
export function usePaper(scheme: Ref<StoredScheme | null>) {
  const store = useProjectStore()
  const id = useId()
  const paper = ref<PaperName>('A4')
  const turn = ref<PaperTurn>('either')
  const chosenLevel = ref<string | null>(null)
  const chosenPanel = ref(WHOLE_LEVEL)
  const levels = computed(() => store.levels.filter(({ panels }) => panels.length > 0))
  const level = computed(() => levels.value.find((each) => each.id === chosenLevel.value) ?? levels.value[0] ?? null)
  const levelId = computed({ get: () => level.value?.id ?? '', set: (value: string) => (chosenLevel.value = value) })
  const panelMark = computed({
    get: () => (level.value?.panels.some(({ mark }) => mark === chosenPanel.value) ? chosenPanel.value : WHOLE_LEVEL),
    set: (value: string) => (chosenPanel.value = value),
  })
  const sized = computed(() => store.full?.sized.find(({ mark }) => mark === scheme.value?.specification.mark) ?? null)

  const content = computed<PaperContent | null>(() => {
    const [row, stored] = [scheme.value, level.value]
    if (row === null || stored === null || sized.value === null) return null
    const isWhole = panelMark.value === WHOLE_LEVEL
    const all = planPanels(stored, sized.value, row.specification.kind)
    const panels = isWhole ? all : all.filter(({ panel }) => panel.mark === panelMark.value)
    const title = `${isWhole ? `Level ${stored.mark}` : `Panel ${panelMark.value} of level ${stored.mark}`}, ${row.specification.mark}`
    const trimmerMm = row.specification.kind === 'ribbed' ? row.specification.trimmerWidth : 0
    const asked = { paper: paper.value, turn: turn.value }
    const drawn = isWhole ? levelOnPaper(id, panels, asked, title) : panelOnPaper(id, panels[0]!, trimmerMm, asked, title)
    return { ...drawn, level: stored, scheme: row, panels }
  })
  return { paper, turn, levels, level, levelId, panelMark, sized, content }
}
