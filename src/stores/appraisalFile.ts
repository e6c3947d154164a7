import type { ApiIssue } from '#shared/contracts/apiError'
import type { AppraisalFile, Rates } from '#shared/contracts/appraisal'
import { brief, level, panel, rates, scheme } from '#shared/contracts/appraisal'
import type { Project, ProjectSheet, StoredLevel, StoredScheme } from '#shared/contracts/project'
import type { EditionWithRates } from '#shared/contracts/rateBook'
import { projectRates } from '#shared/pricing/projectRates'
import type { z } from 'zod'
import type { FileOrigin } from '../workers/appraisalAnswer'
import { readFactors, readScope } from './sheetDeclared'
import { panelsLeftOut, withoutGiven } from '../workers/withoutGiven'

/** What an appraisal file is made from: a surveyor's sheet, or a reader's, which has no prices. */
export interface AppraisalSource {
  readonly project: Pick<Project, 'brief' | 'factors' | 'measurement'> & Partial<Pick<Project, 'markups' | 'scope'>>
  readonly levels: readonly StoredLevel[]
  readonly schemes: StoredScheme[]
  readonly edition: EditionWithRates | null
  readonly overrides?: ProjectSheet['overrides']
}

export interface AppraisalDraft {
  /** Null when nothing can be appraised yet. */
  readonly file: AppraisalFile | null
  readonly origin: FileOrigin
  /** What was left out and why, by path in the sheet. */
  readonly problems: readonly ApiIssue[]
}

/** The value read by its contract; what is wrong goes to `problems` under `path`. */
function read<T extends z.ZodType>(schema: T, value: unknown, path: string, problems: ApiIssue[]): z.infer<T> | null {
  const answer = schema.safeParse(value)
  if (answer.success) return answer.data
  problems.push(...answer.error.issues.map((issue) => ({ path: [path, ...issue.path].join('.'), message: issue.message })))
  return null
}

function readLevel(row: StoredLevel, index: number, problems: ApiIssue[]) {
  const panels = row.panels.flatMap((given, at) => {
    const value = read(panel, given, `levels.${index}.panels.${at}`, problems)
    return value === null ? [] : [{ value, at }]
  })
  if (panels.length === 0) return []
  const given = {
    mark: row.mark,
    repeat: row.repeat,
    proppingHeight: row.proppingHeight,
    panels: panels.map(({ value }) => value),
  }
  const value = read(level, given, `levels.${index}`, problems)
  return value === null ? [] : [{ value, origin: { index, panels: panels.map(({ at }) => at) } }]
}

function ratesOf(source: AppraisalSource, marks: ReadonlySet<string>, problems: ApiIssue[]): Rates | undefined {
  const { edition, schemes, overrides = [] } = source
  const { markups } = source.project
  if (edition === null || markups === undefined) return undefined
  const own = schemes.filter(({ specification }) => marks.has(specification.mark))
  return read(rates, projectRates({ edition, markups, overrides, schemes: own }), 'rates', problems) ?? undefined
}

/** The appraisal file of a sheet: rows that the contract refuses are left out, their reasons kept. */
export function toAppraisalFile(source: AppraisalSource): AppraisalDraft {
  const problems: ApiIssue[] = []
  const readBrief = read(brief, source.project.brief, 'brief', problems)
  const levels = source.levels.flatMap((row, index) => readLevel(row, index, problems))
  const schemes = source.schemes.flatMap((row, index) => {
    const value = read(scheme, row.specification, `schemes.${index}`, problems)
    return value === null ? [] : [{ value, index }]
  })
  const rows = levels.map(({ value }) => value)
  const priced = ratesOf(source, new Set(schemes.map(({ value }) => value.mark)), problems)
  const declared = readScope(
    source.project.scope ?? [],
    schemes.map(({ value }) => value),
    problems,
  )
  const factors = readFactors(source.project.factors, problems)
  const canStand = readBrief !== null && factors !== null && levels.length > 0 && schemes.length > 0
  return {
    origin: { levels: levels.map(({ origin }) => origin), schemes: schemes.map(({ index }) => index) },
    problems,
    file: canStand
      ? {
          format: 'bothways.appraisal/1',
          brief: readBrief,
          levels: rows,
          schemes: withoutGiven(
            schemes.map(({ value }) => value),
            panelsLeftOut(source.levels, rows),
          ),
          measurement: source.project.measurement,
          scope: declared,
          factors,
          ...(priced === undefined ? {} : { rates: priced }),
        }
      : null,
  }
}
