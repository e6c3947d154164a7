import { itemCode } from '#shared/contracts/appraisal'
import { resourceCode } from '#shared/contracts/buildUp'
import { rateInput } from '#shared/contracts/rateBook'
import { quotationInput } from '#shared/contracts/resource'
import { Router, type Request } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { seenVersion, tellVersion } from '../middleware/version'
import { readOpenedRate } from '../services/rates/openedRate'
import { changeQuotation, createQuotation, removeQuotation, type QuotationPlace } from '../services/rates/quotationService'
import { changeRate, createRate, removeRate, type RatePlace } from '../services/rates/rateService'

/** Single prices of an edition: its rates, opened or changed, and suppliers' quotations. */
export function priceRoutes(db: EntityManager): Router {
  const router = Router()
  addRates(router, db)
  addQuotations(router, db)
  return router
}

const rateOf = (request: Request): RatePlace => ({
  editionId: idOf(request, 'id'),
  item: parse(itemCode, request.params['item'], 'item'),
})

function addRates(router: Router, db: EntityManager): void {
  router
    .get('/editions/:id/build-up/:item', async (request, response) => {
      const asked = request.query['block']
      const block = asked === undefined ? undefined : parse(resourceCode, asked, 'block')
      const opened = await readOpenedRate(db, whoOf(response), rateOf(request), block)
      tellVersion(response, opened.rate.version)
      response.json(opened)
    })
    .post('/editions/:id/rates/:item', async (request, response) => {
      const input = parse(rateInput, request.body)
      const rate = await createRate(db, whoOf(response), rateOf(request), input, creatingRequest(request, input))
      tellVersion(response, rate.version)
      response.status(201).json(rate)
    })
    .put('/editions/:id/rates/:item', async (request, response) => {
      const place = rateOf(request)
      const rate = await changeRate(db, whoOf(response), place, seenVersion(request), parse(rateInput, request.body))
      tellVersion(response, rate.version)
      response.json(rate)
    })
    .delete('/editions/:id/rates/:item', async (request, response) => {
      await removeRate(db, whoOf(response), rateOf(request), seenVersion(request))
      response.status(204).end()
    })
}

const quotationOf = (request: Request): QuotationPlace => ({
  editionId: idOf(request, 'id'),
  id: idOf(request, 'quotationId'),
})

function addQuotations(router: Router, db: EntityManager): void {
  router
    .post('/editions/:id/quotations', async (request, response) => {
      const input = parse(quotationInput, request.body)
      const of = idOf(request, 'id')
      const quotation = await createQuotation(db, whoOf(response), of, input, creatingRequest(request, input))
      tellVersion(response, quotation.version)
      response.status(201).json(quotation)
    })
    .put('/editions/:id/quotations/:quotationId', async (request, response) => {
      const place = quotationOf(request)
      const quotation = await changeQuotation(
        db,
        whoOf(response),
        place,
        seenVersion(request),
        parse(quotationInput, request.body),
      )
      tellVersion(response, quotation.version)
      response.json(quotation)
    })
    .delete('/editions/:id/quotations/:quotationId', async (request, response) => {
      await removeQuotation(db, whoOf(response), quotationOf(request), seenVersion(request))
      response.status(204).end()
    })
}
