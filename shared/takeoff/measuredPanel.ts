import type { Level, Panel } from '../contracts/appraisal'
import { findSharedEdges } from '../layout/neighbours'
import type { SizedPanel, SizedScheme } from '../sizing/sizedPanel'
import { type Expression, timesed } from './expression'

/** A sized panel beside the panel it was sized from: what every measuring function takes. */
export interface MeasuredPanel {
  readonly level: Level
  readonly panel: Panel
  readonly sized: SizedPanel
  /** One for each edge of the outline: whether another panel of the level stands on the same support. */
  readonly sharedEdges: readonly boolean[]
}

/**
 * Every panel of a scheme with its level, in the order of the levels.
 *
 * @throws RangeError when the scheme was sized from other levels
 */
export function measuredPanels(sized: SizedScheme, levels: readonly Level[]): MeasuredPanel[] {
  const asked = levels.flatMap((level) => {
    const shared = findSharedEdges(level)
    return level.panels.map((panel, index) => ({ level, panel, sharedEdges: shared[index]! }))
  })
  if (asked.length !== sized.panels.length)
    throw new RangeError(`expected ${asked.length} sized panels, got ${sized.panels.length}`)
  return asked.map(({ level, panel, sharedEdges }, index) => {
    const sizedPanel = sized.panels[index]!
    if (sizedPanel.level !== level.mark || sizedPanel.mark !== panel.mark) {
      throw new RangeError(`expected panel ${level.mark} ${panel.mark} sized, got ${sizedPanel.level} ${sizedPanel.mark}`)
    }
    return { level, panel, sized: sizedPanel, sharedEdges }
  })
}

/** How many times a panel is built: its own repeats times its level's. */
export function repeatsOf({ level, panel }: MeasuredPanel): number {
  return panel.repeat * level.repeat
}

/** An expression for one panel, timesed by both repeats. */
export function withRepeats(once: Expression, { level, panel }: MeasuredPanel): Expression {
  return timesed(once, panel.repeat, level.repeat)
}
