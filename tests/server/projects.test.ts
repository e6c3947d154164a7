import { v7 } from 'uuid'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { AuditEntity } from '../../server/entities/AuditEntity'
import { LevelEntity } from '../../server/entities/project/LevelEntity'
import { ProjectEntity } from '../../server/entities/project/ProjectEntity'
import { SchemeEntity } from '../../server/entities/project/SchemeEntity'
import { project, projectSheet, projectSummary, storedLevel, storedScheme } from '../../shared/contracts/project'
import { projectReaders } from '../../shared/contracts/projectReaders'
import { clientOf, makeBlock, makeEdition, makeFirm, makePerson, signedIn } from '../support/factories'
import { sampleLevel, sampleProject, sampleRibbed, sampleSolid } from '../support/sampleProject'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

async function surveyorWithProject() {
  const surveyor = await signedIn(server, 'surveyor')
  const made = (await surveyor.client.post('/api/projects', sampleProject())).as(project)
  return { ...surveyor, made, at: `/api/projects/${made.id}` }
}

const declared = (change: object) => ({
  scheme: 'R1',
  entry: 'ceiling',
  state: 'priced',
  rate: '7.2',
  per: 'grossArea',
  ...change,
})
const carbon = (change: object) => ({
  material: 'concrete',
  modules: 'A1-A3',
  value: 250,
  unit: 'm³',
  source: 'invented',
  date: '2026-09-01',
  ...change,
})

