import { z } from 'zod'
import type { Project, ProjectInput, ProjectSheet, ProjectSummary } from '#shared/contracts/project'
import { project, projectSheet, projectSummary } from '#shared/contracts/project'
import type { ProjectReading } from '#shared/contracts/projectReading'
import { projectReading } from '#shared/contracts/projectReading'
import { request } from './http'

export const listProjects = (): Promise<ProjectSummary[]> => request(z.array(projectSummary), 'GET', '/api/projects')

export const createProject = (input: ProjectInput, idempotencyKey: string): Promise<Project> =>
  request(project, 'POST', '/api/projects', { body: input, idempotencyKey })

export const readProjectSheet = (id: string): Promise<ProjectSheet> => request(projectSheet, 'GET', `/api/projects/${id}`)

/** For a developer or an engineer the project is shared with. */
export const readProjectReading = (id: string): Promise<ProjectReading> =>
  request(projectReading, 'GET', `/api/projects/${id}/reading`)

export const changeProject = (id: string, version: number, input: ProjectInput, keepalive = false): Promise<Project> =>
  request(project, 'PUT', `/api/projects/${id}`, { body: input, version, keepalive })
