import type { AppraisalFile, Scheme } from '../contracts/appraisal'
import { codeBasisOf } from './codeBases'
import { levelSites } from './panelSite'
import { sizeRibbed } from './ribbed/sizeRibbed'
import type { SizedPanel, SizedScheme } from './sizedPanel'
import { sizeSolid } from './solid/sizeSolid'

/**
 * A scheme sized over all levels of a floor: depth, bars, moments and every check of each panel.
 *
 * Source: project rule, engine design sections 1 to 4
 * @throws OutOfScopeError for a code basis that is not built, or panels outside the rules' scope
 */
export function sizeScheme(scheme: Scheme, { brief, levels }: Pick<AppraisalFile, 'brief' | 'levels'>): SizedScheme {
  const basis = codeBasisOf(brief)
  const sites = levelSites(levels)
  const panels: readonly SizedPanel[] =
    scheme.kind === 'ribbed'
      ? sites.flatMap((level) => sizeRibbed(level, scheme, brief, basis))
      : sizeSolid(sites, scheme, brief, basis)
  return {
    mark: scheme.mark,
    kind: scheme.kind,
    depth: Math.max(...panels.map(({ depth }) => depth)),
    passes: panels.every(({ checks }) => checks.every(({ pass }) => pass)),
    panels,
  }
}
