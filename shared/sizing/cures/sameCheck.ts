import type { Check } from '../../contracts/appraisalResult'
import type { SizedPanel } from '../sizedPanel'

/** A check told from all others of its panel by name, place, and order among those alike. */
interface Identity {
  readonly name: Check['name']
  readonly place: string
  readonly order: number
}

type Checked = Pick<SizedPanel, 'checks' | 'places'>

/**
 * What tells the check in a row of a panel's list from the others.
 *
 * Source: project rule, failing checks say what would cure them
 * @throws RangeError where there is no such row
 */
export function identityOf({ checks, places }: Checked, index: number): Identity {
  const check = checks[index]
  const place = places[index]
  if (!check || place === undefined) throw new RangeError(`expected a check from 0 to ${checks.length - 1}, got ${index}`)
  const { name } = check
  const order = checks.slice(0, index).filter((each, i) => each.name === name && places[i] === place).length
  return { name, place, order }
}

/**
 * The same check in another sizing of the panel; null where the sizing does not ask it.
 *
 * Source: project rule, failing checks say what would cure them
 */
export function sameCheck({ checks, places }: Checked, { name, place, order }: Identity): Check | null {
  return checks.filter((each, i) => each.name === name && places[i] === place)[order] ?? null
}
