import type { GivenRibbedPanel, GivenSolidPanel, Scheme } from '#shared/contracts/appraisal'
import { givenFor } from '#shared/sizing/givenPanel'

interface PanelMarks {
  readonly level: string
  readonly mark: string
}

type Given = GivenRibbedPanel | GivenSolidPanel

/** What a scheme gives one panel by itself. */
export function givenOf(scheme: Scheme, { level, mark }: PanelMarks): Given | undefined {
  return scheme.kind === 'ribbed' ? givenFor(scheme.givenPanels, level, mark) : givenFor(scheme.givenPanels, level, mark)
}

/** The scheme without what it gives one panel. */
export function withoutGivenPanel(scheme: Scheme, { level, mark }: PanelMarks): Scheme {
  const isOther = (given: Given) => given.level !== level || given.panel !== mark
  return scheme.kind === 'ribbed'
    ? { ...scheme, givenPanels: scheme.givenPanels.filter(isOther) }
    : { ...scheme, givenPanels: scheme.givenPanels.filter(isOther) }
}

/** The scheme with these bars for their panel, in place of what it gave it before. */
export function withGiven(scheme: Scheme, given: Given): Scheme {
  const rest = withoutGivenPanel(scheme, { level: given.level, mark: given.panel })
  if (rest.kind === 'ribbed') return 'bars' in given ? rest : { ...rest, givenPanels: [...rest.givenPanels, given] }
  return 'bars' in given ? { ...rest, givenPanels: [...rest.givenPanels, given] } : rest
}
