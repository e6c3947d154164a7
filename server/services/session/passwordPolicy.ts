import { refuse } from '../../errors'
import { COMMON_PASSWORDS } from './commonPasswords'

/** Letters that must be left when the firm's own words are taken out of a password. */
const LEAST_OF_ITS_OWN = 8
const SHORTEST_WORD = 4
const LONGEST_PIECE = 6
const RUNS = ['abcdefghijklmnopqrstuvwxyz', '0123456789', '9876543210', 'qwertyuiop', 'asdfghjkl', 'zxcvbnm']

const bare = (text: string): string => text.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '')

/** True of `abcabcabcabcabc`: a piece of at most six letters over and over. */
function isRepetition(text: string): boolean {
  for (let size = 1; size <= LONGEST_PIECE; size++) {
    if (
      text ===
      text
        .slice(0, size)
        .repeat(Math.ceil(text.length / size))
        .slice(0, text.length)
    )
      return true
  }
  return false
}

/** True of `abcdefghijklmno` or `123456789012345`: one row of the alphabet, the digits or the keyboard, over and over. */
const isRun = (text: string): boolean => RUNS.some((run) => run.repeat(Math.ceil(128 / run.length) + 1).includes(text))

function withoutWords(text: string, words: readonly string[]): string {
  const known = words.flatMap((word) => [bare(word), ...word.split(/[^\p{L}\p{N}]+/u).map(bare)])
  const longestFirst = known.filter((word) => word.length >= SHORTEST_WORD).sort((a, b) => b.length - a.length)
  return longestFirst.reduce((left, word) => left.replaceAll(word, ''), text)
}

/**
 * Refuses a new password that would be guessed first. Its length was checked by the contract; nothing is asked of its letters.
 *
 * Source: OWASP ASVS 5.0, 6.2.4, 6.2.11 (common passwords, words of the context)
 * @param words - names of the firm, the person and the product, the person's address
 * @throws AppError `invalid_request` at `password`
 */
export function requireUncommonPassword(password: string, words: readonly string[]): void {
  const text = bare(password)
  if (COMMON_PASSWORDS.has(text) || isRepetition(text) || isRun(text)) {
    throw refuse('password', 'expected a password that is not among those tried first')
  }
  const own = withoutWords(text, [...words, 'bothways'])
  if (own.length !== text.length && own.length < LEAST_OF_ITS_OWN) {
    throw refuse('password', 'expected more than names: the firm, you and the product are guessed first')
  }
}
