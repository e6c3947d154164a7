import type { ApiFailure, FailureCode } from '../../api/apiFailure'

const TEXTS: Record<FailureCode, string> = {
  invalid_request: 'Something in what was sent is not as expected.',
  unauthenticated: 'You are signed out. Sign in again; nothing typed here is lost.',
  forbidden: 'Your role does not allow this.',
  not_found: 'There is nothing at this address, or it is not yours to see.',
  conflict: 'This clashes with something stored already.',
  stale: 'Somebody else changed this in the meantime.',
  too_large: 'That is more than the server takes at once.',
  unsupported_media_type: 'The server does not take this kind of content.',
  out_of_scope: 'A rule does not reach this far.',
  version_required: 'The server wants to know which version was changed. Load the sheet again.',
  limited: 'Too many tries. Wait a minute, then try again.',
  internal: 'Something went wrong on the server. It has been noted.',
  unavailable: 'The server cannot reach its database just now. Try again in a moment.',
  unreachable: 'No answer from the server. Check the connection and try again.',
  unreadable: 'The server answered in a way this page does not understand. Load the page again.',
}
const SPOKEN_BY_SERVER: readonly FailureCode[] = [
  'invalid_request',
  'conflict',
  'out_of_scope',
  'limited',
  'unsupported_media_type',
]

/** What to tell the reader of a failure: the server's own sentence where it names the trouble, else ours; with the request's number. */
export function failureText({ code, message, issues, requestId }: ApiFailure): string {
  const said = SPOKEN_BY_SERVER.includes(code) && message !== '' ? message : TEXTS[code]
  const fields = issues.map((issue) => (issue.path === '' ? issue.message : `${issue.path}: ${issue.message}`)).join('; ')
  const number = code === 'internal' && requestId !== null ? ` Number of the request: ${requestId}.` : ''
  return [said, fields].filter((text) => text !== '').join(' ') + number
}
