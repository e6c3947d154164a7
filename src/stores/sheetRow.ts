import type { ApiIssue } from '#shared/contracts/apiError'
import type {
  LevelInput,
  Project,
  ProjectInput,
  ProjectSheet,
  SchemeInput,
  StoredLevel,
  StoredScheme,
} from '#shared/contracts/project'
import { changeLevel } from '../api/levels'
import { changeProject } from '../api/projects'
import { changeScheme } from '../api/schemes'

/** One row of a project's sheet, which has a version of its own and is saved by itself. */
export type SheetRow =
  | { readonly kind: 'project'; readonly row: Project }
  | { readonly kind: 'level'; readonly row: StoredLevel }
  | { readonly kind: 'scheme'; readonly row: StoredScheme }

export const keyOf = ({ kind, row }: SheetRow): string => `${kind}:${row.id}`

export const projectInputOf = (project: Project): ProjectInput => ({
  name: project.name,
  reference: project.reference,
  place: project.place,
  use: project.use,
  brief: project.brief,
  editionId: project.editionId,
  markups: project.markups,
  measurement: project.measurement,
  scope: project.scope,
  factors: project.factors,
})

export const levelInputOf = ({ mark, name, repeat, proppingHeight, panels }: StoredLevel): LevelInput => ({
  mark,
  name,
  repeat,
  proppingHeight,
  panels,
})

export const schemeInputOf = ({ name, blockId, specification }: StoredScheme): SchemeInput => ({ name, blockId, specification })

/** The row that a key names, or undefined when the sheet has it no more. */
export function rowOf(sheet: ProjectSheet, key: string): SheetRow | undefined {
  if (key === `project:${sheet.project.id}`) return { kind: 'project', row: sheet.project }
  const level = sheet.levels.find(({ id }) => key === `level:${id}`)
  if (level !== undefined) return { kind: 'level', row: level }
  const scheme = sheet.schemes.find(({ id }) => key === `scheme:${id}`)
  return scheme === undefined ? undefined : { kind: 'scheme', row: scheme }
}

const put = <T extends { id: string }>(rows: readonly T[], row: T): T[] => rows.map((old) => (old.id === row.id ? row : old))

/** The sheet with this row in place of the one of the same id. */
export function withRow(sheet: ProjectSheet, { kind, row }: SheetRow): ProjectSheet {
  switch (kind) {
    case 'project':
      return { ...sheet, project: row }
    case 'level':
      return { ...sheet, levels: put(sheet.levels, row) }
    case 'scheme':
      return { ...sheet, schemes: put(sheet.schemes, row) }
  }
}

/** The sheet without the row: levels and schemes only, a project is never taken out of its own sheet. */
export function withoutRow(sheet: ProjectSheet, key: string): ProjectSheet {
  return {
    ...sheet,
    levels: sheet.levels.filter(({ id }) => key !== `level:${id}`),
    schemes: sheet.schemes.filter(({ id }) => key !== `scheme:${id}`),
  }
}

/** The row with another version: what was typed stays, what it is based on moves. */
export function atVersion({ kind, row }: SheetRow, version: number): SheetRow {
  switch (kind) {
    case 'project':
      return { kind, row: { ...row, version } }
    case 'level':
      return { kind, row: { ...row, version } }
    case 'scheme':
      return { kind, row: { ...row, version } }
  }
}

/** Stores the row over its version and yields it as stored. @throws ApiFailure */
export async function sendRow(projectId: string, { kind, row }: SheetRow, isLeaving: boolean): Promise<SheetRow> {
  switch (kind) {
    case 'project':
      return { kind, row: await changeProject(row.id, row.version, projectInputOf(row), isLeaving) }
    case 'level':
      return { kind, row: await changeLevel(projectId, row.id, row.version, levelInputOf(row), isLeaving) }
    case 'scheme':
      return { kind, row: await changeScheme(projectId, row.id, row.version, schemeInputOf(row), isLeaving) }
  }
}

/** Issues of one row's answer, by path in the sheet: `panels.2.outline` of the first level is `levels.0.panels.2.outline`. */
export function issuesInSheet(sheet: ProjectSheet, { kind, row }: SheetRow, issues: readonly ApiIssue[]): ApiIssue[] {
  const index =
    kind === 'level' ? sheet.levels.findIndex(({ id }) => id === row.id) : sheet.schemes.findIndex(({ id }) => id === row.id)
  const prefix = kind === 'project' ? '' : `${kind}s.${index}.`
  return issues.map(({ path, message }) => ({ path: prefix + path.replace(/^specification\./, ''), message }))
}
