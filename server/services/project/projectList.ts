import { notLikeForLike, scopeDifferences } from '#shared/alsoCompared/scopeDifferences'
import type { ProjectSummary } from '#shared/contracts/project'
import { In, type EntityManager } from 'typeorm'
import { LevelEntity } from '../../entities/project/LevelEntity'
import { ProjectEntity } from '../../entities/project/ProjectEntity'
import { ProjectShareEntity } from '../../entities/project/ProjectShareEntity'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { RateBookEntity } from '../../entities/rates/RateBookEntity'
import type { AppraisalPool } from '../appraisal/appraisalPool'
import { hasRole, requireRole, type SignedIn } from '../session/signedIn'
import { currentTotals } from './projectTotals'

const MOST = 500

async function sharedIds(db: EntityManager, { firmId, personId }: SignedIn): Promise<Set<string>> {
  const rows = await db.findBy(ProjectShareEntity, { firmId, personId })
  return new Set(rows.map(({ projectId }) => projectId))
}

interface Counts {
  readonly levels: number
  readonly panels: number
}

async function countsOf(db: EntityManager, firmId: string): Promise<Map<string, Counts>> {
  const rows: { projectId: string; levels: string; panels: string }[] = await db
    .createQueryBuilder(LevelEntity, 'level')
    .select('level.projectId', 'projectId')
    .addSelect('COUNT(*)', 'levels')
    .addSelect('COALESCE(SUM(JSON_LENGTH(level.panels)), 0)', 'panels')
    .where({ firmId })
    .groupBy('level.projectId')
    .getRawMany()
  return new Map(rows.map(({ projectId, levels, panels }) => [projectId, { levels: Number(levels), panels: Number(panels) }]))
}

async function editionsOf(db: EntityManager, firmId: string, rows: readonly ProjectEntity[]) {
  const ids = rows.flatMap(({ editionId }) => (editionId === null ? [] : [editionId]))
  const editions = await db.findBy(EditionEntity, { firmId, id: In(ids) })
  const books = await db.findBy(RateBookEntity, { firmId, id: In(editions.map(({ bookId }) => bookId)) })
  return new Map(
    editions.map(({ id, number, bookId }) => {
      const { region, currency } = books.find((book) => book.id === bookId)!
      return [id, { region, number, currency }]
    }),
  )
}

/** In what the two totals that the list sets against each other are not like for like. */
function unequalScope(scope: ProjectEntity['scope'], totals: ProjectSummary['totals']): string {
  const [ribbed, solid] = (['ribbed', 'solid'] as const).map((kind) => totals.find((total) => total.kind === kind)?.mark)
  return ribbed && solid ? notLikeForLike(scopeDifferences(scope ?? [], [ribbed, solid])) : ''
}

/**
 * Lines of the projects the reader may know of, newest change first, at most 500: all of the firm for surveyors and estimators, those
 * shared with them for developers and engineers. Engineers see no money.
 */
export async function listProjects(db: EntityManager, pool: AppraisalPool, who: SignedIn): Promise<ProjectSummary[]> {
  requireRole(who, 'surveyor', 'estimator', 'developer', 'engineer')
  const { firmId } = who
  const isReader = hasRole(who, 'developer', 'engineer')
  const shared = isReader ? await sharedIds(db, who) : new Set<string>()
  const where = hasRole(who, 'surveyor', 'estimator') ? { firmId } : { firmId, id: In([...shared]) }
  const rows = await db.find(ProjectEntity, { where, order: { updatedAt: 'DESC', id: 'DESC' }, take: MOST })
  const seesMoney = hasRole(who, 'surveyor', 'estimator', 'developer')
  const totals = seesMoney ? await currentTotals(db, pool, rows) : new Map<string, ProjectSummary['totals']>()
  const counts = await countsOf(db, firmId)
  const editions = await editionsOf(db, firmId, rows)
  return rows.map(({ id, name, reference, place, editionId, scope, updatedAt }) => ({
    id,
    name,
    reference,
    place,
    levelCount: counts.get(id)?.levels ?? 0,
    panelCount: counts.get(id)?.panels ?? 0,
    canOpen: hasRole(who, 'surveyor') || shared.has(id),
    edition: (seesMoney && editionId !== null && editions.get(editionId)) || null,
    totals: totals.get(id) ?? [],
    unequalScope: unequalScope(scope, totals.get(id) ?? []),
    updatedAt: updatedAt.toISOString(),
  }))
}
