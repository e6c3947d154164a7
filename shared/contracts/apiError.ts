import { z } from 'zod'

/** Every code the API answers with; the status follows from the code (server/errors.ts). */
export const apiErrorCode = z.enum([
  'invalid_request',
  'unauthenticated',
  'forbidden',
  'not_found',
  'conflict',
  'stale',
  'too_large',
  'unsupported_media_type',
  'out_of_scope',
  'version_required',
  'limited',
  'internal',
  'unavailable',
])
export type ApiErrorCode = z.infer<typeof apiErrorCode>

/** One thing wrong with the input: `path` names the field (`levels.0.panels.2.outline`), `message` says what was expected. */
export const apiIssue = z.strictObject({ path: z.string(), message: z.string() })
export type ApiIssue = z.infer<typeof apiIssue>

/** The one shape of every answer with status 4xx or 5xx. */
export const apiError = z.strictObject({
  code: apiErrorCode,
  message: z.string(),
  requestId: z.string(),
  issues: z.array(apiIssue).optional(),
})
export type ApiError = z.infer<typeof apiError>
