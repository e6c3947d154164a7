import { compareAllIn } from '#shared/comparison/compareAllIn'
import type { Appraisal } from '#shared/contracts/appraisalResult'
import type { ProjectReading } from '#shared/contracts/projectReading'
import { allInCost } from '#shared/pricing/allInCost'
import type { EntityManager } from 'typeorm'
import { ProjectShareEntity } from '../../entities/project/ProjectShareEntity'
import { AppError } from '../../errors'
import type { AppraisalPool } from '../appraisal/appraisalPool'
import { storedAppraisalFile } from '../appraisal/storedAppraisalFile'
import { hasRole, requireRole, type SignedIn } from '../session/signedIn'
import { inTransaction } from '../transaction'
import { sheetOf } from './projectService'

const NOTHING: Appraisal = { format: 'bothways.appraisal-result/1', schemes: [], comparison: null }

/** Rates with every markup folded in, and the comparison as readers outside the office see it. */
function withAllInRates(appraisal: Appraisal): Appraisal {
  const schemes = appraisal.schemes.map((scheme) => ({ ...scheme, cost: scheme.cost && allInCost(scheme.cost) }))
  const [first, second] = (appraisal.comparison?.between ?? []).map((mark) =>
    appraisal.schemes.find((scheme) => scheme.mark === mark),
  )
  return { ...appraisal, schemes, comparison: first && second ? compareAllIn(first, second) : null }
}

function withoutMoney(appraisal: Appraisal): Appraisal {
  return { ...appraisal, schemes: appraisal.schemes.map((scheme) => ({ ...scheme, cost: null })), comparison: null }
}

/** Refuses a project that is not shared with the reader, as if it were not there. Surveyors read all of the firm. */
async function requireShare(tx: EntityManager, who: SignedIn, projectId: string): Promise<void> {
  if (hasRole(who, 'surveyor')) return
  const { firmId, personId } = who
  if (!(await tx.existsBy(ProjectShareEntity, { firmId, projectId, personId }))) throw new AppError('not_found')
}

/**
 * A project as its readers see it, appraised here. Surveyors and developers get all-in rates; engineers get no money.
 * Schemes that cannot stand on the floor have no result.
 * @throws AppError `not_found` when it is not shared with the reader, `too_large` when it cannot be appraised in time
 */
export async function readProjectReading(
  db: EntityManager,
  pool: AppraisalPool,
  who: SignedIn,
  projectId: string,
): Promise<ProjectReading> {
  requireRole(who, 'surveyor', 'developer', 'engineer')
  const sheet = await inTransaction(db, async (tx) => {
    await requireShare(tx, who, projectId)
    return await sheetOf(tx, who.firmId, projectId)
  })
  const file = storedAppraisalFile(sheet)
  const appraisal = file === null ? NOTHING : await pool.appraiseStored(who.firmId, file)
  const seesMoney = hasRole(who, 'surveyor', 'developer')
  const { id, name, reference, place, use, brief, measurement, scope, factors, version, updatedAt, updatedBy } = sheet.project
  const { edition } = sheet
  return {
    project: { id, name, reference, place, use, brief, measurement, factors, version, updatedAt, updatedBy },
    scope: scope.map(({ scheme, entry, state, note }) => ({ scheme, entry, state, note })),
    levels: sheet.levels,
    schemes: sheet.schemes,
    edition:
      seesMoney && edition !== null
        ? { region: edition.region, number: edition.number, currency: edition.currency, baseDate: edition.baseDate }
        : null,
    appraisal: seesMoney ? withAllInRates(appraisal) : withoutMoney(appraisal),
  }
}
