import type { BarRun } from '../sizedPanel'
import type { BarLines, BarPiece } from './barLines'
import { roundedLengthMm } from './barShape'
import { type CutBar, cutBars, lengthWorking, planMm } from './cutBars'

/**
 * Total length of the bars of one position as they are cut, mm, laps in.
 *
 * Source: see `cutBars`
 */
export function totalLengthMm(lines: Pick<BarLines, 'diameter' | 'pieces' | 'each' | 'stockMm' | 'lapMm'>): number {
  const inPiece = (piece: BarPiece) =>
    straightWithinStockMm(piece, lines.stockMm) ?? cutBars(lines, piece).reduce((sum, { lengthMm }) => sum + lengthMm, 0)
  return lines.each * lines.pieces.reduce((sum, piece) => sum + inPiece(piece), 0)
}

/** Cut length of a line that is one straight bar, mm: most lines are. Null for bent and for lapped ones. */
function straightWithinStockMm(piece: BarPiece, stockMm: number): number | null {
  if (piece.legs[0] !== 0 || piece.legs[1] !== 0) return null
  const lengthMm = roundedLengthMm(planMm(piece))
  return lengthMm <= stockMm ? lengthMm : null
}

/** Bars of a position that are cut and bent alike, the longest of their lines for the working. */
interface Alike {
  readonly bar: CutBar
  readonly longest: BarPiece
  readonly isLapped: boolean
  readonly count: number
}

/**
 * The rows of the bar schedule that bars of one position make: one for each shape and cut length, longest first.
 *
 * Source: BS 8666:2005 (bars of one mark are alike in diameter, shape and dimensions)
 */
export function barRuns(lines: BarLines): BarRun[] {
  const found = new Map<string, Alike>()
  for (const piece of lines.pieces) {
    const bars = cutBars(lines, piece)
    for (const bar of bars) {
      const key = `${bar.shape.code} ${bar.shape.dimensionsMm.join()} ${bars.length > 1}`
      const before = found.get(key)
      const isLonger = !before || planMm(piece) > planMm(before.longest)
      found.set(key, {
        bar,
        longest: isLonger ? piece : before.longest,
        isLapped: bars.length > 1,
        count: (before?.count ?? 0) + 1,
      })
    }
  }
  return [...found.values()].sort((a, b) => b.bar.lengthMm - a.bar.lengthMm).map((alike) => runOf(lines, alike))
}

function runOf(lines: BarLines, { bar, longest, isLapped, count }: Alike): BarRun {
  return {
    position: lines.position + (lines.strip ?? ''),
    diameter: lines.diameter,
    count: count * lines.each,
    lengthMm: bar.lengthMm,
    shape: bar.shape,
    spacingMm: lines.spacingMm,
    countWorking: countWorking(lines, count),
    lengthWorking: lengthWorking(lines, longest, bar, isLapped),
    clause: lines.clause,
  }
}

function countWorking({ each, lines }: BarLines, count: number): string {
  const counted = `${count} ${count === 1 ? lines.replace(/^(\w+)s\b/, '$1') : lines}`
  return each === 1 ? counted : `${counted} × ${each} = ${count * each}`
}
