import { useElementSize } from '@vueuse/core'
import type { Ref } from 'vue'
import { computed } from 'vue'

/** Width a drawing may take, whole px, so that its words keep their size; `fallback` until it is on the page. */
export function useDrawnWidth(element: Ref<HTMLElement | null>, fallback = 640) {
  const { width } = useElementSize(element)
  return computed(() => (width.value > 0 ? Math.max(240, Math.floor(width.value)) : fallback))
}
