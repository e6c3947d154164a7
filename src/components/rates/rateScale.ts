import type { Rate } from '#shared/contracts/rateBook'

/** One scale for the ranges of a whole edition, as shares of the likely rate: 0.65 to 1.7 means from 35 % under to 70 % over. */
export interface RateScale {
  readonly least: number
  readonly most: number
}

/** The scale that all ranges of these rates fit on, ends rounded outward to 5 %. Rates with a likely price of 0 have no range. */
export function rateScale(rates: readonly Pick<Rate, 'low' | 'likely' | 'high'>[]): RateScale {
  const shares = rates.map(rangeOf).filter((range) => range !== null)
  const outward = (share: number, round: (value: number) => number) => round(Number((share * 20).toFixed(6))) / 20
  return {
    least: outward(Math.min(0.9, ...shares.map(({ low }) => low)), Math.floor),
    most: outward(Math.max(1.1, ...shares.map(({ high }) => high)), Math.ceil),
  }
}

/** Low and high as shares of the likely rate; null where that is 0. For drawing only, never for money. */
export function rangeOf({ low, likely, high }: Pick<Rate, 'low' | 'likely' | 'high'>): { low: number; high: number } | null {
  const middle = Number(likely)
  return middle > 0 ? { low: Number(low) / middle, high: Number(high) / middle } : null
}

/** Change from an earlier likely rate, as a share of it; null where there is none to compare with. */
export function changeOf(likely: string, before: string | undefined): number | null {
  if (before === undefined || Number(before) === 0) return null
  return Number(likely) / Number(before) - 1
}