describe('a project', () => {
  it('is stored as it was typed, by whom and when, in the firm of who typed it', async () => {
    const { client, firmId } = await signedIn(server, 'surveyor')
    const input = sampleProject({ name: 'Ölberg <b>“9”</b> 🏗️', place: '' })
    const answer = await client.post('/api/projects', input)
    expect(answer.status).toBe(201)
    expect(answer.headers['etag']).toBe('"1"')
    expect(answer.as(project)).toMatchObject({ ...input, version: 1, updatedBy: 'Terry Test' })
    const row = await server.db.manager.findOneByOrFail(ProjectEntity, { firmId, id: answer.as(project).id })
    expect(row.name).toBe(input.name)
  })

  it('keeps what is declared of the scope and typed as factors, guarded by its version', async () => {
    const { client, at, made } = await surveyorWithProject()
    const input = sampleProject({
      reference: made.reference,
      scope: [
        { scheme: 'R1', entry: 'ceiling', state: 'priced', rate: '7.2', per: 'grossArea', note: 'plaster' },
        { scheme: 'S1', entry: 'ceiling', state: 'leftOut', note: 'painted' },
      ],
      factors: {
        labour: { leastGang: 12 },
        carbon: [{ material: 'blocks', modules: 'A1-A3', value: 2, unit: 'nr', source: 'invented', date: '2026-09-01' }],
      },
    })
    expect((await client.put(at, input)).error.code).toBe('version_required')
    expect((await client.put(at, input, 1)).as(project)).toMatchObject({ ...input, version: 2 })
    expect((await client.put(at, { ...input, scope: [] }, 1)).error.code).toBe('stale')
    const { project: stored } = (await client.get(at)).as(projectSheet)
    expect({ scope: stored.scope, factors: stored.factors }).toEqual({ scope: input.scope, factors: input.factors })
  })

  it('stored before it had a scope and factors is read with none declared and the proposed outputs', async () => {
    const { client, at, made } = await surveyorWithProject()
    await server.db.query('UPDATE project SET scope = NULL, factors = NULL WHERE id = ?', [made.id])
    const { project: read } = (await client.get(at)).as(projectSheet)
    const { scope, factors, measurement } = sampleProject()
    expect(read).toMatchObject({ scope, factors, measurement })
    expect(scope).toEqual([])
  })

  it('changes by its version, which rises by one', async () => {
    const { client, at, made } = await surveyorWithProject()
    const input = sampleProject({ name: 'Renamed', reference: made.reference })
    const answer = await client.put(at, input, 1)
    expect(answer.as(project)).toMatchObject({ ...input, version: 2 })
    expect(answer.headers['etag']).toBe('"2"')
    expect((await client.get(at)).as(projectSheet).project.version).toBe(2)
  })

  it('asks for the version, and answers 412 to a stale one without changing the row', async () => {
    const { client, at, made } = await surveyorWithProject()
    const changed = (name: string) => sampleProject({ name, reference: made.reference })
    expect((await client.put(at, changed('A'))).error.code).toBe('version_required')
    expect((await client.put(at, changed('B'), 1)).status).toBe(200)
    const stale = await client.put(at, changed('C'), 1)
    expect(stale.status).toBe(412)
    expect(stale.error.code).toBe('stale')
    expect((await client.get(at)).as(projectSheet).project.name).toBe('B')
  })

  it('takes one of many changes made at the same moment', async () => {
    const { client, at, made } = await surveyorWithProject()
    const answers = await Promise.all(
      Array.from({ length: 12 }, (_, run) => client.put(at, sampleProject({ name: `N${run}`, reference: made.reference }), 1)),
    )
    const statuses = answers.map(({ status }) => status)
    expect(statuses.filter((status) => status === 200)).toHaveLength(1)
    expect(statuses.filter((status) => status === 412)).toHaveLength(11)
    const winner = answers.find(({ status }) => status === 200)!.as(project).name
    expect((await client.get(at)).as(projectSheet).project).toMatchObject({ name: winner, version: 2 })
  })

  it.each(['1', '"0"', '"x"', '*', '"1", "2"', 'W/"1"'])('refuses If-Match %s, naming the header', async (header) => {
    const { client, at } = await surveyorWithProject()
    const answer = await client.put(at, sampleProject(), undefined, { headers: { 'If-Match': header } })
    expect(answer.status).toBe(400)
    expect(answer.error.issues?.[0]?.path).toBe('If-Match')
  })

  it('has a reference of its own in the firm, and may share it with another firm', async () => {
    const { client, made } = await surveyorWithProject()
    const twice = await client.post('/api/projects', sampleProject({ reference: made.reference }))
    expect(twice.status).toBe(409)
    expect(twice.error.issues).toEqual([{ path: 'reference', message: expect.any(String) as string }])
    const other = (await client.post('/api/projects', sampleProject())).as(project)
    const taken = await client.put(`/api/projects/${other.id}`, sampleProject({ reference: made.reference }), 1)
    expect(taken.error.code).toBe('conflict')
    const elsewhere = await signedIn(server, 'surveyor')
    expect((await elsewhere.client.post('/api/projects', sampleProject({ reference: made.reference }))).status).toBe(201)
  })

  it('is priced by a published edition of the firm only', async () => {
    const { client, firmId, made, at } = await surveyorWithProject()
    const other = await makeFirm(server)
    for (const editionId of [v7(), await makeEdition(server, other), await makeEdition(server, firmId, 'draft')]) {
      const created = await client.post('/api/projects', sampleProject({ editionId }))
      expect(created.error.issues?.[0]?.path).toBe('editionId')
      const changed = await client.put(at, sampleProject({ editionId, reference: made.reference }), 1)
      expect(changed.error.issues?.[0]?.path).toBe('editionId')
    }
    const editionId = await makeEdition(server, firmId)
    expect((await client.put(at, sampleProject({ editionId, reference: made.reference }), 1)).status).toBe(200)
    expect((await client.get(at)).as(projectSheet).edition?.rates.length).toBeGreaterThan(20)
    const audit = await server.db.manager.findBy(AuditEntity, { firmId, event: 'project.pricesChanged' })
    expect(audit.map(({ detail }) => detail['to'])).toMatchObject([{ editionId }])
  })

  it('keeps its edition when that is superseded', async () => {
    const { client, firmId } = await signedIn(server, 'surveyor')
    const editionId = await makeEdition(server, firmId)
    const input = sampleProject({ editionId })
    const { id } = (await client.post('/api/projects', input)).as(project)
    await server.db.query("UPDATE edition SET state = 'superseded' WHERE id = ?", [editionId])
    expect((await client.put(`/api/projects/${id}`, { ...input, name: 'Later' }, 1)).status).toBe(200)
    expect((await client.post('/api/projects', sampleProject({ editionId }))).error.issues?.[0]?.path).toBe('editionId')
  })

  it.each<[string, unknown, string]>([
    ['a number as name', { name: 5 }, 'name'],
    ['an empty name', { name: '  ' }, 'name'],
    ['two lines of name', { name: 'a\nb' }, 'name'],
    ['a long name', { name: 'x'.repeat(121) }, 'name'],
    ['an unknown use', { use: 'Z' }, 'use'],
    ['text as load', { brief: { ...sampleProject().brief, imposedLoad: '2' } }, 'brief.imposedLoad'],
    ['a negative load', { brief: { ...sampleProject().brief, imposedLoad: -1 } }, 'brief.imposedLoad'],
    ['a brief without cover', { brief: { ...sampleProject().brief, cover: undefined } }, 'brief.cover'],
    ['an unknown basis', { brief: { basis: 'EN9999' } }, 'brief.basis'],
    ['a field of the other basis', { brief: { ...sampleProject().brief, fcu: 30 } }, 'brief.fcu'],
    ['a number as markup', { markups: { ...sampleProject().markups, taxPercent: 8 } }, 'markups.taxPercent'],
    ['no id', { editionId: 'x' }, 'editionId'],
    ['rules of measuring that are not there', { measurement: 'x' }, 'measurement'],
    ['a scope entry that is not there', { scope: [declared({ entry: 'x' })] }, 'scope.0.entry'],
    ['an entry priced at nothing', { scope: [declared({ rate: '0.00' })] }, 'scope.0.rate'],
    [
      'an entry left out without a word',
      { scope: [{ scheme: 'R1', entry: 'deck', state: 'leftOut', note: '' }] },
      'scope.0.note',
    ],
    ['an entry declared twice', { scope: [declared({}), declared({ rate: '9' })] }, 'scope.1.entry'],
    ['a labour output of nothing', { factors: { labour: { mesh: { value: 0, source: 'x' } } } }, 'factors.labour.mesh.value'],
    ['an output without a source', { factors: { labour: { mesh: { value: 1, source: '' } } } }, 'factors.labour.mesh.source'],
    ['half a person', { factors: { labour: { leastGang: 2.5 } } }, 'factors.labour.leastGang'],
    ['carbon of concrete by the piece', { factors: { carbon: [carbon({ unit: 'nr' })] } }, 'factors.carbon.0.unit'],
    ['waste of carrying', { factors: { carbon: [carbon({ modules: 'A4', wastePercent: 3 })] } }, 'factors.carbon.0.wastePercent'],
    ['concrete used again', { factors: { carbon: [carbon({ uses: 8 })] } }, 'factors.carbon.0.uses'],
    ['a day that is not there', { factors: { carbon: [carbon({ date: '2026-02-30' })] } }, 'factors.carbon.0.date'],
    ['one carbon factor twice', { factors: { carbon: [carbon({}), carbon({ value: 9 })] } }, 'factors.carbon.1.material'],
    ['an unknown field', { colour: 'red' }, 'colour'],
    ['a version', { version: 7 }, 'version'],
  ])('is refused with %s, naming the field and what was expected', async (_what, change, path) => {
    const { client, firmId } = await signedIn(server, 'surveyor')
    const answer = await client.post('/api/projects', { ...sampleProject(), ...(change as object) })
    expect(answer.status).toBe(400)
    expect(answer.error.issues?.map((issue) => issue.path)).toContain(path)
    for (const { message } of answer.error.issues!) expect(message).toMatch(/expected/)
    expect(await server.db.manager.countBy(ProjectEntity, { firmId })).toBe(0)
  })
})

