import type { Scheme } from '#shared/contracts/appraisal'
import type { Cure } from '#shared/sizing/cures/cure'
import type { useProjectStore } from '../../stores/project'
import { projectInputOf, schemeInputOf } from '../../stores/sheetRow'

type Given = Scheme['givenPanels'][number]

/** What the stored scheme gives panels that were left out when it was appraised, which a change made to the rest must keep. */
function unseen(stored: readonly Given[], seen: readonly Given[]): Given[] {
  return stored.filter(({ level, panel }) => seen.every((each) => each.level !== level || each.panel !== panel))
}

/** The changed scheme with all that the stored one gives to panels it was not appraised with. */
export function keptWhole(stored: Scheme, appraised: Scheme, changed: Scheme): Scheme {
  const givenPanels = [...changed.givenPanels, ...unseen(stored.givenPanels, appraised.givenPanels)]
  return { ...changed, givenPanels } as Scheme // what is given is of the scheme's own kind, as it was in the stored one
}

/** Makes a cure's change in the project's working copy: in its scheme, or in its brief. */
export function applyCure(store: ReturnType<typeof useProjectStore>, mark: string, cure: Cure): void {
  const row = store.schemes.find(({ specification }) => specification.mark === mark)
  const appraised = store.file?.schemes.find((scheme) => scheme.mark === mark)
  if (row === undefined || appraised === undefined || store.sheet === null) return
  const specification = keptWhole(row.specification, appraised, cure.scheme)
  if (JSON.stringify(specification) !== JSON.stringify(row.specification))
    store.changeScheme(row.id, { ...schemeInputOf(row), specification })
  const { project } = store.sheet
  if (JSON.stringify(cure.brief) !== JSON.stringify(store.file?.brief))
    void store.changeProject({ ...projectInputOf(project), brief: cure.brief })
}
