import type { ApiIssue } from '#shared/contracts/apiError'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import type { DispatchInput } from '#shared/contracts/dispatch'
import type { ProjectSheet, StoredScheme } from '#shared/contracts/project'
import type { EditionWithRates } from '#shared/contracts/rateBook'
import { AppraisalRefusedError } from '#shared/appraisalRefused'
import { appraiseInFull, type FullAppraisal } from '#shared/appraise'
import { parseAppraisalFile } from '#shared/parseAppraisalFile'
import { AppError, refuse } from '../../errors'
import type { ComparedProject } from '../../reports/freezeComparison'

function cannotBeSent(issues: readonly ApiIssue[]): AppError {
  return new AppError('out_of_scope', 'The comparison cannot be sent as the project stands; see the issues.', issues)
}

function schemeOf({ schemes }: ProjectSheet, id: string, kind: 'ribbed' | 'solid'): StoredScheme {
  const found = schemes.find((scheme) => scheme.id === id && scheme.specification.kind === kind)
  if (!found) throw refuse(`${kind}SchemeId`, `expected a ${kind} scheme of this project`)
  return found
}

function fileOf({ project, levels }: ProjectSheet, edition: EditionWithRates, schemes: readonly StoredScheme[]): AppraisalFile {
  return parseAppraisalFile({
    format: 'bothways.appraisal/1',
    brief: project.brief,
    levels: levels.filter(({ panels }) => panels.length > 0).map(({ mark, repeat, panels }) => ({ mark, repeat, panels })),
    schemes: schemes.map(({ specification }) => specification),
    rates: {
      currency: edition.currency,
      items: Object.fromEntries(edition.rates.map(({ item, likely }) => [item, likely])),
      markups: project.markups,
    },
  })
}

/** What `work` yields. @throws AppError `out_of_scope` with the reasons, where the floor cannot be appraised */
function withReasons<T>(work: () => T): T {
  try {
    return work()
  } catch (error) {
    if (error instanceof AppraisalRefusedError) throw cannotBeSent(error.issues)
    throw error
  }
}

function appraised(file: AppraisalFile): FullAppraisal {
  const full = withReasons(() => appraiseInFull(file))
  if (full.problems.length === 0) return full
  throw cannotBeSent(
    full.problems.map(({ scheme, issue }) => ({ path: `schemes.${scheme}.${issue.path}`, message: issue.message })),
  )
}

function requirePrices({ appraisal }: FullAppraisal, { region, number }: EditionWithRates): void {
  const missing = [...new Set(appraisal.schemes.flatMap(({ cost }) => cost?.unpriced ?? []))]
  if (missing.length === 0) return
  const message = `expected a rate: edition ${number} of ${region} has none for this item`
  throw cannotBeSent(missing.map((item) => ({ path: `rates.items.${item}`, message })))
}

/**
 * The two schemes of the stored project, appraised.
 * @throws AppError `invalid_request` for a scheme that is not the project's, `out_of_scope` naming what is missing: panels, an
 *   edition, rates of items, or what lies outside the rules
 */
export function compareProject(sheet: ProjectSheet, input: DispatchInput): Omit<ComparedProject, 'blockMaterial'> {
  const schemes = [schemeOf(sheet, input.ribbedSchemeId, 'ribbed'), schemeOf(sheet, input.solidSchemeId, 'solid')] as const
  const { edition, project } = sheet
  if (edition === null) {
    throw cannotBeSent([
      { path: 'project.editionId', message: 'expected an edition of a rate book: without one nothing is priced' },
    ])
  }
  if (sheet.levels.every(({ panels }) => panels.length === 0)) {
    throw cannotBeSent([{ path: 'levels', message: 'expected at least one level with a panel' }])
  }
  const file = withReasons(() => fileOf(sheet, edition, schemes))
  const full = appraised(file)
  requirePrices(full, edition)
  return { project, schemes, edition, file, full }
}
