import type { Express, Router } from 'express'
import { v7 } from 'uuid'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ContactEntity } from '../../server/entities/dispatch/ContactEntity'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { LevelEntity } from '../../server/entities/project/LevelEntity'
import { ProjectEntity } from '../../server/entities/project/ProjectEntity'
import { ProjectShareEntity } from '../../server/entities/project/ProjectShareEntity'
import { RateOverrideEntity } from '../../server/entities/project/RateOverrideEntity'
import { SchemeEntity } from '../../server/entities/project/SchemeEntity'
import { role, type Role } from '../../shared/contracts/person'
import { clientOf, makeBlock, makeFirm, makePerson, type TestPerson } from '../support/factories'
import { importMatching, makeCommittedImport } from '../support/committedImport'
import { makePricedEdition } from '../support/pricedDraft'
import { blockQuotation, fixers, sampleBlock, material, plainRate } from '../support/samplePrices'
import { sampleLevel, sampleProject, sampleRibbed, sampleSolid } from '../support/sampleProject'
import { TestClient, type Method } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

/** What stands in a firm when somebody asks: one project shared with the asker, one other person, one edition. */
interface Place {
  readonly firmId: string
  readonly projectId: string
  readonly levelId: string
  readonly ribbedId: string
  readonly solidId: string
  readonly editionId: string
  readonly bookId: string
  readonly contactId: string
  readonly otherId: string
  /** A draft with resources, a gang, quotations and a built-up rate. */
  readonly draftId: string
  readonly resource: string
  readonly gang: string
  readonly quotationId: string
  readonly blockId: string
  /** An import into the draft that is put in. */
  readonly importId: string
}

interface Row {
  readonly method: Method
  readonly path: string
  /** Who may; everybody who is signed in; anybody at all. */
  readonly may: readonly Role[] | 'signedIn' | 'anybody'
  /** Status for those who may. */
  readonly ok: number
  readonly body?: (place: Place) => unknown
  readonly version?: number
}

const PARTICULARS = { baseDate: '2026-11-01', validUntil: null, taxBasis: 'before tax', note: '', holdsOverheads: true }
const EVERYBODY = 'signedIn'
const BEARERS = 'anybody'
const token = 'A'.repeat(43)

