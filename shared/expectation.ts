import type { z } from 'zod'

type ContractIssue = z.core.$ZodIssue

const KINDS: Readonly<Record<string, string>> = {
  number: 'a number',
  int: 'a whole number',
  string: 'text',
  boolean: 'true or false',
  array: 'a list',
  tuple: 'a list',
  object: 'an object',
  record: 'an object',
}

/** Patterns of the contracts, in words. */
const PATTERNS: Readonly<Record<string, string>> = {
  '/^[\\w.-]+$/': 'a mark of letters, digits, ".", "_" or "-", as "P1"',
  '/^\\d{1,9}(\\.\\d{1,6})?$/': 'a decimal number as text, not negative, at most six decimals, as "149.63"',
  '/^\\d{1,3}(\\.\\d{1,4})?$/': 'a percentage as text, not negative, at most four decimals, as "7.5"',
  '/^[A-Z]{3}$/': 'a currency code of three capital letters, as "USD"',
}

/** What a contract wanted where it found something else: 'a number of at least 10'. Starts with no capital, ends with no stop. */
export function expectationOf(issue: ContractIssue): string {
  switch (issue.code) {
    case 'invalid_type':
      return KINDS[issue.expected] ?? issue.expected
    case 'invalid_value':
      return oneOf(issue.values)
    case 'too_small':
      return sized(issue.origin, issue.inclusive === false ? 'more than' : 'at least', issue.minimum)
    case 'too_big':
      return sized(issue.origin, issue.inclusive === false ? 'less than' : 'at most', issue.maximum)
    case 'not_multiple_of':
      return `a multiple of ${issue.divisor}`
    case 'invalid_format':
      return ownWords(issue) ?? PATTERNS[issue.pattern ?? ''] ?? `text of the form ${issue.pattern ?? issue.format}`
    case 'invalid_union':
      return unionOf(issue)
    default:
      return ownWords(issue) ?? `something else: ${issue.message}`
  }
}

function sized(origin: string, bound: string, limit: number | bigint): string {
  if (origin === 'array') return `a list of ${bound} ${limit}`
  if (origin === 'string') return `text of ${bound} ${limit} ${limit === 1 ? 'character' : 'characters'}`
  return `a number of ${bound} ${limit}`
}

function unionOf(issue: z.core.$ZodIssueInvalidUnion): string {
  if ('options' in issue && Array.isArray(issue.options)) return oneOf(issue.options)
  return [...new Set(issue.errors.flatMap((branch) => branch.filter(({ path }) => path.length === 0).map(expectationOf)))].join(
    ' or ',
  )
}

function oneOf(values: readonly unknown[]): string {
  const quoted = values.map((value) => (typeof value === 'string' ? JSON.stringify(value) : String(value)))
  return quoted.length > 1 ? `${quoted.slice(0, -1).join(', ')} or ${quoted.at(-1)}` : String(quoted[0])
}

/** A message that the contract itself words as 'expected …'. */
function ownWords({ message }: ContractIssue): string | null {
  return message.startsWith('expected ') ? message.slice('expected '.length) : null
}
