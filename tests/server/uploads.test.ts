import { mkdirSync, mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { createServer, request as httpRequest, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import request from 'supertest'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { RateImportEntity } from '../../server/entities/rates/RateImportEntity'
import { apiError } from '../../shared/contracts/apiError'
import { rateImport } from '../../shared/contracts/rateImport'
import { clientOf, makeFirm, makePerson, sessionCookie, type TestPerson } from '../support/factories'
import { openImportSheet } from '../support/importing'
import { makePricedEdition } from '../support/pricedDraft'
import { openTestServer, type TestServer } from '../support/testServer'

const LIST = 'code,description,unit,price\nA1,Sand,m³,30\n'
const MB = 1024 * 1024
let server: TestServer
let folder: string
let person: TestPerson
let path: string
let cookie: string
beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'bothways-uploads-'))
  server = await openTestServer({ dataFolder: folder })
})
afterAll(async () => {
  await server.close()
  rmSync(folder, { recursive: true, force: true })
})
beforeEach(async () => {
  mkdirSync(join(folder, 'imports'), { recursive: true })
  const firmId = await makeFirm(server)
  person = await makePerson(server, firmId, ['estimator'])
  path = `/api/editions/${(await makePricedEdition(server, firmId)).editionId}/imports`
  cookie = await sessionCookie(server, person)
})

const upload = () => request(server.app).post(path).set('Cookie', cookie).set('X-Requested-With', 'bothways')
const left = () => readdirSync(join(folder, 'imports')).filter((name) => name.endsWith('.upload'))

describe('a file that is sent', () => {
  it('needs the header that a form of another site cannot set, and our origin', async () => {
    const bare = await request(server.app).post(path).set('Cookie', cookie).attach('file', Buffer.from(LIST), 'a.csv')
    expect([bare.status, apiError.parse(bare.body).code]).toEqual([415, 'unsupported_media_type'])
    const foreign = await upload().set('Origin', 'http://other.example').attach('file', Buffer.from(LIST), 'a.csv')
    expect(foreign.status).toBe(403)
    const elsewhere = await request(server.app).post('/api/projects').set('Cookie', cookie).set('X-Requested-With', 'bothways').field('a', 'b') // prettier-ignore
    expect(elsewhere.status).toBe(415)
  })

  it('is one file in one field, of a kind that is read', async () => {
    const two = await upload().attach('file', Buffer.from(LIST), 'a.csv').attach('file', Buffer.from(LIST), 'b.csv')
    const other = await upload().attach('list', Buffer.from(LIST), 'a.csv')
    const field = await upload().field('a[b][c]', '1').attach('file', Buffer.from(LIST), 'a.csv')
    const kind = await upload().attach('file', Buffer.from(LIST), 'a.exe')
    const none = await upload().set('Content-Type', 'multipart/form-data; boundary=x').send('--x--\r\n')
    const broken = await upload().set('Content-Type', 'multipart/form-data; boundary=x').send('--x\r\nContent-Disp')
    for (const answer of [two, other, field, kind, none, broken]) {
      expect([answer.status, apiError.parse(answer.body).code]).toEqual([400, 'invalid_request'])
    }
    expect(left()).toEqual([])
  })

  it('of more than 20 MB is refused with 413 and leaves nothing on disk', async () => {
    const answer = await upload().attach('file', Buffer.alloc(21 * MB, 0x61), 'a.csv')
    expect([answer.status, apiError.parse(answer.body).code]).toEqual([413, 'too_large'])
    expect(left()).toEqual([])
  })

  it('twice with one key is one import', async () => {
    const send = () => upload().set('Idempotency-Key', 'once').attach('file', Buffer.from(LIST), 'a.csv')
    const answers = await Promise.all([send(), send()])
    expect(answers.map(({ status }) => status)).toEqual([202, 202])
    expect(new Set(answers.map(({ body }) => rateImport.parse(body).id)).size).toBe(1)
    expect(await server.db.manager.countBy(RateImportEntity, { firmId: person.firmId })).toBe(1)
    expect(left()).toEqual([])
  })

  it('keeps no path of its name', async () => {
    const answer = await upload().attach('file', Buffer.from(LIST), { filename: '../../etc/my\tlist.csv' })
    expect(rateImport.parse(answer.body).fileName).toBe('my list.csv')
  })
})

describe('200 MB that are streamed', () => {
  let listening: Server
  beforeAll(async () => {
    listening = createServer(server.app)
    await new Promise<void>((resolve) => listening.listen(0, '127.0.0.1', resolve))
  })
  afterAll(() => {
    listening.closeAllConnections()
    listening.close()
  })

  /** Sends a form in pieces without saying how long it is, until an answer comes. */
  async function stream(megabytes: number, stated?: number): Promise<{ status: number; body: unknown; sentMb: number }> {
    const { port } = listening.address() as AddressInfo
    const headers = {
      ...{ cookie, 'x-requested-with': 'bothways', 'content-type': 'multipart/form-data; boundary=x' },
      ...(stated === undefined ? { 'transfer-encoding': 'chunked' } : { 'content-length': String(stated) }),
    }
    return await new Promise((resolve, reject) => {
      let sentMb = 0
      let isAnswered = false
      const call = httpRequest({ port, host: '127.0.0.1', path, method: 'POST', headers, agent: false }, (response) => {
        isAnswered = true
        let text = ''
        response.setEncoding('utf8').on('data', (piece: string) => (text += piece))
        response.on('end', () => {
          call.destroy()
          resolve({ status: response.statusCode ?? 0, body: JSON.parse(text), sentMb })
        })
      })
      call.on('error', (cause) => (isAnswered ? undefined : reject(cause)))
      call.write('--x\r\nContent-Disposition: form-data; name="file"; filename="a.csv"\r\n\r\n')
      const piece = Buffer.alloc(MB, 0x61)
      const next = () => {
        if (isAnswered || sentMb >= megabytes) return
        sentMb += 1
        call.write(piece, () => setImmediate(next))
      }
      next()
    })
  }

  it('are refused with 413 once 20 MB are passed, and before that where the length is told', async () => {
    const unknown = await stream(200)
    expect([unknown.status, apiError.parse(unknown.body).code]).toEqual([413, 'too_large'])
    expect(unknown.sentMb).toBeLessThan(60)
    const told = await stream(200, 200 * MB)
    expect([told.status, apiError.parse(told.body).code]).toEqual([413, 'too_large'])
    expect(told.sentMb).toBeLessThan(20)
    await expect.poll(left).toEqual([])
  })

  it('leaves the server answering others while a large list is read', async () => {
    const editionId = path.split('/')[3]!
    const sheet = await openImportSheet(server, person, editionId)
    const many = Array.from({ length: 20_000 }, (_, index) => `code${index},Thing ${index},kg,${index}`)
    const uploaded = rateImport.parse((await sheet.upload('many.csv', ['code,description,unit,price', ...many].join('\n'))).body)
    const client = await clientOf(server, person)
    const times: number[] = []
    for (let turn = 0; turn < 10; turn++) {
      const begun = performance.now()
      expect((await client.get('/api/rate-books')).status).toBe(200)
      times.push(performance.now() - begun)
    }
    expect(times.sort((a, b) => a - b)[5]).toBeLessThan(1000)
    expect(await sheet.settled(uploaded.id)).toMatchObject({ state: 'matching', sheets: [{ rowCount: 20_001 }] })
  })
})
