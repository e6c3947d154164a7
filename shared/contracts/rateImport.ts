import { z } from 'zod'
import { id, line, moment } from './primitives'

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

/** How the table is read: which sheet, which row holds the heads, which column is which field. Columns count from 0. */
export const importMatching = z.strictObject({
  target: importTarget,
  sheet: z.int().min(0).max(99),
  headRow: z.int().min(0).max(200),
  columns: z.partialRecord(importField, z.int().min(0).max(199)),
  decimalMark: z.enum(['.', ',']),
  /** For rows that do not say it themselves. */
  defaults: z.strictObject({
    kind: z.enum(['material', 'labour', 'plant']),
    unit: z.string().max(10),
    supplier: z.string().max(120),
    day: z.iso.date(),
  }),
})
export type ImportMatching = z.infer<typeof importMatching>

export const importRowState = z.enum(['new', 'changed', 'unchanged', 'refused'])
export type ImportRowState = z.infer<typeof importRowState>

/** A sheet as it was read: its first rows, to choose the heads and match the columns by. */
export const importedSheet = z.strictObject({ name: z.string(), rowCount: z.int(), sample: z.array(z.array(z.string())) })

/** An import of a draft, from the upload to the rows that it put in. */
export const rateImport = z.strictObject({
  id,
  editionId: id,
  fileName: line(200),
  state: z.enum(['reading', 'matching', 'previewed', 'committing', 'committed', 'undone', 'failed']),
  /** Of the step under way, 0 to 1. */
  progress: z.number(),
  /** Why it failed, in words for the estimator. */
  failure: z.string().nullable(),
  sheets: z.array(importedSheet),
  /** As chosen, or as proposed from the heads. */
  matching: importMatching.nullable(),
  counts: z.strictObject({ new: z.int(), changed: z.int(), unchanged: z.int(), refused: z.int() }).nullable(),
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
})
export type ImportRow = z.infer<typeof importRow>

export const importRowPage = z.strictObject({ rows: z.array(importRow), total: z.int() })

/** All or nothing: with refused rows it says whether they are left out; without that the import is refused as a whole. */
export const importCommit = z.strictObject({ leaveOutRefused: z.boolean() })
