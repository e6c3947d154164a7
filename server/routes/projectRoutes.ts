import { levelInput, projectInput, schemeInput } from '#shared/contracts/project'
import { projectReadersInput } from '#shared/contracts/projectReaders'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { seenVersion, tellVersion } from '../middleware/version'
import type { AppraisalPool } from '../services/appraisal/appraisalPool'
import { changeLevel, createLevel, removeLevel } from '../services/project/levelService'
import { listProjects } from '../services/project/projectList'
import { changeReaders, readReaders } from '../services/project/readerService'
import { changeProject, createProject, readProjectSheet } from '../services/project/projectService'
import { changeScheme, createScheme, removeScheme } from '../services/project/schemeService'

/** Projects with their levels and schemes, and who may read them. */
export function projectRoutes(db: EntityManager, pool: AppraisalPool): Router {
  const router = Router()
  addProjects(router, db, pool)
  addLevels(router, db)
  addSchemes(router, db)
  return router
}

function addProjects(router: Router, db: EntityManager, pool: AppraisalPool): void {
  router
    .get('/projects', async (_request, response) => {
      response.json(await listProjects(db, pool, whoOf(response)))
    })
    .post('/projects', async (request, response) => {
      const input = parse(projectInput, request.body)
      const project = await createProject(db, whoOf(response), input, creatingRequest(request, input))
      tellVersion(response, project.version)
      response.status(201).json(project)
    })
    .get('/projects/:id', async (request, response) => {
      const sheet = await readProjectSheet(db, whoOf(response), idOf(request, 'id'))
      tellVersion(response, sheet.project.version)
      response.json(sheet)
    })
    .put('/projects/:id', async (request, response) => {
      const id = idOf(request, 'id')
      const project = await changeProject(db, whoOf(response), id, seenVersion(request), parse(projectInput, request.body))
      tellVersion(response, project.version)
      response.json(project)
    })
    .get('/projects/:id/readers', async (request, response) => {
      const readers = await readReaders(db, whoOf(response), idOf(request, 'id'))
      tellVersion(response, readers.version)
      response.json(readers)
    })
    .put('/projects/:id/readers', async (request, response) => {
      const id = idOf(request, 'id')
      const input = parse(projectReadersInput, request.body)
      const readers = await changeReaders(db, whoOf(response), id, seenVersion(request), input)
      tellVersion(response, readers.version)
      response.json(readers)
    })
}

function addLevels(router: Router, db: EntityManager): void {
  router
    .post('/projects/:projectId/levels', async (request, response) => {
      const projectId = idOf(request, 'projectId')
      const input = parse(levelInput, request.body)
      const level = await createLevel(db, whoOf(response), projectId, input, creatingRequest(request, input))
      tellVersion(response, level.version)
      response.status(201).json(level)
    })
    .put('/projects/:projectId/levels/:id', async (request, response) => {
      const place = { projectId: idOf(request, 'projectId'), id: idOf(request, 'id') }
      const level = await changeLevel(db, whoOf(response), place, seenVersion(request), parse(levelInput, request.body))
      tellVersion(response, level.version)
      response.json(level)
    })
    .delete('/projects/:projectId/levels/:id', async (request, response) => {
      const place = { projectId: idOf(request, 'projectId'), id: idOf(request, 'id') }
      await removeLevel(db, whoOf(response), place, seenVersion(request))
      response.status(204).end()
    })
}

function addSchemes(router: Router, db: EntityManager): void {
  router
    .post('/projects/:projectId/schemes', async (request, response) => {
      const projectId = idOf(request, 'projectId')
      const input = parse(schemeInput, request.body)
      const scheme = await createScheme(db, whoOf(response), projectId, input, creatingRequest(request, input))
      tellVersion(response, scheme.version)
      response.status(201).json(scheme)
    })
    .put('/projects/:projectId/schemes/:id', async (request, response) => {
      const place = { projectId: idOf(request, 'projectId'), id: idOf(request, 'id') }
      const scheme = await changeScheme(db, whoOf(response), place, seenVersion(request), parse(schemeInput, request.body))
      tellVersion(response, scheme.version)
      response.json(scheme)
    })
    .delete('/projects/:projectId/schemes/:id', async (request, response) => {
      const place = { projectId: idOf(request, 'projectId'), id: idOf(request, 'id') }
      await removeScheme(db, whoOf(response), place, seenVersion(request))
      response.status(204).end()
    })
}
