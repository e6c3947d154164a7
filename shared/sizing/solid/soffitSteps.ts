import { figure } from '../figure'
import type { LevelSite } from '../panelSite'

/**
 * Where the soffit steps between a panel and its neighbours, one sentence for each neighbour of another thickness.
 *
 * Source: project rule, what a thickness per panel brings with it is stated (tops are level, so soffits step)
 * @param heightsMm - of the level's panels
 * @param panel - number of the panel, from 0
 */
export function soffitSteps({ panels, neighbours }: LevelSite, heightsMm: readonly number[], panel: number): string[] {
  const own = heightsMm[panel]!
  const steps = neighbours
    .filter((each) => each.panel === panel && heightsMm[each.neighbour] !== own)
    .map(({ edge, neighbour }) => {
      const mark = panels[neighbour]!.panel.mark
      return (
        `soffit steps ${figure(Math.abs(heightsMm[neighbour]! - own))} mm at edge ${edge + 1} to panel ${mark}, ` +
        `${figure(heightsMm[neighbour]!)} mm thick; moments as of spans equally stiff`
      )
    })
  return [...new Set(steps)]
}
