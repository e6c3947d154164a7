import type { Request, Response } from 'express'
import { AppError, refuse } from '../errors'

/** Version the caller has seen, from `If-Match: "3"`. @throws AppError `version_required` when absent */
export function seenVersion(request: Request): number {
  const header = request.get('if-match')
  if (header === undefined) throw new AppError('version_required')
  const digits = /^"([1-9]\d{0,8})"$/.exec(header.trim())?.[1]
  if (digits === undefined) throw refuse('If-Match', 'expected the version in quotes, as "3"')
  return Number(digits)
}

/** Tells the version of the row that is answered: what `If-Match` must say to change it. */
export function tellVersion(response: Response, version: number): void {
  response.set('ETag', `"${version}"`)
}
