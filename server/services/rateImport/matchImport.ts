import type { ImportField, ImportMatching, ImportTarget, RateImport } from '#shared/contracts/rateImport'
import type { EntityManager } from 'typeorm'
import type { RateImportEntity } from '../../entities/rates/RateImportEntity'
import { AppError, refuse } from '../../errors'
import type { SignedIn } from '../session/signedIn'
import { checkImport } from './checkImport'
import { importAnswers } from './importAnswer'
import type { ImportDesk } from './importDesk'
import { findImport, takeStep } from './importStep'
import { requireDraft } from './requireDraft'

const NEEDED: readonly ImportField[] = ['code', 'likely']
const MEANT: Readonly<Record<ImportTarget, readonly ImportField[]>> = {
  resources: ['code', 'kind', 'description', 'unit', 'low', 'likely', 'high', 'source', 'sourceDate'],
  quotations: ['code', 'kind', 'description', 'unit', 'likely', 'supplier', 'reference', 'contains', 'day', 'validUntil'],
  rates: ['code', 'description', 'unit', 'low', 'likely', 'high', 'source', 'sourceDate'],
}

/** @throws AppError `invalid_request` where the matching cannot be meant */
function requireMatching({ sheets }: RateImportEntity, { target, sheet, headRow, columns, defaults }: ImportMatching): void {
  const chosen = sheets[sheet]
  if (chosen === undefined) throw refuse('sheet', `expected a sheet from 0 to ${sheets.length - 1}`)
  if (headRow >= chosen.sample.length) throw refuse('headRow', `expected one of the first ${chosen.sample.length} rows`)
  const fields = Object.keys(columns) as ImportField[]
  const missing = NEEDED.filter((field) => columns[field] === undefined)
  const foreign = fields.filter((field) => !MEANT[target].includes(field))
  const issues = [
    ...missing.map((field) => ({ path: `columns.${field}`, message: 'expected the column that holds it' })),
    ...foreign.map((field) => ({ path: `columns.${field}`, message: `expected none: ${target} have no ${field}` })),
    ...fields
      .filter((field, index) => fields.findIndex((other) => columns[other] === columns[field]) !== index)
      .map((field) => ({ path: `columns.${field}`, message: 'expected a column that no other field has' })),
  ]
  if (target === 'quotations' && columns.supplier === undefined && defaults.supplier === '') {
    issues.push({ path: 'defaults.supplier', message: 'expected the supplier, since no column names it' })
  }
  if (issues.length > 0) throw new AppError('invalid_request', undefined, issues)
}

/**
 * Matches the columns of an import and begins to check its rows. It may be matched again until it is put in.
 * @throws AppError `not_found`, `conflict`, `invalid_request`
 */
export async function matchImport(
  db: EntityManager,
  desk: ImportDesk,
  who: SignedIn,
  id: string,
  matching: ImportMatching,
): Promise<RateImport> {
  const row = await findImport(db, who, id)
  await requireDraft(db, row)
  requireMatching(row, matching)
  const blank = { progress: 0, failure: null, counts: null, moves: null }
  await takeStep(db, row, ['matching', 'previewed'], { state: 'checking', matching, ...blank })
  desk.begin(row, 'matching', (tell) => checkImport(db, row, matching, desk.files.rowsPath(id), tell))
  return (await importAnswers(db, desk, [await findImport(db, who, id)]))[0]!
}
