import type { Rate } from '#shared/contracts/rateBook'
import type { RateEntity } from '../../entities/rates/RateEntity'
import { plainDecimal } from '../decimalText'

/** A stored rate as the contract has it. */
export function toRate(row: RateEntity): Rate {
  const { item, description, unit, low, likely, high, source, sourceDate, buildUp, version } = row
  const price = { low: plainDecimal(low), likely: plainDecimal(likely), high: plainDecimal(high) }
  return { item, description, unit, ...price, source, sourceDate, buildUp, version }
}
