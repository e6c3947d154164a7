import type { Panel } from '#shared/contracts/appraisal'
import { boundsOf } from '#shared/geometry/ring'
import { changedWith, changeSpan } from '#shared/layout/edit/changeSpan'
import type { EditOutcome } from '#shared/layout/edit/editOutcome'
import type { PanelColumn } from '#shared/layout/edit/panelRowText'
import { markProblem, readTimes } from '#shared/layout/edit/readPanelRow'
import { likelyLength, readLength } from '#shared/layout/edit/readLength'
import { readRibDirection } from '#shared/layout/edit/readRibDirection'
import { readVoid } from '#shared/layout/edit/readVoid'
import { setVoids } from '#shared/layout/edit/setOutline'
import { formatQuantity } from '../base/formatQuantity'

/** What typing a cell of a panel comes to: its level's panels with a note worth saying, or why it cannot be taken. */
export type CellEdit =
  { readonly panels: Panel[]; readonly note: string | null } | { readonly reason: string; readonly repair?: string }

/** Carries the text of one cell over into the panel at `index`. */
export function editCell(panels: readonly Panel[], index: number, column: PanelColumn, text: string): CellEdit {
  const panel = panels[index]!
  const others = panels.filter((_, i) => i !== index).map(({ mark }) => mark)
  const withPanel = (change: Partial<Panel>): CellEdit => ({
    panels: panels.map((each, i) => (i === index ? { ...each, ...change } : each)),
    note: null,
  })
  switch (column) {
    case 'mark': {
      const reason = markProblem(text.trim(), others)
      return reason === null ? withPanel({ mark: text.trim() }) : { reason }
    }
    case 'alongX':
      return editSpan(panels, index, 'x', text)
    case 'alongY':
      return editSpan(panels, index, 'y', text)
    case 'ribs': {
      const read = readRibDirection(text)
      return 'value' in read ? withPanel({ ribDirection: read.value }) : read
    }
    case 'void': {
      const read = readVoid(text, boundsOf(panel.outline), panel.voids[0] ?? null)
      return 'reason' in read ? read : asEdit(setVoids(panels, index, read.voids))
    }
    case 'times': {
      const read = readTimes(text)
      return 'value' in read ? withPanel({ repeat: read.value }) : read
    }
  }
}

function editSpan(panels: readonly Panel[], index: number, axis: 'x' | 'y', text: string): CellEdit {
  const read = readLength(text, `along ${axis}`)
  if ('reason' in read) return read
  const outcome = changeSpan(panels, index, axis, read.value)
  if ('refused' in outcome) {
    const likely = likelyLength(read.value)
    return { reason: outcome.refused, ...(likely === null ? {} : { repair: `Was it ${formatQuantity(likely)}?` }) }
  }
  const others = changedWith(panels, outcome.panels, index, axis)
  const moved = `The support line has moved: ${others.join(', ')} ${others.length === 1 ? 'is' : 'are'} changed along ${axis} too.`
  return { panels: outcome.panels, note: others.length === 0 ? null : moved }
}

function asEdit(outcome: EditOutcome): CellEdit {
  return 'refused' in outcome ? { reason: outcome.refused } : { panels: outcome.panels, note: null }
}
