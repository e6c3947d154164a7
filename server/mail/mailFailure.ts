/** What became of a mail that was not accepted. `answer`: the server's words, or ours where it did not speak; one line. */
export interface MailFailure {
  readonly isForGood: boolean
  readonly answer: string
}

/** Commands whose refusal concerns this mail. A refusal at the greeting or at signing in concerns our settings. */
const MAIL_COMMANDS = new Set(['MAIL FROM', 'RCPT TO', 'DATA'])
/** Answers that ask us to sign in or to encrypt first, whatever the command (RFC 4954, section 6). */
const SIGN_IN_ANSWERS = new Set([530, 534, 535, 538])
const LONGEST_ANSWER = 500

function property(error: unknown, name: string): unknown {
  return typeof error === 'object' && error !== null && name in error ? (error as Record<string, unknown>)[name] : undefined
}

/**
 * Reads an error of the transport: a 5xx answer to the mail itself is for good, all else is worth another try (RFC 5321, 4.2.1).
 * Where no server spoke, its address and ours stay in the log.
 */
export function mailFailure(error: unknown): MailFailure {
  const code = property(error, 'responseCode')
  const command = property(error, 'command')
  const response = property(error, 'response')
  const reason = property(error, 'code')
  const ours = `The mail server could not be spoken with${typeof reason === 'string' ? ` (${reason})` : ''}.`
  const answer = (typeof response === 'string' && response !== '' ? response : ours).replace(/[\p{Cc}\s]+/gu, ' ').trim()
  const isMail = typeof command === 'string' && MAIL_COMMANDS.has(command)
  return {
    isForGood: isMail && typeof code === 'number' && code >= 500 && code < 600 && !SIGN_IN_ANSWERS.has(code),
    answer: answer.slice(0, LONGEST_ANSWER),
  }
}
