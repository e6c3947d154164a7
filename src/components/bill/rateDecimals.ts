import { minorUnit } from '#shared/pricing/minorUnit'

/** Decimals that a rate is printed with: its own, but never fewer than the currency's. */
export function rateDecimals(rate: string, currency: string): number {
  return Math.max(minorUnit(currency), rate.split('.')[1]?.length ?? 0)
}
