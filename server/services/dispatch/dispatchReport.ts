import { IsNull, type EntityManager } from 'typeorm'
import { DispatchEntity } from '../../entities/dispatch/DispatchEntity'
import { AppError } from '../../errors'
import { frozenComparison, type FrozenComparison } from '../../reports/frozenComparison'
import type { PdfPrinter } from '../../reports/pdfPrinter'
import { reportPage, type ReportPage } from '../../reports/reportPage'
import { hasRole, type SignedIn } from '../session/signedIn'

/** Which dispatch of which firm. */
export interface DispatchKey {
  readonly firmId: string
  readonly id: string
}

/** Name of the report as a file, without its ending: project and reference. */
export function reportName({ project }: FrozenComparison): string {
  return `${project.name} ${project.reference}, built both ways`
}

/** What was sent. @throws AppError `not_found` */
export async function frozenOf(db: EntityManager, key: DispatchKey): Promise<FrozenComparison> {
  const row = await db.findOne(DispatchEntity, { select: { firmId: true, id: true, frozen: true }, where: { ...key } })
  if (row === null) throw new AppError('not_found')
  return frozenComparison.parse(row.frozen)
}

/** The dispatch, if the person may read its report: a surveyor of the firm, or whoever it was sent to. @throws AppError `not_found` */
async function requireReader(db: EntityManager, who: SignedIn, id: string): Promise<DispatchKey> {
  const key = { firmId: who.firmId, id }
  const isSurveyor = hasRole(who, 'surveyor')
  const isReader = hasRole(who, 'client', 'developer', 'engineer')
  const where = isSurveyor ? key : { ...key, contactEmail: who.email }
  if (!(isSurveyor || isReader) || !(await db.existsBy(DispatchEntity, where))) throw new AppError('not_found')
  return key
}

/**
 * The report as it went, or goes, with the mail: printed once and kept, so that everybody reads the same pages.
 * @throws AppError `limited` or `unavailable` when it cannot be printed now
 */
export async function dispatchPdf(db: EntityManager, printer: PdfPrinter, key: DispatchKey): Promise<Buffer> {
  const stored = () => db.findOne(DispatchEntity, { select: { firmId: true, id: true, pdf: true }, where: { ...key } })
  const kept = (await stored())?.pdf
  if (kept) return kept
  const { document } = reportPage(await frozenOf(db, key))
  await db.update(DispatchEntity, { ...key, pdf: IsNull() }, { pdf: await printer.print(document) })
  const pdf = (await stored())?.pdf
  if (!pdf) throw new AppError('not_found')
  return pdf
}

/** A report to be handed out, with the name it is saved under. */
export interface NamedReport<T> {
  readonly name: string
  readonly report: T
}

/** @throws AppError `not_found`, the same for another firm's dispatch and for one sent to somebody else */
export async function readReportPdf(
  db: EntityManager,
  printer: PdfPrinter,
  who: SignedIn,
  id: string,
): Promise<NamedReport<Buffer>> {
  const key = await requireReader(db, who, id)
  const report = await dispatchPdf(db, printer, key)
  return { name: reportName(await frozenOf(db, key)), report }
}

/** @throws AppError `not_found`, as `readReportPdf` */
export async function readReportPage(db: EntityManager, who: SignedIn, id: string): Promise<NamedReport<ReportPage>> {
  const key = await requireReader(db, who, id)
  const frozen = await frozenOf(db, key)
  return { name: reportName(frozen), report: reportPage(frozen) }
}
