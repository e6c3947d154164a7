import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { AppError } from '../errors'

/** `/livez`: the process answers. `/readyz`: it can do work, that is, the database answers and it is not about to stop. */
export function healthRoutes(db: EntityManager, isDraining: () => boolean): Router {
  return Router()
    .get('/livez', (_request, response) => {
      response.json({ status: 'alive' })
    })
    .get('/readyz', async (_request, response) => {
      if (isDraining()) throw new AppError('unavailable')
      await db.query('SELECT 1')
      response.json({ status: 'ready' })
    })
}
