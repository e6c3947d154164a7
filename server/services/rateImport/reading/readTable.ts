import { readText } from './readText'
import { readWorkbook, type ReadSheet } from './readWorkbook'
import { UnreadableFileError } from './unreadable'

const startsWith = (file: Buffer, ...bytes: number[]) => bytes.every((byte, index) => file[index] === byte)

const isArchive = (file: Buffer) => startsWith(file, 0x50, 0x4b)
const isOldWorkbook = (file: Buffer) => startsWith(file, 0xd0, 0xcf, 0x11, 0xe0)

/**
 * Sheets of an uploaded table; what the file is and what its name says must agree.
 * @param extension - of the name it was sent with, lower case, as `xlsx`
 * @throws UnreadableFileError
 */
export async function readTable(file: Buffer, extension: string): Promise<ReadSheet[]> {
  if (file.length === 0) throw new UnreadableFileError('The file is empty.')
  if (isOldWorkbook(file)) {
    throw new UnreadableFileError(
      'The file is a workbook of the old kind, or one with a password. Save it as .xlsx without a password.',
    )
  }
  if (extension === 'xlsx') {
    if (!isArchive(file)) throw new UnreadableFileError('The name says .xlsx, but the content is no workbook.')
    return await readWorkbook(file)
  }
  if (isArchive(file))
    throw new UnreadableFileError(`The name says .${extension}, but the content is a workbook or another archive.`)
  return readText(file)
}
