import type { Panel } from '../../contracts/appraisal'
import { checkOverlaps } from '../checks/checkOverlaps'
import { checkPanel } from '../checks/checkPanel'

/**
 * First thing that keeps panels of a level from being a floor, in words for the screen, or null: an outline that is not
 * simple, supports that leave nothing clear, a void outside the clear outline or over another, panels over each other.
 * The rules are those by which the engine and the server refuse a floor.
 */
export function floorFault(panels: readonly Panel[]): string | null {
  for (const panel of panels) {
    const [issue] = checkPanel(panel, panel.mark)
    if (issue !== undefined) return `${panel.mark}: ${issue.message}`
  }
  return checkOverlaps({ panels: [...panels] }, 'level')[0]?.message ?? null
}
