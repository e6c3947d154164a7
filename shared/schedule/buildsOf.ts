import type { Level, Panel } from '../contracts/appraisal'

/**
 * A panel by its marks, and how many times it is built: its own repeats times its level's.
 *
 * @throws RangeError when no level has such a panel
 */
export function buildsOf(levels: readonly Level[], levelMark: string, panelMark: string): { panel: Panel; members: number } {
  const level = levels.find(({ mark }) => mark === levelMark)
  const panel = level?.panels.find(({ mark }) => mark === panelMark)
  if (!level || !panel) throw new RangeError(`expected panel ${levelMark} ${panelMark} among the levels`)
  return { panel, members: level.repeat * panel.repeat }
}
