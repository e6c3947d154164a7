import express, { Router } from 'express'
import { join, resolve } from 'node:path'
import { AppError } from '../errors'

const YEAR_MS = 365 * 24 * 3600 * 1000

/** The built client: hashed assets are kept for a year, every other address that a browser opens is answered by the one page. */
export function clientFiles(folder: string): Router {
  const root = resolve(folder)
  return Router()
    .use('/assets', express.static(join(root, 'assets'), { maxAge: YEAR_MS, immutable: true, index: false, fallthrough: false }))
    .use(express.static(root, { index: false, maxAge: 0 }))
    .get('/{*path}', (request, response, next) => {
      if (!request.accepts('html')) throw new AppError('not_found')
      response.set('Cache-Control', 'no-cache').sendFile(join(root, 'index.html'), next)
    })
}
