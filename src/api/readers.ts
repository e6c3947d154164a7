import type { ProjectReaders, ProjectReadersInput } from '#shared/contracts/projectReaders'
import { projectReaders } from '#shared/contracts/projectReaders'
import { request } from './http'

export const readReaders = (projectId: string): Promise<ProjectReaders> =>
  request(projectReaders, 'GET', `/api/projects/${projectId}/readers`)

export const changeReaders = (projectId: string, version: number, input: ProjectReadersInput): Promise<ProjectReaders> =>
  request(projectReaders, 'PUT', `/api/projects/${projectId}/readers`, { body: input, version })
