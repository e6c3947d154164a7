import type { Ring } from '#shared/contracts/appraisal'
import type { Point } from '#shared/geometry/point'
import { distance, signedArea } from '#shared/geometry/ring'
import { readLength } from '#shared/layout/edit/readLength'
import { sideEnd, snapPoint } from '#shared/layout/edit/snapPoint'
import { computed, ref, shallowRef } from 'vue'

/** Grid of points drawn by hand, mm. */
const STEP_MM = 50
/** How near the pointer must come to a corner or a line, px. */
const REACH_PX = 10

/**
 * An outline being drawn corner by corner: by the pointer, or by typing the length of the next side, which runs towards the
 * pointer. Closed by its first corner or by Enter; Backspace takes the last corner back, Escape leaves off.
 */
export function useSketch(options: {
  readonly corners: () => readonly Point[]
  readonly pxPerMm: () => number
  readonly onClose: (ring: Ring) => void
  readonly onLeave: () => void
}) {
  const points = shallowRef<readonly Point[]>([])
  const cursor = shallowRef<Point | null>(null)
  const typed = ref('')
  const problem = ref('')
  const reachMm = computed(() => REACH_PX / options.pxPerMm())

  const last = computed(() => points.value.at(-1) ?? null)
  /** Length of the side under way, mm; null before the first corner. */
  const sideMm = computed(() => (last.value && cursor.value ? Math.round(distance(last.value, cursor.value)) : null))
  const canClose = computed(() => points.value.length >= 3)

  function point(raw: Point): void {
    cursor.value = snapPoint(raw, {
      corners: [...options.corners(), ...points.value],
      reachMm: reachMm.value,
      stepMm: STEP_MM,
    })
  }

  /** Sets a corner where the pointer is; on the first corner, closes. */
  function set(): void {
    if (cursor.value === null) return
    const [first] = points.value
    if (first !== undefined && canClose.value && distance(first, cursor.value) < 1) return close()
    add(cursor.value)
  }

  function add(corner: Point): void {
    if (last.value !== null && distance(last.value, corner) < 1) return
    points.value = [...points.value, corner]
    typed.value = ''
    problem.value = ''
  }

  function close(): void {
    if (!canClose.value) {
      problem.value = 'An outline needs at least three corners.'
      return
    }
    const ring: Ring = points.value.map(([x, y]) => [x, y])
    options.onClose(signedArea(ring) < 0 ? ring.reverse() : ring)
  }

  /** Enter: sets the corner that the typed length leads to, or closes when nothing is typed. */
  function enter(): void {
    if (typed.value.trim() === '') return close()
    const read = readLength(typed.value, 'the next side')
    if ('reason' in read) problem.value = `${read.reason}.`
    else if (last.value === null) problem.value = 'Set the first corner on the plan, then type the length of the side.'
    else add(sideEnd(last.value, cursor.value ?? [last.value[0] + 1, last.value[1]], read.value))
  }

  /** Takes the last typed digit, or the last corner, back. */
  function back(): void {
    if (typed.value !== '') typed.value = typed.value.slice(0, -1)
    else points.value = points.value.slice(0, -1)
    problem.value = ''
  }

  function onKey(event: KeyboardEvent): void {
    const act = event.key === 'Enter' ? enter : event.key === 'Backspace' ? back : event.key === 'Escape' ? options.onLeave : null
    const isDigit = /^[\d.,]$/.test(event.key)
    if ((act === null && !isDigit) || event.ctrlKey || event.metaKey) return
    event.preventDefault()
    event.stopPropagation()
    if (act === null) typed.value += event.key
    else act()
  }

  function refuse(reason: string): void {
    problem.value = `${reason.charAt(0).toUpperCase()}${reason.slice(1)}.`
  }

  return { points, cursor, typed, problem, sideMm, canClose, point, set, close, back, onKey, refuse }
}

export type Sketch = ReturnType<typeof useSketch>
