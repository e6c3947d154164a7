import type { LevelInput, StoredLevel } from '#shared/contracts/project'
import { storedLevel } from '#shared/contracts/project'
import { command, request } from './http'

export const createLevel = (projectId: string, input: LevelInput, idempotencyKey: string): Promise<StoredLevel> =>
  request(storedLevel, 'POST', `/api/projects/${projectId}/levels`, { body: input, idempotencyKey })

export const changeLevel = (
  projectId: string,
  id: string,
  version: number,
  input: LevelInput,
  keepalive = false,
): Promise<StoredLevel> =>
  request(storedLevel, 'PUT', `/api/projects/${projectId}/levels/${id}`, { body: input, version, keepalive })

export const removeLevel = (projectId: string, id: string, version: number): Promise<void> =>
  command('DELETE', `/api/projects/${projectId}/levels/${id}`, { version })
