/**
 * How long 50,000 rows take from the upload of a workbook to the rates that move, on a MariaDB of this run alone, and how long another
 * person waits for an answer meanwhile. Run: `npx vitest run --config tests/bench/vitest.config.ts rateImport`.
 */
import { afterAll, beforeAll, expect, it } from 'vitest'
import { rateImport } from '../../shared/contracts/rateImport'
import { workbookOf } from '../support/awkwardFiles'
import { clientOf, makeFirm, makePerson } from '../support/factories'
import { openImportSheet } from '../support/importing'
import { makePricedEdition } from '../support/pricedDraft'
import { openTestServer, type TestServer } from '../support/testServer'

const ROWS = 50_000
let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

const list = async (price: number): Promise<Buffer> =>
  await workbookOf((book) => {
    const sheet = book.addWorksheet('List')
    sheet.addRow(['Price list'])
    sheet.addRow(['Code', 'Description', 'Unit', 'Price', 'Low', 'High'])
    sheet.addRow(['bar', 'Bars', 't', price, price, price])
    for (let at = 1; at < ROWS; at++) sheet.addRow([`C-${at}`, `Thing number ${at}`, 'kg', price + at / 100, 1, 9000])
  })

it('puts 50,000 rows in, changes them, and takes the change back', async () => {
  const firmId = await makeFirm(server)
  const person = await makePerson(server, firmId, ['estimator'])
  const { editionId } = await makePricedEdition(server, firmId)
  const sheet = await openImportSheet(server, person, editionId)
  const client = await clientOf(server, person)
  const [first, second] = [await list(900), await list(901)]
  const figures: Record<string, string> = {}
  const waits: number[] = []
  async function timed<T>(name: string, work: () => Promise<T>): Promise<T> {
    const begun = performance.now()
    const answer = await work()
    figures[name] = `${((performance.now() - begun) / 1000).toFixed(1)} s`
    return answer
  }
  let isOver = false
  const other = (async () => {
    while (!isOver) {
      const begun = performance.now()
      await client.get('/api/rate-books')
      waits.push(performance.now() - begun)
      await new Promise((resolve) => setTimeout(resolve, 50))
    }
  })()
  const read = await timed('read', () => sheet.read('list.xlsx', first))
  const preview = await timed('preview of new rows', () => sheet.preview(read))
  expect(preview.counts).toMatchObject({ new: ROWS - 1, refused: 0 })
  await timed('put in', () => sheet.commit(preview.id))
  const again = await sheet.read('list.xlsx', second)
  const changed = await timed('preview of changes', () => sheet.preview(again))
  expect(changed.counts).toMatchObject({ changed: ROWS })
  await timed('change', () => sheet.commit(changed.id))
  const undone = await timed('undo', () => client.post(`/api/imports/${changed.id}/undo`, {}))
  expect(undone.as(rateImport).state).toBe('undone')
  const workbook = await timed('export', () => client.get(`/api/editions/${editionId}/workbook`))
  expect(workbook.status).toBe(200)
  isOver = true
  await other
  waits.sort((a, b) => a - b)
  const [middle, worst] = [waits[Math.floor(waits.length / 2)]!, waits.at(-1)!]
  figures['another waits'] = `${middle.toFixed(0)} ms in the middle, ${worst.toFixed(0)} ms at most, ${waits.length} answers`
  process.stdout.write(`${JSON.stringify(figures, null, 2)}\n`)
}, 600_000)
