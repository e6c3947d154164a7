import type { Role } from '#shared/contracts/person'

/** The sheets of a project in the order of the set, and who reads them. */
export const PROJECT_SHEETS = [
  { name: 'brief', word: 'Brief', roles: ['surveyor'] },
  { name: 'levels', word: 'Levels', roles: ['surveyor'] },
  { name: 'schemes', word: 'Schemes', roles: ['surveyor'] },
  { name: 'scope', word: 'Scope', roles: ['surveyor'] },
  { name: 'quantities', word: 'Quantities', roles: ['surveyor'] },
  { name: 'bill', word: 'Bill', roles: ['surveyor'] },
  { name: 'compare', word: 'Compare', roles: ['surveyor', 'developer'] },
  { name: 'checks', word: 'Checks', roles: ['surveyor', 'engineer'] },
  { name: 'layout', word: 'Layout', roles: ['surveyor', 'engineer'] },
  { name: 'bars', word: 'Bars', roles: ['surveyor', 'engineer'] },
  { name: 'sent', word: 'Sent', roles: ['surveyor'] },
] as const satisfies readonly { name: string; word: string; roles: readonly Role[] }[]

export type ProjectSheetName = (typeof PROJECT_SHEETS)[number]['name']

/** Number of a sheet in the set, as '06'. */
export function sheetNumber(name: ProjectSheetName): string {
  return String(PROJECT_SHEETS.findIndex((sheet) => sheet.name === name) + 1).padStart(2, '0')
}

/** The sheets that somebody with these roles may open. */
export function sheetsFor(roles: readonly Role[]): readonly (typeof PROJECT_SHEETS)[number][] {
  return PROJECT_SHEETS.filter((sheet) => sheet.roles.some((role) => roles.includes(role)))
}
