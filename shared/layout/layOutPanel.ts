import type { Panel, RibbedScheme } from '../contracts/appraisal'
import { signedArea } from '../geometry/ring'
import type { LaidRow } from './laidRow'
import { layRow } from './laidRow'
import { layoutGround } from './layoutGround'
import type { BlockRow, PanelLayout } from './panelLayout'
import { placedBlocks } from './placedBlocks'
import { ribbedAreas } from './ribbedAreas'
import { solidRegions } from './solidRegions'
import { solidWindows } from './solidWindows'
import { stripAreas } from './stripAreas'

/**
 * A ribbed panel laid out for real, block by block, for any simple outline, rib direction and voids. The local frame of `rows` has
 * its origin at the outline's first vertex and its x axis along the ribs. `blocks`, `regions`, `rows` and
 * `areas` are made when first read. A panel too narrow for a row comes out all solid, with no rows.
 *
 * Source: project rule, engine design section 2 (rows, usable lengths, whole blocks, remainders at both ends)
 * @param solidZoneMm - laid at supported ends, ≥ 0
 * @param crossRibSpacingMm - greatest clear spacing for cross ribs of `rule`; null where the basis asks for none
 * @param sharedEdges - one for each edge of the outline: true where another panel stands on the same support (outer half of walls)
 * @param ground - of this panel and scheme, where it is known from another zone
 * @throws OutOfScopeError when the supports leave no clear outline
 */
export function layOutPanel(
  panel: Panel,
  scheme: RibbedScheme,
  solidZoneMm: number,
  crossRibSpacingMm: number | null,
  sharedEdges: readonly boolean[],
  ground = layoutGround(panel, scheme),
): PanelLayout {
  const { clear, field, ribLines, longestRib } = ground
  const rules = { solidZoneMm, crossRibSpacingMm }
  const rows = ground.rows.map((row) => layRow(row, scheme, rules))
  const windows = once(() => solidWindows(field, rows))
  const runs = rows.flatMap(({ filled }) => filled.flatMap((each) => each.runs))
  const cutRuns = runs.filter(({ cutMm }) => cutMm > 0)
  const blocks = once(() => placedBlocks(field.frame, rows, scheme.block.length))
  const regions = once(() => solidRegions(field, windows()))
  const areas = once(() => ribbedAreas(field, rows, windows(), stripAreas(panel, clear, sharedEdges), signedArea(panel.outline)))
  const blockRows = once(() => rows.map(blockRow))
  return {
    clear: clear.ring,
    get rows() {
      return blockRows()
    },
    get blocks() {
      return blocks()
    },
    ribLines,
    get regions() {
      return regions()
    },
    get areas() {
      return areas()
    },
    netArea: field.clearArea - Math.max(0, field.voidsArea),
    blocksWhole: runs.reduce((sum, { whole }) => sum + whole, 0),
    blocksCut: 2 * cutRuns.length,
    closedEnds: 2 * runs.length,
    cutLength: cutRuns.reduce((sum, { cutMm }) => sum + 2 * cutMm, 0),
    longestRib,
    solidZone: solidZoneMm,
  }
}

function blockRow({ bandStart, bandEnd, lengths, filled }: LaidRow): BlockRow {
  return {
    bandStart,
    bandEnd,
    lengths: lengths
      .filter(({ usableStart, usableEnd }) => usableEnd > usableStart)
      .map(({ usableStart, usableEnd, startsAt, endsAt }) => ({ start: usableStart, end: usableEnd, startsAt, endsAt })),
    runs: filled.flatMap(({ runs }) =>
      runs.map(({ start, end, whole, cutMm }) => ({ start, end, blocks: whole + (cutMm > 0 ? 2 : 0) })),
    ),
  }
}

/** The same value at every call, made at the first. */
function once<Value>(make: () => Value): () => Value {
  let made: { readonly value: Value } | null = null
  return () => (made ??= { value: make() }).value
}
