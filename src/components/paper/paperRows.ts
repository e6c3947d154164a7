import type { StoredScheme } from '#shared/contracts/project'
import type { PlanPanel } from '#shared/drawing/planPanel'
import { boundsOf } from '#shared/geometry/ring'
import type { SizedScheme } from '#shared/sizing/sizedPanel'
import { formatQuantity } from '../base/formatQuantity'

/** Particulars of the panels on a sheet: a head and its rows, one a panel. */
export interface PaperRows {
  readonly head: readonly string[]
  readonly rows: readonly (readonly string[])[]
}

/** What the panels drawn are, each with its repeat; of a ribbed scheme with rows and blocks, of a solid one with thickness and span. */
export function paperRows(
  panels: readonly PlanPanel[],
  levelMark: string,
  { specification }: StoredScheme,
  sized: SizedScheme | null,
): PaperRows {
  const size = ({ panel }: PlanPanel) => {
    const { minX, minY, maxX, maxY } = boundsOf(panel.outline)
    return `${formatQuantity(maxX - minX, { decimals: 0 })} × ${formatQuantity(maxY - minY, { decimals: 0 })}`
  }
  const name = ({ panel }: PlanPanel) => (panel.repeat > 1 ? `${panel.mark} (${panel.repeat} off)` : panel.mark)
  if (specification.kind === 'ribbed')
    return {
      head: ['Panel', 'Over all', 'Rows', 'Solid zone', 'Whole', 'Cut'],
      rows: panels.map((each) => [
        name(each),
        size(each),
        formatQuantity(each.layout?.rows.length),
        formatQuantity(each.layout?.solidZone, { decimals: 0 }),
        formatQuantity(each.layout?.blocksWhole),
        formatQuantity(each.layout?.blocksCut),
      ]),
    }
  const depthOf = (mark: string) => sized?.panels.find((each) => each.level === levelMark && each.mark === mark)?.depth
  return {
    head: ['Panel', 'Over all', 'Thick', 'Spans'],
    rows: panels.map((each) => [
      name(each),
      size(each),
      formatQuantity(depthOf(each.panel.mark)),
      each.isBothWays ? 'both ways' : 'one way',
    ]),
  }
}
