import { v7 } from 'uuid'
import { GangEntity } from '../../server/entities/rates/GangEntity'
import { QuotationEntity } from '../../server/entities/rates/QuotationEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { ResourceEntity } from '../../server/entities/rates/ResourceEntity'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { buildUp } from '../../shared/contracts/buildUp'
import type { EditionState } from '../../shared/contracts/rateBook'
import { makeEdition } from './factories'
import type { TestServer } from './testServer'

/** Ids of what a priced edition holds. */
export interface PricedEdition {
  readonly editionId: string
  readonly quotationId: string
  readonly secondQuotationId: string
}

/** Bars and a steel fixer at 14 kg an hour: 900 × 1.02 + 7 ÷ 0.014 = 1418 a tonne. */
export const BARS = buildUp.parse({
  materials: [{ resource: 'bar', quantity: '1', wastePercent: '2' }],
  labour: [{ gang: 'gang.fixer', basis: 'output', value: '0.014' }],
  plant: [],
})

const RESOURCES = [
  { code: 'bar', kind: 'material', description: 'High-yield bars', unit: 't', price: ['850', '900', '1000'] },
  { code: 'block', kind: 'material', description: 'Hollow block', unit: 'nr', price: ['0.75', '0.8', '0.9'] },
  { code: 'fixer', kind: 'labour', description: 'Steel fixer', unit: 'h', price: ['6', '7', '8'] },
  { code: 'pump', kind: 'plant', description: 'Concrete pump', unit: 'h', price: ['50', '60', '70'] },
] as const

/**
 * A draft, or an edition in a later state, with four resources (`bar`, `block`, `fixer`, `pump`), the gang `gang.fixer`, two quotations
 * for blocks (80 for 100, 105 for 120; none chosen) and a built-up rate of 12 mm bars.
 */
export async function makePricedEdition(
  server: TestServer,
  firmId: string,
  state: EditionState = 'draft',
): Promise<PricedEdition> {
  const editionId = await makeEdition(server, firmId, 'draft', 'formwork.edge')
  const { manager } = server.db
  const of = { firmId, editionId }
  await manager.insert(
    ResourceEntity,
    RESOURCES.map(({ price: [low, likely, high], ...own }) => ({
      ...{ ...own, ...of, low, likely, high, source: 'Price list', sourceDate: '2026-08-01' },
    })),
  )
  await manager.insert(GangEntity, {
    ...of,
    code: 'gang.fixer',
    description: 'A fixer',
    members: [{ resource: 'fixer', count: '1' }],
  })
  const [quotationId, secondQuotationId] = [v7(), v7()]
  const quoted = { ...of, resource: 'block', day: '2026-08-10', validUntil: null }
  await manager.insert(QuotationEntity, [
    { ...quoted, id: quotationId, supplier: 'First kiln', price: '80', contains: '100', reference: 'Q1' },
    { ...quoted, id: secondQuotationId, supplier: 'Second kiln', price: '105', contains: '120', reference: '' },
  ])
  const price = { low: '1301.57', likely: '1418', high: '1591.43' }
  await manager.update(RateEntity, { ...of, item: 'steel.bar.12' }, { ...price, unit: 't', buildUp: BARS })
  if (state !== 'draft') await manager.update(EditionEntity, { firmId, id: editionId }, { state })
  return { editionId, quotationId, secondQuotationId }
}
