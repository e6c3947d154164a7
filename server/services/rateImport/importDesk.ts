import type { EntityManager } from 'typeorm'
import type { ImportState } from '#shared/contracts/rateImport'
import { RateImportEntity } from '../../entities/rates/RateImportEntity'
import { AppError } from '../../errors'
import type { ImportFiles } from './importFiles'
import type { ImportPlace } from './importStep'
import type { TableReader } from './reading/tableReader'

/** What a step is told to say: how far it has come, 0 to 1. */
export type Tell = (progress: number) => void

/** Where imports are worked on, apart from the requests that ask for it. */
export interface ImportDesk {
  readonly reader: TableReader
  readonly files: ImportFiles
  /** How far the step of an import under way has come; undefined: none is under way here. */
  progressOf(id: string): number | undefined
  /** Works on a step after the request; one that fails leaves the import in the state `back`, with the reason. */
  begin(place: ImportPlace, back: ImportState, work: (tell: Tell) => Promise<void>): void
  /** Resolves when nothing is under way any more. */
  close(): Promise<void>
}

/** Longest text of a failure that is kept. */
const MOST_CHARACTERS = 500

function failureOf(cause: unknown): string {
  if (!(cause instanceof AppError)) return 'Something went wrong on our side; it was recorded. Nothing was changed.'
  const issues = (cause.issues ?? []).slice(0, 5).map(({ path, message }) => `${path}: ${message}`)
  return [cause.message, ...issues].join(' ').slice(0, MOST_CHARACTERS)
}

/** A desk on this database. @param onFault - told of failures that are ours */
export function createImportDesk(
  db: EntityManager,
  reader: TableReader,
  files: ImportFiles,
  onFault: (cause: unknown) => void,
): ImportDesk {
  const progress = new Map<string, number>()
  const underWay = new Set<Promise<void>>()
  async function run({ firmId, id }: ImportPlace, back: ImportState, work: (tell: Tell) => Promise<void>): Promise<void> {
    progress.set(id, 0)
    try {
      await work((share) => progress.set(id, share))
    } catch (cause) {
      if (!(cause instanceof AppError)) onFault(cause)
      const change = { state: back, progress: 0, failure: failureOf(cause), touchedAt: new Date() }
      await db.update(RateImportEntity, { firmId, id }, change).catch(onFault)
    } finally {
      progress.delete(id)
    }
  }
  return {
    reader,
    files,
    progressOf: (id) => progress.get(id),
    begin(place, back, work) {
      const running = run(place, back, work).finally(() => underWay.delete(running))
      underWay.add(running)
    },
    async close() {
      reader.close()
      await Promise.all(underWay)
    },
  }
}
