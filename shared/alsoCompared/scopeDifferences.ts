import type { ScopeEntry, ScopeStanding } from '../contracts/sameScope'
import { SCOPE_ENTRIES, SCOPE_WORDS } from './scopeWords'

/** How a scheme stands to an entry; undeclared: nothing was said. */
export type ScopeState = ScopeStanding['state'] | 'undeclared'

/** An entry that two schemes do not treat alike, or of which something is not declared. */
export interface ScopeDifference {
  readonly entry: ScopeEntry
  /** Marks of the two schemes. */
  readonly between: readonly [string, string]
  readonly states: readonly [ScopeState, ScopeState]
  /** True: one total holds it and the other does not, so they are not like for like. False: not declared, but no difference known. */
  readonly isUnequal: boolean
}

const isInTotal = (state: ScopeState): boolean => state === 'priced' || state === 'inRates'

function stateOf(
  standings: readonly Pick<ScopeStanding, 'scheme' | 'entry' | 'state'>[],
  mark: string,
  entry: ScopeEntry,
): ScopeState {
  return standings.find((standing) => standing.scheme === mark && standing.entry === entry)?.state ?? 'undeclared'
}

/**
 * Where two schemes differ in scope, entry by entry in the order of the list: unequal where the one's total holds the entry, priced
 * or in its rates, and the other's does not, because it is left out or nothing is said. What is not declared is named besides.
 *
 * Source: project rule, engine design sections 5 and 7 (unequal scope is flagged, never averaged away)
 * @param between - marks of the two schemes; the order is kept
 */
export function scopeDifferences(
  standings: readonly Pick<ScopeStanding, 'scheme' | 'entry' | 'state'>[],
  between: readonly [string, string],
): ScopeDifference[] {
  return SCOPE_ENTRIES.flatMap((entry) => {
    const states = [stateOf(standings, between[0], entry), stateOf(standings, between[1], entry)] as const
    const isUnequal = isInTotal(states[0]) !== isInTotal(states[1])
    return isUnequal || states.includes('undeclared') ? [{ entry, between, states, isUnequal }] : []
  })
}

/** Differences of every ribbed scheme against every solid one, in the order of the schemes. */
export function allScopeDifferences(
  standings: readonly Pick<ScopeStanding, 'scheme' | 'entry' | 'state'>[],
  schemes: readonly { readonly mark: string; readonly kind: 'ribbed' | 'solid' }[],
): ScopeDifference[] {
  const marks = (kind: 'ribbed' | 'solid') => schemes.filter((scheme) => scheme.kind === kind).map(({ mark }) => mark)
  return marks('ribbed').flatMap((ribbed) => marks('solid').flatMap((solid) => scopeDifferences(standings, [ribbed, solid])))
}

const STATE_WORDS: Readonly<Record<ScopeState, string>> = {
  priced: 'priced',
  inRates: 'in the rates',
  leftOut: 'left out',
  undeclared: 'not declared',
}

/** A scheme's state in words: 'left out for S1'. */
export const scopeStateInWords = (state: ScopeState): string => STATE_WORDS[state]

function listed(names: readonly string[]): string {
  return names.length < 2 ? (names[0] ?? '') : `${names.slice(0, -1).join(', ')} and ${names.at(-1)!}`
}

/**
 * What makes two totals unequal in scope, as one sentence without its full stop, entries that differ alike taken together: 'Not like for
 * like in plaster or ceiling and hoisting: priced for R1, left out for S1'. Empty where nothing is known to differ.
 *
 * @param differences - of one pair of schemes or several
 */
export function notLikeForLike(differences: readonly ScopeDifference[]): string {
  const alike = new Map<string, ScopeDifference[]>()
  for (const difference of differences.filter(({ isUnequal }) => isUnequal)) {
    const key = [...difference.between, ...difference.states].join(' ')
    alike.set(key, [...(alike.get(key) ?? []), difference])
  }
  const parts = [...alike.values()].map((group) => {
    const { between, states } = group[0]!
    const names = listed(group.map(({ entry }) => SCOPE_WORDS[entry].name))
    return `in ${names}: ${STATE_WORDS[states[0]]} for ${between[0]}, ${STATE_WORDS[states[1]]} for ${between[1]}`
  })
  return parts.length === 0 ? '' : `Not like for like ${parts.join('; ')}`
}

/** How many entries lack a declaration in one of the two schemes or both; unequal ones not counted. */
export function undeclaredCount(differences: readonly ScopeDifference[]): number {
  return differences.filter(({ isUnequal }) => !isUnequal).length
}
