import type { Check } from '../../contracts/appraisalResult'
import { type Finding, isMet, utilisationOf } from '../finding'

/** A way to reinforce: what it weighs and what its checks find, which is asked only when needed. */
export interface Candidate<Option> {
  readonly option: Option
  readonly massKg: number
  readonly findings: () => readonly Finding[]
  /** Known, without asking, to fail a check: it counts only where nothing passes. */
  readonly isHopeless?: boolean
}

type Name = Check['name']

/** What no choice of bars may be able to mend comes first: it does not depend on load and is passed over when hopeless. */
const FIXED: readonly Name[] = ['bars.fit', 'fire.cover']

/** What load governs, in this order; where nothing passes, what comes nearest is kept. */
const GOVERNED: readonly (readonly Name[])[] = [
  ['flexure.midspan', 'flexure.support', 'steel.least', 'steel.most', 'bars.spacing'],
  ['shear'],
  ['deflection'],
]

/** Utilisations this close are equal. */
const SAME = 1e-9

/**
 * The candidate of least mass that passes every check. Where none does, the checks are met in a fixed order and the candidate nearest to
 * passing is kept, so that more load never ends in less steel.
 *
 * Source: project rule, engine design section 4 (bars: least total mass that passes every check) and section 8 (monotone)
 * @param candidates - at least one; of equal masses the first counts
 */
export function chooseLeastMass<Option>(candidates: readonly Candidate<Option>[]): Candidate<Option> {
  const inOrder = [...candidates].sort((a, b) => a.massKg - b.massKg)
  const judged = new Map<Candidate<Option>, readonly Finding[]>()
  for (const candidate of inOrder) {
    if (candidate.isHopeless) continue
    const findings = candidate.findings()
    if (findings.every(({ demand, capacity }) => isMet(demand, capacity))) return candidate
    judged.set(candidate, findings)
  }
  return nearest(inOrder.map((candidate) => ({ candidate, findings: judged.get(candidate) ?? candidate.findings() }))).candidate
}

interface Judged<Option> {
  readonly candidate: Candidate<Option>
  readonly findings: readonly Finding[]
}

/** Of candidates in order of mass of which none passes everything, the first that comes nearest. */
function nearest<Option>(judged: readonly Judged<Option>[]): Judged<Option> {
  const worst = ({ findings }: Judged<Option>, names: readonly Name[]) =>
    findings.reduce(
      (most, { name, demand, capacity }) => (names.includes(name) ? Math.max(most, utilisationOf(demand, capacity)) : most),
      0,
    )
  let pool = judged
  for (const name of FIXED) {
    const passing = pool.filter((each) => isMet(worst(each, [name]), 1))
    if (passing.length > 0) pool = passing
  }
  for (const names of GOVERNED) {
    const least = Math.max(1, Math.min(...pool.map((each) => worst(each, names))))
    pool = pool.filter((each) => worst(each, names) <= least + SAME)
  }
  return pool[0]!
}
