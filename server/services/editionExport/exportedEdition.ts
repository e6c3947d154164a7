import type { Gang, Quotation, Resource } from '#shared/contracts/resource'
import type { EditionWithRates } from '#shared/contracts/rateBook'
import type { EntityManager } from 'typeorm'
import { GangEntity } from '../../entities/rates/GangEntity'
import { QuotationEntity } from '../../entities/rates/QuotationEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { AppError } from '../../errors'
import { findEdition } from '../rates/editionService'
import { readableEdition } from '../rates/readableEdition'
import { toGang, toQuotation, toResource } from '../rates/resourceRows'
import type { SignedIn } from '../session/signedIn'

/** An edition with all that it holds, to be written into tables. */
export interface ExportedEdition {
  readonly edition: EditionWithRates
  readonly resources: readonly Resource[]
  readonly gangs: readonly Gang[]
  readonly quotations: readonly Quotation[]
}

const AT_ONCE = 5000

/** Resources in the order of their codes, some thousand at a time. */
async function allResources(db: EntityManager, firmId: string, editionId: string): Promise<ResourceEntity[]> {
  const rows: ResourceEntity[] = []
  for (;;) {
    const query = db.createQueryBuilder(ResourceEntity, 'r').where({ firmId, editionId })
    const last = rows.at(-1)
    if (last !== undefined) query.andWhere('r.code > :last', { last: last.code })
    const some = await query.orderBy('r.code', 'ASC').limit(AT_ONCE).getMany()
    for (const row of some) rows.push(row)
    if (some.length < AT_ONCE) return rows
  }
}

async function allQuotations(db: EntityManager, firmId: string, editionId: string): Promise<QuotationEntity[]> {
  const rows: QuotationEntity[] = []
  for (;;) {
    const query = db.createQueryBuilder(QuotationEntity, 'q').where({ firmId, editionId })
    const last = rows.at(-1)
    if (last !== undefined) query.andWhere('q.id > :last', { last: last.id })
    const some = await query.orderBy('q.id', 'ASC').limit(AT_ONCE).getMany()
    for (const row of some) rows.push(row)
    if (some.length < AT_ONCE) return rows.sort((a, b) => (a.resource < b.resource ? -1 : a.resource > b.resource ? 1 : 0))
  }
}

/** An edition and all that it holds, for whoever may read it. @throws AppError `forbidden`, `not_found` */
export async function exportedEdition(db: EntityManager, who: SignedIn, editionId: string): Promise<ExportedEdition> {
  await readableEdition(db, who, editionId)
  const { firmId } = who
  const edition = await findEdition(db, firmId, editionId)
  if (edition === null) throw new AppError('not_found')
  const resources = await allResources(db, firmId, editionId)
  const chosen = new Set(resources.flatMap(({ quotationId }) => quotationId ?? []))
  const gangs = await db.find(GangEntity, { where: { firmId, editionId }, order: { code: 'ASC' } })
  const quotations = await allQuotations(db, firmId, editionId)
  return {
    edition,
    resources: resources.map(toResource),
    gangs: gangs.map(toGang),
    quotations: quotations.map((row) => toQuotation(row, chosen.has(row.id) ? row.id : null)),
  }
}
