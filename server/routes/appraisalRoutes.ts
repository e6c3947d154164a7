import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import type { AppraisalPool } from '../services/appraisal/appraisalPool'
import { readProjectReading } from '../services/project/projectReading'

/** Appraisals made on the server: of a file that is sent and not kept, and of a project for its readers. */
export function appraisalRoutes(db: EntityManager, pool: AppraisalPool): Router {
  return Router()
    .post('/appraisals/preview', async (request, response) => {
      response.json(await pool.appraiseSent(whoOf(response).firmId, request.body))
    })
    .get('/projects/:id/reading', async (request, response) => {
      response.json(await readProjectReading(db, pool, whoOf(response), idOf(request, 'id')))
    })
}
