import type { RateImport } from '#shared/contracts/rateImport'
import { createReadStream } from 'node:fs'
import { createHash } from 'node:crypto'
import { rename, rm } from 'node:fs/promises'
import { join } from 'node:path'
import { pipeline } from 'node:stream/promises'
import { In, type EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { EditionEntity } from '../../entities/rates/EditionEntity'
import { RateImportEntity } from '../../entities/rates/RateImportEntity'
import { AppError, refuse } from '../../errors'
import { createOnce, type CreatingRequest } from '../createOnce'
import { requireRole, type SignedIn } from '../session/signedIn'
import { touchDraft } from '../rates/touchDraft'
import { importAnswers } from './importAnswer'
import type { ImportDesk } from './importDesk'
import { takeStep } from './importStep'

/** Files of a firm that may wait to be read. */
const MOST_READING = 4
const EXTENSIONS = ['xlsx', 'csv', 'tsv', 'txt']

/** A file as it came in, under a name of ours. */
export interface UploadedFile {
  readonly path: string
  /** As its sender named it. */
  readonly fileName: string
}

/** Extension of a name. @throws AppError `invalid_request` for one that is not read */
export function extensionOf(fileName: string): string {
  const extension = /\.([a-z]+)$/i.exec(fileName)?.[1]?.toLowerCase() ?? ''
  if (EXTENSIONS.includes(extension)) return extension
  throw refuse('file', `expected a name that ends in ${EXTENSIONS.map((one) => `.${one}`).join(', ')}`)
}

/** Name as it is shown: one line, no path, at most 200 characters. */
const shownName = (fileName: string): string =>
  fileName.replace(/^.*[\\/]/, '').replace(/[\p{Cc}\p{Cs}\s]+/gu, ' ').trim().slice(-200) || 'list' // prettier-ignore

/** @throws AppError `forbidden`, `not_found`, `conflict` when the edition is no draft, `limited` when too many files wait */
export async function requireUpload(db: EntityManager, who: SignedIn, editionId: string): Promise<void> {
  requireRole(who, 'estimator')
  const { firmId } = who
  const edition = await db.findOneBy(EditionEntity, { firmId, id: editionId })
  if (edition === null) throw new AppError('not_found')
  if (edition.state !== 'draft')
    throw new AppError('conflict', `This edition is ${edition.state}. Lists are imported into a draft.`)
  if ((await db.countBy(RateImportEntity, { firmId, state: In(['reading']) })) >= MOST_READING) {
    throw new AppError('limited', 'Several lists are being read already. Wait for one of them.', undefined, 10)
  }
}

async function read(db: EntityManager, desk: ImportDesk, row: RateImportEntity, filePath: string): Promise<void> {
  try {
    const job = { filePath, extension: extensionOf(row.fileName), rowsPath: desk.files.rowsPath(row.id) }
    const outcome = await desk.reader.read(job)
    if (outcome.kind === 'read') {
      await takeStep(db, row, ['reading'], { state: 'matching', progress: 1, sheets: [...outcome.sheets] })
    } else {
      await rm(job.rowsPath, { force: true })
      await takeStep(db, row, ['reading'], { state: 'failed', progress: 0, failure: outcome.reason.slice(0, 500) })
    }
  } finally {
    await rm(filePath, { force: true })
  }
}

async function digestOf(path: string): Promise<string> {
  const hash = createHash('sha256')
  await pipeline(createReadStream(path), hash)
  return hash.digest('hex')
}

/**
 * Takes an uploaded list for a draft and begins to read it. The file is removed when it is read, and when it is refused.
 * @param requestOf - the creating request of what identifies the upload
 * @throws AppError `not_found`, `conflict`, `invalid_request`
 */
export async function startImport(
  db: EntityManager,
  desk: ImportDesk,
  who: SignedIn,
  editionId: string,
  { path, fileName }: UploadedFile,
  requestOf: (asked: unknown) => CreatingRequest,
): Promise<RateImport> {
  const [firmId, now] = [who.firmId, new Date()]
  const of = { firmId, editionId, personId: who.personId, createdAt: now, touchedAt: now }
  const nothing = { progress: 0, failure: null, sheets: [], matching: null, counts: null, moves: null }
  const made: RateImportEntity = { ...of, ...nothing, id: v7(), fileName: shownName(fileName), state: 'reading' }
  try {
    extensionOf(made.fileName)
    const request = requestOf({ fileName: made.fileName, digest: await digestOf(path) })
    const answer = await createOnce(db, who, request, async (tx) => {
      await touchDraft(tx, who, editionId)
      await tx.insert(RateImportEntity, made)
      return (await importAnswers(tx, desk, [made]))[0]!
    })
    if (answer.id === made.id) {
      const kept = join(desk.files.folder, `${made.id}.file`)
      await rename(path, kept)
      desk.begin(made, 'failed', () => read(db, desk, made, kept))
    }
    return answer
  } finally {
    await rm(path, { force: true })
  }
}
