import type { Request, RequestHandler } from 'express'
import { AppError } from '../errors'

const READING = new Set(['GET', 'HEAD', 'OPTIONS'])
/** Where files are sent to. */
const UPLOADS = /^\/api\/editions\/[^/]+\/imports\/?$/

/** A file with the header that a page of ours sets, which a form of another site cannot set. */
const isUpload = (request: Request): boolean =>
  UPLOADS.test(request.path) &&
  request.get('x-requested-with') === 'bothways' &&
  /^multipart\/form-data\s*;/i.test(request.get('content-type') ?? '')

/**
 * Refuses a change that another site's page could have sent: its `Origin`, where the browser tells, must be ours, and what it sends must
 * be JSON, which a form cannot send, or a file with a header that a form cannot set.
 */
export function sameOriginOnly(origin: string): RequestHandler {
  return (request, _response, next) => {
    if (READING.has(request.method)) return next()
    const sender = request.get('origin')
    if (sender !== undefined && sender !== origin) throw new AppError('forbidden', 'This request came from another site.')
    const hasBody = request.get('transfer-encoding') !== undefined || Number(request.get('content-length') ?? '0') > 0
    const isJson = /^application\/json\s*(;|$)/i.test(request.get('content-type') ?? '')
    if ((hasBody || request.method === 'POST') && !isJson && !isUpload(request)) throw new AppError('unsupported_media_type')
    next()
  }
}
