import type { Panel } from '../../../../../shared/contracts/appraisal'
import { panel } from '../../../../../shared/contracts/appraisal'

/** Panels P1, P2 … of a grid of spans, row by row from below, joined panels continuous. */
export function gridPanels(spansX: readonly number[], spansY: readonly number[]): Panel[] {
  const linesX = linesOf(spansX)
  const linesY = linesOf(spansY)
  return spansY.flatMap((_, row) =>
    spansX.map((_, column) => {
      const [x0, x1, y0, y1] = [linesX[column]!, linesX[column + 1]!, linesY[row]!, linesY[row + 1]!]
      const isJoined = [row > 0, column < spansX.length - 1, row < spansY.length - 1, column > 0]
      return panel.parse({
        mark: `P${row * spansX.length + column + 1}`,
        outline: [
          [x0, y0],
          [x1, y0],
          [x1, y1],
          [x0, y1],
        ],
        edges: isJoined.map((joined) => ({ supportWidth: 250, continuity: joined ? 'continuous' : 'discontinuous' })),
        ribDirection: 90,
      })
    }),
  )
}

function linesOf(spans: readonly number[]): number[] {
  return spans.reduce((lines, span) => [...lines, lines.at(-1)! + span], [0])
}
