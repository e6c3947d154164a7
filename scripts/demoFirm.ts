import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { ContactEntity } from '../server/entities/dispatch/ContactEntity'
import { FirmEntity } from '../server/entities/firm/FirmEntity'
import { PersonEntity } from '../server/entities/firm/PersonEntity'
import { PersonRoleEntity } from '../server/entities/firm/PersonRoleEntity'
import { LevelEntity } from '../server/entities/project/LevelEntity'
import { ProjectEntity } from '../server/entities/project/ProjectEntity'
import { ProjectShareEntity } from '../server/entities/project/ProjectShareEntity'
import { SchemeEntity } from '../server/entities/project/SchemeEntity'
import { BlockEntity } from '../server/entities/rates/BlockEntity'
import { EditionEntity } from '../server/entities/rates/EditionEntity'
import { RateBookEntity } from '../server/entities/rates/RateBookEntity'
import { RateEntity } from '../server/entities/rates/RateEntity'
import { DEMO_BLOCKS } from './demo/demoBlocks'
import { DEMO_PEOPLE } from './demo/demoPeople'
import type { DemoProject } from './demo/demoProject'
import { DEMO_BOOKS, DEMO_RATES, type DemoEdition } from './demo/demoRates'
import { GANNET_HOUSE } from './demo/gannetHouse'
import { makeDemoPrices } from './demo/makeDemoPrices'
import { MILLRACE_CLINIC } from './demo/millraceClinic'
import { TARN_COURT } from './demo/tarnCourt'

/** Ids of what was made, by the names that the demo data use. */
interface Made {
  readonly firmId: string
  readonly people: ReadonlyMap<string, string>
  readonly blocks: ReadonlyMap<string, string>
  readonly editions: ReadonlyMap<string, string>
}

const SOURCE = 'Demo data, invented; no real quotation'

async function makePeople(tx: EntityManager, firmId: string): Promise<Map<string, string>> {
  const ids = new Map<string, string>()
  for (const { name, email, roles } of DEMO_PEOPLE) {
    const id = v7()
    ids.set(email, id)
    await tx.insert(PersonEntity, { firmId, id, name, email, passwordHash: null, state: 'active', createdAt: new Date() })
    await tx.insert(
      PersonRoleEntity,
      roles.map((role) => ({ firmId, personId: id, role })),
    )
  }
  return ids
}

async function makeBlocks(tx: EntityManager, firmId: string): Promise<Map<string, string>> {
  const rows = DEMO_BLOCKS.map((block) => ({ ...block, firmId, id: v7() }))
  await tx.insert(BlockEntity, rows)
  return new Map(rows.map(({ code, id }) => [code, id]))
}

async function makeEdition(tx: EntityManager, firmId: string, bookId: string, edition: DemoEdition): Promise<string> {
  const id = v7()
  const { factors, state, isBuiltUp, ...own } = edition
  await tx.insert(EditionEntity, {
    ...own,
    firmId,
    id,
    bookId,
    state: 'draft',
    compiledBy: 'Demo estimator',
    checkedBy: 'Demo checker',
    taxBasis: 'Before tax; overheads and profit included',
  })
  const rates = DEMO_RATES.map(({ item, description, unit, likely, range, trade }) => {
    const price = likely * factors[trade]
    const [low, high] = range
    return {
      firmId,
      editionId: id,
      item,
      description,
      unit,
      low: (price * low).toFixed(2),
      likely: price.toFixed(2),
      high: (price * high).toFixed(2),
      source: SOURCE,
    }
  })
  await tx.insert(RateEntity, rates)
  if (isBuiltUp) await makeDemoPrices(tx, firmId, id)
  await tx.update(EditionEntity, { firmId, id }, { state })
  return id
}

async function makeBooks(tx: EntityManager, firmId: string): Promise<Map<string, string>> {
  const published = new Map<string, string>()
  for (const { region, editions } of DEMO_BOOKS) {
    const bookId = v7()
    await tx.insert(RateBookEntity, { firmId, id: bookId, region, currency: 'USD' })
    for (const edition of editions) {
      const id = await makeEdition(tx, firmId, bookId, edition)
      if (edition.state === 'published') published.set(region, id)
    }
  }
  return published
}

async function makeProject(tx: EntityManager, made: Made, { project, region, levels, schemes }: DemoProject): Promise<void> {
  const { firmId, people, blocks, editions } = made
  const projectId = v7()
  const now = new Date()
  const surveyor = people.get('surveyor@example.test')!
  const of = { firmId, projectId }
  await tx.insert(ProjectEntity, {
    ...project,
    firmId,
    id: projectId,
    editionId: editions.get(region)!,
    totals: [],
    createdAt: now,
    updatedAt: now,
    updatedBy: surveyor,
  })
  await tx.insert(
    LevelEntity,
    levels.map((level, position) => ({ ...level, ...of, id: v7(), position })),
  )
  const schemeRows = schemes.map(({ name, blockCode, specification }, position) => {
    const blockId = blockCode === null ? null : blocks.get(blockCode)!
    return { ...of, id: v7(), position, name, blockId, specification, mark: specification.mark }
  })
  await tx.insert(SchemeEntity, schemeRows)
  const readers = ['developer@example.test', 'engineer@example.test'].map((email) => people.get(email)!)
  await tx.insert(
    ProjectShareEntity,
    readers.map((personId) => ({ ...of, personId })),
  )
  await tx.insert(ContactEntity, { ...of, id: v7(), name: 'Demo client', email: 'client@example.test', createdAt: now })
}

/** Makes the demo firm with its people, prices, blocks and projects, unless it is there. Everything in it is invented. */
export async function ensureDemoFirm(db: EntityManager): Promise<void> {
  await db.transaction(async (tx) => {
    if (await tx.existsBy(FirmEntity, { isDemo: true })) return
    const firmId = v7()
    await tx.insert(FirmEntity, { id: firmId, name: 'Quillmark Surveyors', isDemo: true, createdAt: new Date() })
    const people = await makePeople(tx, firmId)
    const made = { firmId, people, blocks: await makeBlocks(tx, firmId), editions: await makeBooks(tx, firmId) }
    for (const project of [GANNET_HOUSE, MILLRACE_CLINIC, TARN_COURT]) await makeProject(tx, made, project)
  })
}
