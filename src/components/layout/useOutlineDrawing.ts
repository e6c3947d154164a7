import type { Ring } from '#shared/contracts/appraisal'
import { boundsOf } from '#shared/geometry/ring'
import { nextMark } from '#shared/layout/edit/nextMark'
import { addPolygon, setVoids } from '#shared/layout/edit/setOutline'
import type { Ref } from 'vue'
import { computed, ref } from 'vue'
import type { LevelEditing } from '../level/useLevelEditing'

/** What is drawn on the plan by hand: the outline of a new panel, or a void of the selected one. */
export function useOutlineDrawing(editing: LevelEditing, selected: Ref<string | null>) {
  const drawing = ref<'panel' | 'void' | null>(null)
  const refusal = ref<string | null>(null)
  const newMark = computed(() =>
    nextMark(
      editing.panels.value.map(({ mark }) => mark),
      'P1',
    ),
  )
  const inWords = computed(() => {
    if (drawing.value === 'void') return `Drawing a void in ${selected.value}`
    return drawing.value === 'panel' ? `Drawing the outline of ${newMark.value}` : null
  })

  function begin(what: 'panel' | 'void'): void {
    refusal.value = null
    drawing.value = what
  }

  function leave(): void {
    drawing.value = null
    refusal.value = null
  }

  function take(ring: Ring): void {
    const panels = editing.panels.value
    const isPanel = drawing.value === 'panel'
    const mark = isPanel ? newMark.value : selected.value
    const index = panels.findIndex((panel) => panel.mark === mark)
    if (!isPanel && index < 0) return leave()
    const outcome = isPanel
      ? addPolygon(panels, newMark.value, ring, shorterDirection(ring))
      : setVoids(panels, index, [...panels[index]!.voids, ring])
    refusal.value = editing.apply(outcome)
    if (refusal.value !== null) return
    selected.value = mark
    leave()
  }

  return { inWords, refusal, begin, leave, take }
}

/** Ribs span the shorter way of the outline's box, degrees from x. */
function shorterDirection(ring: Ring): number {
  const { minX, minY, maxX, maxY } = boundsOf(ring)
  return maxX - minX < maxY - minY ? 0 : 90
}
