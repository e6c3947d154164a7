import { figure } from '../figure'
import type { BarLines, BarPiece } from './barLines'
import { type BarShape, bendSavingMm, cutLengthMm, dimensionsText, formulaLengthMm, shapeOf, sideMm } from './barShape'

/** A bar as it is cut and bent. */
export interface CutBar {
  readonly shape: BarShape
  readonly lengthMm: number
}

type Made = Pick<BarLines, 'diameter' | 'stockMm' | 'lapMm'>

const STRAIGHT = [0, 0] as const

/**
 * Plan length of a line of bars, mm.
 *
 * Source: geometry
 */
export function planMm({ parts }: BarPiece): number {
  return parts.reduce((sum, part) => sum + part, 0)
}

function cutBar({ diameter }: Made, plan: number, legs: BarPiece['legs']): CutBar {
  const shape = shapeOf(plan, legs)
  return { shape, lengthMm: cutLengthMm(shape, diameter) }
}

/**
 * The bars that a line is made of: one, or as few as the stock allows, each as long as the stock but the last, lapped.
 *
 * Source: BS 8666:2005 (see `cutLengthMm`); laps by the basis, `lapMm`, only beyond the stock length (engine design section 4)
 */
export function cutBars(made: Made, piece: BarPiece): CutBar[] {
  const { diameter, stockMm } = made
  const plan = planMm(piece)
  const [start, end] = piece.legs
  const whole = cutBar(made, plan, piece.legs)
  if (whole.lengthMm <= stockMm) return [whole]
  const lapMm = made.lapMm()
  const first =
    start === 0 ? stockMm : sideMm(stockMm + bendSavingMm(diameter) - cutBar(made, 0, [start, 0]).shape.dimensionsMm[1]!)
  for (let laps = 1; ; laps += 1) {
    const last = cutBar(made, plan + laps * lapMm - first - (laps - 1) * stockMm, [0, end])
    if (last.lengthMm > stockMm) continue
    const between = new Array<CutBar>(laps - 1).fill(cutBar(made, stockMm, STRAIGHT))
    return [cutBar(made, first, [start, 0]), ...between, last]
  }
}

/**
 * How the length of a bar came about, for the reader: `5750 + 125 + 125 = 6000`, and for bent bars the formula of the shape.
 *
 * Source: BS 8666:2005, Table 3
 */
export function lengthWorking(made: Made, piece: BarPiece, bar: CutBar, isLapped: boolean): string {
  const terms = piece.parts
    .filter((part, i) => i === 0 || part !== 0)
    .map((part, i) => (i === 0 ? figure(part, 3) : part < 0 ? `− ${figure(-part, 3)}` : `+ ${figure(part, 3)}`))
  const plan = `${terms.join(' ')} = ${figure(planMm(piece), 3)}`
  const lapped = isLapped ? `, lapped ${figure(made.lapMm(), 0)} from stock of ${figure(made.stockMm, 0)}` : ''
  const byFormula = formulaLengthMm(bar.shape, made.diameter)
  const bends = bar.shape.code === '00' ? '' : `; ${dimensionsText(bar.shape)}: ${figure(byFormula, 3)}`
  const isRounded = Math.abs(bar.lengthMm - (bends ? byFormula : planMm(piece))) > 0.01
  return `${plan}${lapped}${bends}${isRounded ? `, cut to ${figure(bar.lengthMm, 0)}` : ''}`
}
