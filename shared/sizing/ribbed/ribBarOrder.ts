import type { Bar, BarDiameter } from '../../contracts/appraisal'
import { areaOf, type BarSet } from '../bars/barSet'
import { BAR_MASS_KG_PER_M, CHOSEN_DIAMETERS } from '../tables/bars'

/** A set of rib bars with what it weighs in a panel. */
export interface WeighedSet {
  readonly set: BarSet
  readonly areaMm2: number
  readonly massKg: number
}

/**
 * Sets a rib may be given: one bar, or two, of equal or different diameters.
 *
 * Source: project rule, engine design section 4 (bars computed)
 */
export const RIB_BAR_SETS: readonly BarSet[] = CHOSEN_DIAMETERS.flatMap((first, i): BarSet[] => [
  [{ diameter: first, count: 1 }],
  ...CHOSEN_DIAMETERS.slice(0, i).map((second): Bar[] => [
    { diameter: first, count: 1 },
    { diameter: second, count: 1 },
  ]),
  [{ diameter: first, count: 2 }],
])

/**
 * The sets by what they weigh, the lightest first; of equal ones in the order of `RIB_BAR_SETS`.
 *
 * Source: BS 4449, nominal masses
 * @param lengthOf - of one bar of a diameter in every rib of the panel, mm, laps in
 */
export function ribBarOrder(lengthOf: (diameter: BarDiameter) => number): WeighedSet[] {
  const kgOf = new Map<BarDiameter, number>(
    CHOSEN_DIAMETERS.map((diameter) => [diameter, (lengthOf(diameter) * BAR_MASS_KG_PER_M[diameter]) / 1000]),
  )
  return RIB_BAR_SETS.map((set) => ({
    set,
    areaMm2: areaOf(set),
    massKg: set.reduce((sum, { diameter, count }) => sum + count * kgOf.get(diameter)!, 0),
  })).sort((a, b) => a.massKg - b.massKg)
}
