import type { ImportedSheet } from '#shared/contracts/rateImport'

/** What the reading process is told: where the file is, what its name ended in, where the rows go. */
export interface ReadingJob {
  readonly filePath: string
  readonly extension: string
  /** Gets one row a line, as JSON. */
  readonly rowsPath: string
}

/** What it answers. */
export type ReadingOutcome =
  { readonly kind: 'read'; readonly sheets: readonly ImportedSheet[] } | { readonly kind: 'unreadable'; readonly reason: string }
