import type { Panel, RibbedScheme } from '../contracts/appraisal'
import { frameAt } from '../geometry/frame'
import type { Point } from '../geometry/point'
import { boundsOf, distance, edgeOfRing, signedArea } from '../geometry/ring'
import type { ClearOutline } from './clearOutline'
import type { Neighbour } from './neighbours'
import { rowBands } from './rowBands'
import { rowGrid, rowsOnGrid } from './rowGrid'

/** Rows of a panel that has a grid in common with neighbours. */
export interface AlignedRows {
  /** Start of each row's band in the panel's own frame (origin at its outline's first vertex, x along the ribs), mm. */
  readonly starts: readonly number[]
  /** Rows that the panel would have more of alone. */
  readonly fewer: number
}

interface AlignedPanel {
  readonly panel: Panel
  readonly clear: ClearOutline
}

type RowMeasures = Pick<RibbedScheme, 'block' | 'ribWidth' | 'edgeStrip'>

/**
 * Ribs run on across an edge that lies at more than this to them; else the panels stand side by side. 5 degrees.
 *
 * Source: project rule
 */
const LEAST_CROSSING_SINE = Math.sin((5 * Math.PI) / 180)

/**
 * Rows of neighbouring panels brought into line: panels of one rib direction that share a support across which their ribs run on, and
 * their like in turn, take their rows from one grid (`rowGrid`); edge strips take up what is left. A panel that the grid leaves without
 * a row keeps its own.
 *
 * Source: project rule, ribs run through from panel to panel
 * @param neighbours - of the level that the panels make up
 * @returns one for each panel; null: its rows are its own
 */
export function alignedRows(
  panels: readonly AlignedPanel[],
  neighbours: readonly Neighbour[],
  scheme: RowMeasures,
): (AlignedRows | null)[] {
  const rows = panels.map((): AlignedRows | null => null)
  for (const group of groupsOf(panels, neighbours)) {
    const { outline, ribDirection } = panels[group[0]!]!.panel
    const { toLocal } = frameAt(outline[0]!, ribDirection)
    const measured = group.map((i) => measure(panels[i]!.clear, toLocal))
    const grid = measured.some((each) => rowBands(each.top - each.bottom, scheme).count > 0) ? rowGrid(measured, scheme) : null
    if (grid === null) continue
    group.forEach((i, k) => {
      const { bottom, top } = measured[k]!
      const [, originY] = toLocal(panels[i]!.panel.outline[0]!)
      const starts = rowsOnGrid(measured[k]!, grid, scheme).map((start) => start - originY)
      if (starts.length > 0) rows[i] = { starts, fewer: rowBands(top - bottom, scheme).count - starts.length }
    })
  }
  return rows
}

function measure({ ring }: ClearOutline, toLocal: (point: Point) => Point) {
  const { minY: bottom, maxY: top } = boundsOf(ring.map(toLocal))
  return { bottom, top, meanLengthMm: signedArea(ring) / (top - bottom) }
}

/** Numbers of panels whose ribs run on into each other, two or more in each group. */
function groupsOf(panels: readonly AlignedPanel[], neighbours: readonly Neighbour[]): number[][] {
  const onward = panels.map((): number[] => [])
  for (const each of neighbours) if (runsOn(panels, each)) onward[each.panel]!.push(each.neighbour)
  const groupOf = panels.map((): number | null => null)
  const groups: number[][] = []
  panels.forEach((_, i) => {
    if (groupOf[i] !== null) return
    const group = [i]
    groupOf[i] = groups.length
    for (const member of group)
      for (const next of onward[member]!) {
        if (groupOf[next] !== null) continue
        groupOf[next] = groups.length
        group.push(next)
      }
    groups.push(group.sort((a, b) => a - b))
  })
  return groups.filter(({ length }) => length > 1)
}

function runsOn(panels: readonly AlignedPanel[], { panel, edge, neighbour }: Neighbour): boolean {
  const { outline, ribDirection } = panels[panel]!.panel
  if (panels[neighbour]!.panel.ribDirection !== ribDirection) return false
  const [a, b] = edgeOfRing(outline, edge)
  const [ux, uy] = frameAt([0, 0], ribDirection).toLevel([1, 0])
  return Math.abs(ux * (b[1] - a[1]) - uy * (b[0] - a[0])) > LEAST_CROSSING_SINE * distance(a, b)
}
