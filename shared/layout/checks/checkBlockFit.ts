import type { ApiIssue } from '../../contracts/apiError'
import type { Panel, RibbedScheme } from '../../contracts/appraisal'
import { clearOutline } from '../clearOutline'
import { clearRow, layRow } from '../laidRow'
import type { PanelField } from '../panelField'
import { panelField } from '../panelField'
import { rowBands } from '../rowBands'

/**
 * Blocks that one panel may take: more is a mistake of units rather than a floor.
 *
 * Source: project rule, some 9,000 m² of floor in one panel with common blocks
 */
const MOST_BLOCKS = 100_000

/**
 * Whether a scheme's blocks fit a panel: at least one row across the ribs and one block along them.
 *
 * @param panel - one that passed `checkPanel`
 * @param where - for the message, as `panel P3 of level L1`
 * @param path - of the scheme, as `schemes.1`
 */
export function checkBlockFit(panel: Panel, scheme: RibbedScheme, where: string, path: string): ApiIssue[] {
  const { block, ribWidth, edgeStrip } = scheme
  const field = panelField(panel, clearOutline(panel), scheme.trimmerWidth)
  const issue = (name: string, message: string) => [{ path: `${path}.block.${name}`, message: `${where}: ${message}` }]
  const width = field.top - field.bottom
  const bands = rowBands(width, scheme)
  if (bands.count === 0) {
    const strips = edgeStrip > 0 ? ` (a block ${whole(block.width)} wide and two edge strips of ${whole(edgeStrip)})` : ''
    const needed = whole(block.width + 2 * edgeStrip)
    return issue(
      'width',
      `${whole(width)} mm are clear across the ribs, one row of blocks needs ${needed} mm${strips}: expected room for a row`,
    )
  }
  const most = Math.round(field.clearArea / ((block.width + ribWidth) * block.length))
  if (most > MOST_BLOCKS) return issue('length', `about ${most} blocks: expected at most ${MOST_BLOCKS} in one panel`)
  const longest = longestWithoutBlock(field, bands.starts, scheme)
  if (longest === null) return []
  return issue(
    'length',
    `${whole(Math.max(0, longest))} mm is the longest length left for blocks in any row, a block is ${whole(block.length)} mm long: expected room for a block`,
  )
}

/** Longest usable length of any row, mm, when none of them takes a block; null as soon as one does. */
function longestWithoutBlock(field: PanelField, starts: readonly number[], scheme: RibbedScheme): number | null {
  const solidZoneMm = scheme.solidZone === 'least' ? 0 : scheme.solidZone
  const middle = (starts.length - 1) / 2
  let longest = 0
  for (const start of [...starts.keys()].sort((a, b) => Math.abs(a - middle) - Math.abs(b - middle)).map((i) => starts[i]!)) {
    const row = layRow(clearRow(field, field.bottom + start, scheme), scheme, { solidZoneMm, crossRibSpacingMm: null })
    if (row.filled.some(({ runs }) => runs.length > 0)) return null
    for (const { start: from, end: to } of row.usable) longest = Math.max(longest, to - from)
  }
  return longest
}

/** Millimetres as read on a tape. */
function whole(lengthMm: number): string {
  return String(Math.round(lengthMm * 10) / 10)
}
