import { existsSync, readdirSync } from 'node:fs'
import { join } from 'node:path'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { AuditEntity } from '../../server/entities/AuditEntity'
import { GangEntity } from '../../server/entities/rates/GangEntity'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { QuotationEntity } from '../../server/entities/rates/QuotationEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { ResourceEntity } from '../../server/entities/rates/ResourceEntity'
import { rateImport } from '../../shared/contracts/rateImport'
import { clientOf, makeFirm, makePerson, type TestPerson } from '../support/factories'
import { openImportSheet, type ImportSheet } from '../support/importing'
import { makePricedEdition } from '../support/pricedDraft'
import type { TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
let firmId: string
let person: TestPerson
let client: TestClient
let editionId: string
let sheet: ImportSheet
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())
beforeEach(async () => {
  firmId = await makeFirm(server)
  person = await makePerson(server, firmId, ['estimator'])
  client = await clientOf(server, person)
  editionId = (await makePricedEdition(server, firmId)).editionId
  sheet = await openImportSheet(server, person, editionId)
})

const of = () => ({ firmId, editionId })
const resource = async (code: string) => await server.db.manager.findOneBy(ResourceEntity, { ...of(), code })
const barRate = async () => (await server.db.manager.findOneByOrFail(RateEntity, { ...of(), item: 'steel.bar.12' })).likely

const LIST = [
  'Kiln and Quarry, prices from 1 October;;;;',
  ';;;;',
  'Article no.;Designation;Unit;Price EUR;Low',
  'bar;High-yield bars;t;1.000,00;900',
  'block;Hollow block;nr;0,80;0,80',
  'sand;Washed sand;m³;€ 31,50;30',
  'gravel;Gravel;;29,00;',
  'pump;Concrete pump;day;60;',
  'lime;Lime;kg;on request;',
  'sand;Washed sand again;m³;32;',
  'chalk;Chalk;kg;-2,00;',
  'clay;Clay;t;20,00;25',
  'Subtotal;;;1.234,56;',
].join('\r\n')

