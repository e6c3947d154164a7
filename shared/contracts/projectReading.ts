import { z } from 'zod'
import { appraisal } from './appraisal'
import { edition } from './rateBook'
import { project, storedLevel, storedScheme } from './project'

/**
 * A project as its readers see it, appraised on the server.
 * developer: all-in rates (markups folded in), no markups; engineer: `cost` and `comparison` are null.
 */
export const projectReading = z.strictObject({
  project: project.omit({ markups: true, editionId: true }),
  levels: z.array(storedLevel),
  schemes: z.array(storedScheme),
  edition: edition.pick({ region: true, number: true, currency: true, baseDate: true }).nullable(),
  appraisal,
})
export type ProjectReading = z.infer<typeof projectReading>
