import { exportTable } from '#shared/contracts/rateImport'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { attachment } from '../middleware/attachment'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { editionSheets } from '../services/editionExport/editionSheets'
import { exportedEdition, type ExportedEdition } from '../services/editionExport/exportedEdition'
import { writeTable } from '../services/editionExport/writeTable'
import { writeWorkbook } from '../services/editionExport/writeWorkbook'

const WORKBOOK = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet'

const nameOf = ({ edition }: ExportedEdition): string => `${edition.region}, edition ${edition.number}`

/** Editions as workbooks and as text of columns. */
export function exportRoutes(db: EntityManager): Router {
  return Router()
    .get('/editions/:id/workbook', async (request, response) => {
      const exported = await exportedEdition(db, whoOf(response), idOf(request, 'id'))
      const sheets = editionSheets(exported)
      attachment(response, WORKBOOK, `${nameOf(exported)}.xlsx`)
      await writeWorkbook(sheets, response)
    })
    .get('/editions/:id/tables/:table', async (request, response) => {
      const table = parse(exportTable, request.params.table, 'table')
      const exported = await exportedEdition(db, whoOf(response), idOf(request, 'id'))
      const sheet = editionSheets(exported).find(({ name }) => name === table)!
      attachment(response, 'text/csv; charset=utf-8', `${nameOf(exported)}, ${table}.csv`)
      await writeTable(sheet, response)
    })
}