const ROWS: readonly Row[] = [
  { method: 'post', path: '/session', may: BEARERS, ok: 400 },
  { method: 'post', path: '/session/refresh', may: BEARERS, ok: 401 },
  { method: 'get', path: '/session', may: EVERYBODY, ok: 200 },
  { method: 'delete', path: '/session', may: EVERYBODY, ok: 204 },
  { method: 'post', path: '/password-resets', may: BEARERS, ok: 202, body: () => ({ email: 'nobody@example.test' }) },
  {
    method: 'post',
    path: '/password-resets/redeem',
    may: BEARERS,
    ok: 400,
    body: () => ({ token, password: 'a long enough password' }),
  },
  {
    method: 'post',
    path: '/invitations/redeem',
    may: BEARERS,
    ok: 400,
    body: () => ({ token, name: 'N', password: 'a long enough password' }),
  },
  { method: 'get', path: '/projects', may: ['surveyor', 'estimator', 'developer', 'engineer'], ok: 200 },
  { method: 'post', path: '/projects', may: ['surveyor'], ok: 201, body: () => sampleProject() },
  { method: 'get', path: '/projects/:projectId', may: ['surveyor'], ok: 200 },
  { method: 'put', path: '/projects/:projectId', may: ['surveyor'], ok: 200, version: 1, body: () => sampleProject() },
  { method: 'get', path: '/projects/:projectId/readers', may: ['surveyor'], ok: 200 },
  {
    method: 'put',
    path: '/projects/:projectId/readers',
    may: ['surveyor'],
    ok: 200,
    version: 1,
    body: () => ({ personIds: [] }),
  },
  { method: 'get', path: '/projects/:projectId/reading', may: ['surveyor', 'developer', 'engineer'], ok: 200 },
  { method: 'post', path: '/projects/:projectId/levels', may: ['surveyor'], ok: 201, body: () => sampleLevel({ mark: 'L2' }) },
  {
    method: 'put',
    path: '/projects/:projectId/levels/:levelId',
    may: ['surveyor'],
    ok: 200,
    version: 1,
    body: () => sampleLevel(),
  },
  { method: 'delete', path: '/projects/:projectId/levels/:levelId', may: ['surveyor'], ok: 204, version: 1 },
  { method: 'post', path: '/projects/:projectId/schemes', may: ['surveyor'], ok: 201, body: () => sampleSolid('S2') },
  {
    method: 'put',
    path: '/projects/:projectId/schemes/:solidId',
    may: ['surveyor'],
    ok: 200,
    version: 1,
    body: () => sampleSolid(),
  },
  { method: 'delete', path: '/projects/:projectId/schemes/:solidId', may: ['surveyor'], ok: 204, version: 1 },
  {
    method: 'post',
    path: '/projects/:projectId/overrides/concrete.slab',
    may: ['surveyor'],
    ok: 201,
    body: () => ({ rate: '151.20', reason: 'tender of a supplier' }),
  },
  {
    method: 'put',
    path: '/projects/:projectId/overrides/formwork.edge',
    may: ['surveyor'],
    ok: 200,
    version: 1,
    body: () => ({ rate: '9.10', reason: 'tender of a supplier' }),
  },
  { method: 'delete', path: '/projects/:projectId/overrides/formwork.edge', may: ['surveyor'], ok: 204, version: 1 },
  { method: 'get', path: '/projects/:projectId/contacts', may: ['surveyor'], ok: 200 },
  {
    method: 'post',
    path: '/projects/:projectId/contacts',
    may: ['surveyor'],
    ok: 201,
    body: () => ({ name: 'C', email: 'c@example.test' }),
  },
  { method: 'get', path: '/projects/:projectId/dispatches', may: ['surveyor'], ok: 200 },
  {
    method: 'post',
    path: '/projects/:projectId/dispatches',
    may: ['surveyor'],
    ok: 201,
    body: ({ contactId, ribbedId, solidId }) => ({ contactId, ribbedSchemeId: ribbedId, solidSchemeId: solidId, note: '' }),
  },
  { method: 'get', path: '/dispatches', may: ['client', 'developer', 'engineer', 'surveyor'], ok: 200 },
  { method: 'get', path: '/dispatches/:otherId/report.pdf', may: EVERYBODY, ok: 404 },
  { method: 'get', path: '/dispatches/:otherId/report.html', may: EVERYBODY, ok: 404 },
  { method: 'post', path: '/appraisals/preview', may: EVERYBODY, ok: 400 },
  { method: 'get', path: '/rate-books', may: ['surveyor', 'estimator'], ok: 200 },
  {
    method: 'post',
    path: '/rate-books',
    may: ['estimator'],
    ok: 201,
    body: () => ({ region: 'Somewhere else', currency: 'USD' }),
  },
  {
    method: 'post',
    path: '/rate-books/:bookId/editions',
    may: ['estimator'],
    ok: 201,
    body: ({ editionId }) => ({ from: editionId, isCorrection: true, reason: 'because', particulars: PARTICULARS }),
  },
  { method: 'get', path: '/editions/:editionId', may: ['surveyor', 'estimator'], ok: 200 },
  { method: 'put', path: '/editions/:draftId', may: ['estimator'], ok: 200, version: 1, body: () => PARTICULARS },
  { method: 'delete', path: '/editions/:draftId', may: ['estimator'], ok: 204, version: 1 },
  {
    method: 'post',
    path: '/editions/:draftId/steps',
    may: ['estimator'],
    ok: 200,
    version: 1,
    body: () => ({ step: 'check', reason: '' }),
  },
  { method: 'get', path: '/editions/:editionId/resources', may: ['surveyor', 'estimator'], ok: 200 },
  { method: 'post', path: '/editions/:draftId/resources', may: ['estimator'], ok: 201, body: () => material('new') },
  { method: 'get', path: '/editions/:editionId/resources/:resource', may: ['surveyor', 'estimator'], ok: 200 },
  {
    method: 'put',
    path: '/editions/:draftId/resources/:resource',
    may: ['estimator'],
    ok: 200,
    version: 1,
    body: ({ resource }) => material(resource),
  },
  { method: 'delete', path: '/editions/:draftId/resources/:resource', may: ['estimator'], ok: 204, version: 1 },
  {
    method: 'post',
    path: '/editions/:editionId/resources/:resource/preview',
    may: ['surveyor', 'estimator'],
    ok: 200,
    body: ({ resource }) => material(resource),
  },
  {
    method: 'put',
    path: '/editions/:draftId/resources/:resource/choice',
    may: ['estimator'],
    ok: 200,
    version: 1,
    body: ({ quotationId }) => ({ quotation: quotationId }),
  },
  {
    method: 'post',
    path: '/editions/:editionId/resources/:resource/choice/preview',
    may: ['surveyor', 'estimator'],
    ok: 200,
    body: () => ({ quotation: null }),
  },
  { method: 'get', path: '/editions/:editionId/gangs', may: ['surveyor', 'estimator'], ok: 200 },
  { method: 'post', path: '/editions/:draftId/gangs', may: ['estimator'], ok: 201, body: () => fixers('new') },
  {
    method: 'put',
    path: '/editions/:draftId/gangs/:gang',
    may: ['estimator'],
    ok: 200,
    version: 1,
    body: ({ gang }) => fixers(gang),
  },
  { method: 'delete', path: '/editions/:draftId/gangs/:gang', may: ['estimator'], ok: 409, version: 1 },
  {
    method: 'post',
    path: '/editions/:editionId/gangs/:gang/preview',
    may: ['surveyor', 'estimator'],
    ok: 200,
    body: ({ gang }) => fixers(gang),
  },
  { method: 'post', path: '/editions/:draftId/quotations', may: ['estimator'], ok: 201, body: () => blockQuotation() },
  {
    method: 'put',
    path: '/editions/:draftId/quotations/:quotationId',
    may: ['estimator'],
    ok: 200,
    version: 1,
    body: () => blockQuotation(),
  },
  { method: 'delete', path: '/editions/:draftId/quotations/:quotationId', may: ['estimator'], ok: 204, version: 1 },
  { method: 'get', path: '/editions/:editionId/build-up/steel.bar.12', may: ['surveyor', 'estimator'], ok: 200 },
  { method: 'post', path: '/editions/:draftId/rates/formwork.edge', may: ['estimator'], ok: 201, body: () => plainRate('m') },
  {
    method: 'put',
    path: '/editions/:draftId/rates/steel.bar.12',
    may: ['estimator'],
    ok: 200,
    version: 1,
    body: () => plainRate('t'),
  },
  { method: 'delete', path: '/editions/:draftId/rates/steel.bar.12', may: ['estimator'], ok: 204, version: 1 },
  { method: 'get', path: '/editions/:editionId/workbook', may: ['surveyor', 'estimator'], ok: 200 },
  { method: 'get', path: '/editions/:editionId/tables/rates', may: ['surveyor', 'estimator'], ok: 200 },
  { method: 'get', path: '/editions/:draftId/imports', may: ['estimator'], ok: 200 },
  { method: 'post', path: '/editions/:draftId/imports', may: ['estimator'], ok: 400 },
  { method: 'get', path: '/imports/:importId', may: ['estimator'], ok: 200 },
  { method: 'get', path: '/imports/:importId/rows', may: ['estimator'], ok: 200 },
  {
    method: 'put',
    path: '/imports/:importId/matching',
    may: ['estimator'],
    ok: 409,
    body: () => importMatching(),
  },
  { method: 'post', path: '/imports/:importId/commit', may: ['estimator'], ok: 409, body: () => ({ leaveOutRefused: true }) },
  { method: 'post', path: '/imports/:importId/undo', may: ['estimator'], ok: 200 },
  { method: 'get', path: '/blocks', may: ['surveyor', 'estimator'], ok: 200 },
  { method: 'post', path: '/blocks', may: ['estimator'], ok: 201, body: () => sampleBlock() },
  { method: 'put', path: '/blocks/:blockId', may: ['estimator'], ok: 200, version: 1, body: () => sampleBlock() },
  { method: 'delete', path: '/blocks/:blockId', may: ['estimator'], ok: 204, version: 1 },
  { method: 'get', path: '/people', may: ['admin'], ok: 200 },
  {
    method: 'post',
    path: '/people',
    may: ['admin'],
    ok: 201,
    body: () => ({ name: 'New', email: `${v7()}@example.test`, roles: ['surveyor'] }),
  },
  {
    method: 'put',
    path: '/people/:otherId',
    may: ['admin'],
    ok: 200,
    version: 1,
    body: () => ({ roles: ['surveyor'], state: 'invited' }),
  },
  { method: 'post', path: '/people/:otherId/invitation', may: ['admin'], ok: 200 },
]

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

