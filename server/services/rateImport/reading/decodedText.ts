import { UnreadableFileError } from './unreadable'

const MARKS: readonly { readonly bytes: readonly number[]; readonly encoding: string }[] = [
  { bytes: [0xef, 0xbb, 0xbf], encoding: 'utf-8' },
  { bytes: [0xff, 0xfe], encoding: 'utf-16le' },
  { bytes: [0xfe, 0xff], encoding: 'utf-16be' },
]

/**
 * What the bytes 0x80 to 0x9F are in Windows-1252; some platforms decode them as control characters. Five of them are none.
 *
 * Source: WHATWG Encoding Standard, index windows-1252
 */
const UPPER = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ'

const fromWindows = (text: string): string => text.replace(/[\u0080-\u009f]/g, (sign) => UPPER[sign.charCodeAt(0) - 0x80] ?? sign)

function decoded(file: Buffer, encoding: string): string | null {
  try {
    return new TextDecoder(encoding, { fatal: true }).decode(file)
  } catch {
    // not in this encoding: the caller tries the next one, or says so
    return null
  }
}

/**
 * Text of a file: by its byte order mark, else UTF-8, else Windows-1252, in which older price lists are written.
 * @throws UnreadableFileError when it is no text
 */
export function decodedText(file: Buffer): string {
  const mark = MARKS.find(({ bytes }) => bytes.every((byte, index) => file[index] === byte))
  const text = mark ? decoded(file, mark.encoding) : (decoded(file, 'utf-8') ?? fromWindows(decoded(file, 'windows-1252') ?? ''))
  if (text === null || text.includes('\0'))
    throw new UnreadableFileError('The file holds no readable text. Save it as CSV in UTF-8.')
  return text
}
