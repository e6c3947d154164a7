import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createTableReader, type TableReader } from '../../server/services/rateImport/reading/tableReader'
import type { ReadingOutcome } from '../../server/services/rateImport/reading/tableReading'
import type { ImportedSheet } from '../../shared/contracts/rateImport'
import { archive, workbookOf, workbookWith } from '../support/awkwardFiles'

let folder: string
let reader: TableReader
let count = 0
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'bothways-reading-'))
  reader = createTableReader()
})
afterAll(() => {
  reader.close()
  rmSync(folder, { recursive: true, force: true })
})

async function outcomeOf(
  content: Buffer | string,
  extension: string,
  by = reader,
): Promise<{ outcome: ReadingOutcome; rowsPath: string }> {
  const base = join(folder, String(++count))
  writeFileSync(`${base}.file`, content)
  return { outcome: await by.read({ filePath: `${base}.file`, extension, rowsPath: `${base}.rows` }), rowsPath: `${base}.rows` }
}
async function sheetsOf(content: Buffer | string, extension = 'csv'): Promise<readonly ImportedSheet[]> {
  const { outcome } = await outcomeOf(content, extension)
  if (outcome.kind !== 'read') throw new Error(outcome.reason)
  return outcome.sheets
}
const reasonOf = async (content: Buffer | string, extension = 'xlsx', by = reader): Promise<string> => {
  const { outcome } = await outcomeOf(content, extension, by)
  return outcome.kind === 'unreadable' ? outcome.reason : 'read'
}

const utf16 = (text: string, isLittle: boolean): Buffer => {
  const little = Buffer.from(`\uFEFF${text}`, 'utf16le')
  return isLittle ? little : little.swap16()
}

describe('a text of columns', () => {
  const TEXT = 'Code;Größe;Einheit;Preis €\r\nA1;"Ziegel; 20 cm";Stk;1.234,50\r\n'
  const READ = [['Code', 'Größe', 'Einheit', 'Preis €'], ['A1', 'Ziegel; 20 cm', 'Stk', '1.234,50']] // prettier-ignore

  it.each([
    ['UTF-8', Buffer.from(TEXT)],
    ['UTF-8 with a mark', Buffer.from(`\uFEFF${TEXT}`)],
    ['UTF-16, little end first', utf16(TEXT, true)],
    ['UTF-16, big end first', utf16(TEXT, false)],
    ['Windows-1252', Buffer.from(TEXT.replaceAll('€', '\x80'), 'latin1')],
  ])('in %s is read as it is written', async (_, content) => {
    const [sheet] = await sheetsOf(content)
    expect(sheet!.sample).toEqual(READ)
    expect(sheet!.proposed).toMatchObject({ columns: { code: 0, unit: 2, likely: 3 }, decimalMark: ',' })
  })

  it.each([
    ['commas', 'code,description,price\nA,"Sand, washed",1.50\n'],
    ['tabs', 'code\tdescription\tprice\nA\tSand, washed\t1.50\n'],
    ['semicolons', 'code;description;price\nA;Sand, washed;1.50\n'],
  ])('between %s is parted by them', async (_, text) => {
    expect((await sheetsOf(text))[0]!.sample[1]).toEqual(['A', 'Sand, washed', '1.50'])
  })

  it('keeps the numbers of rows as a spreadsheet counts them, blank rows and quoted line breaks too', async () => {
    const { rowsPath } = await outcomeOf('code,description,price\n\n"A","two\nlines",1\n\nB,C,2\n', 'csv')
    const rows = readFileSync(rowsPath, 'utf8').trim().split('\n').map((line) => JSON.parse(line) as { row: number }) // prettier-ignore
    expect(rows.map(({ row }) => row)).toEqual([0, 2, 4])
  })

  it('is refused where it is none', async () => {
    expect(await reasonOf(Buffer.from([0, 1, 2, 0, 255, 0]), 'csv')).toContain('no readable text')
    expect(await reasonOf('', 'csv')).toBe('The file is empty.')
    expect(await reasonOf('\n\n ; ;\n', 'csv')).toContain('no row')
    expect(await reasonOf('a,b\n"never closed', 'csv')).toContain('not a table')
    expect(await reasonOf(`${'a,'.repeat(201)}b\n`, 'csv')).toContain('at most 200')
  })
})

