import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { z } from 'zod'
import { startDatabase } from './localDatabase.js'

const connection = z.object({
  DATABASE_SOCKET: z.string(),
  DATABASE_NAME: z.string(),
  DATABASE_USER: z.string(),
  DATABASE_PASSWORD: z.string(),
  ORIGIN: z.string().optional(),
})

/** Variables that name the local database, and what ends it where it was started for the caller alone. */
export interface LocalConnection {
  readonly variables: Readonly<Record<string, string | undefined>>
  stop(): Promise<void>
}

/** The local database of this data folder: the running product's, or one started for the caller when the product is not running. */
export async function openLocalConnection(dataFolder: string): Promise<LocalConnection> {
  const path = join(dataFolder, 'connection.json')
  if (existsSync(path)) {
    const variables = connection.parse(JSON.parse(readFileSync(path, 'utf8')))
    if (existsSync(variables.DATABASE_SOCKET)) return { variables, stop: () => Promise.resolve() }
  }
  const database = await startDatabase({ dataFolder: join(dataFolder, 'database') })
  const variables = {
    DATABASE_SOCKET: database.socketPath,
    DATABASE_NAME: database.database,
    DATABASE_USER: database.user,
    DATABASE_PASSWORD: database.password,
  }
  return { variables, stop: () => database.stop() }
}
