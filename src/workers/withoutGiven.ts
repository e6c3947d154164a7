import type { Scheme } from '#shared/contracts/appraisal'

/** A panel by the marks of its level and its own. */
export interface PanelMarks {
  readonly level: string
  readonly panel: string
}

/**
 * Schemes without what they give panels that are left out of a file for now: those stand on the sheet still, so that nothing is
 * wrong with the scheme. What is given to a panel that the sheet does not have stays, to be refused.
 */
export function withoutGiven(schemes: readonly Scheme[], leftOut: readonly PanelMarks[]): Scheme[] {
  if (leftOut.length === 0) return [...schemes]
  const isLeft = (given: PanelMarks) => leftOut.every(({ level, panel }) => level !== given.level || panel !== given.panel)
  return schemes.map((scheme) =>
    scheme.kind === 'ribbed'
      ? { ...scheme, givenPanels: scheme.givenPanels.filter(isLeft) }
      : { ...scheme, givenPanels: scheme.givenPanels.filter(isLeft) },
  )
}

/** Panels of some levels that stand in none of others. */
export function panelsLeftOut(
  all: readonly { readonly mark: string; readonly panels: readonly { readonly mark: string }[] }[],
  kept: typeof all,
): PanelMarks[] {
  return all.flatMap(({ mark: level, panels }) =>
    panels
      .filter(({ mark }) => !kept.some((each) => each.mark === level && each.panels.some((panel) => panel.mark === mark)))
      .map(({ mark: panel }) => ({ level, panel })),
  )
}
