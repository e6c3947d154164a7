import { emailAddress } from '#shared/contracts/primitives'

/** A name beside an address, as a mail header shows them. */
export interface Mailbox {
  readonly name: string
  readonly address: string
}

/** `Name <name@example.com>` or a bare address. @throws RangeError when the address is not one plain address */
export function parseMailbox(text: string): Mailbox {
  const named = /^\s*"?([^"<>]*?)"?\s*<([^<>]+)>\s*$/.exec(requireLine(text))
  const address = requireAddress(named ? named[2]! : text)
  return { name: named ? named[1]! : '', address }
}

/** One plain address in lower case. @throws RangeError for anything else: a list, a group, a line break, a quoted part */
export function requireAddress(text: string): string {
  const parsed = emailAddress.safeParse(text)
  if (!parsed.success) throw new RangeError('expected one plain e-mail address, as name@example.com')
  return parsed.data
}

/** Text for one header line. @throws RangeError when it holds control characters: they would begin another header */
export function requireLine(text: string): string {
  if (/\p{Cc}/u.test(text)) throw new RangeError('expected one line of text without control characters')
  return text
}
