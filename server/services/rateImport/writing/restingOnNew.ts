import { IsNull, Not, type EntityManager } from 'typeorm'
import { GangEntity } from '../../../entities/rates/GangEntity'
import { QuotationEntity } from '../../../entities/rates/QuotationEntity'
import { RateEntity } from '../../../entities/rates/RateEntity'
import type { RateImportWriteEntity } from '../../../entities/rates/RateImportWriteEntity'
import { ResourceEntity } from '../../../entities/rates/ResourceEntity'
import { namedResources, type InEdition } from '../../rates/buildUpPricesOf'
import { findByCodes } from '../checking/standingRows'

/** Build-ups, gangs and quotations that rest on resources an import made, and resources that take its quotations' price. */
export async function restingOnNew(
  tx: EntityManager,
  of: InEdition,
  writes: readonly RateImportWriteEntity[],
): Promise<string[]> {
  const made = (kind: 'resource' | 'quotation') =>
    new Set(writes.filter((write) => write.kind === kind && write.before === null).map(({ target }) => target))
  const [codes, quotations] = [made('resource'), made('quotation')]
  const written = new Set(writes.filter(({ kind }) => kind === 'resource').map(({ target }) => target))
  const rates = await tx.findBy(RateEntity, { ...of, buildUp: Not(IsNull()) })
  const gangs = await tx.findBy(GangEntity, of)
  const later = (await findByCodes(tx, QuotationEntity, of, 'resource', [...codes])).filter(({ id }) => !quotations.has(id))
  const chosen = (await tx.findBy(ResourceEntity, { ...of, quotationId: Not(IsNull()) })).filter(
    ({ code, quotationId }) => !written.has(code) && quotations.has(quotationId ?? ''),
  )
  return [
    ...rates.filter(({ buildUp }) => buildUp !== null && namedResources(buildUp).some((code) => codes.has(code))).map(({ item }) => `the rate of ${item}`), // prettier-ignore
    ...gangs.filter(({ members }) => members.some(({ resource }) => codes.has(resource))).map(({ code }) => `the gang ${code}`),
    ...later.map(({ supplier, resource }) => `the quotation of ${supplier} for ${resource}`),
    ...chosen.map(({ code }) => `the price of ${code}`),
  ]
}
