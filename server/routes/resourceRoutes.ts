import { resourceCode } from '#shared/contracts/buildUp'
import { gangInput, resourceInput } from '#shared/contracts/resource'
import { quotationChoice, resourceQuery } from '#shared/contracts/resourceSheet'
import { Router, type Request } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { seenVersion, tellVersion } from '../middleware/version'
import { changeGang, createGang, previewGang, removeGang } from '../services/rates/gangService'
import { chooseQuotation, previewChoice } from '../services/rates/quotationChoice'
import { listGangs, listResources, readResource } from '../services/rates/resourceList'
import {
  changeResource,
  createResource,
  previewResource,
  removeResource,
  type PricePlace,
} from '../services/rates/resourceService'

/** Resources and gangs of an edition, and the quotation that a resource takes its price from. */
export function resourceRoutes(db: EntityManager): Router {
  const router = Router()
  addResources(router, db)
  addChoice(router, db)
  addGangs(router, db)
  return router
}

const placeOf = (request: Request): PricePlace => ({
  editionId: idOf(request, 'id'),
  code: parse(resourceCode, request.params['code'], 'code'),
})

function addResources(router: Router, db: EntityManager): void {
  router
    .get('/editions/:id/resources', async (request, response) => {
      const query = parse(resourceQuery, { ...request.query })
      response.json(await listResources(db, whoOf(response), idOf(request, 'id'), query))
    })
    .post('/editions/:id/resources', async (request, response) => {
      const input = parse(resourceInput, request.body)
      const of = idOf(request, 'id')
      const resource = await createResource(db, whoOf(response), of, input, creatingRequest(request, input))
      tellVersion(response, resource.version)
      response.status(201).json(resource)
    })
    .get('/editions/:id/resources/:code', async (request, response) => {
      const { editionId, code } = placeOf(request)
      const sheet = await readResource(db, whoOf(response), editionId, code)
      tellVersion(response, sheet.resource.version)
      response.json(sheet)
    })
    .put('/editions/:id/resources/:code', async (request, response) => {
      const place = placeOf(request)
      const resource = await changeResource(db, whoOf(response), place, seenVersion(request), parse(resourceInput, request.body))
      tellVersion(response, resource.version)
      response.json(resource)
    })
    .delete('/editions/:id/resources/:code', async (request, response) => {
      await removeResource(db, whoOf(response), placeOf(request), seenVersion(request))
      response.status(204).end()
    })
    .post('/editions/:id/resources/:code/preview', async (request, response) => {
      const place = placeOf(request)
      response.json(await previewResource(db, whoOf(response), place, parse(resourceInput, request.body)))
    })
}

function addChoice(router: Router, db: EntityManager): void {
  router
    .put('/editions/:id/resources/:code/choice', async (request, response) => {
      const place = placeOf(request)
      const choice = parse(quotationChoice, request.body)
      const sheet = await chooseQuotation(db, whoOf(response), place, seenVersion(request), choice)
      tellVersion(response, sheet.resource.version)
      response.json(sheet)
    })
    .post('/editions/:id/resources/:code/choice/preview', async (request, response) => {
      const place = placeOf(request)
      response.json(await previewChoice(db, whoOf(response), place, parse(quotationChoice, request.body)))
    })
}

function addGangs(router: Router, db: EntityManager): void {
  router
    .get('/editions/:id/gangs', async (request, response) => {
      response.json(await listGangs(db, whoOf(response), idOf(request, 'id')))
    })
    .post('/editions/:id/gangs', async (request, response) => {
      const input = parse(gangInput, request.body)
      const gang = await createGang(db, whoOf(response), idOf(request, 'id'), input, creatingRequest(request, input))
      tellVersion(response, gang.version)
      response.status(201).json(gang)
    })
    .put('/editions/:id/gangs/:code', async (request, response) => {
      const place = placeOf(request)
      const gang = await changeGang(db, whoOf(response), place, seenVersion(request), parse(gangInput, request.body))
      tellVersion(response, gang.version)
      response.json(gang)
    })
    .delete('/editions/:id/gangs/:code', async (request, response) => {
      await removeGang(db, whoOf(response), placeOf(request), seenVersion(request))
      response.status(204).end()
    })
    .post('/editions/:id/gangs/:code/preview', async (request, response) => {
      response.json(await previewGang(db, whoOf(response), placeOf(request), parse(gangInput, request.body)))
    })
}