/** A firm with one person for each role, and a project shared with all of them, with everything that hangs on it. */
async function makePlace(): Promise<{ place: Place; people: Map<Role, TestPerson> }> {
  const firmId = await makeFirm(server)
  const people = new Map<Role, TestPerson>()
  for (const asking of role.options) people.set(asking, await makePerson(server, firmId, [asking]))
  const { manager } = server.db
  const other = await makePerson(server, firmId, ['surveyor'], { state: 'invited' })
  const { editionId } = await makePricedEdition(server, firmId, 'published')
  const { editionId: draftId, quotationId } = await makePricedEdition(server, firmId)
  const { bookId } = await manager.findOneByOrFail(EditionEntity, { firmId, id: editionId })
  const importId = await makeCommittedImport(server, firmId, draftId, other.id)
  const prices = { editionId, bookId, draftId, quotationId, importId, resource: 'block', gang: 'gang.fixer' }
  const [projectId, levelId, ribbedId, solidId, contactId] = [v7(), v7(), v7(), v7(), v7()]
  const of = { firmId, projectId }
  const now = new Date()
  const stamps = { totals: [], createdAt: now, updatedAt: now, updatedBy: other.id }
  await manager.insert(ProjectEntity, { ...sampleProject({ editionId }), ...stamps, firmId, id: projectId })
  await manager.insert(LevelEntity, { ...sampleLevel(), ...of, id: levelId, position: 0 })
  await manager.insert(SchemeEntity, [
    { ...sampleRibbed(), ...of, id: ribbedId, position: 0, mark: 'R1' },
    { ...sampleSolid(), ...of, id: solidId, position: 1, mark: 'S1' },
  ])
  await manager.insert(
    ProjectShareEntity,
    [...people.values()].map(({ id }) => ({ ...of, personId: id })),
  )
  const blockId = await makeBlock(server, firmId)
  const override = { item: 'formwork.edge', rate: '9', reason: 'tender', changedBy: other.id, changedAt: now } as const
  await manager.insert(RateOverrideEntity, { ...of, ...override })
  await manager.insert(ContactEntity, { ...of, id: contactId, name: 'Contact', email: 'contact@example.test', createdAt: now })
  return { place: { firmId, projectId, levelId, ribbedId, solidId, contactId, blockId, otherId: other.id, ...prices }, people }
}

