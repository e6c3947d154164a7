import { z } from 'zod'
import { brief, level, mark, markups, panel, scheme } from './appraisal'
import { factors } from './factors'
import { measurement } from './measurement'
import { edition, editionWithRates } from './rateBook'
import { rateOverride } from './rateOverride'
import { id, line, moment, optionalLine, version } from './primitives'
import { scope } from './sameScope'

/** Use of the floor by EN 1991-1-1 Table 6.1; it proposes an imposed load, which stays editable. */
export const useCategory = z.enum(['A', 'B', 'C1', 'C2', 'C3', 'C4', 'C5', 'D1', 'D2', 'E1'])
export type UseCategory = z.infer<typeof useCategory>

export const projectInput = z.strictObject({
  name: line(120),
  /** The office's own number, as TC-02. */
  reference: line(40),
  place: optionalLine(120),
  use: useCategory,
  brief,
  editionId: id.nullable(),
  markups,
  measurement: measurement.default('comparing'),
  /** By the marks of the project's schemes. */
  scope: scope.default([]),
  factors: factors.prefault({}),
})
export type ProjectInput = z.infer<typeof projectInput>

export const project = projectInput.extend({ id, version, updatedAt: moment, updatedBy: z.string() })
export type Project = z.infer<typeof project>

/** A level as stored: it may have no panel yet. */
export const levelInput = level.extend({ name: line(120), panels: z.array(panel).max(500) })
export type LevelInput = z.infer<typeof levelInput>
export const storedLevel = levelInput.extend({ id, version, position: z.int() })
export type StoredLevel = z.infer<typeof storedLevel>

/** A scheme as stored: the specification is the engine's own. `blockId` remembers the catalogue block it was taken from. */
export const schemeInput = z.strictObject({ name: line(120), blockId: id.nullable(), specification: scheme })
export type SchemeInput = z.infer<typeof schemeInput>
export const storedScheme = schemeInput.extend({ id, version, position: z.int() })
export type StoredScheme = z.infer<typeof storedScheme>

/** Everything a surveyor's sheets need of a project, in one answer. */
export const projectSheet = z.strictObject({
  project,
  levels: z.array(storedLevel),
  schemes: z.array(storedScheme),
  edition: editionWithRates.nullable(),
  /** Rates of this project's own, in the order of their items. */
  overrides: z.array(rateOverride).default([]),
})
export type ProjectSheet = z.infer<typeof projectSheet>

/** A line of the list of projects. */
export const projectSummary = z.strictObject({
  id,
  name: z.string(),
  reference: z.string(),
  place: z.string(),
  levelCount: z.int(),
  panelCount: z.int(),
  /** The reader may open the project, not only see this line. */
  canOpen: z.boolean(),
  /** Region and number of the edition in use; null: none chosen. */
  edition: edition.pick({ region: true, number: true, currency: true }).nullable(),
  /** Totals as appraised at the last save; null where a scheme cannot be priced yet. */
  totals: z.array(z.strictObject({ mark, kind: z.enum(['ribbed', 'solid']), total: z.string().nullable() })),
  /** In what the first ribbed and the first solid total are not like for like; empty where nothing is known to differ. */
  unequalScope: z.string(),
  updatedAt: moment,
})
export type ProjectSummary = z.infer<typeof projectSummary>
