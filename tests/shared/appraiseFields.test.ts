import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '#shared/appraise'
import { AppraisalRefusedError } from '#shared/appraisalRefused'
import { type AppraisalFileInput, appraisalFile } from '#shared/contracts/appraisal'
import { OutOfScopeError } from '#shared/outOfScope'
import { parseAppraisalFile } from '#shared/parseAppraisalFile'
import { britishFile, computedFile, givenFile } from './support/richFiles'

type Path = readonly (string | number)[]

/** Every field that holds a value, defaults filled in, by its path. */
function fieldsOf(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [path]
  return Object.entries(value).flatMap(([key, inner]) => fieldsOf(inner, [...path, Array.isArray(value) ? Number(key) : key]))
}

function valueAt(file: unknown, path: Path): unknown {
  return path.reduce<unknown>((value, key) => (value as Record<string | number, unknown>)[key], file)
}

function withValue(file: unknown, path: Path, value: unknown): unknown {
  const copy: unknown = structuredClone(file)
  const parent = valueAt(copy, path.slice(0, -1)) as Record<string | number, unknown>
  parent[path.at(-1)!] = value
  return copy
}

/** Other values of words that the contract lists. */
const OTHER_WORD: Readonly<Record<string, unknown>> = {
  EN1992: 'BS8110',
  BS8110: 'EN1992',
  beam: 'wall',
  wall: 'beam',
  continuous: 'discontinuous',
  discontinuous: 'continuous',
  scheme: 'panel',
  ribbed: 'solid',
  solid: 'ribbed',
  USD: 'JPY',
  nrm2: 'kilograms',
  XC1: 'XC4',
  mild: 'moderate',
  held: 'mayLift',
  mayLift: 'held',
}
/** Other values of single fields, where the next number or word would not do, or is too near to change how many blocks fit. */
const OTHER_VALUE: Readonly<Record<string, unknown>> = {
  mesh: 'A393',
  'crossRibs:rule': 'none',
  'ribBars:computed': [{ diameter: 25, count: 3 }],
  'topBars:computed': [{ diameter: 25, count: 3 }],
  'bars:computed': { bottomX: { diameter: 12, spacing: 100 }, bottomY: { diameter: 12, spacing: 100 } },
  'thickness:least': 400,
  'solidZone:least': 900,
  diameter: 16,
  fireMinutes: 90,
  edgeStrip: 400,
  every: 900,
  leastPiece: 190,
  link: 10,
  mark: 'M9',
  gammaPermanent: 1.25,
  gammaVariable: 1.6,
  gammaConcrete: 1.4,
  gammaSteel: 1.05,
  alphaCc: 1,
  redistributionK1: 0.4,
  redistributionK2: 1,
  vMinCoefficient: 0.05,
  greatestSteelFactor: 1.2,
  greatestSpanDepth: 20,
}

function otherThan(path: Path, value: unknown): unknown {
  const name = String(path.at(-1))
  const special = OTHER_VALUE[`${name}:${String(value)}`] ?? OTHER_VALUE[name]
  if (special !== undefined) return special
  if (typeof value === 'boolean') return !value
  if (typeof value === 'number') return Number.isInteger(value) ? value + Math.max(1, Math.round(value / 5)) : value * 1.2
  if (/^\d/.test(String(value))) return `1${String(value)}`
  return OTHER_WORD[String(value)] ?? `${String(value)}x`
}

/** The result and what is stated with it as text, or 'refused'. */
function outcomeOf(file: unknown): string {
  try {
    const { appraisal, sized, problems, alsoCompared, scopeDifferences } = appraiseInFull(parseAppraisalFile(file))
    return problems.length > 0
      ? 'refused'
      : JSON.stringify([appraisal, alsoCompared, scopeDifferences, sized.map(({ panels }) => panels.map(({ flags }) => flags))])
  } catch (error) {
    if (error instanceof AppraisalRefusedError || error instanceof OutOfScopeError) return 'refused'
    throw error
  }
}

const files: [string, AppraisalFileInput][] = [
  ['sizes left to the engine', computedFile],
  ['sizes given', givenFile],
  ['BS 8110', britishFile],
]

describe.each(files)('with %s', (_name, input) => {
  const file = appraisalFile.parse(input)
  const before = outcomeOf(file)

  it('appraises the file as it is', () => {
    expect(before).not.toBe('refused')
  })

  it.each(fieldsOf(file).map((path) => [path.join('.'), path] as const))('%s changes the result or is refused', (_path, path) => {
    const changed = withValue(file, path, otherThan(path, valueAt(file, path)))
    expect(outcomeOf(changed)).not.toBe(before)
  })
})
