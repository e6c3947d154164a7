import type { Brief, Level, Scheme } from '../contracts/appraisal'
import type { Quantity } from '../contracts/appraisalResult'
import type { SizedScheme } from '../sizing/sizedPanel'
import { type MeasuredPanel, measuredPanels } from './measuredPanel'
import type { Composite, MeasurementRules } from './measurementRules'
import { floorAreaOf } from './planAreas'
import { quantityOf } from './quantityOf'
import { type TakeOff, takeOffItems } from './takeOffItems'

/**
 * Everything a scheme takes, item by item in the order of a bill, all levels and repeats together. Items of which it takes
 * nothing are left out. Every part is one panel (for bars one run of bars), with the arithmetic that yields it. A composite item
 * holds the items that it is made up of as its analysis, measured over the same panels.
 *
 * Source: measurement rules in `rules`
 * @param sized - the same scheme, sized over the same levels
 * @param basis - that it was sized by
 * @throws RangeError when `sized` belongs to other levels
 */
export function takeOffScheme(
  scheme: Scheme,
  sized: SizedScheme,
  levels: readonly Level[],
  rules: MeasurementRules,
  basis: Brief['basis'],
): Quantity[] {
  const panels = measuredPanels(sized, levels)
  const job = { scheme, rules, basis }
  const composite = rules.composites[scheme.kind]
  return composite === undefined ? takeOffItems(job, panels) : withComposite(job, panels, composite)
}

/** One composite for each overall depth, then what is not in it. */
function withComposite(job: TakeOff, panels: readonly MeasuredPanel[], { item, of }: Composite): Quantity[] {
  const isIn = (other: string) => of.some((family) => other === family || other.startsWith(`${family}.`))
  const depths = [...new Set(panels.map(({ sized }) => sized.depth))].sort((a, b) => a - b)
  const floors = depths.flatMap((mm): Quantity[] => {
    const members = panels.filter(({ sized }) => sized.depth === mm)
    const area = quantityOf(item, members, job.rules, (measured) => [floorAreaOf(measured, job.rules.deductVoidsOver.floorM2)])
    const analysis = takeOffItems(job, members).filter((quantity) => isIn(quantity.item))
    return area === null ? [] : [{ ...area, bands: [{ of: 'overallDepth', mm }], analysis }]
  })
  return [...floors, ...takeOffItems(job, panels).filter((quantity) => !isIn(quantity.item))]
}
