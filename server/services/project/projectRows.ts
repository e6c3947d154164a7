import {
  brief as briefContract,
  markups as markupsContract,
  panel as panelContract,
  scheme as schemeContract,
} from '#shared/contracts/appraisal'
import { factors as factorsContract } from '#shared/contracts/factors'
import { scope as scopeContract } from '#shared/contracts/sameScope'
import type { Project, StoredLevel, StoredScheme } from '#shared/contracts/project'
import type { EntityManager } from 'typeorm'
import { PersonEntity } from '../../entities/firm/PersonEntity'
import type { LevelEntity } from '../../entities/project/LevelEntity'
import { ProjectEntity } from '../../entities/project/ProjectEntity'
import type { SchemeEntity } from '../../entities/project/SchemeEntity'
import { AppError } from '../../errors'

/** The firm's project. @throws AppError `not_found`, the same for another firm's */
export async function requireProject(db: EntityManager, firmId: string, id: string): Promise<ProjectEntity> {
  const row = await db.findOneBy(ProjectEntity, { firmId, id })
  if (row === null) throw new AppError('not_found')
  return row
}

/** A project's row as the contract has it; fields younger than the row take their defaults. */
export async function toProject(db: EntityManager, row: ProjectEntity): Promise<Project> {
  const { id, name, reference, place, use, editionId, measurement, version } = row
  const person = await db.findOneByOrFail(PersonEntity, { firmId: row.firmId, id: row.updatedBy })
  const given = {
    brief: briefContract.parse(row.brief),
    markups: markupsContract.parse(row.markups),
    scope: scopeContract.parse(row.scope ?? []),
    factors: factorsContract.parse(row.factors ?? {}),
    updatedAt: row.updatedAt.toISOString(),
    updatedBy: person.name,
  }
  return { id, name, reference, place, use, editionId, measurement, version, ...given }
}

/** A level's row as the contract has it; fields of its panels younger than the row take their defaults. */
export function toStoredLevel({ panels, ...row }: LevelEntity): StoredLevel {
  const { id, position, mark, name, repeat, proppingHeight, version } = row
  const read = panels.map((panel) => panelContract.parse(panel))
  return { id, position, mark, name, repeat, proppingHeight, panels: read, version }
}

/** A scheme's row as the contract has it; fields younger than the row take their defaults. */
export function toStoredScheme({ id, position, name, blockId, specification, version }: SchemeEntity): StoredScheme {
  return { id, position, name, blockId, specification: schemeContract.parse(specification), version }
}
