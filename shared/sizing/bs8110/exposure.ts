import type { BritishExposure } from '../../contracts/exposure'
import type { Comparison, ExposedBars } from '../codeBasis'
import { figure } from '../figure'

const CLAUSE = 'BS 8110-1 3.3.3, Table 3.3'

/** Grades that head the columns, MPa. */
const GRADES = [30, 35, 40, 45, 50] as const

/** Nominal cover, mm, of an exposure by grade, null where the grade is too low for it. */
type Row = readonly [number | null, number | null, number | null, number | null, number | null]

/**
 * Nominal cover to all reinforcement, links included, for durability.
 *
 * Source: BS 8110-1:1997, Table 3.3 (from memory)
 */
export const NOMINAL_COVER_MM = {
  mild: [25, 20, 20, 20, 20],
  moderate: [null, 35, 30, 25, 20],
  severe: [null, null, 40, 30, 25],
  verySevere: [null, null, 50, 40, 30],
  mostSevere: [null, null, null, null, 50],
} as const satisfies Record<BritishExposure, Row>

const NAMES = {
  mild: 'mild',
  moderate: 'moderate',
  severe: 'severe',
  verySevere: 'very severe',
  mostSevere: 'most severe',
} as const satisfies Record<BritishExposure, string>

/**
 * Nominal cover that an exposure asks of a grade and of the size of the bars, against the cover there is; where the table has no cover
 * for the grade, the least grade it has one for.
 *
 * Source: BS 8110-1:1997, 3.3.1.2 (bar size), 3.3.3, Table 3.3 (from memory); between grades the lower one counts
 */
export function exposureCover(
  exposure: BritishExposure,
  { coverMm, linkMm, diameterMm }: ExposedBars,
  fcuMpa: number,
): readonly Comparison[] {
  const row: Row = NOMINAL_COVER_MM[exposure]
  const column = GRADES.filter((grade) => grade <= fcuMpa).length - 1
  const tabulated = row[column] ?? null
  if (tabulated === null) return [gradeTooLow(exposure, row, fcuMpa)]
  const demand = Math.max(tabulated, diameterMm - linkMm)
  return [
    {
      demand,
      capacity: coverMm,
      unit: 'mm',
      clause: CLAUSE,
      working: () =>
        `${NAMES[exposure]}, fcu ${figure(fcuMpa)}: nominal cover = max(table; bar − link) = max(${tabulated}; ` +
        `${figure(diameterMm - linkMm)}) = ${figure(demand)} mm; cover ${figure(coverMm)} mm`,
    },
  ]
}

function gradeTooLow(exposure: BritishExposure, row: Row, fcuMpa: number): Comparison {
  const demand = GRADES[row.findIndex((cover) => cover !== null)]!
  return {
    demand,
    capacity: fcuMpa,
    unit: 'MPa',
    clause: CLAUSE,
    working: () => `${NAMES[exposure]}: lowest grade ${demand}; fcu ${figure(fcuMpa)} MPa`,
  }
}
