import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { tellVersion } from '../middleware/version'
import { listRateBooks, readEdition } from '../services/rates/editionService'

/** Rate books with their editions. */
export function rateRoutes(db: EntityManager): Router {
  return Router()
    .get('/rate-books', async (_request, response) => {
      response.json(await listRateBooks(db, whoOf(response)))
    })
    .get('/editions/:id', async (request, response) => {
      const edition = await readEdition(db, whoOf(response), idOf(request, 'id'))
      tellVersion(response, edition.version)
      response.json(edition)
    })
}
