import fc from 'fast-check'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ContactEntity } from '../../server/entities/dispatch/ContactEntity'
import { LevelEntity } from '../../server/entities/project/LevelEntity'
import { ProjectEntity } from '../../server/entities/project/ProjectEntity'
import { apiError } from '../../shared/contracts/apiError'
import { project } from '../../shared/contracts/project'
import { signedIn } from '../support/factories'
import { sampleLevel, sampleProject, sampleRibbed, sampleSolid } from '../support/sampleProject'
import type { Answer, Method, TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
let client: TestClient
let firmId: string
let id: string
beforeAll(async () => {
  server = await openTestServer()
  ;({ client, firmId } = await signedIn(server, 'surveyor', 'admin'))
  id = (await client.post('/api/projects', sampleProject())).as(project).id
})
afterAll(() => server.close())

/** Values that a hostile or careless caller sends instead of what belongs there. */
const HOSTILE: readonly unknown[] = [
  null,
  true,
  0,
  -1,
  1e9,
  1e308,
  0.1,
  '',
  '0',
  'NaN',
  '-0',
  "'; DROP TABLE project; -- ",
  '<img src=x onerror=alert(1)>',
  '\u0000',
  '\ud800',
  '‮',
  'a\r\nBcc: b@example.test',
  'x'.repeat(5000),
  [],
  [[]],
  {},
  { $ne: null },
  { toString: 'x' },
  { constructor: { prototype: {} } },
]

/** Every place of a JSON value, as a way to put another value there. */
function placesOf(value: unknown): ((other: unknown) => unknown)[] {
  if (Array.isArray(value)) {
    return value.flatMap((item, index) => [
      (other: unknown) => value.with(index, other),
      ...placesOf(item).map((put) => (other: unknown) => value.with(index, put(other))),
    ])
  }
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, item]) => [
    (other: unknown) => ({ ...value, [key]: other }),
    ...placesOf(item).map((put) => (other: unknown) => ({ ...value, [key]: put(other) })),
  ])
}

function expectRefusedOrTaken(answer: Answer, what: unknown): void {
  const told = `${answer.status} ${JSON.stringify(what).slice(0, 300)}`
  expect(answer.status, told).toBeLessThan(500)
  if (answer.status < 400) return
  const error = apiError.parse(answer.body)
  expect(JSON.stringify(error), told).not.toMatch(/SELECT|INSERT|node_modules|\.ts:|at async/)
}

const preview = () => ({
  format: 'bothways.appraisal/1',
  brief: sampleProject().brief,
  levels: [{ mark: 'L1', repeat: 1, panels: sampleLevel().panels }],
  schemes: [sampleRibbed().specification, sampleSolid().specification],
})
const BODIES: readonly [string, Method, string, () => unknown][] = [
  ['a project', 'post', '/api/projects', () => sampleProject()],
  ['a level', 'post', '/api/projects/:id/levels', () => sampleLevel({ mark: 'H1' })],
  ['a scheme', 'post', '/api/projects/:id/schemes', () => sampleRibbed('H1')],
  ['a contact', 'post', '/api/projects/:id/contacts', () => ({ name: 'C', email: 'c@example.test' })],
  ['an invitation', 'post', '/api/people', () => ({ name: 'P', email: 'p@example.test', roles: ['engineer'] })],
  ['readers', 'put', '/api/projects/:id/readers', () => ({ personIds: [] })],
  ['a sign-in', 'post', '/api/session', () => ({ email: 'h@example.test', password: 'x' })],
  ['a reset', 'post', '/api/password-resets/redeem', () => ({ token: 'A'.repeat(43), password: 'some long password' })],
]

