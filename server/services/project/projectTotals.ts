import type { ProjectSheet, ProjectSummary } from '#shared/contracts/project'
import type { EntityManager } from 'typeorm'
import { ProjectEntity } from '../../entities/project/ProjectEntity'
import type { AppraisalPool } from '../appraisal/appraisalPool'
import { storedAppraisalFile } from '../appraisal/storedAppraisalFile'
import { AppError } from '../../errors'
import { sheetOf } from './projectService'

type Totals = ProjectSummary['totals']

/** Longest time that a list waits for totals; what is not done by then shows without and is done by a later list. */
const PATIENCE_MS = 2_000

/** A scheme's total, or null: it cannot stand, has no prices, or lacks the price of an item it needs. */
async function appraisedTotals(pool: AppraisalPool, sheet: ProjectSheet): Promise<Totals> {
  const file = storedAppraisalFile(sheet)
  const results = file === null ? [] : (await pool.appraiseStored(file)).schemes
  return sheet.schemes.map(({ specification: { mark, kind } }) => {
    const cost = results.find((result) => result.mark === mark)?.cost ?? null
    return { mark, kind, total: cost === null || cost.unpriced.length > 0 ? null : cost.total }
  })
}

/** An appraisal that is too heavy leaves its schemes without a total; the list is shown all the same. */
async function totalsOrNone(pool: AppraisalPool, sheet: ProjectSheet): Promise<Totals> {
  try {
    return await appraisedTotals(pool, sheet)
  } catch (error) {
    if (!(error instanceof AppError) || error.code !== 'too_large') throw error
    return sheet.schemes.map(({ specification: { mark, kind } }) => ({ mark, kind, total: null }))
  }
}

/**
 * Totals of each project by its id. Those stored for the present content are taken as they are; others are appraised anew and
 * stored, unless the content changed again meanwhile.
 */
export async function currentTotals(
  db: EntityManager,
  pool: AppraisalPool,
  rows: readonly ProjectEntity[],
): Promise<Map<string, Totals>> {
  const deadline = Date.now() + PATIENCE_MS
  const found = new Map<string, Totals>()
  for (const { firmId, id, totals, totalsVersion, contentVersion } of rows) {
    if (totalsVersion === contentVersion) {
      found.set(id, totals)
    } else if (Date.now() < deadline) {
      const fresh = await totalsOrNone(pool, await sheetOf(db, firmId, id))
      const change = { totals: fresh, totalsVersion: contentVersion }
      await db.update(ProjectEntity, { firmId, id, contentVersion }, change)
      found.set(id, fresh)
    }
  }
  return found
}
