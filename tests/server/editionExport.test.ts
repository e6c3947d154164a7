import { parse } from 'csv-parse/sync'
import ExcelJS from 'exceljs'
import request from 'supertest'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { QuotationEntity } from '../../server/entities/rates/QuotationEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { ResourceEntity } from '../../server/entities/rates/ResourceEntity'
import { buildUp } from '../../shared/contracts/buildUp'
import { unitOf } from '../../shared/takeoff/measurementRules'
import { clientOf, makeFirm, makePerson, sessionCookie, type TestPerson } from '../support/factories'
import { openImportSheet } from '../support/importing'
import { makePricedEdition } from '../support/pricedDraft'
import { cellNumber } from '../support/sheetFormula'
import { openTestServer, type TestServer } from '../support/testServer'

/** Everything that a build-up may have: 24.5725… rounds once, at the end. */
const FULL = buildUp.parse({
  materials: [
    { resource: 'block', quantity: '9', wastePercent: '4', uses: 3 },
    { resource: 'bar', quantity: '0.002' },
  ],
  labour: [
    { gang: 'gang.fixer', basis: 'hours', value: '0.35' },
    { gang: 'gang.fixer', basis: 'output', value: '3' },
  ],
  plant: [{ resource: 'pump', fuel: { resource: 'block', perHour: '2' }, outputPerHour: '7' }],
  overheadsPercent: '8',
  profitPercent: '4.5',
})

let server: TestServer
let firmId: string
let person: TestPerson
let editionId: string
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())
beforeEach(async () => {
  firmId = await makeFirm(server)
  person = await makePerson(server, firmId, ['estimator'])
  editionId = (await makePricedEdition(server, firmId)).editionId
  const { manager } = server.db
  for (const { item } of await manager.findBy(RateEntity, { firmId, editionId })) {
    await manager.update(RateEntity, { firmId, editionId, item }, { unit: unitOf(item) })
  }
  const price = { low: '1', likely: '1', high: '1', source: '', sourceDate: null }
  await manager.insert(RateEntity, { firmId, editionId, item: 'formwork.edge', description: 'Edge', unit: 'm', ...price, buildUp: FULL }) // prettier-ignore
  const client = await clientOf(server, person)
  const bar = {
    code: 'bar',
    kind: 'material',
    description: '=HYPERLINK("x")',
    unit: 't',
    source: ' ＋list',
    sourceDate: '2026-08-01',
  }
  const answer = await client.put(`/api/editions/${editionId}/resources/bar`, { ...bar, price: { low: '850', likely: '900', high: '1000' } }, 1) // prettier-ignore
  expect(answer.status).toBe(200)
})

async function download(path: string): Promise<request.Response> {
  return await request(server.app)
    .get(`/api/editions/${editionId}/${path}`)
    .set('Cookie', await sessionCookie(server, person))
    .responseType('blob')
}

async function workbook(): Promise<ExcelJS.Workbook> {
  const { body } = await download('workbook')
  const book = new ExcelJS.Workbook()
  await book.xlsx.load(body as ArrayBuffer)
  return book
}

