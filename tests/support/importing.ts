import request from 'supertest'
import { setTimeout as pause } from 'node:timers/promises'
import {
  importRowPage,
  rateImport,
  type ImportCommit,
  type ImportMatching,
  type ImportRow,
  type RateImport,
} from '../../shared/contracts/rateImport'
import { clientOf, sessionCookie, type TestPerson } from './factories'
import type { TestServer } from './testServer'

const UNDER_WAY = ['reading', 'checking', 'committing']

/** An estimator at the import sheet of one draft. */
export interface ImportSheet {
  upload(name: string, content: Buffer | string): Promise<request.Response>
  /** Uploads and waits until the file is read. */
  read(name: string, content: Buffer | string): Promise<RateImport>
  /** Matches as the file proposes, but for `changed`, and waits for the preview. */
  preview(read: RateImport, changed?: Partial<ImportMatching>): Promise<RateImport>
  rows(id: string, query?: string): Promise<ImportRow[]>
  commit(id: string, input?: ImportCommit): Promise<RateImport>
  settled(id: string): Promise<RateImport>
}

/** What a list says as it is read, on its first sheet that looks like one. */
export function proposedOf({ sheets }: RateImport): ImportMatching {
  const sheet = sheets.findIndex(({ proposed }) => proposed !== null)
  const proposed = sheets[sheet]?.proposed
  if (!proposed) throw new Error('no sheet of the file looks like a list')
  return { ...proposed, sheet, defaults: { kind: 'material', unit: '', supplier: '', day: '2026-10-01' } }
}

export async function openImportSheet(server: TestServer, person: TestPerson, editionId: string): Promise<ImportSheet> {
  const client = await clientOf(server, person)
  const cookie = await sessionCookie(server, person)
  async function settled(id: string): Promise<RateImport> {
    for (;;) {
      const found = (await client.get(`/api/imports/${id}`)).as(rateImport)
      if (!UNDER_WAY.includes(found.state)) return found
      await pause(30)
    }
  }
  const upload = (name: string, content: Buffer | string) =>
    request(server.app)
      .post(`/api/editions/${editionId}/imports`)
      .set('Cookie', cookie)
      .set('X-Requested-With', 'bothways')
      .attach('file', Buffer.from(content as string), name)
  return {
    upload: async (name, content) => await upload(name, content),
    async read(name, content) {
      return await settled(rateImport.parse((await upload(name, content)).body).id)
    },
    async preview(read, changed = {}) {
      const answer = await client.put(`/api/imports/${read.id}/matching`, { ...proposedOf(read), ...changed })
      return await settled(answer.as(rateImport).id)
    },
    async rows(id, query = '') {
      return (await client.get(`/api/imports/${id}/rows${query}`)).as(importRowPage).rows
    },
    async commit(id, input = { leaveOutRefused: false }) {
      return await settled((await client.post(`/api/imports/${id}/commit`, input)).as(rateImport).id)
    },
    settled,
  }
}
