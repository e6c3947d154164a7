import type { ApiIssue } from '#shared/contracts/apiError'
import type { Scheme } from '#shared/contracts/appraisal'
import { type Factors, factors } from '#shared/contracts/factors'
import { scope, type ScopeDeclaration, scopeFaults } from '#shared/contracts/sameScope'
import type { z } from 'zod'

const issuesAt = (path: string, issues: readonly z.core.$ZodIssue[]): ApiIssue[] =>
  issues.map((issue) => ({ path: [path, ...issue.path].join('.'), message: issue.message }))

/** Declarations that can stand; one half typed, or of a scheme that is not in the file, is left out and its reason kept. */
export function readScope(
  given: readonly ScopeDeclaration[],
  schemes: readonly Scheme[],
  problems: ApiIssue[],
): ScopeDeclaration[] {
  const issues = scope.safeParse(given).error?.issues ?? []
  const faults = scopeFaults(given, schemes)
  problems.push(...issuesAt('scope', issues))
  problems.push(...faults.map(({ index, field, message }) => ({ path: `scope.${index}.${field}`, message })))
  const faulty = new Set([...issues.map((issue) => issue.path[0]), ...faults.map(({ index }) => index)])
  return given.filter((_, index) => !faulty.has(index))
}

/** Factors that can stand: a carbon factor half typed is left out and its reason kept; null where a labour output cannot be read. */
export function readFactors(given: Factors, problems: ApiIssue[]): Factors | null {
  const answer = factors.safeParse(given)
  if (answer.success) return answer.data
  const { issues } = answer.error
  problems.push(...issuesAt('factors', issues))
  if (issues.some((issue) => issue.path[0] !== 'carbon')) return null
  const faulty = new Set(issues.map((issue) => issue.path[1]))
  return { ...given, carbon: given.carbon.filter((_, index) => !faulty.has(index)) }
}
