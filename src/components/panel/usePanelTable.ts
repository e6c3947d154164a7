import type { Panel } from '#shared/contracts/appraisal'
import { boundsOf } from '#shared/geometry/ring'
import { addRectangle } from '#shared/layout/edit/addRectangle'
import { floorFault } from '#shared/layout/edit/floorFault'
import { nextMark } from '#shared/layout/edit/nextMark'
import type { CellProblem, PanelColumn, PanelRowText } from '#shared/layout/edit/panelRowText'
import { EMPTY_ROW } from '#shared/layout/edit/panelRowText'
import { pastedRows } from '#shared/layout/edit/pastedRows'
import { readPanelRow } from '#shared/layout/edit/readPanelRow'
import { readVoid } from '#shared/layout/edit/readVoid'
import { setVoids } from '#shared/layout/edit/setOutline'
import { computed, ref } from 'vue'
import type { RowDraft } from '../../stores/panelDrafts'
import { usePanelDrafts } from '../../stores/panelDrafts'
import type { LevelEditing } from '../level/useLevelEditing'
import { panelRowText } from './panelCells'
import { editCell } from './panelCellEdit'
import type { PanelRow } from './panelRows'

/** A row read against the panels before it: the panels with it, or what is wrong. */
type RowOutcome = { readonly panels: Panel[] } | { readonly problems: readonly CellProblem[] }

/** What the panel table does with what is typed in it. `note` is a sentence about the last change, to be said. */
export function usePanelTable(editing: LevelEditing) {
  const store = usePanelDrafts()
  const note = ref('')
  const levelId = computed(() => editing.level.value?.id ?? '')
  const drafts = computed(() => store.of(levelId.value))
  const suggestedMark = computed(() => nextMark(marksOf(editing.panels.value), 'P1'))

  function commit(row: PanelRow, column: PanelColumn, text: string): void {
    if (text === row.text[column]) return
    note.value = ''
    if (row.kind === 'panel') commitPanel(row.index, column, text)
    else commitDraft(row, column, text)
  }

  function commitPanel(index: number, column: PanelColumn, text: string): void {
    const panels = editing.panels.value
    const { mark } = panels[index]!
    if (text.trim() === panelRowText(panels[index]!)[column]) return store.putCell(levelId.value, mark, column, null)
    const edit = editCell(panels, index, column, text)
    if ('reason' in edit) {
      store.putCell(levelId.value, mark, column, { text, problem: { column, ...edit } })
      return
    }
    store.putCell(levelId.value, mark, column, null)
    if (column === 'mark') carryDrafts(mark, edit.panels[index]!.mark)
    editing.setPanels(edit.panels)
    note.value = edit.note ?? ''
  }

  function carryDrafts(from: string, to: string): void {
    const cells = new Map(drafts.value.cells)
    const kept = cells.get(from)
    if (kept === undefined) return
    cells.delete(from)
    store.put(levelId.value, { cells: cells.set(to, kept) })
  }

  function commitDraft(row: PanelRow, column: PanelColumn, text: string): void {
    const rows = drafts.value.rows
    const at = row.kind === 'empty' ? rows.length : row.index
    const draft: RowDraft = { text: { ...row.text, [column]: text }, problems: [], isLeft: rows[at]?.isLeft ?? false }
    settle([...rows.slice(0, at), draft, ...rows.slice(at + 1)])
  }

  /** Turns rows into panels where they can be read, keeps the others as typed; one step of undo for all. */
  function settle(rows: readonly RowDraft[]): void {
    let panels: Panel[] = [...editing.panels.value]
    const kept: RowDraft[] = []
    for (const draft of rows.filter(({ text }) => !isBlank(text))) {
      const outcome = addRow(panels, draft.text)
      if ('panels' in outcome) panels = outcome.panels
      else kept.push({ ...draft, problems: draft.isLeft ? outcome.problems : problemsOfTyped(draft.text, outcome.problems) })
    }
    store.put(levelId.value, { rows: kept })
    if (panels.length > editing.panels.value.length) editing.setPanels(panels)
  }

  /** The reader has gone on from a row: what is missing in it is wrong from now on. */
  function leave(row: PanelRow): void {
    if (row.kind !== 'draft' || drafts.value.rows[row.index]?.isLeft !== false) return
    settle(drafts.value.rows.map((draft, i) => (i === row.index ? { ...draft, isLeft: true } : draft)))
  }

  function paste(text: string): void {
    const { rows, heading } = pastedRows(text)
    const before = editing.panels.value.length
    settle([...drafts.value.rows, ...rows.map((row) => ({ text: row, problems: [], isLeft: true }))])
    const added = editing.panels.value.length - before
    const wrong = rows.length - added
    note.value = [
      `${added} of ${rows.length} pasted ${rows.length === 1 ? 'row' : 'rows'} added.`,
      ...(wrong > 0 ? [`${wrong} to be put right below.`] : []),
      ...(heading === null ? [] : [`Left out as a heading: ${heading}.`]),
    ].join(' ')
  }

  /** Leaves a cell as it was before it was typed wrong. */
  function restore(row: PanelRow, column: PanelColumn): void {
    if (row.kind === 'panel') store.putCell(levelId.value, row.mark, column, null)
  }

  function dropDraft(row: PanelRow): void {
    store.put(levelId.value, { rows: drafts.value.rows.filter((_, i) => i !== row.index) })
  }

  return { drafts, note, suggestedMark, commit, leave, paste, restore, dropDraft }
}

export type PanelTableActions = ReturnType<typeof usePanelTable>

function addRow(panels: readonly Panel[], text: PanelRowText): RowOutcome {
  const mark = text.mark.trim() === '' ? nextMark(marksOf(panels), 'P1') : text.mark
  const read = readPanelRow({ ...text, mark }, marksOf(panels))
  if ('problems' in read) return read
  const added = addRectangle(panels, read.row)
  const fault = floorFault(added)
  if (fault !== null) return { problems: [{ column: 'alongX', reason: fault }] }
  const index = added.length - 1
  const voids = readVoid(text.void, boundsOf(added[index]!.outline), null)
  if ('reason' in voids) return { problems: [{ column: 'void', reason: voids.reason }] }
  const outcome = setVoids(added, index, voids.voids)
  return 'refused' in outcome ? { problems: [{ column: 'void', reason: outcome.refused }] } : outcome
}

function problemsOfTyped(text: PanelRowText, problems: readonly CellProblem[]): CellProblem[] {
  return problems.filter(({ column }) => text[column].trim() !== '')
}

function isBlank(text: PanelRowText): boolean {
  return Object.keys(EMPTY_ROW).every((column) => text[column as PanelColumn].trim() === '')
}

function marksOf(panels: readonly Panel[]): string[] {
  return panels.map(({ mark }) => mark)
}
