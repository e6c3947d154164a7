/**
 * Well-formed input that lies outside a rule's scope, or whose rule is not built: never repaired, answered with 422.
 * `path` names the field of the appraisal file, `expected` what would have been accepted.
 */
export class OutOfScopeError extends Error {
  constructor(
    readonly path: string,
    readonly expected: string,
  ) {
    super(`${path}: ${expected}`)
    this.name = 'OutOfScopeError'
  }
}
