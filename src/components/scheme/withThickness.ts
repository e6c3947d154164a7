import type { SolidScheme } from '#shared/contracts/appraisal'

/** The scheme with another thickness: a number holds for all panels; the note is how it was found, and none stays from before. */
export function withThickness(scheme: SolidScheme, thickness: SolidScheme['thickness'], note?: string): SolidScheme {
  const { mark, kind, thicknessPer, bars, givenPanels } = scheme
  if (thickness === 'least') return { mark, kind, thickness, thicknessPer, bars, givenPanels }
  return { mark, kind, thickness, thicknessPer: 'scheme', bars, givenPanels, ...(note ? { thicknessNote: note } : {}) }
}
