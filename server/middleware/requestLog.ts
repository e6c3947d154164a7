import type { RequestHandler } from 'express'
import { randomUUID } from 'node:crypto'
import { pinoHttp } from 'pino-http'
import type { Log } from '../log'

/** One line a request: id, method, path, status, time. No header, query or body: they may hold what is secret. */
export function requestLog(log: Log): RequestHandler {
  return pinoHttp({
    logger: log,
    genReqId: () => randomUUID(),
    customLogLevel: (_request, response, error) => (error || response.statusCode >= 500 ? 'error' : 'info'),
    serializers: {
      req: (request: { id: string; method: string; url: string }) => ({
        id: request.id,
        method: request.method,
        path: request.url.split('?')[0],
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  })
}
