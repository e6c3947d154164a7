import { mkdir, readdir, rm, stat } from 'node:fs/promises'
import { join } from 'node:path'

/** Older files belong to nobody any more. */
const KEPT_MS = 7 * 24 * 3600 * 1000

/** Where uploads and the rows read from them lie, by names of ours. */
export interface ImportFiles {
  readonly folder: string
  /** Rows of an import. */
  rowsPath(importId: string): string
}

/** Files of imports below the data folder. */
export const importFiles = (dataFolder: string): ImportFiles => {
  const folder = join(dataFolder, 'imports')
  return { folder, rowsPath: (importId) => join(folder, `${importId}.rows`) }
}

/** Makes the folder, open to nobody else. */
export async function makeImportFolder({ folder }: ImportFiles): Promise<void> {
  await mkdir(folder, { recursive: true, mode: 0o700 })
}

/** Removes what lies in the folder longer than a week. */
export async function tidyImportFiles({ folder }: ImportFiles, now: Date): Promise<void> {
  await mkdir(folder, { recursive: true, mode: 0o700 })
  for (const name of await readdir(folder)) {
    const path = join(folder, name)
    const found = await stat(path).catch((cause: NodeJS.ErrnoException) => {
      if (cause.code === 'ENOENT') return null
      throw cause
    })
    if (found !== null && now.getTime() - found.mtimeMs > KEPT_MS) await rm(path, { force: true })
  }
}
