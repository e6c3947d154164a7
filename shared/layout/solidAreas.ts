import type { Panel } from '../contracts/appraisal'
import { signedArea } from '../geometry/ring'
import { clearOutline } from './clearOutline'
import { panelField } from './panelField'
import type { PanelAreas } from './panelLayout'
import { stripAreas } from './stripAreas'

/**
 * Plan areas of a solid panel, mm²: the clear area less voids is one solid zone; blocks, ribs, edge strips, cross ribs, trimmers and
 * fillers are 0.
 *
 * @param sharedEdges - one for each edge of the outline: true where another panel stands on the same support (outer half of walls)
 * @throws OutOfScopeError when the supports leave no clear outline
 */
export function solidAreas(panel: Panel, sharedEdges: readonly boolean[]): PanelAreas {
  const outline = clearOutline(panel)
  const { clearArea: clear, voidsArea: voids } = panelField(panel, outline, 0)
  const none = { blocks: 0, ribs: 0, edgeStrips: 0, crossRibs: 0, trimmers: 0, fillers: 0 }
  return {
    gross: signedArea(panel.outline),
    ...stripAreas(panel, outline, sharedEdges),
    clear,
    ...none,
    solidZones: clear - voids,
    voids,
  }
}
