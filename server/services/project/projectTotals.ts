import { setTimeout as pause } from 'node:timers/promises'
import type { ProjectSheet, ProjectSummary } from '#shared/contracts/project'
import type { EntityManager } from 'typeorm'
import { ProjectEntity } from '../../entities/project/ProjectEntity'
import type { AppraisalPool } from '../appraisal/appraisalPool'
import { storedAppraisalFile } from '../appraisal/storedAppraisalFile'
import { AppError } from '../../errors'
import { sheetOf } from './projectService'

type Totals = ProjectSummary['totals']

/** Longest time that a list waits for totals. */
const PATIENCE_MS = 4_000
const AT_ONCE = 4

/** A scheme's total, or null: it cannot stand, has no prices, or lacks the price of an item it needs. */
async function appraisedTotals(pool: AppraisalPool, firmId: string, sheet: ProjectSheet): Promise<Totals> {
  const file = storedAppraisalFile(sheet)
  const results = file === null ? [] : (await pool.appraiseStored(firmId, file)).schemes
  return sheet.schemes.map(({ specification: { mark, kind } }) => {
    const cost = results.find((result) => result.mark === mark)?.cost ?? null
    return { mark, kind, total: cost === null || cost.unpriced.length > 0 ? null : cost.total }
  })
}

/** An appraisal that is too heavy leaves its schemes without a total; the list is shown all the same. */
async function totalsOrNone(pool: AppraisalPool, firmId: string, sheet: ProjectSheet): Promise<Totals> {
  try {
    return await appraisedTotals(pool, firmId, sheet)
  } catch (error) {
    if (!(error instanceof AppError) || error.code !== 'too_large') throw error
    return sheet.schemes.map(({ specification: { mark, kind } }) => ({ mark, kind, total: null }))
  }
}

/** Appraisals of stored content under way, by project and content: asked for twice, done once. */
const underWay = new Map<string, Promise<Totals>>()

async function refreshed(db: EntityManager, pool: AppraisalPool, row: ProjectEntity): Promise<Totals> {
  const { firmId, id, contentVersion } = row
  const totals = await totalsOrNone(pool, firmId, await sheetOf(db, firmId, id))
  await db.update(ProjectEntity, { firmId, id, contentVersion }, { totals, totalsVersion: contentVersion })
  return totals
}

function refreshOnce(db: EntityManager, pool: AppraisalPool, row: ProjectEntity): Promise<Totals> {
  const key = `${row.id}/${row.contentVersion}`
  const work = underWay.get(key) ?? refreshed(db, pool, row).finally(() => underWay.delete(key))
  underWay.set(key, work)
  return work
}

/** Null where the threads have too much to do: the totals are left out this time. */
function nullWhenBusy(error: unknown): null {
  if (error instanceof AppError && (error.code === 'limited' || error.code === 'unavailable')) return null
  throw error
}

/** What `work` yields, or null when `ms` pass first. A failure after that is met again by whoever asks next. */
async function within<T>(work: Promise<T>, ms: number): Promise<T | null> {
  const waiting = new AbortController()
  try {
    return await Promise.race([work, pause(ms, null, { signal: waiting.signal })])
  } finally {
    waiting.abort()
    work.catch(() => null)
  }
}

/**
 * Totals of each project by its id. Those stored for the present content are taken as they are; others are appraised anew and
 * stored, unless the content changed again meanwhile. What is not done within 4 s is left out, and stored when it is done.
 */
export async function currentTotals(
  db: EntityManager,
  pool: AppraisalPool,
  rows: readonly ProjectEntity[],
): Promise<Map<string, Totals>> {
  const deadline = Date.now() + PATIENCE_MS
  const isCurrent = (row: ProjectEntity) => row.totalsVersion === row.contentVersion
  const found = new Map(rows.filter(isCurrent).map(({ id, totals }) => [id, totals]))
  const stale = rows.filter((row) => !isCurrent(row))
  for (let first = 0; first < stale.length && Date.now() < deadline; first += AT_ONCE) {
    const group = stale.slice(first, first + AT_ONCE)
    const fresh = await Promise.all(
      group.map((row) => within(refreshOnce(db, pool, row).catch(nullWhenBusy), deadline - Date.now())),
    )
    group.forEach(({ id }, place) => {
      const totals = fresh[place]
      if (totals) found.set(id, totals)
    })
  }
  return found
}

/** Brings every stored total up to date, one after the other, so that the first lists after a start need not wait. */
export async function refreshAllTotals(db: EntityManager, pool: AppraisalPool, isStopping: () => boolean): Promise<void> {
  const stale = await db
    .createQueryBuilder(ProjectEntity, 'project')
    .where('project.totalsVersion <> project.contentVersion')
    .orderBy('project.updatedAt', 'DESC')
    .getMany()
  for (const row of stale) {
    if (isStopping()) return
    await refreshOnce(db, pool, row).catch(nullWhenBusy)
  }
}
