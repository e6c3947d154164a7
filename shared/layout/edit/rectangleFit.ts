import type { Panel, RibbedScheme } from '../../contracts/appraisal'
import { FIT_TOLERANCE_MM } from '../../geometry/tolerance'
import { edgeRecords } from './edgeRecords'
import type { CellProblem } from './panelRowText'
import { likelyLength } from './readLength'
import { boxLengths, isRectangle } from './rectangle'

/**
 * Why a rectangular panel takes no row of blocks, told by the length that was typed: what its supports leave, and what one
 * row, or one block, needs. Null where a row fits, and for panels that are no rectangle or whose ribs are skew.
 */
export function rectangleFit(panel: Panel, { block, edgeStrip }: RibbedScheme): CellProblem | null {
  if (!isRectangle(panel) || panel.ribDirection % 90 !== 0) return null
  const [alongX, alongY] = boxLengths(panel.outline)
  const clears = (
    [
      { column: 'alongX', lengthMm: alongX, isAcrossRibs: panel.ribDirection === 90, axis: 1 },
      { column: 'alongY', lengthMm: alongY, isAcrossRibs: panel.ribDirection === 0, axis: 0 },
    ] as const
  ).map((side) => ({ ...side, supports: supportsAcross(panel, side.axis) }))
  for (const { column, lengthMm, isAcrossRibs, supports } of clears) {
    const leaves = lengthMm - (supports[0] + supports[1]) / 2
    const needs = isAcrossRibs ? block.width + 2 * edgeStrip : block.length
    if (leaves >= needs - FIT_TOLERANCE_MM) continue
    const what = isAcrossRibs ? 'one row of blocks needs' : 'one block needs'
    const reason = `${figure(lengthMm)} leaves ${figure(leaves)} between ${supportsText(supports)}; ${what} ${figure(needs)}`
    const likely = likelyLength(lengthMm)
    return { column, reason, ...(likely === null ? {} : { repair: `Was it ${figure(likely)}?` }) }
  }
  return null
}

/** Widths of the two supports that lie across an axis: of the edges that run along axis 0 (x) or 1 (y). */
function supportsAcross(panel: Panel, edgesAlong: 0 | 1): readonly [number, number] {
  const records = edgeRecords(panel)
  const widths = panel.outline.flatMap((point, i) => {
    const next = panel.outline[(i + 1) % panel.outline.length]!
    const across = 1 - edgesAlong
    return Math.abs(next[across]! - point[across]!) < Math.abs(next[edgesAlong]! - point[edgesAlong]!)
      ? [records[i]!.supportWidth]
      : []
  })
  return [widths[0] ?? 0, widths[1] ?? 0]
}

function supportsText([a, b]: readonly [number, number]): string {
  return a === b ? `two supports of ${figure(a)}` : `supports of ${figure(a)} and ${figure(b)}`
}

function figure(lengthMm: number): string {
  return Number(lengthMm.toFixed(1)).toLocaleString('en')
}