async function ask(client: TestClient, row: Row, place: Place) {
  const path = row.path.replace(/:(\w+)/g, (_, name: keyof Place) => place[name])
  const body = row.body?.(place) ?? (row.method === 'post' ? {} : undefined)
  return await client.call(row.method, `/api${path}`, {
    ...(body ? { body } : {}),
    ...(row.version ? { version: row.version } : {}),
  })
}

describe('access', () => {
  const needSession = ROWS.filter(({ may }) => may !== 'anybody')
  const mayRole = (row: Row, asking: Role) => row.may === 'signedIn' || row.may === 'anybody' || row.may.includes(asking)

  it.each(ROWS)('to $method $path is open to exactly the roles of its row', async (row) => {
    const { place, people } = await makePlace()
    const refusedFirst = [...role.options].sort((a, b) => Number(mayRole(row, a)) - Number(mayRole(row, b)))
    for (const asking of refusedFirst) {
      const answer = await ask(await clientOf(server, people.get(asking)!), row, place)
      expect({ asking, status: answer.status }).toEqual({ asking, status: mayRole(row, asking) ? row.ok : 403 })
      if (answer.status >= 400) expect(answer.error.requestId).not.toBe('')
    }
  })

  it.each(needSession)('to $method $path is answered 401 without a session', async (row) => {
    const answer = await ask(new TestClient(server.app), row, (await makePlace()).place)
    expect(answer.error.code).toBe('unauthenticated')
  })

  const withIds = needSession.filter(({ path }) => path.includes(':'))
  it.each(withIds)("to $method $path is answered for another firm's ids as if they were not there", async (row) => {
    const { place: there } = await makePlace()
    const { place: here } = await makePlace()
    const client = await clientOf(server, await makePerson(server, here.firmId, role.options))
    const absent = Object.fromEntries(Object.keys(there).map((name) => [name, v7()])) as unknown as Place
    const [foreign, missing] = [await ask(client, row, there), await ask(client, row, absent)]
    expect(foreign.status).toBe(404)
    expect({ ...foreign.error, requestId: '' }).toEqual({ ...missing.error, requestId: '' })
    expect(await server.db.manager.countBy(LevelEntity, { firmId: there.firmId, version: 1 })).toBe(1)
    expect(await server.db.manager.countBy(SchemeEntity, { firmId: there.firmId, version: 1 })).toBe(2)
  })

  const nested = ROWS.filter(({ path }) => /:projectId\/\w+\/:/.test(path))
  it.each(nested)("to $method $path does not reach another firm's row through a project of one's own", async (row) => {
    const { place: there } = await makePlace()
    const { place: here } = await makePlace()
    const client = await clientOf(server, await makePerson(server, here.firmId, role.options))
    expect((await ask(client, row, { ...there, projectId: here.projectId })).status).toBe(404)
    expect(await server.db.manager.countBy(LevelEntity, { firmId: there.firmId, version: 1 })).toBe(1)
    expect(await server.db.manager.countBy(SchemeEntity, { firmId: there.firmId, version: 1 })).toBe(2)
  })
})

