import type { ScopeDeclaration, ScopeEntry } from '#shared/contracts/sameScope'

export type DeclaredState = ScopeDeclaration['state'] | 'undeclared'

/** What a declaration becomes when another state is chosen: its note stays; a rate is still to be typed. */
export function withState(
  { scheme, entry, note }: Pick<ScopeDeclaration, 'scheme' | 'entry' | 'note'>,
  state: DeclaredState,
): ScopeDeclaration | null {
  if (state === 'undeclared') return null
  return state === 'priced' ? { scheme, entry, state, rate: '', per: 'grossArea', note } : { scheme, entry, state, note }
}

/** The list with one entry of one scheme as declared, or without it; what stands where it stood keeps its place. */
export function withDeclared(
  scope: readonly ScopeDeclaration[],
  { scheme, entry }: { readonly scheme: string; readonly entry: ScopeEntry },
  declared: ScopeDeclaration | null,
): ScopeDeclaration[] {
  const isIt = (each: ScopeDeclaration) => each.scheme === scheme && each.entry === entry
  if (declared === null) return scope.filter((each) => !isIt(each))
  return scope.some(isIt) ? scope.map((each) => (isIt(each) ? declared : each)) : [...scope, declared]
}
