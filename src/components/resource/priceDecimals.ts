/** Decimals that a price is written with: two, or as many as it has. */
export function priceDecimals(amount: string): number {
  return Math.max(2, amount.split('.')[1]?.length ?? 0)
}
