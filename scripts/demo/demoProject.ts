import type { LevelInput, ProjectInput, SchemeInput } from '#shared/contracts/project'

/** A project as it is typed, with names where the database will have ids. */
export interface DemoProject {
  readonly project: Omit<ProjectInput, 'editionId'>
  readonly region: string
  readonly levels: readonly LevelInput[]
  readonly schemes: readonly (Omit<SchemeInput, 'blockId'> & { readonly blockCode: string | null })[]
}