describe('an exported workbook', () => {
  it('has the sheets of an edition and is sent as a file that no browser opens', async () => {
    const { headers } = await download('workbook')
    expect(headers['content-disposition']).toMatch(/^attachment; filename=".+\.xlsx"; filename\*=UTF-8''/)
    expect([headers['x-content-type-options'], headers['content-security-policy']]).toEqual([
      'nosniff',
      expect.stringContaining('sandbox'),
    ])
    const names = (await workbook()).worksheets.map(({ name }) => name)
    expect(names).toEqual(['edition', 'rates', 'resources', 'gangs', 'build-ups', 'quotations'])
  })

  it('works each rate out again by its formulas, to the value kept beside them and in the database', async () => {
    const book = await workbook()
    const rates = book.getWorksheet('rates')!
    const stored = await server.db.manager.findBy(RateEntity, { firmId, editionId })
    expect(stored.filter(({ buildUp: built }) => built !== null)).toHaveLength(2)
    for (let row = 2; row <= rates.rowCount; row++) {
      const { low, likely, high } = stored.find(({ item }) => item === rates.getCell(`A${row}`).value)!
      expect(['D', 'E', 'F'].map((column) => cellNumber(book, 'rates', `${column}${row}`))).toEqual(
        [low, likely, high].map(Number),
      )
      expect(['D', 'E', 'F'].map((column) => rates.getCell(`${column}${row}`).result ?? rates.getCell(`${column}${row}`).value)).toEqual([low, likely, high].map(Number)) // prettier-ignore
    }
  })

  it('keeps beside every formula the value that it has', async () => {
    const book = await workbook()
    let count = 0
    for (const sheet of book.worksheets) {
      sheet.eachRow((row) => row.eachCell((cell) => {
        if (cell.type !== ExcelJS.ValueType.Formula) return
        count += 1
        expect(cell.result as number).toBeCloseTo(cellNumber(book, sheet.name, cell.address), 9)
      })) // prettier-ignore
    }
    expect(count).toBeGreaterThan(30)
  })

  it('changes the rate when a price is changed in the spreadsheet', async () => {
    const book = await workbook()
    const resources = book.getWorksheet('resources')!
    const bar = resources.getColumn('A').values.indexOf('bar')
    resources.getCell(`F${bar}`).value = 1000
    const at = book.getWorksheet('rates')!.getColumn('A').values.indexOf('steel.bar.12')
    // 1000 × 1.02 + 7 ÷ 0.014
    expect(cellNumber(book, 'rates', `E${at}`)).toBe(1520)
  })

  it('makes text that would begin a formula harmless, and keeps numbers numbers', async () => {
    const resources = (await workbook()).getWorksheet('resources')!
    const bar = resources.getColumn('A').values.indexOf('bar')
    expect([resources.getCell(`C${bar}`).value, resources.getCell(`H${bar}`).value]).toEqual([`'=HYPERLINK("x")`, `'＋list`])
    expect(resources.getCell(`F${bar}`).value).toBe(900)
  })

  it('comes back into the same edition with every row unchanged', async () => {
    const { body } = await download('workbook')
    const sheet = await openImportSheet(server, person, editionId)
    const read = await sheet.read('edition.xlsx', Buffer.from(body as ArrayBuffer))
    const counts: Record<string, unknown> = {}
    for (const target of ['rates', 'resources', 'quotations']) {
      const index = read.sheets.findIndex(({ name }) => name === target)
      const { proposed } = read.sheets[index]!
      expect(proposed?.target).toBe(target)
      const preview = await sheet.preview(read, { ...proposed, sheet: index })
      counts[target] = preview.counts
    }
    const of = { firmId, editionId }
    const none = { new: 0, changed: 0, refused: 0, leftOut: 0 }
    expect(counts).toEqual({
      rates: { ...none, unchanged: await server.db.manager.countBy(RateEntity, of) },
      resources: { ...none, unchanged: await server.db.manager.countBy(ResourceEntity, of) },
      quotations: { ...none, unchanged: await server.db.manager.countBy(QuotationEntity, of) },
    })
  })
})

describe('an exported table', () => {
  it.each(['rates', 'resources', 'quotations'])('of %s comes back with every row unchanged', async (table) => {
    const { body, headers } = await download(`tables/${table}`)
    expect(headers['content-type']).toBe('text/csv; charset=utf-8')
    const sheet = await openImportSheet(server, person, editionId)
    const preview = await sheet.preview(await sheet.read(`${table}.csv`, Buffer.from(body as ArrayBuffer)))
    expect(preview.matching?.target).toBe(table)
    expect(preview.counts).toMatchObject({ new: 0, changed: 0, refused: 0 })
    expect(preview.counts!.unchanged).toBeGreaterThan(1)
  })

  it.each(['gangs', 'build-ups'])('of %s has a value in every column that is asked for', async (table) => {
    const { body } = await download(`tables/${table}`)
    const rows: Record<string, string>[] = parse(Buffer.from(body as ArrayBuffer), { columns: true, bom: true })
    expect(rows.every(({ likely }) => Number(likely) >= 0 && likely !== '')).toBe(true)
  })

  it('of another name is refused', async () => {
    expect((await download('tables/people')).status).toBe(400)
  })
})