describe('an import of resources', () => {
  it('previews each row as new, changed, unchanged or refused with the reason, and says which rates move', async () => {
    const read = await sheet.read('list.csv', LIST)
    expect(read.sheets[0]!.proposed).toMatchObject({ target: 'resources', headRow: 2, decimalMark: ',' })
    const preview = await sheet.preview(read)
    expect(preview).toMatchObject({ state: 'previewed', failure: null })
    const rows = await sheet.rows(preview.id)
    expect(rows.map(({ row, code, state, reason }) => [row, code, state, reason])).toEqual([
      [4, 'bar', 'changed', null],
      [5, 'block', 'changed', null],
      [6, 'sand', 'new', null],
      [7, 'gravel', 'refused', 'missing unit'],
      [8, 'pump', 'refused', 'unit differs: the edition has h, the list day'],
      [9, 'lime', 'refused', 'price: unreadable number “on request”, where the decimal mark is “,”'],
      [10, 'sand', 'refused', 'duplicate code in the file: row 6 has it too'],
      [11, 'chalk', 'refused', 'price: the number is negative'],
      [12, 'clay', 'refused', 'low price 25 is above the price 20'],
    ])
    expect(preview.counts).toEqual({ new: 1, changed: 2, unchanged: 0, refused: 6, leftOut: 1 })
    // 1000 × 1.02 + 7 ÷ 0.014 = 1520 a tonne, from 1418
    expect(preview.moves).toMatchObject([{ item: 'steel.bar.12', before: { likely: '1418' }, after: { likely: '1520' } }])
    expect(Number(await barRate())).toBe(1418)
  })

  it('puts all in or nothing, moves the rates with it, and takes it back whole', async () => {
    const before = await resource('bar')
    const preview = await sheet.preview(await sheet.read('list.csv', LIST))
    const refusal = await client.post(`/api/imports/${preview.id}/commit`, { leaveOutRefused: false })
    expect([refusal.status, refusal.error.message]).toEqual([409, expect.stringContaining('6 rows are refused')])
    expect(await resource('sand')).toBeNull()
    const done = await sheet.commit(preview.id, { leaveOutRefused: true })
    expect(done).toMatchObject({ state: 'committed', failure: null })
    expect(await resource('sand')).toMatchObject({ likely: '31.500000', low: '30.000000', high: '31.500000', source: 'list.csv' })
    expect(await resource('bar')).toMatchObject({ likely: '1000.000000', sourceDate: '2026-10-01', version: 2 })
    expect(Number(await barRate())).toBe(1520)
    expect(await server.db.manager.countBy(AuditEntity, { firmId, event: 'edition.imported' })).toBe(1)
    const undone = (await client.post(`/api/imports/${preview.id}/undo`, {})).as(rateImport)
    expect(undone.state).toBe('undone')
    expect(await resource('sand')).toBeNull()
    expect(await resource('bar')).toEqual({ ...before, version: 3 })
    expect(Number(await barRate())).toBe(1418)
  })

  it('undoes nothing, and names the row, when one was changed since', async () => {
    const preview = await sheet.preview(await sheet.read('list.csv', LIST))
    await sheet.commit(preview.id, { leaveOutRefused: true })
    const input = { code: 'bar', kind: 'material', description: 'Bars', unit: 't', source: '', sourceDate: null }
    await client.put(`/api/editions/${editionId}/resources/bar`, { ...input, price: { low: '1', likely: '2', high: '3' } }, 2)
    const refusal = await client.post(`/api/imports/${preview.id}/undo`, {})
    expect([refusal.status, refusal.error.message]).toEqual([409, expect.stringContaining('changed since the import: bar')])
    expect(await resource('sand')).not.toBeNull()
    expect((await client.get(`/api/imports/${preview.id}`)).as(rateImport).state).toBe('committed')
  })

  it('undoes nothing when a gang rests on what it made', async () => {
    const read = await sheet.read('labour.csv', 'code,description,unit,price,kind\nmate,Mate,h,5,labour\n')
    const preview = await sheet.preview(read)
    await sheet.commit(preview.id)
    await server.db.manager.insert(GangEntity, { ...of(), code: 'gang.two', description: 'Two', members: [{ resource: 'mate', count: '1' }] }) // prettier-ignore
    const refusal = await client.post(`/api/imports/${preview.id}/undo`, {})
    expect(refusal.error.message).toContain('in use since the import: the gang gang.two')
    expect(await resource('mate')).not.toBeNull()
  })

  it('puts nothing in when a row was changed between preview and commit', async () => {
    const preview = await sheet.preview(await sheet.read('list.csv', LIST))
    await server.db.manager.update(ResourceEntity, { ...of(), code: 'bar' }, { version: 5 })
    const answer = await sheet.commit(preview.id, { leaveOutRefused: true })
    expect(answer).toMatchObject({ state: 'previewed', failure: expect.stringContaining('Changed since the preview: bar') })
    expect(await resource('sand')).toBeNull()
  })

  it('finds every row unchanged when the same list comes again', async () => {
    const first = await sheet.preview(await sheet.read('list.csv', LIST))
    await sheet.commit(first.id, { leaveOutRefused: true })
    const again = await sheet.preview(await sheet.read('list.csv', LIST))
    expect(again.counts).toMatchObject({ new: 0, changed: 0, unchanged: 3 })
    const refusal = await client.post(`/api/imports/${again.id}/commit`, { leaveOutRefused: true })
    expect(refusal.error.message).toContain('nothing to put in')
  })

  it('is put in once when two commits come at the same moment', async () => {
    const preview = await sheet.preview(await sheet.read('list.csv', LIST))
    const input = { leaveOutRefused: true }
    const answers = await Promise.all([1, 2].map(() => client.post(`/api/imports/${preview.id}/commit`, input)))
    expect(answers.map(({ status }) => status).sort()).toEqual([202, 409])
    expect(await sheet.settled(preview.id)).toMatchObject({ state: 'committed' })
    expect((await resource('bar'))!.version).toBe(2)
  })
})

describe('an import of quotations', () => {
  const QUOTED = [
    'code\tdescription\tunit\tprice\tcontains\tsupplier\treference\tvalid until',
    'block\tHollow block\tnr\t78\t100\tFirst kiln\tQ9\t31.12.2026',
    'tie\tWall tie\tpcs\t12.50\t250\tWire works\tW1\t',
    'tie\tWall tie\tpcs\t10.00\t250\tOther wire\tO1\t',
  ].join('\n')

  it('makes unknown codes resources with their first quotation chosen', async () => {
    const preview = await sheet.preview(await sheet.read('quoted.txt', QUOTED))
    expect(preview).toMatchObject({ counts: { new: 3, refused: 0 }, matching: { target: 'quotations' } })
    await sheet.commit(preview.id)
    // 12.50 ÷ 250 and 10 ÷ 250
    expect(await resource('tie')).toMatchObject({
      likely: '0.050000',
      low: '0.040000',
      high: '0.050000',
      source: 'Wire works, W1',
    })
    const found = await server.db.manager.findBy(QuotationEntity, { ...of(), resource: 'tie' })
    expect(found.find(({ id }) => id === found.find(({ supplier }) => supplier === 'Wire works')!.id)!.contains).toBe(
      '250.000000',
    )
    expect((await resource('block'))!.version).toBe(1)
    const undone = await client.post(`/api/imports/${preview.id}/undo`, {})
    expect(undone.status).toBe(200)
    expect(await resource('tie')).toBeNull()
    expect(await server.db.manager.countBy(QuotationEntity, of())).toBe(2)
  })

  it('lets a resource with a chosen quotation follow', async () => {
    const { manager } = server.db
    const first = await manager.findOneByOrFail(QuotationEntity, { ...of(), supplier: 'First kiln' })
    await manager.update(ResourceEntity, { ...of(), code: 'block' }, { quotationId: first.id })
    const list = 'code;unit;price;contains;supplier;reference;day\nblock;nr;90;100;First kiln;Q1;2026-08-10\n'
    const preview = await sheet.preview(await sheet.read('quoted.csv', list))
    expect(preview.counts).toMatchObject({ changed: 1, new: 0 })
    await sheet.commit(preview.id)
    expect(await resource('block')).toMatchObject({ likely: '0.900000', low: '0.875000', high: '0.900000' })
    await client.post(`/api/imports/${preview.id}/undo`, {})
    expect(await resource('block')).toMatchObject({ likely: '0.800000', version: 3, quotationId: first.id })
    expect(await manager.findOneBy(QuotationEntity, { ...of(), id: first.id })).toMatchObject({ price: '80.000000', version: 3 })
  })
})

