import { blockInput } from '#shared/contracts/blockCatalogue'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { seenVersion, tellVersion } from '../middleware/version'
import { changeBlock, createBlock, listBlocks, removeBlock } from '../services/rates/blockService'

/** The firm's block catalogue. */
export function blockRoutes(db: EntityManager): Router {
  return Router()
    .get('/blocks', async (_request, response) => {
      response.json(await listBlocks(db, whoOf(response)))
    })
    .post('/blocks', async (request, response) => {
      const input = parse(blockInput, request.body)
      const block = await createBlock(db, whoOf(response), input, creatingRequest(request, input))
      tellVersion(response, block.version)
      response.status(201).json(block)
    })
    .put('/blocks/:id', async (request, response) => {
      const id = idOf(request, 'id')
      const block = await changeBlock(db, whoOf(response), id, seenVersion(request), parse(blockInput, request.body))
      tellVersion(response, block.version)
      response.json(block)
    })
    .delete('/blocks/:id', async (request, response) => {
      await removeBlock(db, whoOf(response), idOf(request, 'id'), seenVersion(request))
      response.status(204).end()
    })
}
