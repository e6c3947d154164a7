import type { BarDiameter, Level } from '../contracts/appraisal'
import type { BarShape } from '../sizing/bars/barShape'
import type { BarRun, SizedScheme } from '../sizing/sizedPanel'
import { BAR_MASS_KG_PER_M } from '../sizing/tables/bars'
import { toM } from '../units'
import { buildsOf } from './buildsOf'

/** Bars of one mark in one panel. */
export interface ScheduledMember extends Pick<BarRun, 'position' | 'countWorking' | 'lengthWorking' | 'clause'> {
  readonly level: string
  readonly panel: string
  /** How many times the panel is built: its own repeats times its level's. */
  readonly members: number
  readonly each: number
  readonly total: number
}

/** All bars that are alike: one bending and one tag. */
export interface ScheduledMark {
  readonly mark: string
  readonly diameter: BarDiameter
  readonly shape: BarShape
  readonly lengthMm: number
  readonly total: number
  readonly massKg: number
  readonly members: readonly ScheduledMember[]
}

/** Bars of one diameter, all marks together. */
export interface DiameterTotal {
  readonly diameter: BarDiameter
  readonly bars: number
  readonly lengthM: number
  readonly massKg: number
}

/** The bar schedule of a scheme over all levels, repeats in. */
export interface BarSchedule {
  readonly marks: readonly ScheduledMark[]
  readonly totals: readonly DiameterTotal[]
  readonly massKg: number
}

type Unmarked = Omit<ScheduledMark, 'mark'>

/**
 * The bar schedule of a scheme: every bar the take-off weighs, under marks that are unique in the scheme. Bars alike in diameter, shape,
 * dimensions and length have one mark, whichever member they lie in.
 *
 * Source: BS 8666:2005, clause 6 (contents of a schedule, from memory); masses BS 4449
 * @param sized - sized over the same levels
 * @throws RangeError when `sized` belongs to other levels
 */
export function barSchedule(sized: SizedScheme, levels: readonly Level[]): BarSchedule {
  const found = new Map<string, Unmarked>()
  for (const { level, mark: panel, bars } of sized.panels) {
    const { members } = buildsOf(levels, level, panel)
    for (const run of bars) {
      if (run.count === 0) continue
      const key = [run.diameter, run.shape.code, run.lengthMm, ...run.shape.dimensionsMm].join(' ')
      found.set(key, withMember(found.get(key), run, { level, panel, members }))
    }
  }
  const marks = [...found.values()]
    .sort(inOrder)
    .map((each, i): ScheduledMark => ({ mark: String(i + 1).padStart(2, '0'), ...each }))
  const totals = totalsOf(marks)
  return { marks, totals, massKg: totals.reduce((sum, { massKg }) => sum + massKg, 0) }
}

function withMember(
  before: Unmarked | undefined,
  run: BarRun,
  { level, panel, members }: Pick<ScheduledMember, 'level' | 'panel' | 'members'>,
): Unmarked {
  const { diameter, shape, lengthMm, count, position, countWorking, lengthWorking, clause } = run
  const total = members * count
  const member = { level, panel, position, members, each: count, total, countWorking, lengthWorking, clause }
  const bars = (before?.total ?? 0) + total
  return {
    diameter,
    shape,
    lengthMm,
    total: bars,
    massKg: bars * toM(lengthMm) * BAR_MASS_KG_PER_M[diameter],
    members: [...(before?.members ?? []), member],
  }
}

/** By diameter, then shape, then length, the longest first. */
function inOrder(a: Unmarked, b: Unmarked): number {
  const sides = ({ shape }: Unmarked) => shape.dimensionsMm.reduce((sum, side, i) => sum + side / 10 ** i, 0)
  return a.diameter - b.diameter || Number(a.shape.code) - Number(b.shape.code) || b.lengthMm - a.lengthMm || sides(b) - sides(a)
}

function totalsOf(marks: readonly ScheduledMark[]): DiameterTotal[] {
  return [...new Set(marks.map(({ diameter }) => diameter))].map((diameter) => {
    const own = marks.filter((each) => each.diameter === diameter)
    const sum = (valueOf: (mark: ScheduledMark) => number) => own.reduce((total, each) => total + valueOf(each), 0)
    return {
      diameter,
      bars: sum(({ total }) => total),
      lengthM: sum(({ total, lengthMm }) => total * toM(lengthMm)),
      massKg: sum(({ massKg }) => massKg),
    }
  })
}
