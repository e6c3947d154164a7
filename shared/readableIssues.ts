import type { z } from 'zod'
import type { ApiIssue } from './contracts/apiError'
import { expectationOf } from './expectation'

type ContractIssue = z.core.$ZodIssue
type Path = readonly PropertyKey[]

/**
 * What a contract found wrong, in words of the trade: the field by its dotted path, what was expected and what was given.
 * One issue a field; an unknown field is named itself.
 *
 * @param input - what was parsed, to quote from
 */
export function readableIssues(issues: readonly ContractIssue[], input: unknown): ApiIssue[] {
  const firstOfField = new Map<string, ApiIssue>()
  for (const issue of issues.flatMap((found) => readIssue(found, [], input))) {
    if (!firstOfField.has(issue.path)) firstOfField.set(issue.path, issue)
  }
  return [...firstOfField.values()]
}

function readIssue(issue: ContractIssue, parent: Path, input: unknown): ApiIssue[] {
  const path = [...parent, ...issue.path]
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({ path: dotted([...path, key]), message: 'unknown field: expected no such name here' }))
  }
  const branch = issue.code === 'invalid_union' ? meantBranch(issue) : null
  if (branch) return branch.flatMap((inner) => readIssue(inner, path, input))
  return [{ path: dotted(path), message: `expected ${expectationOf(issue)}, got ${quote(valueAt(input, path))}` }]
}

/** The alternative that the writer meant: the one that accepts the kind of value given, and finds fault further inside. */
function meantBranch(issue: z.core.$ZodIssueInvalidUnion): readonly ContractIssue[] | null {
  const reachesInside = (branch: readonly ContractIssue[]) =>
    branch.every(({ code, path }) => path.length > 0 || (code !== 'invalid_type' && code !== 'invalid_value'))
  return issue.errors.find(reachesInside) ?? null
}

const dotted = (path: Path): string => path.map(String).join('.')

function valueAt(input: unknown, path: Path): unknown {
  return path.reduce<unknown>((value, key) => {
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, key)) return undefined
    return Reflect.get(value, key)
  }, input)
}

const LONGEST_QUOTE = 40

function quote(value: unknown): string {
  if (value === undefined) return 'nothing'
  if (Array.isArray(value)) return `a list of ${value.length}`
  if (typeof value === 'object' && value !== null) return 'an object'
  if (typeof value !== 'string') return String(value)
  return JSON.stringify(value.length > LONGEST_QUOTE ? `${value.slice(0, LONGEST_QUOTE)}…` : value)
}
