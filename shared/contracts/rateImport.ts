import { z } from 'zod'
import { id, line, moment } from './primitives'
import { rateMove, resourceKind } from './resource'

/** What the rows of an uploaded table become in a draft. */
export const importTarget = z.enum(['resources', 'quotations', 'rates'])
export type ImportTarget = z.infer<typeof importTarget>

/** Columns that a target knows; those with a star in the form are needed. */
export const importField = z.enum([
  'code',
  'kind',
  'description',
  'unit',
  'low',
  'likely',
  'high',
  'supplier',
  'reference',
  'contains',
  'day',
  'validUntil',
  'source',
  'sourceDate',
])
export type ImportField = z.infer<typeof importField>

/** Which column is which field. Columns count from 0. */
export const importColumns = z.partialRecord(importField, z.int().min(0).max(199))
export type ImportColumns = z.infer<typeof importColumns>

const decimalMark = z.enum(['.', ','])

/** How the table is read: which sheet, which row holds the heads (counted from 0, as in the sheet), which column is which field. */
export const importMatching = z.strictObject({
  target: importTarget,
  sheet: z.int().min(0).max(99),
  headRow: z.int().min(0).max(200),
  columns: importColumns,
  /** Of prices typed as text; numbers of a workbook have none. */
  decimalMark,
  /** For rows that do not say it themselves. */
  defaults: z.strictObject({
    kind: resourceKind,
    unit: z
      .string()
      .trim()
      .max(10)
      .regex(/^[^\p{Cc}\p{Cs}]*$/u),
    supplier: z
      .string()
      .trim()
      .max(120)
      .regex(/^[^\p{Cc}\p{Cs}]*$/u),
    day: z.iso.date(),
  }),
})
export type ImportMatching = z.infer<typeof importMatching>

/** How a sheet looks as if it were to be read: proposed from its heads and its first rows. */
export const proposedMatching = importMatching.omit({ sheet: true, defaults: true })
export type ProposedMatching = z.infer<typeof proposedMatching>

export const importRowState = z.enum(['new', 'changed', 'unchanged', 'refused'])
export type ImportRowState = z.infer<typeof importRowState>

/** A sheet as it was read: its first rows, to choose the heads and match the columns by. */
export const importedSheet = z.strictObject({
  name: z.string(),
  rowCount: z.int(),
  hiddenRowCount: z.int(),
  /** Its first rows from row 1, empty ones too; each as long as its last cell with something in it. */
  sample: z.array(z.array(z.string())),
  /** Null: no row looks like heads. */
  proposed: proposedMatching.nullable(),
})
export type ImportedSheet = z.infer<typeof importedSheet>

/** Under way are `reading`, `checking` and `committing`; the rest stand until somebody goes on. */
export const importState = z.enum(['reading', 'matching', 'checking', 'previewed', 'committing', 'committed', 'undone', 'failed'])
export type ImportState = z.infer<typeof importState>

/** `leftOut`: titles, repeated heads and subtotals, which are no rows of the list. */
export const importCounts = z.strictObject({
  new: z.int(),
  changed: z.int(),
  unchanged: z.int(),
  refused: z.int(),
  leftOut: z.int(),
})
export type ImportCounts = z.infer<typeof importCounts>

/** An import of a draft, from the upload to the rows that it put in. */
export const rateImport = z.strictObject({
  id,
  editionId: id,
  fileName: line(200),
  state: importState,
  /** Of the step under way, 0 to 1. */
  progress: z.number(),
  /** Why the last step failed, in words for the estimator. */
  failure: z.string().nullable(),
  sheets: z.array(importedSheet),
  /** As chosen; null before. */
  matching: importMatching.nullable(),
  counts: importCounts.nullable(),
  /** Built-up rates that the prices move; null before the preview. */
  moves: z.array(rateMove).nullable(),
  createdAt: moment,
  createdBy: z.string(),
})
export type RateImport = z.infer<typeof rateImport>

/** A row of the preview: what stands, what would stand, and why it is refused. */
export const importRow = z.strictObject({
  /** Row of the sheet, counted from 1 as a spreadsheet does. */
  row: z.int(),
  state: importRowState,
  code: z.string(),
  before: z.record(z.string(), z.string()).nullable(),
  after: z.record(z.string(), z.string()).nullable(),
  reason: z.string().nullable(),
  /** What to know of a row that is taken: it is hidden in the sheet, its price was rounded to six decimals. */
  note: z.string().nullable(),
})
export type ImportRow = z.infer<typeof importRow>

export const ROWS_A_PAGE = 100
export const importRowQuery = z.strictObject({
  state: importRowState.optional(),
  page: z.coerce.number('expected a page number').int().min(1).max(10_000).default(1),
})
export type ImportRowQuery = z.infer<typeof importRowQuery>
export const importRowPage = z.strictObject({ rows: z.array(importRow), total: z.int() })
export type ImportRowPage = z.infer<typeof importRowPage>

/** All or nothing: with refused rows it says whether they are left out; without that the import is refused as a whole. */
export const importCommit = z.strictObject({ leaveOutRefused: z.boolean() })
export type ImportCommit = z.infer<typeof importCommit>

/** Tables of an edition that are exported one by one. */
export const exportTable = z.enum(['rates', 'resources', 'gangs', 'build-ups', 'quotations'])
export type ExportTable = z.infer<typeof exportTable>
