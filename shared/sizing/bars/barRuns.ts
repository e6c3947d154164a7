import type { BarDiameter } from '../../contracts/appraisal'
import { figure } from '../figure'
import type { BarRun } from '../sizedPanel'
import { STOCK_LENGTH_MM } from '../tables/bars'

/** Bars of one position to be scheduled: each piece is one line of bars, its length as the parts it adds up from, mm. */
export interface BarLines {
  readonly position: string
  readonly diameter: BarDiameter
  /** Bars side by side in each line. */
  readonly each: number
  /** What is counted, as `ribs`. */
  readonly lines: string
  readonly pieces: readonly (readonly number[])[]
  readonly lapMm: () => number
  readonly clause: string
}

/** Lengths of one position up to this many are listed apiece; more are scheduled as varying, by their mean. */
const MOST_LENGTHS = 3

const sumOf = (parts: readonly number[]) => parts.reduce((sum, part) => sum + part, 0)

/** Laps that a bar of a given length needs because stock is shorter. */
function lapsIn(lengthMm: number, lapMm: () => number): number {
  return lengthMm <= STOCK_LENGTH_MM ? 0 : Math.ceil((lengthMm - STOCK_LENGTH_MM) / (STOCK_LENGTH_MM - lapMm()))
}

/** Length of a bar with its laps. */
function lappedMm(parts: readonly number[], lapMm: () => number): number {
  const length = sumOf(parts)
  const laps = lapsIn(length, lapMm)
  return laps === 0 ? length : length + laps * lapMm()
}

/**
 * How far a bottom bar passes the face of its support, mm: at least ten diameters or to the middle, at most to the far cover.
 *
 * Source: EN 1992-1-1:2004, 9.3.1.2(1) with 8.4.4 (10φ); the middle of the support: common practice, no source (engine design section 4)
 */
export function pastFaceMm(diameter: BarDiameter, supportMm: number, coverMm: number): number {
  return Math.min(Math.max(10 * diameter, supportMm / 2), supportMm - coverMm)
}

/**
 * Total length of the bars of one position, mm, laps in.
 *
 * Source: project rule, engine design section 4 (laps only beyond the stock length)
 */
export function totalLengthMm({ pieces, each, lapMm }: Pick<BarLines, 'pieces' | 'each' | 'lapMm'>): number {
  return each * pieces.reduce((sum, parts) => sum + lappedMm(parts, lapMm), 0)
}

/**
 * The rows of the bar schedule that bars of one position make: equal lengths together, many different ones by their mean.
 *
 * Source: project rule, common practice of scheduling varying bars, no source
 */
export function barRuns(bars: BarLines): BarRun[] {
  const groups = new Map<string, (readonly number[])[]>()
  for (const parts of bars.pieces) {
    const key = figure(sumOf(parts), 2)
    groups.set(key, [...(groups.get(key) ?? []), parts])
  }
  if (groups.size <= MOST_LENGTHS) return [...groups.values()].map((pieces) => equalRun(bars, pieces))
  return [varyingRun(bars)]
}

function countWorking({ each, lines }: BarLines, count: number): string {
  const counted = `${count} ${count === 1 ? lines.replace(/^(\w+)s\b/, '$1') : lines}`
  return each === 1 ? counted : `${counted} × ${each} = ${count * each}`
}

function equalRun(bars: BarLines, pieces: readonly (readonly number[])[]): BarRun {
  const parts = pieces[0]!
  const laps = lapsIn(sumOf(parts), bars.lapMm)
  const lengthMm = lappedMm(parts, bars.lapMm)
  const terms = parts.map((part, i) => (i === 0 ? figure(part, 3) : part < 0 ? `− ${figure(-part, 3)}` : `+ ${figure(part, 3)}`))
  const lapped = laps === 0 ? [] : [`+ ${laps} × ${figure(bars.lapMm(), 3)}`]
  return {
    position: bars.position,
    diameter: bars.diameter,
    count: pieces.length * bars.each,
    lengthMm,
    countWorking: countWorking(bars, pieces.length),
    lengthWorking: [...terms, ...lapped, `= ${figure(lengthMm, 3)}`].join(' '),
    clause: bars.clause,
  }
}

function varyingRun(bars: BarLines): BarRun {
  const lengths = bars.pieces.map(sumOf)
  const total = totalLengthMm({ ...bars, each: 1 })
  const lengthMm = total / lengths.length
  const [least, most] = [Math.min(...lengths), Math.max(...lengths)]
  return {
    position: bars.position,
    diameter: bars.diameter,
    count: lengths.length * bars.each,
    lengthMm,
    countWorking: countWorking(bars, lengths.length),
    lengthWorking: `varying from ${figure(least, 0)} to ${figure(most, 0)}: ${figure(total, 3)} / ${lengths.length} = ${figure(lengthMm, 3)}`,
    clause: bars.clause,
  }
}
