import type { AppraisalFile, Rates } from '#shared/contracts/appraisal'
import type { ProjectSheet } from '#shared/contracts/project'
import { declaredFor } from '#shared/contracts/sameScope'
import { projectRates } from '#shared/pricing/projectRates'

function ratesOf({ project, edition, overrides, schemes }: ProjectSheet): Rates | undefined {
  return edition === null ? undefined : projectRates({ edition, markups: project.markups, overrides, schemes })
}

/** The appraisal file of a stored project, priced by its edition's likely rates and its own. Null while it has no panel or no scheme. */
export function storedAppraisalFile(sheet: ProjectSheet): AppraisalFile | null {
  const levels = sheet.levels
    .filter(({ panels }) => panels.length > 0)
    .map(({ mark, repeat, proppingHeight, panels }) => ({ mark, repeat, proppingHeight, panels }))
  const schemes = sheet.schemes.map(({ specification }) => specification)
  if (levels.length === 0 || schemes.length === 0) return null
  const rates = ratesOf(sheet)
  const { brief, measurement, scope, factors } = sheet.project
  const declared = declaredFor(scope, schemes)
  return {
    format: 'bothways.appraisal/1',
    brief,
    levels,
    schemes,
    measurement,
    scope: declared,
    factors,
    ...(rates ? { rates } : {}),
  }
}
