import type { Level } from '#shared/contracts/appraisal'
import type { StoredScheme } from '#shared/contracts/project'

type Marked = Pick<Level, 'mark' | 'panels'>

/**
 * Schemes whose bars given to panels of a level must follow its new marks: those of the level and of panels renamed where they stand.
 * Where panels were put in or taken out, only the mark of the level is followed.
 */
export function followMarks(schemes: readonly StoredScheme[], before: Marked, after: Marked): StoredScheme[] {
  const isSameCount = before.panels.length === after.panels.length
  const renamed = new Map(isSameCount ? before.panels.map(({ mark }, i) => [mark, after.panels[i]!.mark]) : [])
  const isRenamed = before.mark !== after.mark || [...renamed].some(([old, now]) => old !== now)
  if (!isRenamed) return []
  const follow = <Given extends { level: string; panel: string }>(given: Given): Given =>
    given.level === before.mark ? { ...given, level: after.mark, panel: renamed.get(given.panel) ?? given.panel } : given
  return schemes.flatMap((row): StoredScheme[] => {
    const { specification } = row
    if (specification.givenPanels.every(({ level }) => level !== before.mark)) return []
    return specification.kind === 'ribbed'
      ? [{ ...row, specification: { ...specification, givenPanels: specification.givenPanels.map(follow) } }]
      : [{ ...row, specification: { ...specification, givenPanels: specification.givenPanels.map(follow) } }]
  })
}
