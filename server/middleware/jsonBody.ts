import { json, type Request, type RequestHandler, type Response } from 'express'
import { AppError } from '../errors'

const MOST_DEPTH = 40
const LARGER: readonly { path: RegExp; limit: string }[] = [
  { path: /^\/api\/projects\/[^/]+\/levels(\/|$)/, limit: '2mb' },
  { path: /^\/api\/appraisals(\/|$)/, limit: '1mb' },
]

/** Deepest nesting of the JSON text; brackets inside strings do not count. */
function depthOf(text: Buffer): number {
  let depth = 0
  let most = 0
  let isInString = false
  for (let at = 0; at < text.length; at++) {
    const byte = text[at]
    if (isInString) {
      if (byte === 0x5c) at++
      else if (byte === 0x22) isInString = false
    } else if (byte === 0x22) isInString = true
    else if (byte === 0x5b || byte === 0x7b) most = Math.max(most, ++depth)
    else if (byte === 0x5d || byte === 0x7d) depth--
  }
  return most
}

function refuseDeep(_request: unknown, _response: unknown, text: Buffer): void {
  if (depthOf(text) > MOST_DEPTH) throw new AppError('invalid_request', `The JSON is nested more than ${MOST_DEPTH} deep.`)
}

/** Reads JSON bodies: up to 100 kB, levels up to 2 MB, appraisal files up to 1 MB, nested at most 40 deep. */
export function jsonBody(): RequestHandler {
  const parserOf = (limit: string) => json({ limit, strict: true, inflate: false, verify: refuseDeep })
  const usual = parserOf('100kb')
  const larger = LARGER.map(({ path, limit }) => ({ path, parser: parserOf(limit) }))
  return (request: Request, response: Response, next) => {
    const parser = larger.find(({ path }) => path.test(request.path))?.parser ?? usual
    parser(request, response, next)
  }
}
