import type { ApiIssue } from '../../contracts/apiError'
import type { AppraisalFile } from '../../contracts/appraisal'

/** Bars given to a panel that the file does not have, and to the same panel twice. */
export function checkGivenPanels({ levels, schemes }: Pick<AppraisalFile, 'levels' | 'schemes'>): ApiIssue[] {
  return schemes.flatMap(({ givenPanels }, i) => {
    const seen = new Set<string>()
    return givenPanels.flatMap(({ level, panel }, j): ApiIssue[] => {
      const path = `schemes.${i}.givenPanels.${j}`
      const found = levels.find(({ mark }) => mark === level)
      if (!found)
        return [{ path: `${path}.level`, message: `there is no level ${level}: expected the mark of a level of this file` }]
      if (found.panels.every(({ mark }) => mark !== panel))
        return [
          { path: `${path}.panel`, message: `level ${level} has no panel ${panel}: expected the mark of one of its panels` },
        ]
      const key = JSON.stringify([level, panel])
      if (seen.has(key))
        return [{ path, message: `panel ${panel} of level ${level} is given bars already: expected each panel once` }]
      seen.add(key)
      return []
    })
  })
}
