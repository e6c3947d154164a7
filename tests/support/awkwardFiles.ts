import ExcelJS from 'exceljs'
import { crc32, deflateRawSync } from 'node:zlib'

/** A part of an archive: what it holds, and what the archive says of its size where that is a lie. */
export interface ArchivePart {
  readonly name: string
  readonly content: Buffer
  readonly statedBytes?: number
}

const numbers = (...pairs: readonly (readonly [2 | 4, number])[]): Buffer => {
  const buffer = Buffer.alloc(pairs.reduce((sum, [bytes]) => sum + bytes, 0))
  let at = 0
  for (const [bytes, value] of pairs) at = buffer.writeUIntLE(value, at, bytes)
  return buffer
}

/** A compressed archive of these parts. */
export function archive(parts: readonly ArchivePart[]): Buffer {
  const local: Buffer[] = []
  const central: Buffer[] = []
  let at = 0
  for (const { name, content, statedBytes = content.length } of parts) {
    const [nameBytes, packed] = [Buffer.from(name), deflateRawSync(content)]
    const sizes = [[4, crc32(content)], [4, packed.length], [4, statedBytes]] as const // prettier-ignore
    const shared = numbers([2, 20], [2, 0], [2, 8], [4, 0], ...sizes, [2, nameBytes.length], [2, 0])
    central.push(numbers([4, 0x02014b50], [2, 20]), shared, Buffer.alloc(10), numbers([4, at]), nameBytes)
    const whole = Buffer.concat([numbers([4, 0x04034b50]), shared, nameBytes, packed])
    local.push(whole)
    at += whole.length
  }
  const directory = Buffer.concat(central)
  const count = parts.length
  const end = numbers([4, 0x06054b50], [4, 0], [2, count], [2, count], [4, directory.length], [4, at], [2, 0])
  return Buffer.concat([...local, directory, end])
}

/** Parts of a workbook whose one sheet is this XML. */
export function workbookWith(sheet: string | Buffer, statedBytes?: number): ArchivePart[] {
  const part = (name: string, text: string): ArchivePart => ({ name, content: Buffer.from(`<?xml version="1.0"?>${text}`) })
  const office = 'http://schemas.openxmlformats.org'
  const own = Buffer.from(sheet as string)
  return [
    part('[Content_Types].xml', `<Types xmlns="${office}/package/2006/content-types"/>`),
    part(
      'xl/workbook.xml',
      `<workbook xmlns="${office}/spreadsheetml/2006/main" xmlns:r="${office}/officeDocument/2006/relationships"><sheets><sheet name="List" sheetId="1" r:id="rId1"/></sheets></workbook>`,
    ),
    part(
      'xl/_rels/workbook.xml.rels',
      `<Relationships xmlns="${office}/package/2006/relationships"><Relationship Id="rId1" Type="${office}/officeDocument/2006/relationships/worksheet" Target="worksheets/sheet1.xml"/></Relationships>`,
    ),
    { name: 'xl/worksheets/sheet1.xml', content: own, ...(statedBytes === undefined ? {} : { statedBytes }) },
  ]
}

/** A workbook as an office makes it. */
export async function workbookOf(make: (book: ExcelJS.Workbook) => void): Promise<Buffer> {
  const book = new ExcelJS.Workbook()
  make(book)
  return Buffer.from(await book.xlsx.writeBuffer())
}