describe('a level', () => {
  it('is stored with its panels, changed and removed by its version', async () => {
    const { client, at, firmId } = await surveyorWithProject()
    const made = await client.post(`${at}/levels`, sampleLevel())
    expect(made.status).toBe(201)
    const level = made.as(storedLevel)
    expect(level).toEqual({ ...sampleLevel(), id: level.id, position: 0, version: 1 })
    const changed = (await client.put(`${at}/levels/${level.id}`, sampleLevel({ repeat: 5 }), 1)).as(storedLevel)
    expect(changed).toMatchObject({ repeat: 5, version: 2 })
    expect((await client.delete(`${at}/levels/${level.id}`, 1)).status).toBe(412)
    expect((await client.delete(`${at}/levels/${level.id}`)).status).toBe(428)
    expect((await client.delete(`${at}/levels/${level.id}`, 2)).status).toBe(204)
    expect((await client.delete(`${at}/levels/${level.id}`, 2)).status).toBe(404)
    expect(await server.db.manager.countBy(LevelEntity, { firmId })).toBe(0)
  })

  it('takes the next position, and a mark that no other level of the project has', async () => {
    const { client, at } = await surveyorWithProject()
    const first = (await client.post(`${at}/levels`, sampleLevel({ mark: 'A' }))).as(storedLevel)
    const second = (await client.post(`${at}/levels`, sampleLevel({ mark: 'B', panels: [] }))).as(storedLevel)
    expect([first.position, second.position]).toEqual([0, 1])
    expect((await client.post(`${at}/levels`, sampleLevel({ mark: 'A' }))).error.issues?.[0]?.path).toBe('mark')
    expect((await client.put(`${at}/levels/${second.id}`, sampleLevel({ mark: 'A' }), 1)).status).toBe(409)
    expect((await client.post(`${at}/levels`, sampleLevel({ mark: 'a' }))).status).toBe(201)
  })

  const [panel] = sampleLevel().panels
  const square = (x: number, y: number, size: number) => [
    [x, y],
    [x + size, y],
    [x + size, y + size],
    [x, y + size],
  ]
  it.each<[string, unknown, RegExp]>([
    [
      'an outline that crosses itself',
      {
        panels: [
          {
            ...panel,
            outline: [
              [0, 0],
              [6000, 5000],
              [6000, 0],
              [0, 5000],
            ],
          },
        ],
      },
      /^panels\.0\.outline/,
    ],
    ['a clockwise outline', { panels: [{ ...panel, outline: [...square(0, 0, 5000)].reverse() }] }, /^panels\.0\.outline/],
    ['a panel of no size', { panels: [{ ...panel, outline: square(0, 0, 0) }] }, /^panels\.0\.outline/],
    ['a void outside', { panels: [{ ...panel, voids: [square(9000, 0, 500)] }] }, /^panels\.0\.voids\.0/],
    ['panels that overlap', { panels: [panel, { ...panel, mark: 'P2' }] }, /^panels\.1/],
    ['two panels of one mark', { panels: [panel, { ...panel, outline: square(9000, 0, 5000) }] }, /^panels\.1\.mark/],
    ['a thousand million repeats', { repeat: 1e9 }, /^repeat$/],
    ['a thousand million repeats of a panel', { panels: [{ ...panel, repeat: 1e9 }] }, /^panels\.0\.repeat$/],
    ['half a repeat', { repeat: 0.5 }, /^repeat$/],
    [
      'text in an outline',
      {
        panels: [
          {
            ...panel,
            outline: [
              ['0', 0],
              [1, 0],
              [1, 1],
            ],
          },
        ],
      },
      /^panels\.0\.outline\.0\.0$/,
    ],
    [
      'null in an outline, as NaN is sent',
      {
        panels: [
          {
            ...panel,
            outline: [
              [Number.NaN, 0],
              [1, 0],
              [1, 1],
            ],
          },
        ],
      },
      /^panels\.0\.outline\.0\.0$/,
    ],
    ['more edges than corners', { panels: [{ ...panel, edges: Array(5).fill(panel!.edges[0]) }] }, /^panels\.0\.edges/],
    [
      'an unknown continuity',
      { panels: [{ ...panel, edges: [{ supportWidth: 1, continuity: 'perhaps' }] }] },
      /^panels\.0\.edges\.0\.continuity$/,
    ],
    ['501 panels', { panels: Array(501).fill(panel) }, /^panels$/],
  ])('with %s is refused, naming the field, and what is stored stays', async (_what, change, path) => {
    const { client, at } = await surveyorWithProject()
    const { id } = (await client.post(`${at}/levels`, sampleLevel())).as(storedLevel)
    for (const answer of [
      await client.post(`${at}/levels`, { ...sampleLevel({ mark: 'L2' }), ...(change as object) }),
      await client.put(`${at}/levels/${id}`, { ...sampleLevel(), ...(change as object) }, 1),
    ]) {
      expect(answer.status).toBe(400)
      expect(
        answer.error.issues!.some((issue) => path.test(issue.path)),
        JSON.stringify(answer.error.issues),
      ).toBe(true)
    }
    expect((await client.get(at)).as(projectSheet).levels).toMatchObject([{ ...sampleLevel(), version: 1 }])
  })

  it('may be as large as 2 MB, other bodies 100 kB', async () => {
    const { client, at } = await surveyorWithProject()
    const outline = Array.from({ length: 200 }, (_, corner) => [
      Math.round(50_000 * Math.cos((2 * Math.PI * corner) / 200) * 1000) / 1000,
      Math.round(50_000 * Math.sin((2 * Math.PI * corner) / 200) * 1000) / 1000,
    ])
    const panels = Array.from({ length: 200 }, (_, run) => ({
      ...panel,
      mark: `P${run}`,
      outline: outline.map(([x, y]) => [
        x! + 110_000 * (run % 8) - 400_000,
        y! + 35_000 * run * 0 + 110_000 * Math.floor(run / 8) - 900_000,
      ]),
    }))
    const fitting = panels.filter(({ outline: ring }) => ring.every(([, y]) => Math.abs(y!) < 1_000_000))
    const body = { ...sampleLevel(), panels: fitting }
    expect(JSON.stringify(body).length).toBeGreaterThan(300_000)
    expect((await client.post(`${at}/levels`, body)).status).toBe(201)
    const tooLarge = await client.post(`${at}/levels`, { ...sampleLevel({ mark: 'L2' }), name: 'x'.repeat(2_200_000) })
    expect(tooLarge.error.code).toBe('too_large')
    expect((await client.post('/api/projects', { ...sampleProject(), name: 'x'.repeat(110_000) })).error.code).toBe('too_large')
  })
})

