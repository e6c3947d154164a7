import type { Gang } from '#shared/contracts/resource'
import { RESOURCES_A_PAGE, type ResourcePage, type ResourceQuery, type ResourceSheet } from '#shared/contracts/resourceSheet'
import { Decimal } from '#shared/pricing/decimal'
import type { EntityManager } from 'typeorm'
import { GangEntity } from '../../entities/rates/GangEntity'
import { QuotationEntity } from '../../entities/rates/QuotationEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { AppError } from '../../errors'
import type { SignedIn } from '../session/signedIn'
import type { InEdition } from './buildUpPricesOf'
import { readableEdition } from './readableEdition'
import { toGang, toQuotation, toResource } from './resourceRows'
import { restingOnResource } from './restingOn'

/** Words of a search that count; what is typed beyond them is left out. */
const MOST_WORDS = 6
/** More gangs than an edition may have. */
export const MOST_GANGS = 500

const pattern = (word: string) => `%${word.replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`

/** A page of an edition's resources, in the order of their codes. @throws AppError `forbidden`, `not_found` */
export async function listResources(
  db: EntityManager,
  who: SignedIn,
  editionId: string,
  { search, kind, page }: ResourceQuery,
): Promise<ResourcePage> {
  await readableEdition(db, who, editionId)
  const query = db.createQueryBuilder(ResourceEntity, 'r').where({ firmId: who.firmId, editionId })
  if (kind !== undefined) query.andWhere({ kind })
  const words = search.split(/\s+/).filter((word) => word !== '')
  for (const [index, word] of words.slice(0, MOST_WORDS).entries()) {
    const name = `word${index}`
    query.andWhere(`(r.code COLLATE utf8mb4_unicode_520_ci LIKE :${name} OR r.description LIKE :${name})`, {
      [name]: pattern(word),
    })
  }
  const [rows, total] = await query
    .orderBy('r.code', 'ASC')
    .offset((page - 1) * RESOURCES_A_PAGE)
    .limit(RESOURCES_A_PAGE)
    .getManyAndCount()
  return { resources: rows.map(toResource), page, total }
}

/** A resource of an edition with its quotations, cheapest first, and what rests on it, for whoever may read the edition. */
export async function readResource(db: EntityManager, who: SignedIn, editionId: string, code: string): Promise<ResourceSheet> {
  await readableEdition(db, who, editionId)
  return await resourceSheetOf(db, { firmId: who.firmId, editionId }, code)
}

/** @throws AppError `not_found` */
export async function resourceSheetOf(db: EntityManager, of: InEdition, code: string): Promise<ResourceSheet> {
  const row = await db.findOneBy(ResourceEntity, { ...of, code })
  if (row === null) throw new AppError('not_found')
  const quotations = await db.findBy(QuotationEntity, { ...of, resource: code })
  const byUnit = quotations
    .map((quoted) => ({ quoted, unit: new Decimal(quoted.price).div(quoted.contains) }))
    .sort((a, b) => a.unit.comparedTo(b.unit) || a.quoted.id.localeCompare(b.quoted.id))
  return {
    resource: toResource(row),
    quotations: byUnit.map(({ quoted }) => toQuotation(quoted, row.quotationId)),
    restingOn: await restingOnResource(db, of, code),
  }
}

/** All gangs of an edition in the order of their codes. @throws AppError `forbidden`, `not_found` */
export async function listGangs(db: EntityManager, who: SignedIn, editionId: string): Promise<Gang[]> {
  await readableEdition(db, who, editionId)
  const rows = await db.find(GangEntity, { where: { firmId: who.firmId, editionId }, order: { code: 'ASC' }, take: MOST_GANGS })
  return rows.map(toGang)
}