describe('hostile input', () => {
  it.each(BODIES)(
    'in any field of %s is refused or taken as text, never a fault of ours',
    { timeout: 120_000 },
    async (_what, method, path, body) => {
      const sound = body()
      const places = placesOf(sound)
      const tries = places.flatMap((put, place) =>
        HOSTILE.filter((_, kind) => (kind + place) % 4 === 0 || places.length < 6).map(put),
      )
      for (const hostile of tries) {
        const answer = await client.call(method, path.replace(':id', id), { body: hostile, version: 1 })
        expectRefusedOrTaken(answer, hostile)
      }
    },
  )

  it('in a file to be appraised is refused, each with the field', { timeout: 120_000 }, async () => {
    for (const [place, put] of placesOf(preview()).entries()) {
      const hostile = put(HOSTILE[place % HOSTILE.length])
      const answer = await client.post('/api/appraisals/preview', hostile)
      expectRefusedOrTaken(answer, hostile)
      if (answer.status === 400) expect(answer.error.issues?.length).toBeGreaterThan(0)
    }
  })

  it('of any JSON at all is never a fault of ours', { timeout: 120_000 }, async () => {
    await fc.assert(
      fc.asyncProperty(fc.constantFrom(...BODIES), fc.jsonValue(), async ([, method, path], body) => {
        if (typeof body !== 'object' || body === null) return
        expectRefusedOrTaken(await client.call(method, path.replace(':id', id), { body, version: 1 }), body)
      }),
      { numRuns: 150, seed: 7 },
    )
  })

  it.each([
    ['broken', '{"name":'],
    ['no object', '"text"'],
    ['NaN', '{"name":NaN}'],
    ['an infinite number', '{"name":1e999}'],
    ['nested deeply', `${'['.repeat(20_000)}${']'.repeat(20_000)}`],
    ['nested deeply in a field', `{"name":${'{"a":'.repeat(10_000)}1${'}'.repeat(10_000)}}`],
    ['with __proto__', '{"__proto__":{"isAdmin":true},"name":"x"}'],
    ['with a field twice', '{"name":"x","name":5}'],
    ['not UTF-8', Buffer.from([0x7b, 0x22, 0xff, 0xfe, 0x22, 0x3a, 0x31, 0x7d])],
    ['empty', ''],
  ])('as a body that is %s is answered 400', async (_what, text) => {
    for (const path of ['/api/projects', `/api/projects/${id}/levels`, '/api/appraisals/preview']) {
      const answer = await client.call('post', path, { headers: { 'Content-Type': 'application/json' }, body: text })
      expect(answer.status, path).toBe(400)
      expect(answer.error.code).toBe('invalid_request')
    }
  })

  it.each(['%00', '%zz', '..%2f..%2fetc', "' OR 1=1", '0', 'null', '00000000-0000-0000-0000-00000000000g', 'x'.repeat(3000)])(
    'as id %j is answered 400 or 404',
    async (text) => {
      for (const path of [
        `/api/projects/${text}`,
        `/api/editions/${text}`,
        `/api/projects/${text}/reading`,
        `/api/projects/${id}/levels/${text}`,
      ]) {
        const answer = await client.call(path.includes('levels') ? 'delete' : 'get', path, { version: 1 })
        expect([400, 404], path).toContain(answer.status)
        expect(answer.error.requestId).not.toBe('')
      }
    },
  )

  it('in headers and query is no fault of ours', async () => {
    const odd: Record<string, string>[] = [
      { 'If-Match': '"99999999999999999999"' },
      { 'Idempotency-Key': '\u00e9' },
      { Cookie: 'bothways-access=%E0%A4%A' },
    ]
    for (const headers of odd) {
      expect((await client.call('post', '/api/projects', { headers, body: sampleProject() })).status).toBeLessThan(500)
    }
    expect((await client.get('/api/projects?a[]=1&__proto__[x]=1&%E0%A4%A')).status).toBe(200)
  })

  it('left the tables as they were', async () => {
    expect(await server.db.manager.countBy(ProjectEntity, { firmId, id, name: 'Alder Row' })).toBe(1)
    const levels = await server.db.manager.findBy(LevelEntity, { firmId })
    for (const { repeat, panels } of levels) expect(repeat * panels.length).toBeLessThanOrEqual(1000)
    for (const { email } of await server.db.manager.findBy(ContactEntity, { firmId })) expect(email).toBe('c@example.test')
  })
})
