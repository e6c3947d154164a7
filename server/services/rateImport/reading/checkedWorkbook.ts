import { inflateRawSync } from 'node:zlib'
import { TABLE_LIMITS } from './tableLimits'
import { UnreadableFileError } from './unreadable'

const END_SIGN = 0x06054b50
const ENTRY_SIGN = 0x02014b50
const LOCAL_SIGN = 0x04034b50
const END_BYTES = 22
const ENTRY_BYTES = 46
const LOCAL_BYTES = 30
const STORED = 0
const DEFLATED = 8
const ENCRYPTED = 1

interface Entry {
  readonly name: string
  readonly flags: number
  readonly method: number
  readonly packedBytes: number
  readonly at: number
}

/** A file inside a workbook, inflated. */
export interface WorkbookPart {
  readonly name: string
  readonly content: Buffer
}

const broken = () => new UnreadableFileError('The workbook is damaged or was cut off on the way. Save it again and send it anew.')

function endOf(file: Buffer): number {
  const earliest = Math.max(0, file.length - END_BYTES - 0xffff)
  for (let at = file.length - END_BYTES; at >= earliest; at--) if (file.readUInt32LE(at) === END_SIGN) return at
  throw broken()
}

function directoryOf(file: Buffer): Entry[] {
  const end = endOf(file)
  const count = file.readUInt16LE(end + 10)
  if (count > TABLE_LIMITS.entries) {
    throw new UnreadableFileError(`The workbook has ${count} parts inside; at most ${TABLE_LIMITS.entries} are read.`)
  }
  const entries: Entry[] = []
  let at = file.readUInt32LE(end + 16)
  for (let index = 0; index < count; index++) {
    if (at + ENTRY_BYTES > end || file.readUInt32LE(at) !== ENTRY_SIGN) throw broken()
    const nameBytes = file.readUInt16LE(at + 28)
    entries.push({
      name: file.toString('utf8', at + ENTRY_BYTES, at + ENTRY_BYTES + nameBytes),
      flags: file.readUInt16LE(at + 8),
      method: file.readUInt16LE(at + 10),
      packedBytes: file.readUInt32LE(at + 20),
      at: file.readUInt32LE(at + 42),
    })
    at += ENTRY_BYTES + nameBytes + file.readUInt16LE(at + 30) + file.readUInt16LE(at + 32)
  }
  return entries
}

function packedContent(file: Buffer, { at, packedBytes }: Entry): Buffer {
  if (at + LOCAL_BYTES > file.length || file.readUInt32LE(at) !== LOCAL_SIGN) throw broken()
  const begin = at + LOCAL_BYTES + file.readUInt16LE(at + 26) + file.readUInt16LE(at + 28)
  if (begin + packedBytes > file.length) throw broken()
  return file.subarray(begin, begin + packedBytes)
}

function inflated(packed: Buffer, method: number, mostBytes: number): Buffer {
  const tooLarge = () =>
    new UnreadableFileError(`The workbook unpacks to more than ${TABLE_LIMITS.inflatedBytes / 1024 / 1024} MB; split it up.`)
  if (method === STORED) {
    if (packed.length > mostBytes) throw tooLarge()
    return packed
  }
  if (method !== DEFLATED) throw broken()
  try {
    return inflateRawSync(packed, { maxOutputLength: Math.max(1, mostBytes) })
  } catch (cause) {
    throw cause instanceof RangeError ? tooLarge() : broken()
  }
}

/**
 * The parts of a workbook, inflated within the bounds. Sizes that the file states are not believed: what comes out is counted. Parts
 * without a use here (pictures, macros) are left out unread; a part that is named twice is refused, since readers differ on which counts.
 * @param isWanted - whether a part of that name is read
 * @throws UnreadableFileError
 */
export function workbookParts(file: Buffer, isWanted: (name: string) => boolean): WorkbookPart[] {
  const entries = directoryOf(file)
  if (new Set(entries.map(({ name }) => name.toLowerCase())).size !== entries.length) throw broken()
  if (entries.some(({ flags }) => (flags & ENCRYPTED) !== 0)) {
    throw new UnreadableFileError('The workbook is protected by a password. Save it without one.')
  }
  let left: number = TABLE_LIMITS.inflatedBytes
  return entries
    .filter(({ name }) => isWanted(name))
    .map((entry) => {
      const content = inflated(packedContent(file, entry), entry.method, left)
      left -= content.length
      return { name: entry.name, content }
    })
}
