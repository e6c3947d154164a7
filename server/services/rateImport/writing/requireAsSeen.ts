import type { ImportTarget } from '#shared/contracts/rateImport'
import { AppError } from '../../../errors'
import type { DraftWrites, WrittenRow } from './draftWrite'

const NAMED = 10

/** Names of rows for a message, the first ten of them. */
export const named = (names: readonly string[]): string =>
  names.length > NAMED ? `${names.slice(0, NAMED).join(', ')} and ${names.length - NAMED} more` : names.join(', ')

/**
 * Requires that what the rows change stands as the preview saw it.
 * @param writes - in the order of the rows
 * @throws AppError `conflict` that names what was changed meanwhile
 */
export function requireAsSeen(target: ImportTarget, rows: readonly WrittenRow[], writes: DraftWrites): void {
  const own = target === 'quotations' ? writes.quotations : target === 'rates' ? writes.rates : writes.resources
  const versions = new Map<string, number | null>(own.map(({ target: key, before }) => [key, before?.version ?? null]))
  const isQuoted = target === 'quotations'
  const changed = rows.filter(({ code, quotationId, seenVersion }) => {
    if (isQuoted && quotationId === null) return false
    return (versions.get(isQuoted ? (quotationId ?? '') : code) ?? null) !== seenVersion
  })
  if (changed.length === 0) return
  const codes = [...new Set(changed.map(({ code }) => code))]
  throw new AppError('conflict', `Changed since the preview: ${named(codes)}. Check the rows again; nothing was put in.`)
}