describe('a scheme', () => {
  it('is stored, changed and removed by its version', async () => {
    const { client, at, firmId } = await surveyorWithProject()
    const blockId = await makeBlock(server, firmId)
    const made = (await client.post(`${at}/schemes`, sampleRibbed('R1', blockId))).as(storedScheme)
    expect(made).toEqual({ ...sampleRibbed('R1', blockId), id: made.id, position: 0, version: 1 })
    const solid = (await client.post(`${at}/schemes`, sampleSolid())).as(storedScheme)
    expect(solid.position).toBe(1)
    expect((await client.put(`${at}/schemes/${made.id}`, sampleSolid('R1'), 1)).as(storedScheme)).toMatchObject({
      version: 2,
      blockId: null,
    })
    expect((await client.put(`${at}/schemes/${made.id}`, sampleSolid('R1'), 1)).status).toBe(412)
    expect((await client.delete(`${at}/schemes/${made.id}`, 2)).status).toBe(204)
    expect(await server.db.manager.countBy(SchemeEntity, { firmId })).toBe(1)
  })

  it('has a mark of its own and a block of the firm', async () => {
    const { client, at, firmId } = await surveyorWithProject()
    await client.post(`${at}/schemes`, sampleRibbed('R1'))
    expect((await client.post(`${at}/schemes`, sampleSolid('R1'))).error.issues?.[0]?.path).toBe('specification.mark')
    const foreign = await makeBlock(server, await makeFirm(server))
    for (const input of [
      sampleRibbed('R2', foreign),
      sampleRibbed('R2', v7()),
      { ...sampleSolid('S1'), blockId: await makeBlock(server, firmId) },
    ]) {
      expect((await client.post(`${at}/schemes`, input)).error.issues?.[0]?.path).toBe('blockId')
    }
  })

  it('is the twentieth of a project at most, also when many come at once', async () => {
    const { client, at, firmId } = await surveyorWithProject()
    const answers = await Promise.all(
      Array.from({ length: 24 }, (_, run) => client.post(`${at}/schemes`, sampleSolid(`S${run}`))),
    )
    expect(answers.filter(({ status }) => status === 201)).toHaveLength(20)
    expect(answers.filter(({ status }) => status === 400)).toHaveLength(4)
    const rows = await server.db.manager.findBy(SchemeEntity, { firmId })
    expect(rows.map(({ position }) => position).sort((a, b) => a - b)).toEqual(Array.from({ length: 20 }, (_, place) => place))
  })
})