interface Layer {
  readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> }
  readonly handle: { readonly stack?: readonly Layer[] }
}

/** Every route of the application, as the framework has them. */
function routesOf(layers: readonly Layer[]): string[] {
  return layers.flatMap(({ route, handle }) => [
    ...(route ? Object.keys(route.methods).map((method) => `${method} ${route.path}`) : []),
    ...routesOf(handle.stack ?? []),
  ])
}

describe('the matrix', () => {
  const shape = (path: string) =>
    path.replace(/(?<=\/tables)\/rates|\/(:\w+|steel\.bar\.12|formwork\.edge|concrete\.slab)/g, '/:id')
  const OUTSIDE_API = ['get /livez', 'get /readyz', 'get /{*path}']

  it('has a row for every route of the application, and no other', () => {
    const stack = (server.app as Express & { router: Router & { stack: Layer[] } }).router.stack
    const routes = routesOf(stack).map(shape)
    const rows = ROWS.map(({ method, path }) => shape(`${method} ${path}`))
    expect([...new Set(routes)].sort()).toEqual([...new Set([...rows, ...OUTSIDE_API])].sort())
  })

  it('leaves nothing else open: an address that is not there needs a session too', async () => {
    expect((await new TestClient(server.app).get('/api/nothing')).status).toBe(401)
    const client = await clientOf(server, await makePerson(server, await makeFirm(server), ['admin']))
    expect((await client.get('/api/nothing')).error.code).toBe('not_found')
  })
})
