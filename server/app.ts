import cookieParser from 'cookie-parser'
import express, { Router, type Express } from 'express'
import type { DataSource } from 'typeorm'
import type { Env } from './env'
import { AppError } from './errors'
import type { Log } from './log'
import type { LocalInbox } from './mail/localInbox'
import { clientFiles } from './middleware/clientFiles'
import { errorHandler } from './middleware/errorHandler'
import { jsonBody } from './middleware/jsonBody'
import { requestLog } from './middleware/requestLog'
import { sameOriginOnly } from './middleware/sameOriginOnly'
import { securityHeaders } from './middleware/securityHeaders'
import { signedInOnly } from './middleware/signedInOnly'
import { createPdfPrinter, type PdfPrinter } from './reports/pdfPrinter'
import { appraisalRoutes } from './routes/appraisalRoutes'
import { blockRoutes } from './routes/blockRoutes'
import { contactRoutes } from './routes/contactRoutes'
import { dispatchRoutes } from './routes/dispatchRoutes'
import { exportRoutes } from './routes/exportRoutes'
import { healthRoutes } from './routes/healthRoutes'
import { importRoutes } from './routes/importRoutes'
import { localMailRoutes } from './routes/localMailRoutes'
import { overrideRoutes } from './routes/overrideRoutes'
import { passwordRoutes } from './routes/passwordRoutes'
import { personRoutes } from './routes/personRoutes'
import { projectRoutes } from './routes/projectRoutes'
import { priceRoutes } from './routes/priceRoutes'
import { rateRoutes } from './routes/rateRoutes'
import { editionRoutes } from './routes/editionRoutes'
import { resourceRoutes } from './routes/resourceRoutes'
import { sessionRoutes } from './routes/sessionRoutes'
import type { AppraisalPool } from './services/appraisal/appraisalPool'
import { createImportDesk, type ImportDesk } from './services/rateImport/importDesk'
import { importFiles } from './services/rateImport/importFiles'
import { createTableReader } from './services/rateImport/reading/tableReader'

/** What the application runs on. */
export interface Surroundings {
  readonly db: DataSource
  readonly env: Env
  readonly log: Log
  readonly appraisals: AppraisalPool
  /** Prints reports; absent: one of its own, started when it is first needed. */
  readonly printer?: PdfPrinter
  /** Works on imported price lists; absent: a desk of its own. */
  readonly imports?: ImportDesk
  /** Mail server of the local set-up; absent elsewhere, where `/mail` does not exist. */
  readonly inbox?: LocalInbox
  /** True once the server is about to stop. */
  readonly isDraining?: () => boolean
}

/** A desk for price lists in the data folder. */
export function importDeskOf({ db, env, log }: Pick<Surroundings, 'db' | 'env' | 'log'>): ImportDesk {
  const onFault = (cause: unknown) => log.error({ err: cause }, 'import failed')
  return createImportDesk(db.manager, createTableReader(), importFiles(env.dataFolder), onFault)
}

/** The API below `/api`: first what is open to everybody, then what needs a session. */
function api(surroundings: Surroundings): Router {
  const { db, env, appraisals, printer = createPdfPrinter(env.chromiumPath) } = surroundings
  const settings = { secret: env.sessionSecret, origin: env.origin }
  const { manager } = db
  return Router()
    .use((_request, response, next) => {
      response.set('Cache-Control', 'no-store')
      next()
    })
    .use(sessionRoutes(manager, settings, env.localMailFolder !== null))
    .use(passwordRoutes(manager, settings))
    .use(signedInOnly(manager, settings))
    .use(projectRoutes(manager, appraisals))
    .use(overrideRoutes(manager))
    .use(appraisalRoutes(manager, appraisals))
    .use(rateRoutes(manager))
    .use(blockRoutes(manager))
    .use(editionRoutes(manager))
    .use(resourceRoutes(manager))
    .use(priceRoutes(manager))
    .use(exportRoutes(manager))
    .use(importRoutes(manager, surroundings.imports ?? importDeskOf(surroundings)))
    .use(contactRoutes(manager))
    .use(dispatchRoutes(manager, appraisals, printer))
    .use(personRoutes(manager, env.origin))
    .use(absent)
}

function absent(): never {
  throw new AppError('not_found')
}

/** The whole application, not yet listening. The database must be initialised and migrated. */
export function createApp(surroundings: Surroundings): Express {
  const { db, env, log, inbox, isDraining = () => false } = surroundings
  const app = express()
  app.disable('x-powered-by').set('etag', false).set('trust proxy', env.trustedProxies).set('is https', env.isHttps)
  app.set('query parser', 'simple')
  app.use(requestLog(log))
  app.use(securityHeaders(env.isHttps))
  app.use(healthRoutes(db.manager, isDraining))
  app.use(sameOriginOnly(env.origin), jsonBody(), cookieParser())
  app.use('/api', api(surroundings))
  app.use('/mail', inbox ? localMailRoutes(inbox, env.origin) : absent)
  app.use(clientFiles(env.clientFolder))
  app.use(errorHandler(db.manager, log))
  return app
}
