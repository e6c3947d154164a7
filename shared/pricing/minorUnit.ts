/**
 * Currencies whose minor unit is not a hundredth, with their number of decimals.
 *
 * Source: ISO 4217:2015 and its current list of codes, column "minor unit"; from memory
 */
const DECIMALS: ReadonlyMap<string, number> = new Map([
  ...['BIF', 'CLP', 'DJF', 'GNF', 'ISK', 'JPY', 'KMF', 'KRW', 'PYG', 'RWF', 'UGX', 'UYI', 'VND', 'VUV', 'XAF', 'XOF', 'XPF'].map(
    (code) => [code, 0] as const,
  ),
  ...['BHD', 'IQD', 'JOD', 'KWD', 'LYD', 'OMR', 'TND'].map((code) => [code, 3] as const),
  ...['CLF', 'UYW'].map((code) => [code, 4] as const),
])

/**
 * Decimals of a currency's minor unit: 2 for USD, 0 for JPY, 3 for KWD. A code that is not listed has hundredths.
 *
 * @param currency - three capital letters
 */
export function minorUnit(currency: string): number {
  return DECIMALS.get(currency) ?? 2
}
