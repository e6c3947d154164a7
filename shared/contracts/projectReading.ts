import { z } from 'zod'
import { appraisal } from './appraisalResult'
import { edition } from './rateBook'
import { project, storedLevel, storedScheme } from './project'
import { scopeStanding } from './sameScope'

/**
 * A project as its readers see it, appraised on the server.
 * developer: all-in rates (markups folded in), no markups; both: what stands in the scope without its rates; engineer: `cost` and `comparison` are null.
 */
export const projectReading = z.strictObject({
  project: project.omit({ markups: true, editionId: true, scope: true }),
  scope: z.array(scopeStanding),
  levels: z.array(storedLevel),
  schemes: z.array(storedScheme),
  edition: edition.pick({ region: true, number: true, currency: true, baseDate: true }).nullable(),
  appraisal,
})
export type ProjectReading = z.infer<typeof projectReading>
