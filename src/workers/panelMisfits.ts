import type { ApiIssue } from '#shared/contracts/apiError'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import { checkBlockFit } from '#shared/layout/checks/checkBlockFit'
import { checkPanel } from '#shared/layout/checks/checkPanel'

/**
 * Panels too small for the blocks of a scheme that fits others: the engine finds fault with the scheme, but on a sheet it is
 * the panel that was typed wrong. Where no panel takes the blocks, the scheme is at fault and nothing is said here.
 */
export function panelMisfits({ levels, schemes }: AppraisalFile): ApiIssue[] {
  const panels = levels.flatMap((level, l) =>
    level.panels.flatMap((panel, p) => {
      const path = `levels.${l}.panels.${p}`
      return checkPanel(panel, path).length > 0 ? [] : [{ panel, path, where: `panel ${panel.mark} of level ${level.mark}` }]
    }),
  )
  return schemes.flatMap((scheme) => {
    if (scheme.kind !== 'ribbed') return []
    const found = panels.flatMap(({ panel, path, where }) =>
      checkBlockFit(panel, scheme, where, scheme.mark)
        .slice(0, 1)
        .map(({ message }) => ({ path: `${path}.outline`, message: message.replace(`${where}: `, '') })),
    )
    return found.length < panels.length ? found : []
  })
}
