import type { Decimal } from '#shared/pricing/decimal'
import type { PriceLevel } from '#shared/pricing/threeDecimals'

export const LEVELS: readonly PriceLevel[] = ['low', 'likely', 'high']

/** Columns of the three prices, by sheet. */
export const LEVEL_COLUMNS = {
  resources: { low: 'E', likely: 'F', high: 'G' },
  gangs: { low: 'E', likely: 'F', high: 'G' },
  buildUps: { low: 'L', likely: 'M', high: 'N' },
} as const satisfies Record<string, Record<PriceLevel, string>>

/** Digits that a spreadsheet keeps of a number. */
const KEPT_DIGITS = 15

/** A value as it is kept beside a formula. */
export const cached = (value: Decimal): string => value.toSignificantDigits(KEPT_DIGITS).toFixed()
