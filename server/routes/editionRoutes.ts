import { draftInput, editionInput, editionStep, rateBookInput } from '#shared/contracts/rateBook'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { seenVersion, tellVersion } from '../middleware/version'
import { createRateBook } from '../services/rates/bookService'
import { changeEdition, createDraft, discardDraft } from '../services/rates/draftService'
import { takeStep } from '../services/rates/editionSteps'

/** The life of rate books and their editions, from the first draft to the last withdrawal. */
export function editionRoutes(db: EntityManager): Router {
  return Router()
    .post('/rate-books', async (request, response) => {
      const input = parse(rateBookInput, request.body)
      response.status(201).json(await createRateBook(db, whoOf(response), input, creatingRequest(request, input)))
    })
    .post('/rate-books/:id/editions', async (request, response) => {
      const bookId = idOf(request, 'id')
      const input = parse(draftInput, request.body)
      const edition = await createDraft(db, whoOf(response), bookId, input, creatingRequest(request, input))
      tellVersion(response, edition.version)
      response.status(201).json(edition)
    })
    .put('/editions/:id', async (request, response) => {
      const id = idOf(request, 'id')
      const edition = await changeEdition(db, whoOf(response), id, seenVersion(request), parse(editionInput, request.body))
      tellVersion(response, edition.version)
      response.json(edition)
    })
    .delete('/editions/:id', async (request, response) => {
      await discardDraft(db, whoOf(response), idOf(request, 'id'), seenVersion(request))
      response.status(204).end()
    })
    .post('/editions/:id/steps', async (request, response) => {
      const id = idOf(request, 'id')
      const edition = await takeStep(db, whoOf(response), id, seenVersion(request), parse(editionStep, request.body))
      tellVersion(response, edition.version)
      response.json(edition)
    })
}
