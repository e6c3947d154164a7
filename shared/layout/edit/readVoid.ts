import type { Ring } from '../../contracts/appraisal'
import type { Bounds } from '../../geometry/ring'
import { readLength } from './readLength'
import { boxLengths, rectangleRing } from './rectangle'

/** A void's cell read: no void, one rectangle by size and place, or why not. */
export type ReadVoid = { readonly voids: Ring[] } | { readonly reason: string }

const SIZE = /^(.+?)\s*[×x*]\s*(.+?)(?:\s+at\s+(.+?)\s*[;/]\s*(.+))?$/i

/**
 * Rectangular void typed as `2600 × 3600`, in the middle of the panel's box, or `2600 × 3600 at 2000 / 1675`, its corner that
 * far from the box's corner of least x and y. Empty or `none`: no void.
 */
export function readVoid(text: string, box: Bounds): ReadVoid {
  const typed = text.trim()
  if (typed === '' || /^(none|-|–)$/i.test(typed)) return { voids: [] }
  const [, alongX, alongY, atX, atY] = SIZE.exec(typed) ?? []
  if (alongX === undefined || alongY === undefined)
    return { reason: 'void: expected its size, as 2600 × 3600, or with its offsets, as 2600 × 3600 at 2000 / 1675' }
  const read = [readLength(alongX, 'void along x'), readLength(alongY, 'void along y')]
  const offsets = [atX, atY].map((offset, i) =>
    offset === undefined ? null : readLength(offset, `void offset along ${'xy'[i]}`, true),
  )
  const wrong = [...read, ...offsets].find((each) => each !== null && 'reason' in each)
  if (wrong !== undefined && wrong !== null && 'reason' in wrong) return { reason: wrong.reason }
  const [x, y] = read.map((each) => ('value' in each ? each.value : 0)) as [number, number]
  const least = [box.minX, box.minY]
  const lengths = [box.maxX - box.minX, box.maxY - box.minY]
  const place = [x, y].map((length, axis) => {
    const offset = offsets[axis]
    return least[axis]! + (offset && 'value' in offset ? offset.value : (lengths[axis]! - length) / 2)
  })
  return { voids: [rectangleRing([place[0]!, place[1]!], x, y)] }
}

/** How a panel's voids stand in the table's cell: nothing, one rectangle's size, or how many. */
export function voidText(voids: readonly Ring[]): string {
  const [first] = voids
  if (first === undefined) return ''
  if (voids.length > 1) return `${voids.length} voids`
  const [x, y] = boxLengths(first)
  return first.length === 4 ? `${Number(x.toFixed(3))} × ${Number(y.toFixed(3))}` : '1 by points'
}
