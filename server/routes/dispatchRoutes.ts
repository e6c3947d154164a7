import { dispatchInput } from '#shared/contracts/dispatch'
import { Router } from 'express'
import type { EntityManager } from 'typeorm'
import { parse } from '../errors'
import { attachmentHeader } from '../middleware/attachmentHeader'
import { creatingRequest } from '../middleware/creatingRequest'
import { idOf } from '../middleware/idOf'
import { whoOf } from '../middleware/signedInOnly'
import { tellVersion } from '../middleware/version'
import type { PdfPrinter } from '../reports/pdfPrinter'
import type { AppraisalPool } from '../services/appraisal/appraisalPool'
import { readReportPage, readReportPdf } from '../services/dispatch/dispatchReport'
import { createDispatch, listDispatches, listReceived } from '../services/dispatch/dispatchService'

/** Comparisons sent by mail, and their reports. */
export function dispatchRoutes(db: EntityManager, appraisals: AppraisalPool, printer: PdfPrinter): Router {
  const router = Router()
    .get('/projects/:id/dispatches', async (request, response) => {
      response.json(await listDispatches(db, whoOf(response), idOf(request, 'id')))
    })
    .post('/projects/:id/dispatches', async (request, response) => {
      const projectId = idOf(request, 'id')
      const input = parse(dispatchInput, request.body)
      const made = await createDispatch(db, appraisals, whoOf(response), projectId, input, creatingRequest(request, input))
      tellVersion(response, made.version)
      response.status(201).json(made)
    })
    .get('/dispatches', async (_request, response) => {
      response.json(await listReceived(db, whoOf(response)))
    })
  addReports(router, db, printer)
  return router
}

/** Both forms of the report stand in a sandbox: whatever is in them, it cannot act for the reader. */
function addReports(router: Router, db: EntityManager, printer: PdfPrinter): void {
  router
    .get('/dispatches/:id/report.pdf', async (request, response) => {
      const { name, report } = await readReportPdf(db, printer, whoOf(response), idOf(request, 'id'))
      response
        .set('Content-Security-Policy', "sandbox; default-src 'none'")
        .set('Content-Disposition', attachmentHeader('attachment', name, 'pdf'))
        .type('application/pdf')
        .send(report)
    })
    .get('/dispatches/:id/report.html', async (request, response) => {
      const { name, report } = await readReportPage(db, whoOf(response), idOf(request, 'id'))
      const policy = [
        'sandbox',
        "default-src 'none'",
        `style-src 'sha256-${report.styleHash}'`,
        'font-src data:',
        "frame-ancestors 'self'",
      ]
      response
        .set('Content-Security-Policy', policy.join('; '))
        .set('Content-Disposition', attachmentHeader('inline', name, 'html'))
        .type('text/html')
        .send(report.document)
    })
}
