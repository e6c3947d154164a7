import { importCommit, importMatching, importRowQuery } from '#shared/contracts/rateImport'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { uploadedFile } from '../middleware/uploadedFile'
import { commitImport } from '../services/rateImport/commitImport'
import type { ImportDesk } from '../services/rateImport/importDesk'
import { makeImportFolder } from '../services/rateImport/importFiles'
import { listImportRows, listImports, readImport } from '../services/rateImport/importList'
import { matchImport } from '../services/rateImport/matchImport'
import { requireUpload, startImport } from '../services/rateImport/startImport'
import { undoImport } from '../services/rateImport/undoImport'

/** Price lists on their way into a draft: upload, matching, preview, putting in, undoing. */
export function importRoutes(db: EntityManager, desk: ImportDesk): Router {
  const router = Router()
  addUpload(router, db, desk)
  return router
    .get('/imports/:id', async (request, response) => {
      response.json(await readImport(db, desk, whoOf(response), idOf(request, 'id')))
    })
    .get('/imports/:id/rows', async (request, response) => {
      const query = parse(importRowQuery, { ...request.query })
      response.json(await listImportRows(db, whoOf(response), idOf(request, 'id'), query))
    })
    .put('/imports/:id/matching', async (request, response) => {
      const matching = parse(importMatching, request.body)
      response.status(202).json(await matchImport(db, desk, whoOf(response), idOf(request, 'id'), matching))
    })
    .post('/imports/:id/commit', async (request, response) => {
      const input = parse(importCommit, request.body)
      response.status(202).json(await commitImport(db, desk, whoOf(response), idOf(request, 'id'), input))
    })
    .post('/imports/:id/undo', async (request, response) => {
      response.json(await undoImport(db, desk, whoOf(response), idOf(request, 'id')))
    })
}

function addUpload(router: Router, db: EntityManager, desk: ImportDesk): void {
  router
    .get('/editions/:id/imports', async (request, response) => {
      response.json(await listImports(db, desk, whoOf(response), idOf(request, 'id')))
    })
    .post('/editions/:id/imports', async (request, response) => {
      const [who, editionId] = [whoOf(response), idOf(request, 'id')]
      await requireUpload(db, who, editionId)
      await makeImportFolder(desk.files)
      const file = await uploadedFile(request, response, desk.files.folder)
      const requestOf = (asked: unknown) => creatingRequest(request, asked)
      response.status(202).json(await startImport(db, desk, who, editionId, file, requestOf))
    })
}
