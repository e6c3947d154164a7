import type { Request } from 'express'
import { refuse } from '../errors'
import type { CreatingRequest } from '../services/createOnce'

/** Key and content of a creating request; `asked` is the body as its contract read it. */
export function creatingRequest(request: Request, asked: unknown): CreatingRequest {
  const key = request.get('idempotency-key')
  if (key !== undefined && !/^[\x21-\x7e]{1,200}$/.test(key)) {
    throw refuse('Idempotency-Key', 'expected 1 to 200 visible ASCII characters')
  }
  return { key, asked: [request.method, `${request.baseUrl}${request.path}`, asked] }
}
