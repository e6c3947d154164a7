import { crc32 } from 'node:zlib'
import type { WorkbookPart } from './checkedWorkbook'

const VERSION = 20
const UTF8_NAMES = 0x0800

/**
 * The parts written into one archive again, without compression: what reads it sees what was checked and nothing else, whatever else
 * the file that was sent held.
 *
 * Source: ZIP file format (ISO/IEC 21320-1:2015), local file header, central directory header, end of central directory record
 */
export function storedWorkbook(parts: readonly WorkbookPart[]): Buffer {
  const local: Buffer[] = []
  const directory: Buffer[] = []
  let at = 0
  for (const { name, content } of parts) {
    const nameBytes = Buffer.from(name, 'utf8')
    const shared = sharedHeader(nameBytes, content)
    const begin = Buffer.concat([word(0x04034b50), shared, nameBytes, content])
    directory.push(word(0x02014b50), half(VERSION), shared, Buffer.alloc(10), word(at), nameBytes)
    local.push(begin)
    at += begin.length
  }
  const central = Buffer.concat(directory)
  const count = half(parts.length)
  return Buffer.concat([...local, central, word(0x06054b50), word(0), count, count, word(central.length), word(at), half(0)])
}

/** What both headers of a part have in common, from the version to the length of the extra field. */
function sharedHeader(nameBytes: Buffer, content: Buffer): Buffer {
  const size = word(content.length)
  const sums = [word(crc32(content)), size, size]
  return Buffer.concat([half(VERSION), half(UTF8_NAMES), half(0), word(0), ...sums, half(nameBytes.length), half(0)])
}

function word(value: number): Buffer {
  const buffer = Buffer.alloc(4)
  buffer.writeUInt32LE(value >>> 0)
  return buffer
}

function half(value: number): Buffer {
  const buffer = Buffer.alloc(2)
  buffer.writeUInt16LE(value)
  return buffer
}