describe('a workbook', () => {
  it('is read on every sheet: numbers, days, formulas by their value, titles once, hidden rows noted', async () => {
    const file = await workbookOf((book) => {
      book.addWorksheet('Cover').addRow(['Kiln and Quarry'])
      const sheet = book.addWorksheet('Prices')
      sheet.addRow(['Prices of October'])
      sheet.mergeCells('A1:D1')
      sheet.addRow([])
      sheet.addRow(['Code', 'Description', 'Unit', 'Price', 'Date of source'])
      sheet.addRow([1001, { richText: [{ text: 'Wa' }, { text: 'ter' }] }, 'm³', { formula: '3/4', result: 0.75 }, new Date(Date.UTC(2026, 8, 1))])
      sheet.addRow(['A2', { text: 'Sand', hyperlink: 'http://example.test' }, 'm³', 0.1 + 0.2])
      sheet.getRow(5).hidden = true
    }) // prettier-ignore
    const { outcome, rowsPath } = await outcomeOf(file, 'xlsx')
    expect(outcome).toMatchObject({
      kind: 'read',
      sheets: [
        { name: 'Cover', proposed: null },
        { name: 'Prices', hiddenRowCount: 1 },
      ],
    })
    const rows = readFileSync(rowsPath, 'utf8').trim().split('\n').map((line) => JSON.parse(line) as { cells: unknown; isHidden: boolean }) // prettier-ignore
    expect(rows.slice(1).map(({ cells, isHidden }) => [isHidden, cells])).toEqual([
      [false, ['Prices of October']],
      [false, ['Code', 'Description', 'Unit', 'Price', 'Date of source']],
      [false, [1001, 'Water', 'm³', 0.75, '2026-09-01']],
      [true, ['A2', 'Sand', 'm³', 0.1 + 0.2]],
    ])
  })

  it('is refused when its name and its content differ, and when it is damaged', async () => {
    const file = await workbookOf((book) => book.addWorksheet('List').addRow(['Code', 'Price']))
    expect(await reasonOf('code,price\n', 'xlsx')).toContain('no workbook')
    expect(await reasonOf(file, 'csv')).toContain('content is a workbook')
    expect(await reasonOf(Buffer.from([0xd0, 0xcf, 0x11, 0xe0, 1, 2]), 'xlsx')).toContain('old kind')
    expect(await reasonOf(file.subarray(0, file.length / 2), 'xlsx')).toContain('damaged')
    expect(await reasonOf(archive([{ name: 'note.txt', content: Buffer.from('x') }]), 'xlsx')).toContain(
      'no workbook of the kind',
    )
    expect(await reasonOf(archive(workbookWith('<worksheet><sheetData><row')), 'xlsx')).toContain('could not be read')
  })

  it('that unpacks to too much is refused by what comes out, whatever it states', async () => {
    const bomb = Buffer.alloc(200 * 1024 * 1024, 0x20)
    const honest = archive(workbookWith(bomb))
    expect(honest.length).toBeLessThan(300_000)
    expect(await reasonOf(honest)).toContain('unpacks to more than 160 MB')
    expect(await reasonOf(archive(workbookWith(bomb, 1000)))).toContain('unpacks to more than 160 MB')
  })

  it('with too many parts, or one part named twice, is refused', async () => {
    const many = Array.from({ length: 5000 }, (_, index) => ({ name: `xl/worksheets/s${index}.xml`, content: Buffer.alloc(0) }))
    expect(await reasonOf(archive(many))).toContain('5000 parts')
    const parts = workbookWith('<worksheet><sheetData/></worksheet>')
    expect(await reasonOf(archive([...parts, parts.at(-1)!]))).toContain('damaged')
  })

  it('of a few thousand bytes that would blow up to millions of cells is read or refused, within the bounds', async () => {
    const validations =
      '<dataValidations count="1"><dataValidation type="list" sqref="A1:XFD1048576"><formula1>"a"</formula1></dataValidation></dataValidations>'
    const cells = '<sheetData><row r="1"><c r="A1"><v>1</v></c></row></sheetData>'
    const merged = '<mergeCells count="1"><mergeCell ref="A1:XFD1048576"/></mergeCells>'
    const patient = createTableReader({ timeMs: 15_000, heapMb: 256, memoryMb: 600, processes: 1 })
    const hostile = archive(workbookWith(`<worksheet>${cells}${validations}</worksheet>`))
    expect(hostile.length).toBeLessThan(6000)
    expect(await reasonOf(hostile, 'xlsx', patient)).toBe('read')
    expect(await reasonOf(archive(workbookWith(`<worksheet>${cells}${merged}</worksheet>`)), 'xlsx', patient)).not.toBe('read')
  })
})

describe('the process that reads', () => {
  it('is killed at its deadline, and the next file is read all the same', async () => {
    const hasty = createTableReader({ timeMs: 30, heapMb: 256, memoryMb: 600, processes: 1 })
    expect(await reasonOf('code,price\nA,1\n', 'csv', hasty)).toContain('more than is allowed')
    expect(await reasonOf('code,price\nA,1\n', 'csv')).toBe('read')
  })

  it('is killed when it takes more memory than it may', async () => {
    const poor = createTableReader({ timeMs: 60_000, heapMb: 256, memoryMb: 10, processes: 1 })
    expect(await reasonOf('code,price\nA,1\n', 'csv', poor)).toContain('more than is allowed')
  })
})
