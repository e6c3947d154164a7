import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ProjectEntity } from '../../server/entities/project/ProjectEntity'
import { appraise } from '../../shared/appraise'
import { appraisal } from '../../shared/contracts/appraisalResult'
import { project, projectSheet, projectSummary, storedScheme } from '../../shared/contracts/project'
import { projectReading } from '../../shared/contracts/projectReading'
import { parseAppraisalFile } from '../../shared/parseAppraisalFile'
import { clientOf, makeEdition, makePerson, signedIn } from '../support/factories'
import { sampleLevel, sampleProject, sampleRibbed, sampleSolid } from '../support/sampleProject'
import type { TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

async function pricedProject() {
  const surveyor = await signedIn(server, 'surveyor')
  const editionId = await makeEdition(server, surveyor.firmId)
  const input = sampleProject({ editionId })
  const { id } = (await surveyor.client.post('/api/projects', input)).as(project)
  const at = `/api/projects/${id}`
  await surveyor.client.post(`${at}/levels`, sampleLevel())
  await surveyor.client.post(`${at}/schemes`, sampleRibbed())
  const solid = (await surveyor.client.post(`${at}/schemes`, sampleSolid())).as(storedScheme)
  const developer = await makePerson(server, surveyor.firmId, ['developer'])
  const engineer = await makePerson(server, surveyor.firmId, ['engineer'])
  await surveyor.client.put(`${at}/readers`, { personIds: [developer.id, engineer.id] }, 1)
  return {
    ...surveyor,
    id,
    at,
    input,
    solid,
    developer: await clientOf(server, developer),
    engineer: await clientOf(server, engineer),
  }
}

/** The stored project appraised here, apart from the server. */
async function appraisedApart(client: TestClient, at: string) {
  const sheet = (await client.get(at)).as(projectSheet)
  const file = parseAppraisalFile({
    format: 'bothways.appraisal/1',
    brief: sheet.project.brief,
    levels: sheet.levels.map(({ mark, repeat, panels }) => ({ mark, repeat, panels })),
    schemes: sheet.schemes.map(({ specification }) => specification),
    rates: {
      currency: sheet.edition!.currency,
      items: Object.fromEntries(sheet.edition!.rates.map(({ item, likely }) => [item, likely])),
      markups: sheet.project.markups,
    },
  })
  return { file, result: appraise(file) }
}

describe('a reading', () => {
  it('shows a developer all-in rates that make the same total, and no markup anywhere', async () => {
    const { client, developer, at, input } = await pricedProject()
    const answer = await developer.get(`${at}/reading`)
    const reading = answer.as(projectReading)
    const { result } = await appraisedApart(client, at)
    expect(reading.appraisal.schemes.map(({ cost }) => cost?.total)).toEqual(result.schemes.map(({ cost }) => cost?.total))
    for (const { cost } of reading.appraisal.schemes) {
      expect(cost?.markups).toEqual([])
      const cents = cost!.lines.reduce((sum, { amount }) => sum + Math.round(Number(amount) * 100), 0)
      expect(cents).toBe(Math.round(Number(cost!.total) * 100))
    }
    const text = JSON.stringify(answer.body)
    for (const word of ['Percent', 'preliminaries', 'contingency', 'low', 'high', input.editionId!])
      expect(text).not.toContain(`"${word}"`)
    const plain = result.schemes[0]!.cost!.lines.map(({ rate }) => rate)
    const allIn = reading.appraisal.schemes[0]!.cost!.lines.map(({ rate }) => rate)
    allIn.forEach((rate, line) => expect(Number(rate)).toBeGreaterThan(Number(plain[line])))
    expect(reading.appraisal.comparison?.ledger.at(-1)?.running).toBe(result.comparison?.ledger.at(-1)?.running)
  })

  it('shows an engineer sizes and checks and no money at all', async () => {
    const { engineer, at } = await pricedProject()
    const answer = await engineer.get(`${at}/reading`)
    const reading = answer.as(projectReading)
    expect(reading.appraisal.comparison).toBeNull()
    expect(reading.edition).toBeNull()
    for (const scheme of reading.appraisal.schemes) {
      expect(scheme.cost).toBeNull()
      expect(scheme.checks.length).toBeGreaterThan(0)
    }
    expect(JSON.stringify(answer.body)).not.toMatch(/"(rate|amount|currency|markups|editionId)"|"total":"/)
  })

  it('leaves out a scheme that cannot stand, and is empty while there is nothing', async () => {
    const { client, developer, at, solid } = await pricedProject()
    const wide = sampleRibbed('R2')
    await client.post(`${at}/schemes`, {
      ...wide,
      specification: { ...wide.specification, block: { length: 200, width: 2000, height: 200, mass: 15 }, edgeStrip: 4000 },
    })
    const reading = (await developer.get(`${at}/reading`)).as(projectReading)
    expect(reading.appraisal.schemes.map(({ mark }) => mark)).toEqual(['R1', solid.specification.mark])
    const empty = (await client.post('/api/projects', sampleProject())).as(project)
    const nothing = (await client.get(`/api/projects/${empty.id}/reading`)).as(projectReading)
    expect(nothing.appraisal).toMatchObject({ schemes: [], comparison: null })
  })

  it('is closed again when the project is no longer shared', async () => {
    const { client, developer, at } = await pricedProject()
    expect((await developer.get(`${at}/reading`)).status).toBe(200)
    await client.put(`${at}/readers`, { personIds: [] }, 2)
    expect((await developer.get(`${at}/reading`)).error.code).toBe('not_found')
  })
})

describe('totals in the list', () => {
  const totalsOf = async (client: TestClient, id: string) =>
    (await client.get('/api/projects')).as(projectSummary.array()).find((line) => line.id === id)!.totals

  it('are those of the engine, kept until the content changes, and never those of an earlier content', async () => {
    const { client, at, id, input, firmId, solid } = await pricedProject()
    const { result } = await appraisedApart(client, at)
    const expected = result.schemes.map(({ mark, kind, cost }) => ({ mark, kind, total: cost!.total }))
    expect(await totalsOf(client, id)).toEqual(expected)
    const row = await server.db.manager.findOneByOrFail(ProjectEntity, { firmId, id })
    expect(row.totals).toEqual(expected)
    expect(row.totalsVersion).toBe(row.contentVersion)

    await client.put(at, { ...input, markups: { ...input.markups, taxPercent: '20' } }, 1)
    const dearer = await totalsOf(client, id)
    expect(Number(dearer[0]!.total)).toBeGreaterThan(Number(expected[0]!.total))
    await client.delete(`${at}/schemes/${solid.id}`, 1)
    expect((await totalsOf(client, id)).map(({ mark }) => mark)).toEqual(['R1'])
  })

  it('are null where an item lacks a rate or no edition is chosen, rather than too small', async () => {
    const { client, at, id, input, firmId } = await pricedProject()
    await client.put(at, { ...input, editionId: null }, 1)
    expect((await totalsOf(client, id)).map(({ total }) => total)).toEqual([null, null])
    const editionId = await makeEdition(server, firmId, 'published', 'blocks.whole')
    await client.put(at, { ...input, editionId }, 2)
    expect((await totalsOf(client, id)).map(({ total }) => total)).toEqual([null, expect.any(String)])
  })

  it('are kept from engineers and given to estimators', async () => {
    const { id, engineer, developer, firmId } = await pricedProject()
    expect(await totalsOf(engineer, id)).toEqual([])
    const estimator = await clientOf(server, await makePerson(server, firmId, ['estimator']))
    expect((await totalsOf(estimator, id)).map(({ total }) => total)).toEqual([expect.any(String), expect.any(String)])
    expect((await totalsOf(developer, id)).map(({ total }) => total)).toEqual([expect.any(String), expect.any(String)])
  })
})

describe('a preview', () => {
  it('appraises a file as the engine does, and keeps nothing', async () => {
    const { client, at } = await pricedProject()
    const { file, result } = await appraisedApart(client, at)
    const answer = await client.post('/api/appraisals/preview', file)
    expect(answer.as(appraisal)).toEqual(result)
  })

  it.each<[string, (file: Record<string, unknown>) => unknown, RegExp]>([
    ['of another format', (file) => ({ ...file, format: 'x' }), /^format$/],
    ['without schemes', (file) => ({ ...file, schemes: [] }), /^schemes$/],
    ['with an unknown field', (file) => ({ ...file, extra: 1 }), /^extra$/],
    ['with 10⁹ repeats', (file) => ({ ...file, levels: [{ ...sampleLevelOf(file), repeat: 1e9 }] }), /^levels\.0\.repeat$/],
    ['with a clockwise outline', (file) => ({ ...file, levels: [clockwise(file)] }), /^levels\.0\.panels\.0\.outline/],
    ['that is a list', () => [], /^$/],
  ])('%s is refused with the field', async (_what, change, path) => {
    const { client, at } = await pricedProject()
    const { file } = await appraisedApart(client, at)
    const answer = await client.post('/api/appraisals/preview', change(file as unknown as Record<string, unknown>))
    expect(answer.status).toBe(400)
    expect(answer.error.issues!.map((issue) => issue.path)).toEqual(expect.arrayContaining([expect.stringMatching(path)]))
  })

  it('outside the scope of the rules is answered 422 with the field', async () => {
    const { client, at } = await pricedProject()
    const { file } = await appraisedApart(client, at)
    const panel = { ...file.levels[0]!.panels[0]!, edges: Array(4).fill({ supportWidth: 0, kind: 'beam', continuity: 'free' }) }
    const answer = await client.post('/api/appraisals/preview', { ...file, levels: [{ ...file.levels[0]!, panels: [panel] }] })
    expect(answer.status).toBe(422)
    expect(answer.error).toMatchObject({
      code: 'out_of_scope',
      issues: [{ path: expect.stringMatching(/^levels\.0\.panels\.0/) as string }],
    })
  })

  it('is 1 MB at most', async () => {
    const { client } = await signedIn(server, 'surveyor')
    expect((await client.post('/api/appraisals/preview', { format: 'x'.repeat(1_100_000) })).error.code).toBe('too_large')
  })
})

interface AnyFile {
  levels: { panels: { outline: unknown[] }[] }[]
}
const sampleLevelOf = (file: unknown) => (file as AnyFile).levels[0]!
function clockwise(file: unknown) {
  const level = sampleLevelOf(file)
  return { ...level, panels: level.panels.map((panel) => ({ ...panel, outline: [...panel.outline].reverse() })) }
}
