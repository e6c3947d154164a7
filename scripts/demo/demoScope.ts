import type { ScopeBasis, ScopeDeclaration, ScopeEntry } from '#shared/contracts/sameScope'

const DEMO_NOTE = 'Demo figure, invented'

/** A demo price of an entry, invented. */
export const pricedIn = (scheme: string, entry: ScopeEntry, rate: string, per: ScopeBasis): ScopeDeclaration => ({
  scheme,
  entry,
  state: 'priced',
  rate,
  per,
  note: DEMO_NOTE,
})

/** Entries that the demo edition's rates hold already, for each of the schemes. */
export const inRatesOf = (schemes: readonly string[], entries: readonly ScopeEntry[]): ScopeDeclaration[] =>
  schemes.flatMap((scheme) => entries.map((entry): ScopeDeclaration => ({ scheme, entry, state: 'inRates', note: '' })))

export const leftOutOf = (scheme: string, entry: ScopeEntry, note: string): ScopeDeclaration => ({
  scheme,
  entry,
  state: 'leftOut',
  note,
})
