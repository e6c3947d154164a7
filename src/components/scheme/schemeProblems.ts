import type { ApiIssue } from '#shared/contracts/apiError'

/** Says what is wrong with a field of a scheme, or nothing. */
export type ProblemOf = (...fields: string[]) => string | null

/** Looks up the problems of one scheme by field; `block.width` also answers for `block`'s own. */
export function problemsOfScheme(problems: readonly ApiIssue[], index: number): ProblemOf {
  const prefix = `schemes.${index}.`
  return (...fields) => {
    const paths = fields.map((field) => prefix + field)
    const found = problems.find(({ path }) => paths.some((own) => path === own || path.startsWith(`${own}.`)))
    return found?.message ?? null
  }
}

/** Problems of a scheme that no field of the form shows. */
export function otherProblems(problems: readonly ApiIssue[], index: number, shownFields: readonly string[]): string[] {
  const own = `schemes.${index}`
  return problems
    .filter(({ path }) => path === own || path.startsWith(`${own}.`))
    .filter(({ path }) => !shownFields.some((field) => path === `${own}.${field}` || path.startsWith(`${own}.${field}.`)))
    .map(({ path, message }) => [path.slice(own.length + 1), message].filter((text) => text !== '').join(': '))
}
