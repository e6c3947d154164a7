import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { PersonEntity } from '../../server/entities/firm/PersonEntity'
import { LevelEntity } from '../../server/entities/project/LevelEntity'
import { ProjectEntity } from '../../server/entities/project/ProjectEntity'
import { OutboxEntity } from '../../server/entities/dispatch/OutboxEntity'
import { person } from '../../shared/contracts/person'
import { project, storedLevel } from '../../shared/contracts/project'
import { clientOf, makePerson, signedIn } from '../support/factories'
import { sampleLevel, sampleProject } from '../support/sampleProject'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

describe('a creating request with an Idempotency-Key', () => {
  it('sent fifty times at once makes one row and is answered alike fifty times', async () => {
    const { client, firmId } = await signedIn(server, 'surveyor')
    const input = sampleProject()
    const answers = await Promise.all(Array.from({ length: 50 }, () => client.post('/api/projects', input, { key: 'one' })))
    expect(answers.map(({ status }) => status)).toEqual(Array(50).fill(201))
    expect(new Set(answers.map((answer) => JSON.stringify(answer.as(project)))).size).toBe(1)
    expect(new Set(answers.map(({ headers }) => headers['etag']))).toEqual(new Set(['"1"']))
    expect(await server.db.manager.countBy(ProjectEntity, { firmId })).toBe(1)
  })

  it('gets its first answer again after the row was changed', async () => {
    const { client } = await signedIn(server, 'surveyor')
    const input = sampleProject()
    const first = (await client.post('/api/projects', input, { key: 'k' })).as(project)
    await client.put(`/api/projects/${first.id}`, { ...input, name: 'Later' }, 1)
    expect((await client.post('/api/projects', input, { key: 'k' })).as(project)).toEqual(first)
  })

  it('is refused with 422 when the key was used for another body or another address', async () => {
    const { client, firmId } = await signedIn(server, 'surveyor')
    const { id } = (await client.post('/api/projects', sampleProject(), { key: 'k' })).as(project)
    expect((await client.post('/api/projects', sampleProject(), { key: 'k' })).status).toBe(422)
    expect((await client.post(`/api/projects/${id}/levels`, sampleLevel(), { key: 'k' })).status).toBe(422)
    expect(await server.db.manager.countBy(LevelEntity, { firmId })).toBe(0)
  })

  it('is its person’s own: a colleague may use the same key', async () => {
    const { client, firmId } = await signedIn(server, 'surveyor')
    const colleague = await clientOf(server, await makePerson(server, firmId, ['surveyor']))
    const mine = (await client.post('/api/projects', sampleProject(), { key: 'k' })).as(project)
    const theirs = (await colleague.post('/api/projects', sampleProject(), { key: 'k' })).as(project)
    expect(theirs.id).not.toBe(mine.id)
  })

  it('is not remembered when it failed', async () => {
    const { client } = await signedIn(server, 'surveyor')
    const input = sampleProject()
    await client.post('/api/projects', input)
    expect((await client.post('/api/projects', input, { key: 'k' })).status).toBe(409)
    expect((await client.post('/api/projects', sampleProject(), { key: 'k' })).status).toBe(201)
  })

  it('works for levels and people too, and queues one mail', async () => {
    const { client, firmId } = await signedIn(server, 'surveyor', 'admin')
    const { id } = (await client.post('/api/projects', sampleProject())).as(project)
    const levels = await Promise.all([1, 2, 3].map(() => client.post(`/api/projects/${id}/levels`, sampleLevel(), { key: 'l' })))
    expect(new Set(levels.map((answer) => answer.as(storedLevel).id)).size).toBe(1)
    const invitation = { name: 'New', email: `new-${firmId}@example.test`, roles: ['engineer'] }
    const people = await Promise.all([1, 2, 3].map(() => client.post('/api/people', invitation, { key: 'p' })))
    expect(new Set(people.map((answer) => answer.as(person).id)).size).toBe(1)
    expect(await server.db.manager.countBy(PersonEntity, { firmId })).toBe(2)
    expect(await server.db.manager.countBy(OutboxEntity, { firmId })).toBe(1)
  })

  it.each(['', 'x'.repeat(201), 'a b'])('is refused with the key %j', async (key) => {
    const { client } = await signedIn(server, 'surveyor')
    expect((await client.post('/api/projects', sampleProject(), { key })).error.issues?.[0]?.path).toBe('Idempotency-Key')
  })
})