describe('readers', () => {
  it('are developers and engineers of the firm, set as a list by its own version', async () => {
    const { client, at, firmId, made } = await surveyorWithProject()
    const developer = await makePerson(server, firmId, ['developer'])
    const engineer = await makePerson(server, firmId, ['engineer'])
    const estimator = await makePerson(server, firmId, ['estimator'])
    const before = (await client.get(`${at}/readers`)).as(projectReaders)
    expect(before.people.map(({ id }) => id).sort()).toEqual([developer.id, engineer.id].sort())
    const after = (await client.put(`${at}/readers`, { personIds: [developer.id] }, 1)).as(projectReaders)
    expect(after.version).toBe(2)
    expect(after.people.filter(({ isReader }) => isReader).map(({ id }) => id)).toEqual([developer.id])
    expect((await client.put(`${at}/readers`, { personIds: [] }, 1)).status).toBe(412)
    const foreign = await makePerson(server, await makeFirm(server), ['developer'])
    for (const id of [estimator.id, foreign.id, v7()]) {
      expect((await client.put(`${at}/readers`, { personIds: [id] }, 2)).error.issues?.[0]?.path).toBe('personIds.0')
    }
    expect((await client.put(`${at}/readers`, { personIds: [developer.id, developer.id] }, 2)).status).toBe(400)
    const reading = await clientOf(server, developer)
    expect((await reading.get(`${at}/reading`)).status).toBe(200)
    expect((await (await clientOf(server, engineer)).get(`${at}/reading`)).status).toBe(404)
    expect((await client.get(at)).as(projectSheet).project.version).toBe(made.version)
  })
})

