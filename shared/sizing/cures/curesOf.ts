import type { Check } from '../../contracts/appraisalResult'
import { OutOfScopeError } from '../../outOfScope'
import { figure } from '../figure'
import type { SizedPanel } from '../sizedPanel'
import { sizeScheme } from '../sizeScheme'
import type { CheckName, CheckTarget, Cure, CureInput, Cures, Lever, Trial } from './cure'
import { firstPassing } from './firstPassing'
import { leversOf } from './leversOf'
import { identityOf, sameCheck } from './sameCheck'

/**
 * What would make one failing check pass, each change by itself with all else as it is: found by sizing the floor again with the change,
 * never by a rule of thumb. Slow against one sizing; asked only when somebody looks.
 *
 * Source: project rule, failing checks say what would cure them
 * @throws RangeError where there is no such panel or check, OutOfScopeError as `sizeScheme`
 */
export function curesOf(input: CureInput, target: CheckTarget): Cures {
  const now = panelIn(input, target)
  const identity = identityOf(now, target.index)
  const answers = leversOf(input, target, identity).map((lever) => ({ lever, cure: pulled(lever) }))
  return {
    cures: answers.flatMap(({ cure }) => cure ?? []),
    inVain: answers.flatMap(({ lever, cure }) => (cure ? [] : [lever.limit])),
  }

  function pulled({ trials, isEvery }: Lever): Cure | null {
    const passes = (trial: Trial) => attempt(input, target, trial, (panel) => sameCheck(panel, identity)?.pass ?? true)
    const breaksNothing = (trial: Trial) => passes(trial) && cureBy(trial).breaks.length === 0
    const found = isEvery ? (trials.find(breaksNothing) ?? trials.find(passes)) : firstPassing(trials, passes)
    return found ? cureBy(found) : null
  }

  function cureBy({ scheme, brief, change }: Trial): Cure {
    const after = panelIn({ ...input, scheme, brief }, target)
    const check = sameCheck(after, identity)
    return { change, result: check ? resultOf(check) : 'no longer asked', scheme, brief, breaks: brokenBy(now, after) }
  }
}

/** The panel sized; levels that have no say in it are left out. */
function panelIn({ scheme, brief, levels }: CureInput, { level, panel }: CheckTarget): SizedPanel {
  const isOneForAll = scheme.kind === 'solid' && scheme.thickness === 'least' && scheme.thicknessPer === 'scheme'
  const needed = isOneForAll ? levels : levels.filter(({ mark }) => mark === level)
  if (needed.every(({ mark }) => mark !== level)) throw new RangeError(`expected a level of the floor, got ${level}`)
  const found = sizeScheme(scheme, { brief, levels: [...needed] }).panels.find(
    (each) => each.level === level && each.mark === panel,
  )
  if (!found) throw new RangeError(`expected a panel of level ${level}, got ${panel}`)
  return found
}

/** Whether a change can be built and `holds`; what lies outside the rules' scope is no cure. */
function attempt(
  input: CureInput,
  target: CheckTarget,
  { scheme, brief }: Trial,
  holds: (panel: SizedPanel) => boolean,
): boolean {
  try {
    return holds(panelIn({ ...input, scheme, brief }, target))
  } catch (error) {
    if (error instanceof OutOfScopeError) return false
    throw error
  }
}

/** Names of checks in which a minimum is asked: what is there must be more. */
const MINIMA: readonly Check['name'][] = ['steel.least', 'topping', 'fire.size', 'fire.cover', 'cover.exposure']

function resultOf({ name, demand, capacity, unit }: Check): string {
  const decimals = capacity >= 100 ? 0 : capacity >= 10 ? 1 : 3
  const [asked, has] = [figure(demand, decimals), figure(capacity, decimals)]
  const isMinimum = MINIMA.includes(name) || (unit === 'mm²' && name.startsWith('flexure'))
  return [isMinimum ? `${has} ≥ ${asked}` : `${asked} ≤ ${has}`, ...(unit === '-' ? [] : [unit])].join(' ')
}

function brokenBy(before: SizedPanel, after: SizedPanel): CheckName[] {
  return after.checks.flatMap(({ pass, name }, i) => {
    if (pass) return []
    const was = sameCheck(before, identityOf(after, i))
    return was?.pass === false ? [] : [{ name, place: after.places[i]! }]
  })
}