describe('an import of rates', () => {
  it('takes items that floors are measured by, in their unit, and leaves built-up rates to their build-ups', async () => {
    const list =
      'item,description,unit,low,likely,high\nformwork.edge,Edge,m,9,10,12\nsteel.bar.12,Bars,t,1,2,3\nformwork.soffit,Soffit,m,1,2,3\nroof.tiles,Tiles,m2,1,2,3\n'
    const preview = await sheet.preview(await sheet.read('rates.csv', list))
    expect((await sheet.rows(preview.id)).map(({ code, state, reason }) => [code, state, reason])).toEqual([
      ['formwork.edge', 'new', null],
      ['steel.bar.12', 'refused', 'the rate is built up; change its build-up or its resources'],
      ['formwork.soffit', 'refused', 'unit differs: formwork.soffit is measured in m², the list has m'],
      ['roof.tiles', 'refused', '“roof.tiles” is no item that floors are measured by'],
    ])
    await sheet.commit(preview.id, { leaveOutRefused: true })
    expect(await server.db.manager.findOneBy(RateEntity, { ...of(), item: 'formwork.edge' })).toMatchObject({
      likely: '10.000000',
    })
  })
})

describe('the way of an import', () => {
  it('keeps only the rows of a file until they are put in, then nothing', async () => {
    const read = await sheet.read('list.csv', LIST)
    const preview = await sheet.preview(read)
    const folder = join(server.env.dataFolder, 'imports')
    expect(readdirSync(folder).filter((name) => name.startsWith(read.id))).toEqual([`${read.id}.rows`])
    await sheet.commit(preview.id, { leaveOutRefused: true })
    await expect.poll(() => existsSync(join(folder, `${read.id}.rows`))).toBe(false)
  })

  it('is refused in an edition that is no draft any more, at every step', async () => {
    const preview = await sheet.preview(await sheet.read('list.csv', LIST))
    await server.db.manager.update(EditionEntity, { firmId, id: editionId }, { state: 'checked' })
    expect((await sheet.upload('list.csv', LIST)).status).toBe(409)
    expect((await client.put(`/api/imports/${preview.id}/matching`, preview.matching)).status).toBe(409)
    expect((await client.post(`/api/imports/${preview.id}/commit`, { leaveOutRefused: true })).status).toBe(409)
  })

  it('names what is wrong with a matching', async () => {
    const read = await sheet.read('list.csv', LIST)
    const { target, headRow, decimalMark } = read.sheets[0]!.proposed!
    const defaults = { kind: 'material', unit: '', supplier: '', day: '2026-10-01' }
    const matching = { target, headRow, decimalMark, sheet: 0, defaults, columns: { code: 0, description: 0, supplier: 1 } }
    const { error } = await client.put(`/api/imports/${read.id}/matching`, matching)
    expect(error.issues?.map(({ path }) => path)).toEqual(['columns.likely', 'columns.supplier', 'columns.description'])
  })

  it('has no rows before the preview, and pages them after', async () => {
    const many = ['code,description,unit,price', ...Array.from({ length: 230 }, (_, n) => `c${n},Thing,kg,${n}`)].join('\n')
    const read = await sheet.read('many.csv', many)
    expect((await client.get(`/api/imports/${read.id}/rows`)).status).toBe(409)
    await sheet.preview(read)
    expect(await sheet.rows(read.id, '?page=3&state=new')).toHaveLength(30)
    expect(await sheet.rows(read.id, '?state=refused')).toEqual([])
  })
})
