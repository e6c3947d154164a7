import { z } from 'zod'
import type { ExportTable, ImportMatching, ImportRowPage, ImportRowState, RateImport } from '#shared/contracts/rateImport'
import { importRowPage, rateImport } from '#shared/contracts/rateImport'
import { request } from './http'

const addressOf = (id: string): string => `/api/imports/${id}`

/** Imports of an edition, newest first. */
export const listImports = (editionId: string): Promise<RateImport[]> =>
  request(z.array(rateImport), 'GET', `/api/editions/${editionId}/imports`)

/** Sends a list; the server reads it afterwards. */
export function uploadList(editionId: string, file: File, idempotencyKey: string): Promise<RateImport> {
  const form = new FormData()
  form.set('file', file, file.name)
  return request(rateImport, 'POST', `/api/editions/${editionId}/imports`, { form, idempotencyKey })
}

export const readImport = (id: string): Promise<RateImport> => request(rateImport, 'GET', addressOf(id))

/** Begins to check the rows; nothing is put in. */
export const matchImport = (id: string, matching: ImportMatching): Promise<RateImport> =>
  request(rateImport, 'PUT', `${addressOf(id)}/matching`, { body: matching })

/** A page of the preview, of one state or of all. */
export function listImportRows(id: string, state: ImportRowState | null, page: number): Promise<ImportRowPage> {
  const asked = new URLSearchParams({ page: String(page), ...(state === null ? {} : { state }) })
  return request(importRowPage, 'GET', `${addressOf(id)}/rows?${asked.toString()}`)
}

/** Begins to put the new and changed rows in. */
export const commitImport = (id: string, leaveOutRefused: boolean): Promise<RateImport> =>
  request(rateImport, 'POST', `${addressOf(id)}/commit`, { body: { leaveOutRefused } })

export const undoImport = (id: string): Promise<RateImport> => request(rateImport, 'POST', `${addressOf(id)}/undo`, { body: {} })

/** Where an edition is had as a workbook. */
export const workbookAddress = (editionId: string): string => `/api/editions/${editionId}/workbook`

/** Where one of its tables is had as CSV. */
export const tableAddress = (editionId: string, table: ExportTable): string => `/api/editions/${editionId}/tables/${table}`
