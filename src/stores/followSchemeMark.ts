import type { ScopeDeclaration } from '#shared/contracts/sameScope'

/**
 * Declarations of a scheme that follow it to its new mark, or go with it where it is taken out (`now` is null); null where none is
 * its own, so that nothing changes.
 */
export function followSchemeMark(
  scope: readonly ScopeDeclaration[],
  before: string,
  now: string | null,
): ScopeDeclaration[] | null {
  if (before === now || scope.every(({ scheme }) => scheme !== before)) return null
  return scope.flatMap((declaration) => {
    if (declaration.scheme !== before) return [declaration]
    return now === null ? [] : [{ ...declaration, scheme: now }]
  })
}
