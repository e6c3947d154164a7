import type { Check } from '../contracts/appraisalResult'
import type { SizedPanel } from '../sizing/sizedPanel'
import type { CalculationEntry, CalculationTitle } from './calculation'
import { readWorking } from './readWorking'

const TITLES: Record<Check['name'], CalculationTitle> = {
  'flexure.midspan': 'Bending',
  'flexure.support': 'Bending',
  shear: 'Shear',
  deflection: 'Deflection',
  'steel.least': 'Limits of steel',
  'steel.most': 'Limits of steel',
  'bars.spacing': 'Proportions and detailing',
  'bars.fit': 'Proportions and detailing',
  'ribs.proportions': 'Proportions and detailing',
  topping: 'Proportions and detailing',
  'fire.size': 'Fire and cover',
  'fire.cover': 'Fire and cover',
  'cover.exposure': 'Fire and cover',
}

/** The checks of a panel that belong to one step of its calculation, with their workings as lines. */
export function checkEntries(
  { checks, places }: Pick<SizedPanel, 'checks' | 'places'>,
  title: CalculationTitle,
): CalculationEntry[] {
  return checks.flatMap((check, i) => {
    if (TITLES[check.name] !== title) return []
    const { heading, lines } = readWorking(check.working)
    return [{ heading: heading ?? places[i]!, clause: check.clause, lines, check }]
  })
}
