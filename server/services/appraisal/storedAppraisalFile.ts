import type { AppraisalFile, ItemCode, Rates } from '#shared/contracts/appraisal'
import type { ProjectSheet } from '#shared/contracts/project'
import { declaredFor } from '#shared/contracts/sameScope'

function ratesOf({ project, edition }: ProjectSheet): Rates | undefined {
  if (edition === null) return undefined
  const items = Object.fromEntries(edition.rates.map(({ item, likely }) => [item, likely])) as Partial<Record<ItemCode, string>>
  return { currency: edition.currency, items, byScheme: {}, markups: project.markups }
}

/** The appraisal file of a stored project, priced by its edition's likely rates. Null while it has no panel or no scheme. */
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
