import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { AuditEntity } from '../../server/entities/AuditEntity'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { QuotationEntity } from '../../server/entities/rates/QuotationEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { ResourceEntity } from '../../server/entities/rates/ResourceEntity'
import { id } from '../../shared/contracts/primitives'
import { edition, editionWithRates, rateBook, type Edition, type EditionState } from '../../shared/contracts/rateBook'
import { clientOf, makeEdition, makePerson, signedIn } from '../support/factories'
import { makePricedEdition } from '../support/pricedDraft'
import { plainRate } from '../support/samplePrices'
import type { TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

const PARTICULARS = { baseDate: '2026-11-01', validUntil: '2027-04-30', taxBasis: 'before tax', note: '', holdsOverheads: true }
const draftOf = (from: string | null, more = {}) => ({ from, isCorrection: false, reason: '', particulars: PARTICULARS, ...more })

/** A firm with a compiler and a checker, both estimators, and a published edition with build-ups. */
async function makeOffice() {
  const { firmId, client: compiler } = await signedIn(server, 'estimator')
  const checker = await clientOf(server, await makePerson(server, firmId, ['estimator']))
  const { editionId } = await makePricedEdition(server, firmId, 'published')
  const { bookId } = await server.db.manager.findOneByOrFail(EditionEntity, { firmId, id: editionId })
  return { firmId, compiler, checker, editionId, bookId }
}

async function begin(client: TestClient, bookId: string, body: unknown): Promise<Edition> {
  return (await client.post(`/api/rate-books/${bookId}/editions`, body)).as(edition)
}
const step = (client: TestClient, { id, version }: Pick<Edition, 'id' | 'version'>, name: string, reason = '') =>
  client.call('post', `/api/editions/${id}/steps`, { body: { step: name, reason }, version })

describe('a rate book', () => {
  it('is one of a region, and begins without an edition', async () => {
    const { client } = await signedIn(server, 'estimator')
    const made = (await client.post('/api/rate-books', { region: 'Farreach', currency: 'USD' })).as(rateBook)
    expect(made).toMatchObject({ region: 'Farreach', currency: 'USD', editions: [] })
    const again = await client.post('/api/rate-books', { region: 'Farreach', currency: 'EUR' })
    expect([again.status, again.error.issues?.[0]?.path]).toEqual([409, 'region'])
    const first = await begin(client, made.id, draftOf(null))
    expect(first).toMatchObject({ number: 1, state: 'draft', isOwnWork: true, compiledBy: 'Terry Test', checkedBy: null })
  })
})

describe('a draft', () => {
  it('copies rates, resources, gangs and quotations of an edition, what is chosen too, and leaves that edition alone', async () => {
    const { firmId, compiler, editionId, bookId } = await makeOffice()
    const { manager } = server.db
    const [chosen] = await manager.findBy(QuotationEntity, { firmId, editionId })
    const { editionId: source } = await makePricedEdition(server, firmId)
    const [first] = await manager.findBy(QuotationEntity, { firmId, editionId: source })
    await manager.update(ResourceEntity, { firmId, editionId: source, code: 'block' }, { quotationId: first!.id })
    const draft = await begin(compiler, bookId, draftOf(source))
    expect(draft).toMatchObject({ number: 2, corrects: null, reason: '' })
    const held = async (id: string) => {
      const of = { firmId, editionId: id }
      const strip = (rows: object[]) => rows.map((row) => ({ ...row, id: '', editionId: '', quotationId: '', version: 0 }))
      return {
        rates: strip(await manager.find(RateEntity, { where: of, order: { item: 'ASC' } })),
        resources: strip(await manager.find(ResourceEntity, { where: of, order: { code: 'ASC' } })),
        quotations: strip(await manager.find(QuotationEntity, { where: of, order: { supplier: 'ASC' } })),
      }
    }
    const before = await held(source)
    expect(before.resources.length).toBeGreaterThan(3)
    expect(await held(draft.id)).toEqual(before)
    const block = await manager.findOneByOrFail(ResourceEntity, { firmId, editionId: draft.id, code: 'block' })
    expect(await manager.findOneByOrFail(QuotationEntity, { firmId, id: block.quotationId! })).toMatchObject({
      editionId: draft.id,
      supplier: first!.supplier,
    })
    expect(await manager.findBy(QuotationEntity, { firmId, editionId })).toContainEqual(chosen)
    for (const { id: copied } of await manager.findBy(QuotationEntity, { firmId, editionId: draft.id }))
      expect(id.parse(copied)).toBe(copied)
  })

  it('puts a published edition right with a reason, and not one that is still open', async () => {
    const { firmId, compiler, editionId, bookId } = await makeOffice()
    const correction = draftOf(editionId, { isCorrection: true, reason: 'Mesh was priced by the sheet' })
    expect(await begin(compiler, bookId, correction)).toMatchObject({ corrects: 1, reason: 'Mesh was priced by the sheet' })
    const path = `/api/rate-books/${bookId}/editions`
    const silent = await compiler.post(path, { ...correction, reason: '' })
    expect([silent.status, silent.error.issues?.[0]?.path]).toEqual([400, 'reason'])
    const draft = await begin(compiler, bookId, draftOf(editionId))
    const open = await compiler.post(path, { ...correction, from: draft.id })
    expect([open.status, open.error.issues?.[0]?.path]).toEqual([400, 'from'])
    const elsewhere = await makeEdition(server, firmId)
    expect((await compiler.post(path, { ...correction, from: elsewhere })).status).toBe(400)
    expect((await compiler.post(path, draftOf(elsewhere))).status).toBe(201)
    const foreign = await makeEdition(server, (await signedIn(server, 'estimator')).firmId)
    expect((await compiler.post(path, draftOf(foreign))).error.issues?.[0]?.path).toBe('from')
  })

  it('is made once for one key, and numbered apart for two at the same moment', async () => {
    const { compiler, checker, bookId } = await makeOffice()
    const made = await Promise.all([compiler, checker, compiler].map((client) => begin(client, bookId, draftOf(null))))
    expect(made.map(({ number }) => number).sort()).toEqual([2, 3, 4])
  })

  it('changes what is stated of it, by version, and is thrown away with all that is in it', async () => {
    const { firmId, compiler, editionId, bookId } = await makeOffice()
    const draft = await begin(compiler, bookId, draftOf(editionId))
    const path = `/api/editions/${draft.id}`
    const change = { ...PARTICULARS, note: 'Steel fell' }
    expect((await compiler.call('put', path, { body: change })).status).toBe(428)
    const changed = (await compiler.call('put', path, { body: change, version: draft.version })).as(edition)
    expect(changed).toMatchObject({ note: 'Steel fell', version: draft.version + 1 })
    expect((await compiler.call('put', path, { body: change, version: draft.version })).status).toBe(412)
    expect((await compiler.call('delete', path, { version: draft.version })).status).toBe(412)
    expect((await compiler.call('delete', path, { version: changed.version })).status).toBe(204)
    expect((await compiler.get(path)).status).toBe(404)
    expect(await server.db.manager.countBy(ResourceEntity, { firmId, editionId: draft.id })).toBe(0)
  })

  it('refuses to leave overheads to projects while build-ups hold them', async () => {
    const { firmId, compiler, editionId, bookId } = await makeOffice()
    const draft = await begin(compiler, bookId, draftOf(editionId))
    const { buildUp } = await server.db.manager.findOneByOrFail(RateEntity, { firmId, editionId, item: 'steel.bar.12' })
    const where = { firmId, editionId: draft.id, item: 'steel.bar.12' } as const
    await server.db.manager.update(RateEntity, where, { buildUp: { ...buildUp!, profitPercent: '5' } })
    const body = { ...PARTICULARS, holdsOverheads: false }
    const answer = await compiler.call('put', `/api/editions/${draft.id}`, { body, version: draft.version })
    expect([answer.status, answer.error.issues?.[0]?.path]).toEqual([400, 'holdsOverheads'])
  })
})

describe('the life of an edition', () => {
  it('goes from draft over checked to published, supersedes the one before, and each step is on record', async () => {
    const { firmId, compiler, checker, editionId, bookId } = await makeOffice()
    const draft = await begin(compiler, bookId, draftOf(editionId))
    const checked = (await step(checker, draft, 'check')).as(edition)
    expect(checked).toMatchObject({ state: 'checked', checkedBy: 'Terry Test', isOwnWork: false })
    const published = (await step(checker, checked, 'publish')).as(edition)
    expect(published.state).toBe('published')
    const before = await server.db.manager.findOneByOrFail(EditionEntity, { firmId, id: editionId })
    expect(before.state).toBe('superseded')
    const withdrawn = (await step(compiler, published, 'withdraw', 'Wrong base date')).as(edition)
    expect(withdrawn).toMatchObject({ state: 'withdrawn', stateReason: 'Wrong base date', checkedBy: 'Terry Test' })
    const steps = await server.db.manager.findBy(AuditEntity, { firmId, event: 'edition.stepped' })
    expect(steps.map(({ detail }) => detail['step']).sort()).toEqual(['check', 'publish', 'withdraw'])
  })

  it('is checked and published by nobody who compiled it or changed a price in it', async () => {
    const { compiler, checker, editionId, bookId } = await makeOffice()
    const draft = await begin(compiler, bookId, draftOf(editionId))
    const own = await step(compiler, draft, 'check')
    expect([own.status, own.error.message]).toEqual([409, expect.stringContaining('somebody else must check')])
    await checker.post(`/api/editions/${draft.id}/rates/formwork.edge`, plainRate('m'))
    const touched = (await checker.get(`/api/editions/${draft.id}`)).as(editionWithRates)
    expect(touched).toMatchObject({ isOwnWork: true, version: draft.version + 1 })
    expect((await step(checker, touched, 'check')).status).toBe(409)
  })

  it('is not checked as it was seen before somebody changed a price in it', async () => {
    const { compiler, checker, editionId, bookId } = await makeOffice()
    const draft = await begin(compiler, bookId, draftOf(editionId))
    expect((await compiler.post(`/api/editions/${draft.id}/rates/formwork.edge`, plainRate('m'))).status).toBe(201)
    expect((await step(checker, draft, 'check')).status).toBe(412)
    expect((await step(checker, { ...draft, version: draft.version + 1 }, 'check')).status).toBe(200)
    const late = await compiler.call('delete', `/api/editions/${draft.id}/rates/formwork.edge`, { version: 1 })
    expect(late.status).toBe(409)
  })

  it('goes back to its compilers with a reason, which they see', async () => {
    const { compiler, checker, editionId, bookId } = await makeOffice()
    const draft = await begin(compiler, bookId, draftOf(editionId))
    const checked = (await step(checker, draft, 'check')).as(edition)
    const silent = await step(checker, checked, 'return')
    expect([silent.status, silent.error.issues?.[0]?.path]).toEqual([400, 'reason'])
    const back = (await step(checker, checked, 'return', 'Blocks lack breakage')).as(edition)
    expect(back).toMatchObject({ state: 'draft', stateReason: 'Blocks lack breakage', checkedBy: null })
  })

  it('needs a rate, and the source of each', async () => {
    const { firmId, compiler, checker, editionId, bookId } = await makeOffice()
    const empty = await begin(compiler, bookId, draftOf(null))
    expect((await step(checker, empty, 'check')).error.message).toContain('no rate yet')
    const draft = await begin(compiler, bookId, draftOf(editionId))
    await server.db.manager.update(RateEntity, { firmId, editionId: draft.id, item: 'curing.area' }, { source: '' })
    expect((await step(checker, draft, 'check')).error.message).toContain('curing.area')
  })

  const STATES: readonly EditionState[] = ['draft', 'checked', 'published', 'superseded', 'withdrawn']
  const ALLOWED: Readonly<Record<string, readonly EditionState[]>> = {
    check: ['draft'],
    return: ['checked'],
    publish: ['checked'],
    withdraw: ['published', 'superseded'],
  }
  it.each(Object.keys(ALLOWED).flatMap((name) => STATES.map((state) => [name, state] as const)))(
    'lets nobody %s what is %s unless that step leads from there',
    async (name, state) => {
      const { firmId, client } = await signedIn(server, 'estimator')
      const id = await makeEdition(server, firmId, state)
      const isAllowed = ALLOWED[name]!.includes(state)
      const answer = await step(client, { id, version: 1 }, name, 'because')
      expect(answer.status).toBe(isAllowed ? 200 : 409)
      const row = await server.db.manager.findOneByOrFail(EditionEntity, { firmId, id })
      expect(row.state === state).toBe(!isAllowed)
    },
  )

  it('has one published edition in a book, whoever publishes at the same moment', async () => {
    const { firmId, compiler, checker, editionId, bookId } = await makeOffice()
    const checked: Edition[] = []
    for (let count = 0; count < 4; count++)
      checked.push((await step(checker, await begin(compiler, bookId, draftOf(editionId)), 'check')).as(edition))
    const answers = await Promise.all(checked.flatMap((row) => [step(checker, row, 'publish'), step(checker, row, 'publish')]))
    for (const { status } of answers) expect([200, 409, 412]).toContain(status)
    const published = await server.db.manager.findBy(EditionEntity, { firmId, bookId, state: 'published' })
    expect(published).toHaveLength(1)
    expect(answers.filter(({ status }) => status === 200).length).toBeGreaterThan(0)
  })
})

describe('what an edition holds', () => {
  const tables = ['resource', 'gang', 'quotation', 'rate'] as const
  it.each(keptStates().flatMap((state) => tables.map((table) => [table, state] as const)))(
    'keeps its %s rows by direct SQL once it is %s',
    async (table, state) => {
      const { firmId } = await signedIn(server, 'estimator')
      const { editionId } = await makePricedEdition(server, firmId, state)
      const { editionId: draftId } = await makePricedEdition(server, firmId)
      const run = (sql: string) => server.db.query(sql)
      const column = table === 'quotation' ? 'supplier' : 'description'
      const of = `firm_id = '${firmId}' AND edition_id = '${editionId}'`
      const before: unknown = await run(`SELECT * FROM ${table} WHERE ${of}`)
      await expect(run(`UPDATE ${table} SET ${column} = 'x' WHERE ${of}`)).rejects.toThrow('in a draft only')
      await expect(run(`DELETE FROM ${table} WHERE ${of}`)).rejects.toThrow('in a draft only')
      const drafted = `firm_id = '${firmId}' AND edition_id = '${draftId}'`
      await expect(run(`UPDATE ${table} SET edition_id = '${editionId}' WHERE ${drafted}`)).rejects.toThrow()
      const columns: { name: string }[] = await run(
        `SELECT column_name AS name FROM information_schema.columns WHERE table_schema = DATABASE() AND table_name = '${table}'`,
      )
      const values = columns.map(({ name }) => {
        if (name === 'edition_id') return `'${editionId}'`
        if (name === 'id') return 'UUID()'
        return name === 'code' || name === 'item' ? "'steel.bar.6'" : name
      })
      const copied = `INSERT INTO ${table} (${columns.map(({ name }) => name).join()}) SELECT ${values.join()} FROM ${table} WHERE ${drafted} LIMIT 1`
      await expect(run(copied)).rejects.toThrow()
      expect(await run(`SELECT * FROM ${table} WHERE ${of}`)).toEqual(before)
    },
  )

  it('keeps what is stated of it, whoever tries', async () => {
    const { firmId } = await signedIn(server, 'estimator')
    const id = await makeEdition(server, firmId)
    const changes: Partial<EditionEntity>[] = [{ holdsOverheads: false }, { reason: 'x' }, { corrects: 3 }, { stateReason: 'x' }]
    for (const change of changes)
      await expect(server.db.manager.update(EditionEntity, { firmId, id }, change)).rejects.toThrow('never edited')
    await server.db.manager.update(EditionEntity, { firmId, id }, { state: 'withdrawn', stateReason: 'wrong' })
    await expect(server.db.manager.update(EditionEntity, { firmId, id }, { state: 'superseded' })).rejects.toThrow('never edited')
  })
})

function keptStates(): readonly EditionState[] {
  return ['checked', 'published', 'superseded', 'withdrawn']
}
