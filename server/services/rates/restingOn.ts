import type { RestingOn } from '#shared/contracts/resourceSheet'
import { IsNull, Not, type EntityManager } from 'typeorm'
import { GangEntity } from '../../entities/rates/GangEntity'
import { RateEntity } from '../../entities/rates/RateEntity'
import { AppError } from '../../errors'
import { namedResources, type InEdition } from './buildUpPricesOf'

const builtRates = async (db: EntityManager, of: InEdition) =>
  await db.find(RateEntity, { where: { ...of, buildUp: Not(IsNull()) }, order: { item: 'ASC' } })

/** Rates whose build-ups name a resource, themselves or through a gang, and the gangs that it is a member of. */
export async function restingOnResource(db: EntityManager, of: InEdition, code: string): Promise<RestingOn> {
  const all = await db.find(GangEntity, { where: of, order: { code: 'ASC' } })
  const gangs = new Set(all.filter(({ members }) => members.some(({ resource }) => resource === code)).map((gang) => gang.code))
  const rates = (await builtRates(db, of)).filter(
    ({ buildUp }) =>
      buildUp !== null && (namedResources(buildUp).includes(code) || buildUp.labour.some(({ gang }) => gangs.has(gang))),
  )
  return { rates: rates.map(({ item }) => item), gangs: [...gangs] }
}

/** Rates whose build-ups name a gang. */
export async function restingOnGang(db: EntityManager, of: InEdition, code: string): Promise<RestingOn> {
  const rates = (await builtRates(db, of)).filter(({ buildUp }) => buildUp?.labour.some(({ gang }) => gang === code) ?? false)
  return { rates: rates.map(({ item }) => item), gangs: [] }
}

/** @throws AppError `conflict` that names what rests on it, where something does */
export function requireNothingRests({ rates, gangs }: RestingOn, path: string): void {
  const resting = [...rates.map((item) => `the rate of ${item}`), ...gangs.map((code) => `the gang ${code}`)]
  if (resting.length === 0) return
  const named = resting.length > 12 ? `${resting.slice(0, 12).join(', ')} and ${resting.length - 12} more` : resting.join(', ')
  throw new AppError('conflict', `Still in use: ${named}.`, [
    { path, message: `expected nothing that rests on it, got ${named}` },
  ])
}
