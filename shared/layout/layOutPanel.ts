import type { Panel, RibbedScheme } from '../contracts/appraisal'
import { signedArea } from '../geometry/ring'
import { clearOutline } from './clearOutline'
import type { LaidRow } from './laidRow'
import { layRow } from './laidRow'
import { panelField } from './panelField'
import type { BlockRow, PanelLayout } from './panelLayout'
import { placedBlocks } from './placedBlocks'
import { longestRib, ribLines } from './ribLines'
import { ribbedAreas } from './ribbedAreas'
import { rowBands } from './rowBands'
import { solidRegions } from './solidRegions'
import { solidWindows } from './solidWindows'
import { stripAreas } from './stripAreas'

/**
 * A ribbed panel laid out for real, block by block, for any simple outline, rib direction and voids. The local frame of `rows` has
 * its origin at the outline's first vertex and its x axis along the ribs. `blocks` and `regions` are made when first read.
 * A panel too narrow for a row comes out all solid, with no rows.
 *
 * Source: project rule, engine design section 2 (rows, usable lengths, whole blocks, remainders at both ends)
 * @param solidZoneMm - laid at supported ends, ≥ 0
 * @param crossRibSpacingMm - greatest clear spacing for cross ribs of `rule`; null where the basis asks for none
 * @param sharedEdges - one for each edge of the outline: true where another panel stands on the same support (outer half of walls)
 * @throws OutOfScopeError when the supports leave no clear outline
 */
export function layOutPanel(
  panel: Panel,
  scheme: RibbedScheme,
  solidZoneMm: number,
  crossRibSpacingMm: number | null,
  sharedEdges: readonly boolean[],
): PanelLayout {
  const clear = clearOutline(panel)
  const field = panelField(panel, clear, scheme.trimmerWidth)
  const rules = { solidZoneMm, crossRibSpacingMm }
  const bands = rowBands(field.top - field.bottom, scheme)
  const rows = bands.starts.map((start) => layRow(field, field.bottom + start, scheme, rules))
  const windows = solidWindows(field, rows)
  const runs = rows.flatMap(({ filled }) => filled.flatMap((each) => each.runs))
  const cutRuns = runs.filter(({ cutMm }) => cutMm > 0)
  const blocks = once(() => placedBlocks(field.frame, rows, scheme.block.length))
  const regions = once(() => solidRegions(field, windows))
  return {
    clear: clear.ring,
    rows: rows.map(blockRow),
    get blocks() {
      return blocks()
    },
    ribLines: ribLines(field, rows, scheme),
    get regions() {
      return regions()
    },
    areas: ribbedAreas(field, rows, windows, stripAreas(panel, clear, sharedEdges), signedArea(panel.outline)),
    blocksWhole: runs.reduce((sum, { whole }) => sum + whole, 0),
    blocksCut: 2 * cutRuns.length,
    closedEnds: 2 * runs.length,
    cutLength: cutRuns.reduce((sum, { cutMm }) => sum + 2 * cutMm, 0),
    longestRib: longestRib(field, rows, scheme),
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
