import { mark as markContract } from '../../contracts/appraisal'
import type { RectangleInput } from './addRectangle'
import type { CellProblem, PanelColumn, PanelRowText } from './panelRowText'
import type { ReadNumber } from './readLength'
import { readCount, readLength } from './readLength'
import { readRibDirection } from './readRibDirection'

/** A row read whole, or every cell that is wrong. */
export type ReadRow = { readonly row: RectangleInput } | { readonly problems: readonly CellProblem[] }

/** Repeats of one panel at most, as the appraisal file takes them. */
const MOST_REPEATS = 1000

/**
 * A row of the panel table read as a rectangle. Ribs left empty run along the shorter side, times left empty is 1; nothing
 * else is taken for granted. The void's cell is read by `readVoid`, once the panel stands.
 *
 * @param taken - marks of the level's other panels
 */
export function readPanelRow(text: PanelRowText, taken: readonly string[]): ReadRow {
  const mark = text.mark.trim()
  const alongX = readLength(text.alongX, 'along x')
  const alongY = readLength(text.alongY, 'along y')
  const ribs = text.ribs.trim() === '' ? null : readRibDirection(text.ribs)
  const times = readTimes(text.times)
  const wrongMark = markProblem(mark, taken)
  const problems = [
    ...(wrongMark === null ? [] : [{ column: 'mark' as const, reason: wrongMark }]),
    ...cellProblem('alongX', alongX),
    ...cellProblem('alongY', alongY),
    ...(ribs === null ? [] : cellProblem('ribs', ribs)),
    ...cellProblem('times', times),
  ]
  if (problems.length > 0 || !('value' in alongX && 'value' in alongY && 'value' in times)) return { problems }
  const ribDirection = ribs !== null && 'value' in ribs ? ribs.value : shorterSide(alongX.value, alongY.value)
  return { row: { mark, alongX: alongX.value, alongY: alongY.value, ribDirection, repeat: times.value } }
}

/** Repeats as typed; empty is once. */
export function readTimes(text: string): ReadNumber {
  return text.trim() === '' ? { value: 1 } : readCount(text, 'times', MOST_REPEATS)
}

/** Why a panel cannot have this mark, in words; null where it can. */
export function markProblem(mark: string, taken: readonly string[]): string | null {
  if (mark === '') return 'mark is missing: expected a short name, as P1'
  if (!markContract.safeParse(mark).success) return 'mark: expected up to 20 letters, digits, points or dashes, as P1'
  return taken.includes(mark) ? `mark ${mark} is taken by another panel of this level` : null
}

function shorterSide(alongX: number, alongY: number): number {
  return alongX < alongY ? 0 : 90
}

function cellProblem(column: PanelColumn, read: ReadNumber): CellProblem[] {
  if ('value' in read) return []
  return [{ column, reason: read.reason, ...(read.repair === undefined ? {} : { repair: read.repair }) }]
}
