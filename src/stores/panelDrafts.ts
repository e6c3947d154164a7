import type { CellProblem, PanelColumn, PanelRowText } from '#shared/layout/edit/panelRowText'
import { defineStore } from 'pinia'
import { shallowRef } from 'vue'

/** A cell that stays as typed because it cannot be taken, with the reason. */
export interface CellDraft {
  readonly text: string
  readonly problem: CellProblem
}

/** A row that is not a panel yet. `isLeft`: somebody has gone on from it, so that what is missing may be said. */
export interface RowDraft {
  readonly text: PanelRowText
  readonly problems: readonly CellProblem[]
  readonly isLeft: boolean
}

/** What is typed in the panel table of one level and cannot be counted: cells by panel mark, and rows not yet panels. */
export interface LevelDrafts {
  readonly cells: ReadonlyMap<string, Readonly<Partial<Record<PanelColumn, CellDraft>>>>
  readonly rows: readonly RowDraft[]
}

const NONE: LevelDrafts = { cells: new Map(), rows: [] }

/** Keeps, by level, what was typed wrong, so that it is still there when the reader comes back from another sheet. */
export const usePanelDrafts = defineStore('panelDrafts', () => {
  const byLevel = shallowRef<ReadonlyMap<string, LevelDrafts>>(new Map())

  const of = (levelId: string): LevelDrafts => byLevel.value.get(levelId) ?? NONE

  function put(levelId: string, drafts: Partial<LevelDrafts>): void {
    byLevel.value = new Map(byLevel.value).set(levelId, { ...of(levelId), ...drafts })
  }

  /** Keeps a cell's text under a panel's mark; null: the cell is right again. */
  function putCell(levelId: string, mark: string, column: PanelColumn, draft: CellDraft | null): void {
    const cells = new Map(of(levelId).cells)
    const kept = { ...cells.get(mark) }
    if (draft === null) delete kept[column]
    else kept[column] = draft
    if (Object.keys(kept).length === 0) cells.delete(mark)
    else cells.set(mark, kept)
    put(levelId, { cells })
  }

  return { of, put, putCell }
})