describe('the list', () => {
  it('shows each role what it may know', async () => {
    const { client, firmId, made, at } = await surveyorWithProject()
    const hidden = (await client.post('/api/projects', sampleProject())).as(project)
    const developer = await makePerson(server, firmId, ['developer'])
    const engineer = await makePerson(server, firmId, ['engineer'])
    await client.put(`${at}/readers`, { personIds: [developer.id, engineer.id] }, 1)
    const list = async (of: typeof client) => (await of.get('/api/projects')).as(projectSummary.array())
    const openable = async (of: typeof client) => (await list(of)).map(({ id, canOpen }) => [id, canOpen])
    expect(await openable(client)).toEqual([
      [hidden.id, true],
      [made.id, true],
    ])
    const estimator = await clientOf(server, await makePerson(server, firmId, ['estimator']))
    expect(await openable(estimator)).toEqual([
      [hidden.id, false],
      [made.id, false],
    ])
    expect(await openable(await clientOf(server, developer))).toEqual([[made.id, true]])
    expect(await openable(await clientOf(server, engineer))).toEqual([[made.id, true]])
    expect((await (await clientOf(server, await makePerson(server, firmId, ['admin']))).get('/api/projects')).status).toBe(403)
    expect(await list((await signedIn(server, 'surveyor')).client)).toEqual([])
  })

  it('counts levels and panels', async () => {
    const { client, at } = await surveyorWithProject()
    await client.post(`${at}/levels`, sampleLevel())
    await client.post(`${at}/levels`, sampleLevel({ mark: 'L2', panels: [] }))
    const [line] = (await client.get('/api/projects')).as(projectSummary.array())
    expect(line).toMatchObject({ levelCount: 2, panelCount: 1, edition: null, totals: [] })
  })
})
