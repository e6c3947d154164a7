import type { ApiIssue } from '#shared/contracts/apiError'
import type { Panel, RibbedScheme } from '#shared/contracts/appraisal'
import type { PanelResult } from '#shared/contracts/appraisalResult'
import type { CellProblem, PanelColumn, PanelRowText } from '#shared/layout/edit/panelRowText'
import { EMPTY_ROW } from '#shared/layout/edit/panelRowText'
import { rectangleFit } from '#shared/layout/edit/rectangleFit'
import type { LevelDrafts, RowDraft } from '../../stores/panelDrafts'
import { panelRowText, workedOutColumns } from './panelCells'

/** A row of the panel table: a panel, a row that is not one yet, or the empty one to begin a new panel in. */
export interface PanelRow {
  readonly kind: 'panel' | 'draft' | 'empty'
  /** Place among the panels, or among the drafts. */
  readonly index: number
  /** Mark of the panel; of a row that is not one yet, what is typed. */
  readonly mark: string
  readonly text: PanelRowText
  /** Columns not typed here. */
  readonly workedOut: readonly PanelColumn[]
  readonly problems: readonly CellProblem[]
  /** Sentence that ends the reasons: whether the row counts meanwhile. */
  readonly verdict: string
  /** What the appraisal made of it; null where it was not counted. */
  readonly result: PanelResult | null
}

/** What the rows are made from. */
export interface PanelRowsInput {
  readonly panels: readonly Panel[]
  readonly drafts: LevelDrafts
  readonly results: readonly PanelResult[]
  /** Problems of this level, by path within it: `panels.2.outline`. */
  readonly issues: readonly ApiIssue[]
  /** Ribbed schemes of the project: a panel that one of them cannot cover is left out of all. */
  readonly ribbed: readonly RibbedScheme[]
}

const NOT_COUNTED = 'Not counted until it is put right.'

/** Rows of the table: the level's panels, then rows that are not yet panels, then an empty one. */
export function panelRows(input: PanelRowsInput): PanelRow[] {
  const rows = input.panels.map((panel, index) => panelRow(panel, index, input))
  return [...rows, ...input.drafts.rows.map(draftRow), emptyRow()]
}

function panelRow(panel: Panel, index: number, { drafts, results, issues, ribbed }: PanelRowsInput): PanelRow {
  const cells = drafts.cells.get(panel.mark) ?? {}
  const typed = Object.entries(cells).map(([column, { text }]) => [column, text])
  const result = results.find(({ mark }) => mark === panel.mark) ?? null
  const own = issues.filter(({ path }) => path === `panels.${index}` || path.startsWith(`panels.${index}.`))
  const refused = own.length === 0 ? [] : refusals(panel, own, ribbed)
  return {
    kind: 'panel',
    index,
    mark: panel.mark,
    text: { ...panelRowText(panel), ...Object.fromEntries(typed) },
    workedOut: workedOutColumns(panel),
    problems: [...Object.values(cells).map(({ problem }) => problem), ...refused],
    verdict: own.length > 0 ? NOT_COUNTED : `${panel.mark} is counted as it was before.`,
    result: own.length > 0 ? null : result,
  }
}

/** Reasons why the engine leaves a panel out: told by its typed lengths where they can be, else in the engine's words. */
function refusals(panel: Panel, issues: readonly ApiIssue[], ribbed: readonly RibbedScheme[]): CellProblem[] {
  const fit = ribbed.map((scheme) => rectangleFit(panel, scheme)).find((problem) => problem !== null)
  if (fit !== undefined) return [fit]
  return issues.map(({ path, message }) => ({ column: columnOf(path), reason: message }))
}

function columnOf(path: string): PanelColumn {
  if (path.includes('.voids')) return 'void'
  if (path.includes('.ribDirection')) return 'ribs'
  if (path.includes('.repeat')) return 'times'
  return path.endsWith('.mark') ? 'mark' : 'alongX'
}

function draftRow({ text, problems }: RowDraft, index: number): PanelRow {
  return { kind: 'draft', index, mark: text.mark, text, workedOut: [], problems, verdict: NOT_COUNTED, result: null }
}

function emptyRow(): PanelRow {
  return { kind: 'empty', index: 0, mark: '', text: EMPTY_ROW, workedOut: [], problems: [], verdict: '', result: null }
}
