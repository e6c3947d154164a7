import type { RequestHandler } from 'express'
import { AppError } from '../errors'

const READING = new Set(['GET', 'HEAD', 'OPTIONS'])

/**
 * Refuses a change that another site's page could have sent: its `Origin`, where the browser tells, must be ours, and what it sends must
 * be JSON, which a form cannot send.
 */
export function sameOriginOnly(origin: string): RequestHandler {
  return (request, _response, next) => {
    if (READING.has(request.method)) return next()
    const sender = request.get('origin')
    if (sender !== undefined && sender !== origin) throw new AppError('forbidden', 'This request came from another site.')
    const hasBody = request.get('transfer-encoding') !== undefined || Number(request.get('content-length') ?? '0') > 0
    const isJson = /^application\/json\s*(;|$)/i.test(request.get('content-type') ?? '')
    if ((hasBody || request.method === 'POST') && !isJson) throw new AppError('unsupported_media_type')
    next()
  }
}
