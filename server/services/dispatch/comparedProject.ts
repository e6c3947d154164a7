import type { ApiIssue } from '#shared/contracts/apiError'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import type { DispatchInput } from '#shared/contracts/dispatch'
import type { ProjectSheet, StoredScheme } from '#shared/contracts/project'
import type { EditionWithRates } from '#shared/contracts/rateBook'
import { AppError, refuse } from '../../errors'
import type { ComparedProject } from '../../reports/freezeComparison'
import type { ComparedAppraisal } from '../appraisal/appraisalJob'
import type { AppraisalPool } from '../appraisal/appraisalPool'
import { storedAppraisalFile } from '../appraisal/storedAppraisalFile'

function cannotBeSent(issues: readonly ApiIssue[]): AppError {
  return new AppError('out_of_scope', 'The comparison cannot be sent as the project stands; see the issues.', issues)
}

function schemeOf({ schemes }: ProjectSheet, id: string, kind: 'ribbed' | 'solid'): StoredScheme {
  const found = schemes.find((scheme) => scheme.id === id && scheme.specification.kind === kind)
  if (!found) throw refuse(`${kind}SchemeId`, `expected a ${kind} scheme of this project`)
  return found
}

/** What is wrong with a stored floor is not wrong with the request: its reasons are told as such. */
async function appraised(pool: AppraisalPool, firmId: string, file: AppraisalFile): Promise<ComparedAppraisal> {
  return await pool.appraiseCompared(firmId, file).catch((error: unknown) => {
    const isRefusal = error instanceof AppError && (error.code === 'invalid_request' || error.code === 'out_of_scope')
    throw isRefusal ? cannotBeSent(error.issues ?? []) : error
  })
}

function requirePrices({ appraisal }: ComparedAppraisal, { region, number }: EditionWithRates): void {
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
export async function compareProject(
  pool: AppraisalPool,
  firmId: string,
  sheet: ProjectSheet,
  input: DispatchInput,
): Promise<Omit<ComparedProject, 'blockMaterial'>> {
  const schemes = [schemeOf(sheet, input.ribbedSchemeId, 'ribbed'), schemeOf(sheet, input.solidSchemeId, 'solid')] as const
  const { edition, project } = sheet
  if (edition === null) {
    throw cannotBeSent([
      { path: 'project.editionId', message: 'expected an edition of a rate book: without one nothing is priced' },
    ])
  }
  const file = storedAppraisalFile({ ...sheet, schemes: [...schemes] })
  if (file === null) throw cannotBeSent([{ path: 'levels', message: 'expected at least one level with a panel' }])
  const compared = await appraised(pool, firmId, file)
  requirePrices(compared, edition)
  return { project, schemes, edition, overrides: sheet.overrides, file, ...compared }
}
