import type { Ring } from '../../contracts/appraisal'
import type { Bounds } from '../../geometry/ring'
import { boundsOf } from '../../geometry/ring'
import type { ReadNumber } from './readLength'
import { readLength } from './readLength'
import { boxLengths, isRectangle, rectangleRing } from './rectangle'

/** A void's cell read: no void, one rectangle by size and place, or why not. */
export type ReadVoid = { readonly voids: Ring[] } | { readonly reason: string }

const SIZE = /^(.+?)\s*[×x*]\s*(.+?)(?:\s+at\s+(.+?)\s*[;/]\s*(.+))?$/i

/**
 * Rectangular void typed as `2600 × 3600`, or `2600 × 3600 at 2000 / 1675`, its corner that far from the corner of least x and
 * y of the panel's box. Without offsets it keeps the corner of the void that stood there, else stands in the middle of the box.
 * Empty or `none`: no void.
 *
 * @param box - of the panel's outline
 * @param before - the void that stood there, or null
 */
export function readVoid(text: string, box: Bounds, before: Ring | null): ReadVoid {
  const typed = text.trim()
  if (typed === '' || /^(none|-|–)$/i.test(typed)) return { voids: [] }
  const [, sizeX, sizeY, offsetX, offsetY] = SIZE.exec(typed) ?? []
  if (sizeX === undefined || sizeY === undefined)
    return { reason: 'void: expected its size, as 2600 × 3600, or with its offsets, as 2600 × 3600 at 2000 / 1675' }
  const kept = before === null ? null : boundsOf(before)
  const x = readSide('x', sizeX, offsetX, [box.minX, box.maxX], kept?.minX)
  const y = readSide('y', sizeY, offsetY, [box.minY, box.maxY], kept?.minY)
  if ('reason' in x) return x
  if ('reason' in y) return y
  return { voids: [rectangleRing([x.start, y.start], x.length, y.length)] }
}

/** How a panel's voids stand in the table's cell: nothing, one rectangle's size, or how many. */
export function voidText(voids: readonly Ring[]): string {
  const [first] = voids
  if (first === undefined) return ''
  if (voids.length > 1) return `${voids.length} voids`
  if (!isRectangle({ outline: first })) return 'by points'
  return boxLengths(first)
    .map((length) => Number(length.toFixed(1)))
    .join('×')
}

function readSide(
  axis: 'x' | 'y',
  size: string,
  offset: string | undefined,
  [least, most]: readonly [number, number],
  kept: number | undefined,
): { readonly length: number; readonly start: number } | { readonly reason: string } {
  const length = readLength(size, `void along ${axis}`)
  if ('reason' in length) return { reason: length.reason }
  const inMiddle = least + (most - least - length.value) / 2
  if (offset === undefined) return { length: length.value, start: kept ?? inMiddle }
  const from: ReadNumber = readLength(offset, `void offset along ${axis}`, true)
  return 'reason' in from ? { reason: from.reason } : { length: length.value, start: least + from.value }
}
