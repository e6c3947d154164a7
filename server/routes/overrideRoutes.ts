import { itemCode } from '#shared/contracts/appraisal'
import { rateOverrideInput } from '#shared/contracts/rateOverride'
import { Router, type Request } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { seenVersion, tellVersion } from '../middleware/version'
import { changeOverride, createOverride, removeOverride, type OverridePlace } from '../services/project/overrideService'

const placeOf = (request: Request): OverridePlace => ({
  projectId: idOf(request, 'projectId'),
  item: parse(itemCode, request.params['item'], 'item'),
})

/** Rates of a project's own. */
export function overrideRoutes(db: EntityManager): Router {
  return Router()
    .post('/projects/:projectId/overrides/:item', async (request, response) => {
      const input = parse(rateOverrideInput, request.body)
      const override = await createOverride(db, whoOf(response), placeOf(request), input, creatingRequest(request, input))
      tellVersion(response, override.version)
      response.status(201).json(override)
    })
    .put('/projects/:projectId/overrides/:item', async (request, response) => {
      const place = placeOf(request)
      const input = parse(rateOverrideInput, request.body)
      const override = await changeOverride(db, whoOf(response), place, seenVersion(request), input)
      tellVersion(response, override.version)
      response.json(override)
    })
    .delete('/projects/:projectId/overrides/:item', async (request, response) => {
      await removeOverride(db, whoOf(response), placeOf(request), seenVersion(request))
      response.status(204).end()
    })
}
