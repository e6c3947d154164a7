import type { BarDiameter } from '../../contracts/appraisal'
import { LEAST_RADIUS_MM } from './bends'

/** Straight; bent once; bent at both ends the same way. Source: BS 8666:2005, Table 3 */
export type ShapeCode = '00' | '11' | '21'

/**
 * How a bar is bent. `dimensionsMm` are A, B, C as scheduled, outside to outside: 00 the length; 11 the long side and the leg; 21 a leg,
 * the side between and the other leg.
 */
export interface BarShape {
  readonly code: ShapeCode
  readonly dimensionsMm: readonly number[]
}

/** Lengths and dimensions this close to a step count as on it, so that a floor that is turned keeps its bars, mm. */
const STEP_TOLERANCE_MM = 0.01

/** Steps of cut lengths and of bending dimensions, mm. Source: BS 8666:2005, clause 8 (from memory) */
const LENGTH_STEP_MM = 25
const DIMENSION_STEP_MM = 5

const roundedUp = (valueMm: number, stepMm: number) => Math.ceil((valueMm - STEP_TOLERANCE_MM) / stepMm) * stepMm
const roundedDown = (valueMm: number, stepMm: number) => Math.floor((valueMm + STEP_TOLERANCE_MM) / stepMm) * stepMm

/**
 * A length as bars are cut to, mm: the next multiple of 25.
 *
 * Source: BS 8666:2005, clause 8 (from memory)
 */
export function roundedLengthMm(lengthMm: number): number {
  return roundedUp(lengthMm, LENGTH_STEP_MM)
}

/**
 * The most a side may measure so that it keeps its cover, mm: the multiple of 5 below.
 *
 * Source: BS 8666:2005, clause 8 (from memory)
 */
export function sideMm(roomMm: number): number {
  return roundedDown(roomMm, DIMENSION_STEP_MM)
}

/**
 * The shape of a bar that lies along a plan length and is turned at its ends.
 *
 * Source: BS 8666:2005, Table 3, shapes 00, 11 and 21; dimensions to 5 mm, a side between two legs rounded down
 * @param planMm - outside to outside along the bar
 * @param legsMm - of its two ends, outside; 0 where it ends straight
 */
export function shapeOf(planMm: number, legsMm: readonly [number, number]): BarShape {
  const [first, last] = legsMm.map((leg) => roundedUp(leg, DIMENSION_STEP_MM)) as [number, number]
  if (first === 0 && last === 0) return { code: '00', dimensionsMm: [roundedLengthMm(planMm)] }
  if (first > 0 && last > 0) return { code: '21', dimensionsMm: [first, sideMm(planMm), last] }
  return { code: '11', dimensionsMm: [roundedUp(planMm, DIMENSION_STEP_MM), Math.max(first, last)] }
}

/**
 * What every leg adds to the length of a bar beside its own dimension: half the radius and the diameter are saved by the bend, mm.
 *
 * Source: BS 8666:2005, Table 3, shapes 11 and 21
 */
export function bendSavingMm(diameter: BarDiameter): number {
  return LEAST_RADIUS_MM[diameter] / 2 + diameter
}

/**
 * Length of a bar by the formula of its shape, mm, not rounded.
 *
 * Source: BS 8666:2005, Table 3: 00 A; 11 A + B − 0.5r − d; 21 A + B + C − r − 2d
 */
export function formulaLengthMm({ code, dimensionsMm }: BarShape, diameter: BarDiameter): number {
  const bends = { '00': 0, '11': 1, '21': 2 }[code]
  return dimensionsMm.reduce((sum, side) => sum + side, 0) - bends * bendSavingMm(diameter)
}

/**
 * Length that a bar is cut to, mm.
 *
 * Source: BS 8666:2005, Table 3 and clause 8
 */
export function cutLengthMm(shape: BarShape, diameter: BarDiameter): number {
  return roundedLengthMm(formulaLengthMm(shape, diameter))
}

/**
 * A shape's dimensions as a schedule writes them, `A 1125, B 240`.
 *
 * Source: BS 8666:2005, Table 3, letters of the sides
 */
export function dimensionsText({ dimensionsMm }: BarShape): string {
  return dimensionsMm.map((side, i) => `${'ABC'[i]!} ${side}`).join(', ')
}
