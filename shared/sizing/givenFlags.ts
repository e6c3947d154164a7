import type { Scheme } from '../contracts/appraisal'
import { givenFor } from './givenPanel'

/**
 * That a panel's bars are given for it alone, and how a given thickness was found where a note says so.
 *
 * Source: project rule, what was not worked out here is stated
 */
export function givenFlags(scheme: Scheme, level: string, panel: string): string[] {
  const isGiven =
    scheme.kind === 'ribbed' ? givenFor(scheme.givenPanels, level, panel) : givenFor(scheme.givenPanels, level, panel)
  return [
    ...(isGiven ? ['bars given for this panel in place of computed ones: checked as given'] : []),
    ...(scheme.kind === 'solid' && scheme.thicknessNote ? [`thickness: ${scheme.thicknessNote}`] : []),
  ]
}
