import type { SchemeInput, StoredScheme } from '#shared/contracts/project'
import { storedScheme } from '#shared/contracts/project'
import { command, request } from './http'

export const createScheme = (projectId: string, input: SchemeInput, idempotencyKey: string): Promise<StoredScheme> =>
  request(storedScheme, 'POST', `/api/projects/${projectId}/schemes`, { body: input, idempotencyKey })

export const changeScheme = (
  projectId: string,
  id: string,
  version: number,
  input: SchemeInput,
  keepalive = false,
): Promise<StoredScheme> =>
  request(storedScheme, 'PUT', `/api/projects/${projectId}/schemes/${id}`, { body: input, version, keepalive })

export const removeScheme = (projectId: string, id: string, version: number): Promise<void> =>
  command('DELETE', `/api/projects/${projectId}/schemes/${id}`, { version })
